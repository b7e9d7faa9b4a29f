import { insetOf, isTree, withoutBlankEnd } from "../plan/plan-fields";

/** Names of the page's fields beside the API's own: `slabBy` says how the slab is given, `planBy` how the wanted plan is, `each.ab` is a side's own inset. */
export const slabWays = ["readings", "corners"] as const;
export const planWays = ["size", "walk", "none"] as const;
export type SlabWay = (typeof slabWays)[number];
export type PlanWay = (typeof planWays)[number];

export const modes = ["size-held", "size-free", "wall-held", "follow"] as const;

export const defaults: Readonly<Record<string, string>> = { inset: "7/16 in" };

type Value = (name: string) => string;

export function slabWayOf(value: Value, corners: number): SlabWay {
  return slabWays.find((way) => way === value("slabBy")) ?? (corners > 0 ? "corners" : "readings");
}

export function planWayOf(value: Value, slab: SlabWay): PlanWay {
  const chosen = planWays.find((way) => way === value("planBy"));
  if (chosen !== undefined) return chosen;
  if (value("walk") !== "") return "walk";
  return value("size.length") !== "" || slab === "readings" ? "size" : "none";
}

/** How many corners the form has: lettered one after another. */
export function cornersIn(value: Value): number {
  let count = 0;
  while (count < 26 && (value(`corners.${letter(count)}.x`) !== "" || value(`corners.${letter(count)}.y`) !== "")) count += 1;
  return count;
}

export const letter = (index: number) => String.fromCharCode(65 + index);

type Tree = Record<string, unknown>;

/** The page's input as the API takes it: one way of giving the slab and one of giving the plan, blank rows left out. */
export function prepareFit(input: Tree): Tree {
  const { slabBy, planBy, corners, length, width, sides, diagonals, size, walk, mode, held, edges, bolts, inset: _inset, preset: _preset, each: _each, ...rest } = input;
  const byCorners = slabBy === "corners" || (slabBy === undefined && corners !== undefined);
  const slab = byCorners ? { corners } : { length, width, sides, diagonals };
  const plan = planBy === "none" ? {} : planBy === "walk" ? { walk } : planBy === "size" ? { size: wholeSize(size) } : { size: wholeSize(size), walk };
  const hasPlan = Object.values(plan).some((value) => value !== undefined);
  // Without a size nothing can be held rigid: the choice on the page then means free sizes.
  const asked = mode === "size-held" && !hasPlan ? undefined : mode;
  const all = { ...rest, ...slab, ...plan, mode: asked, held: mode === "wall-held" ? held : undefined, edges: withoutBlankEnd(edges, "offset"), bolts: withoutBlankEnd(bolts, "station"), inset: insetOf(input) };
  return Object.fromEntries(Object.entries(all).filter(([, value]) => value !== undefined));
}

/** A size counts once both are there. */
function wholeSize(size: unknown): unknown {
  return isTree(size) && size.length !== undefined && size.width !== undefined ? size : undefined;
}

export function isLengthField(name: string): boolean {
  return !/^(slabBy|planBy|walk|mode|held|preset)$|\.wall$/.test(name);
}
