import { ownRule } from "../anchors/anchors-fields";
import { readPastedBolts } from "../anchors/pasted-bolts";

/**
 * Names of the page's fields beside the API's own: `planFrom` (walls or pieces), `measuredFrom` for all bolts, `inside.A` for inside
 * corners, `own.*` for a rule from one's drawings, and `paste.0`, a wall's bolts as text, which only a browser without script sends.
 */
export type PlanFrom = "walls" | "pieces";
type Tree = Record<string, unknown>;
type Value = (name: string) => string;

const isTree = (value: unknown): value is Tree => typeof value === "object" && value !== null && !Array.isArray(value);
const listOf = (value: unknown): Tree[] => (Array.isArray(value) ? value.filter(isTree) : []);

export const defaults: Readonly<Record<string, string>> = { "stock.0.length": "16 ft", shortest: "24 in" };

export function planFromOf(value: Value): PlanFrom {
  const chosen = value("planFrom");
  if (chosen === "walls" || chosen === "pieces") return chosen;
  return value("pieces.0.length") !== "" && value("walls.0.length") === "" ? "pieces" : "walls";
}

/** A rectangle's four walls, then more round the house. */
export function wallNameOf(value: Value, row: number): string {
  const letter = (index: number) => String.fromCharCode(97 + (index % 26));
  return value(`walls.${row}.name`) || (row === 3 ? "da" : letter(row) + letter(row + 1));
}

/** Corners that two of the walls share, each with those two. */
export function sharedCorners(names: readonly string[]): { corner: string; walls: readonly string[] }[] {
  const byCorner = new Map<string, string[]>();
  for (const name of names) if (/^[a-z]{2}$/i.test(name)) for (const letter of name.toUpperCase()) byCorner.set(letter, [...(byCorner.get(letter) ?? []), name.toLowerCase()]);
  return [...byCorner].filter(([, walls]) => walls.length === 2).sort(([a], [b]) => (a < b ? -1 : 1)).map(([corner, walls]) => ({ corner, walls }));
}

/** The page's input as the API takes it: rows not filled in left out, names given to walls that have none. */
export function preparePlates(input: Tree): Tree {
  const { planFrom, measuredFrom, inside, own, paste, walls, pieces, stock, corners, insideCorners, rule, ...rest } = input;
  const cuts = listOf(pieces).filter((piece) => piece.length !== undefined);
  const byPieces = planFrom === "pieces" || (planFrom === undefined && cuts.length > 0 && !Array.isArray(walls));
  const boards = listOf(stock).filter((board) => board.length !== undefined);
  const shared = { ...rest, stock: boards.length === 0 ? [{}] : boards, ...(rule === "own" ? { rule: ownRule(isTree(own) ? own : {}) } : rule === undefined ? {} : { rule }) };
  if (byPieces) return { ...shared, pieces: cuts.length === 0 ? [{}] : cuts };
  const texts = Array.isArray(paste) ? paste : [];
  const rows = listOf(walls).map((wall, row) => wallOf(wall, row, measuredFrom, texts[row]));
  const kept = rows.filter(({ length, bolts }) => length !== undefined || bolts !== undefined);
  const names = new Set(kept.map(({ name }) => String(name).toLowerCase()));
  const through = Object.fromEntries(Object.entries(isTree(corners) ? corners : {}).filter(([, wall]) => names.has(String(wall).toLowerCase())));
  const inward = [...(Array.isArray(insideCorners) ? insideCorners : []), ...Object.entries(isTree(inside) ? inside : {}).flatMap(([corner, on]) => (on === "true" ? [corner] : []))];
  return { ...shared, walls: kept.length === 0 ? [{ name: "ab" }] : kept, ...(Object.keys(through).length === 0 ? {} : { corners: through }), ...(inward.length === 0 ? {} : { insideCorners: inward }) };
}

function wallOf({ bolts, openings, steps, ...wall }: Tree, row: number, measuredFrom: unknown, pasted: unknown): Tree {
  const typed = listOf(bolts).filter((bolt) => bolt.station !== undefined);
  const all = [...typed, ...(typeof pasted === "string" ? readPastedBolts(pasted) : [])].map((bolt) => ("from" in bolt || typeof measuredFrom !== "string" ? bolt : { ...bolt, from: measuredFrom }));
  const gaps = listOf(openings).filter(({ from, to }) => from !== undefined || to !== undefined);
  const heights = (Array.isArray(steps) ? steps : []).filter((step) => step !== undefined);
  return { name: wallNameOf(() => String(wall.name ?? ""), row), ...wall, ...(all.length === 0 ? {} : { bolts: all }), ...(gaps.length === 0 ? {} : { openings: gaps }), ...(heights.length === 0 ? {} : { steps: heights }) };
}

const notLengths = /^(planFrom|measuredFrom|rule|timeLimit|corners\..*|inside\..*|insideCorners\..*|paste\..*|own\.(boltsPerPiece|middleThird))$|\.(name|price|count|from|engineered|strap|joinsOffsetPanels)$|^rule\.(id|title|.*\.(clause|source|status|diameters))$|boltsPerPiece|middleThird/;

export function isLengthField(name: string): boolean {
  return /^walls\.\d+\.openings\.\d+\.from$/.test(name) || !notLengths.test(name);
}
