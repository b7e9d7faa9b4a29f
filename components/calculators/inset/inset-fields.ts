/** Names of the page's fields beside the API's own: `preset` is a choice of thickness, `each.ab` a side's own inset, `veneerOn.ab` a side with veneer. */
export const sides = ["ab", "bc", "cd", "da"] as const;
export type Side = (typeof sides)[number];

/** Panel thicknesses by their label (PS 1 and PS 2 performance categories). */
export const presets = ["7/16 in", "15/32 in", "1/2 in", "19/32 in"] as const;

type Tree = Record<string, unknown>;

const isTree = (value: unknown): value is Tree => typeof value === "object" && value !== null && !Array.isArray(value);
const treeOf = (value: unknown): Tree => (isTree(value) ? value : {});

/** The page's input as the API takes it: sides on their own join the common inset, a pair of diagonals counts once both are there. */
export function prepareInset(input: Tree): Tree {
  const { preset, each, veneerOn, inset, veneer, slabDiagonals, chalkDiagonals, ...rest } = input;
  const common = typeof inset === "string" ? inset : typeof preset === "string" ? preset : undefined;
  return withoutGaps({ ...rest, inset: insetOf(common, { ...treeOf(inset), ...treeOf(each) }), veneer: veneerOf(veneer, treeOf(veneerOn)), slabDiagonals: pairOf(slabDiagonals), chalkDiagonals: pairOf(chalkDiagonals) });
}

function insetOf(common: string | undefined, own: Tree): unknown {
  if (Object.keys(own).length === 0) return common;
  return withoutGaps(Object.fromEntries(sides.map((side) => [side, own[side] ?? common])));
}

function veneerOf(veneer: unknown, on: Tree): unknown {
  const some = sides.filter((side) => on[side] === "true");
  if (typeof veneer !== "string" || some.length === 0) return veneer;
  return Object.fromEntries(some.map((side) => [side, veneer]));
}

function pairOf(pair: unknown): unknown {
  return isTree(pair) && pair.ac !== undefined && pair.bd !== undefined ? pair : undefined;
}

function withoutGaps(tree: Tree): Tree {
  return Object.fromEntries(Object.entries(tree).filter(([, value]) => value !== undefined));
}

const notLengths = /^(preset|veneerOn\.)/;

export function isLengthField(name: string): boolean {
  return !notLengths.test(name);
}
