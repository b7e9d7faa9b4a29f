/** Names of the page's fields beside the API's own: `toleranceBy` says which tolerance, `own.*` is one from the drawings, `paste` is only sent without script. */
export const toleranceWays = ["none", "half-in-20-ft", "quarter-in-10-ft", "own"] as const;
export type ToleranceWay = (typeof toleranceWays)[number];

type Tree = Record<string, unknown>;
const isTree = (value: unknown): value is Tree => typeof value === "object" && value !== null && !Array.isArray(value);

export function toleranceOf(value: (name: string) => string): ToleranceWay {
  const way = value("toleranceBy") || value("tolerance");
  return toleranceWays.find((known) => known === way) ?? (value("own.difference") === "" && value("tolerance.0.difference") === "" ? "none" : "own");
}

/** The page's input as the API takes it: rows not yet filled in left out, one way of giving the tolerance. */
export function prepareLevel(input: Tree): Tree {
  const { toleranceBy, own, paste, setups, tolerance, benchmark, ...rest } = input;
  const list = (Array.isArray(setups) ? setups : []).filter(isTree).map((setup) => withReadings(setup));
  const first = list[0] ?? {};
  const pasted = typeof paste === "string" && paste.trim() !== "" ? readPastedReadings(paste) : [];
  const all = pasted.length === 0 ? list : [{ ...first, readings: [...((first.readings as unknown[] | undefined) ?? []), ...pasted] }, ...list.slice(1)];
  const kept = all.filter((setup, index) => index === 0 || setup.backsight !== undefined || setup.readings !== undefined);
  const asked = toleranceBy === "own" ? (isTree(own) ? [own] : undefined) : toleranceBy === "none" ? undefined : (toleranceBy ?? tolerance);
  return { ...rest, setups: kept.length === 0 ? [{}] : kept, ...(asked === undefined ? {} : { tolerance: asked }), ...(isTree(benchmark) && Object.keys(benchmark).length > 0 ? { benchmark } : {}) };
}

/** Readings at the end that have no rod yet are blank rows. */
function withReadings(setup: Tree): Tree {
  const { readings, ...rest } = setup;
  const rows = Array.isArray(readings) ? readings.filter(isTree) : [];
  const last = rows.findLastIndex((row) => row.rod !== undefined);
  return last < 0 ? rest : { ...rest, readings: rows.slice(0, last + 1) };
}

export interface PastedReading {
  wall?: string;
  station?: string;
  rod: string;
}

/**
 * One reading a line: wall, station, rod, parted by tabs or semicolons, else by commas; or rod alone; or station and rod.
 * A line without a digit is a heading and is passed over.
 */
export function readPastedReadings(text: string): PastedReading[] {
  return text
    .split(/\r?\n/)
    .filter((line) => /\d/.test(line))
    .slice(0, 200)
    .flatMap((line) => {
      const parts = line.split(/[\t;]/.test(line) ? /[\t;]/ : ",").map((part) => part.trim()).filter((part) => part !== "");
      const named = /^[a-z]{1,2}$|^[^\d]{3,24}$/i.test(parts[0] ?? "") ? parts[0]! : null;
      const figures = named === null ? parts : parts.slice(1);
      const rod = figures.at(-1);
      if (rod === undefined) return [];
      return [{ ...(named === null ? {} : { wall: named.toLowerCase() }), ...(figures.length > 1 ? { station: figures[0]! } : {}), rod }];
    });
}

export function isLengthField(name: string): boolean {
  return !/^(toleranceBy|tolerance|paste|mostPairs)$|\.(wall|turn)$/.test(name);
}
