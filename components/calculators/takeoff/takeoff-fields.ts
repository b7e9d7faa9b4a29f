type Tree = Record<string, unknown>;
const isTree = (value: unknown): value is Tree => typeof value === "object" && value !== null && !Array.isArray(value);

/** The page's input as the API takes it: board rows not yet filled in left out, a count of 1 where none is typed. */
export function prepareTakeoff(input: Tree): Tree {
  const { lumber, ...rest } = input;
  const rows = (Array.isArray(lumber) ? lumber : []).filter(isTree).filter(({ length, count }) => length !== undefined || count !== undefined);
  return { ...rest, lumber: rows.length === 0 ? [{ count: "1" }] : rows.map((row) => ({ ...row, count: row.count ?? "1" })) };
}

export const lengthNames = ["plateLength", "plateWidth", "plateThickness", "diameter", "sealerRoll", "anchorDepth", "anchorHole"] as const;

export function isLengthField(name: string): boolean {
  return /^lumber\.\d+\.length$/.test(name) || (lengthNames as readonly string[]).includes(name);
}
