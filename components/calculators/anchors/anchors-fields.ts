import { readPastedBolts } from "./pasted-bolts";

/**
 * The page's fields beside the API's own: `mode`, `measuredFrom` for all bolts, `insetFirst` for the corner's other wall,
 * `own.*` for a rule from one's drawings, and `paste`, which only a browser without script sends.
 */
export type Mode = "layout" | "check";

type Tree = Record<string, unknown>;

const isTree = (value: unknown): value is Tree => typeof value === "object" && value !== null && !Array.isArray(value);
const treeOf = (value: unknown): Tree => (isTree(value) ? value : {});
const listOf = (value: unknown): unknown[] => (Array.isArray(value) ? value : []);

/** Which of the two an input means: by its word, else by the shape of its pieces. */
export function modeOf(input: Tree): Mode {
  if (input.mode === "check" || input.mode === "layout") return input.mode;
  return isTree(listOf(input.pieces)[0]) ? "check" : "layout";
}

const checkOnly = new Set(["bolts", "plateWidth", "plateThickness", "washerThickness", "wall", "inset", "clearOfBolts"]);
const layoutOnly = new Set(["module", "moduleStart"]);

/** The page's input as the API's layout or check takes it. */
export function prepareAnchors(input: Tree): Tree {
  const mode = modeOf(input);
  const { mode: _, measuredFrom, insetFirst, own, paste, widthPreset, ...rest } = input;
  const foreign = mode === "layout" ? checkOnly : layoutOnly;
  const shared = Object.fromEntries(Object.entries(rest).filter(([name]) => !foreign.has(name)));
  if (shared.rule === "own") shared.rule = ownRule(treeOf(own));
  if (mode === "layout") return { ...shared, ...(shared.pieces === undefined ? {} : { pieces: listOf(shared.pieces).filter((piece) => !isTree(piece)) }) };
  const pieces = listOf(shared.pieces).filter(isTree);
  const bolts = Array.isArray(shared.bolts) ? shared.bolts : typeof paste === "string" ? readPastedBolts(paste) : [];
  const inset = typeof insetFirst === "string" && typeof shared.inset === "string" ? insetPair(String(shared.wall ?? "ab"), shared.inset, insetFirst) : shared.inset;
  return {
    ...shared,
    ...(inset === undefined ? {} : { inset }),
    ...(shared.plateWidth === undefined && typeof widthPreset === "string" ? { plateWidth: widthPreset } : {}),
    pieces: pieces.length === 0 ? [{ from: "0" }] : withStarts(pieces),
    bolts: bolts.map((bolt) => (isTree(bolt) && bolt.from === undefined && typeof measuredFrom === "string" ? { ...bolt, from: measuredFrom } : bolt)),
  };
}

/** A piece begins where the one before it ends, the first at 0. */
function withStarts(pieces: readonly Tree[]): Tree[] {
  return pieces.map((piece, index) => ({ ...piece, from: piece.from ?? (index === 0 ? "0" : pieces[index - 1]!.to) }));
}

const wallBefore: Record<string, string> = { ab: "da", bc: "ab", cd: "bc", da: "cd" };

function insetPair(wall: string, own: string, first: string): Tree {
  return { ab: own, bc: own, cd: own, da: own, [wallBefore[wall] ?? "da"]: first };
}

export const ownFigures = ["spacing", "endMinimum", "endMaximum", "diameter", "edgeCover"] as const;

/** Figures from one's own drawings, as the API takes a rule. */
export function ownRule(own: Tree): Tree {
  const figures = Object.fromEntries(ownFigures.flatMap((name) => (own[name] === undefined ? [] : [[name, { value: own[name] }]])));
  return { ...figures, ...(own.boltsPerPiece === undefined ? {} : { boltsPerPiece: { value: own.boltsPerPiece } }), ...(own.middleThird === "true" ? { middleThird: { value: "true" } } : {}) };
}

const notLengths = /^(mode|rule|measuredFrom|wall|joinsOffsetPanels|shearWall|paste|widthPreset|own\.(boltsPerPiece|middleThird))$|^rule\.(id|title|.*\.(clause|source|status|diameters))$|boltsPerPiece|middleThird|^bolts\.\d+\.(from|engineered)$/;

export function isLengthField(name: string): boolean {
  return !notLengths.test(name);
}
