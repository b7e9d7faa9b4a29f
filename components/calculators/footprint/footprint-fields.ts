import { insetOf, isTree, withoutBlankEnd } from "../plan/plan-fields";

/** Names of the page's fields beside the API's own: `by` says how the plan is given, `each.ab` is a side's own inset, `runs.0.bearing` a direction that is none of four. */
export const ways = ["runs", "walk", "readings"] as const;
export type Way = (typeof ways)[number];

export const towards = ["E", "N", "W", "S"] as const;

/** Round the plan counter-clockwise, turning left at each corner: what a new run most likely does. */
export function nextToward(last: string): string {
  const at = towards.findIndex((toward) => toward === last);
  return at < 0 ? "" : towards[(at + 1) % 4]!;
}

export const defaults: Readonly<Record<string, string>> = { inset: "7/16 in", "runs.0.toward": "E", "runs.1.toward": "N", "runs.2.toward": "W", "runs.3.toward": "S" };

/** How the plan is given: as chosen, else as the address fills it. */
export function wayOf(value: (name: string) => string, rows: (list: string) => number): Way {
  const chosen = ways.find((way) => way === value("by"));
  if (chosen !== undefined) return chosen;
  if (rows("readings") > 0) return "readings";
  return value("walk") === "" ? "runs" : "walk";
}

type Tree = Record<string, unknown>;

/** The page's input as the API takes it: one way of giving the plan, rows at the end that are still blank left out. */
export function prepareFootprint(input: Tree): Tree {
  const { by, square: _square, runs, walk, readings, inside, bows, inset: _inset, preset: _preset, each: _each, ...rest } = input;
  const way = typeof by === "string" ? by : readings !== undefined ? "readings" : walk !== undefined ? "walk" : "runs";
  const plan = way === "readings" ? { readings, inside } : way === "walk" ? { walk } : { runs: withBearings(withoutBlankEnd(runs, "length")) };
  return Object.fromEntries(Object.entries({ ...rest, ...plan, inset: insetOf(input), bows: withoutBlankEnd(bows, "outward") }).filter(([, value]) => value !== undefined));
}

function withBearings(runs: unknown): unknown {
  if (!Array.isArray(runs)) return runs;
  return runs.map((run) => {
    if (!isTree(run)) return run;
    const { bearing, ...rest } = run;
    return rest.toward === "bearing" || rest.toward === undefined ? { ...rest, toward: bearing } : rest;
  });
}

export function isLengthField(name: string): boolean {
  return !/^(by|square|walk|inside|preset)$|\.(toward|bearing|times|from|to|side)$/.test(name);
}

export interface PullRow {
  from: string;
  to: string;
  reading: string;
}

const letter = (index: number) => String.fromCharCode(65 + index);

/** The pulls proposed for so many corners: all sides, the diagonals from A, and one across that checks them. Readings already typed are kept. */
export function pullsFor(corners: number, typed: readonly PullRow[]): PullRow[] {
  const sides = Array.from({ length: corners }, (_, index) => [letter(index), letter((index + 1) % corners)] as const);
  const fan = Array.from({ length: Math.max(0, corners - 3) }, (_, index) => ["A", letter(index + 2)] as const);
  const across = corners > 3 ? [["B", letter(corners - 1)] as const] : [];
  const readingOf = (from: string, to: string) => typed.find((row) => (row.from === from && row.to === to) || (row.from === to && row.to === from))?.reading ?? "";
  return [...sides, ...fan, ...across].map(([from, to]) => ({ from, to, reading: readingOf(from, to) }));
}
