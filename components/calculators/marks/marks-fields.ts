/** Names of the page's fields beside the API's own: `module` is a spacing chosen, `paste` and `pasteOpposite` are only sent without script. */
export const modules = ["12 in", "16 in", "19.2 in", "24 in"] as const;
export const metricModules = ["400 mm", "600 mm"] as const;

export const defaults: Readonly<Record<string, string>> = { spacing: "16 in" };

type Tree = Record<string, unknown>;
const isTree = (value: unknown): value is Tree => typeof value === "object" && value !== null && !Array.isArray(value);

/** The page's input as the API takes it. */
export function prepareMarks(input: Tree): Tree {
  const { module, paste, bolts, oppositeBolts, spacing, ...rest } = input;
  const own = placed(bolts);
  const all = own.length > 0 || typeof paste !== "string" ? own : readPastedStations(paste).map((station) => ({ station }));
  const opposite = placed(oppositeBolts);
  return { ...rest, spacing: spacing ?? module, ...(all.length === 0 ? {} : { bolts: all }), ...(opposite.length === 0 ? {} : { oppositeBolts: opposite }) };
}

/** Rows that have a station; what a set carries along with it, such as an offset, is not asked here. */
function placed(bolts: unknown): Tree[] {
  return (Array.isArray(bolts) ? bolts : []).filter(isTree).flatMap(({ station, diameter, washer }) => (station === undefined ? [] : [{ station, ...(diameter === undefined ? {} : { diameter }), ...(washer === undefined ? {} : { washer }) }]));
}

/** Stations, one a line; what follows a tab, a semicolon or a comma on its line is passed over. */
export function readPastedStations(text: string): string[] {
  return text
    .split(/\r?\n/)
    .filter((line) => /\d/.test(line))
    .slice(0, 200)
    .map((line) => (line.split(/[\t;]/.test(line) ? /[\t;]/ : ",")[0] ?? "").trim())
    .filter((station) => station !== "");
}

export function isLengthField(name: string): boolean {
  return !/^(lapped|lap|paste|mostMarks)$/.test(name);
}
