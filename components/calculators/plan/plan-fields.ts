/** Panel thicknesses by their label (PS 1 and PS 2 performance categories). */
export const insetPresets = ["7/16 in", "15/32 in", "1/2 in", "19/32 in"] as const;

/** `ab` as people write it: A-B. */
export function spokenSide(side: string): string {
  return side.toUpperCase().split("").join("-");
}

type Tree = Record<string, unknown>;
export const isTree = (value: unknown): value is Tree => typeof value === "object" && value !== null && !Array.isArray(value);

/** The page's `inset`, `preset` and `each` as the API's inset: sides of their own beside one for the others. */
export function insetOf({ inset, preset, each }: Tree): unknown {
  const common = typeof inset === "string" ? inset : isTree(inset) ? undefined : preset;
  const own = { ...(isTree(inset) ? inset : {}), ...(isTree(each) ? each : {}) };
  if (Object.keys(own).length === 0) return common;
  return common === undefined ? own : { ...own, other: common };
}

/** Rows at the end that lack `field` are blank ones, not yet filled in. */
export function withoutBlankEnd(rows: unknown, field: string): unknown {
  if (!Array.isArray(rows)) return rows;
  const last = rows.findLastIndex((row) => isTree(row) && row[field] !== undefined);
  return last < 0 ? undefined : rows.slice(0, last + 1);
}
