import { parseLength, printLength, type Length, type Precision } from "@/calculators/length";
import type { LengthAnswer } from "@/calculators/schema/measure";
import { byCorners, onTape, shownAs, unitOfInput, withLean, type Context } from "../context";
import type { Table } from "../sheet";

type Shown = string | null;

/** Each pull on concrete, what the chalk must read, and what it read: with the burn in, as the tape shows it. */
export function readingsTable(context: Context): Table | null {
  const { t, answers, precision } = context;
  const { square, footprint, inset, fit, recheck, repulled } = answers;
  const pullsOf = (asked: typeof footprint) => typedPulls(asked?.input, precision);
  const rows: { name: string; concrete: Shown; expected: Shown; chalk: Shown }[] = [];
  const shownReading = (reading: { reading: LengthAnswer | null; measured: LengthAnswer } | null | undefined): Shown => (reading === null || reading === undefined ? null : onTape(reading.reading ?? reading.measured, precision));
  const row = (name: string, concrete: Shown, expected: Shown, chalk: Shown) => {
    if (concrete !== null || expected !== null || chalk !== null) rows.push({ name, concrete, expected, chalk });
  };
  const fitCheck = (name: string): LengthAnswer | undefined => fit?.answer.checks.find(({ from, to }) => `${from}${to}`.toLowerCase() === name)?.reading;
  if (footprint === null) {
    for (const name of ["ab", "bc", "cd", "da"] as const) row(byCorners(name), shownReading(square?.answer.readings[name]), null, shownReading(recheck?.answer.readings[name]));
    for (const name of ["ac", "bd"] as const) {
      const expected = inset?.answer.expected[name].reading ?? fitCheck(name);
      const typed = typedChalk(inset?.input, name);
      row(byCorners(name), shownReading(square?.answer.readings[name]), expected === undefined ? null : onTape(expected, precision), shownReading(recheck?.answer.readings[name]) ?? (typed === null ? null : printLength(typed, precision, "inches")));
    }
    const [ac, bd] = [typedChalk(inset?.input, "ac"), typedChalk(inset?.input, "bd")];
    row(t("sheet.readings.difference"), square?.answer.difference.text ?? null, null, recheck?.answer.difference.text ?? (ac === null || bd === null ? null : printLength(ac.minus(bd).magnitude(), precision)));
  } else {
    const [pulled, again] = [pullsOf(footprint), pullsOf(repulled)];
    const known = new Map(fit?.answer.checks.map(({ from, to, reading }) => [pullName(from, to), reading]));
    const proving = new Map(footprint.answer.checks.map((check) => [pullName(check.from, check.to), check]));
    for (const name of new Set([...pulled.keys(), ...proving.keys(), ...known.keys(), ...again.keys()])) {
      const check = proving.get(name);
      const expected = known.get(name) ?? check?.chalk?.reading;
      const [read, chalk] = [pulled.get(name), again.get(name)];
      const concrete = read ?? (check === undefined || pulled.size > 0 ? null : onTape(check.reading, precision));
      row(byCorners(name), concrete, expected === undefined ? null : onTape(expected, precision), chalk ?? null);
    }
  }
  if (rows.length === 0) return null;
  const source = square ?? footprint ?? inset ?? fit ?? recheck;
  const burn = typeof source?.input.burn === "string" ? shownAs(source.input.burn, precision, unitOfInput(source.input)) : null;
  const columns = (["concrete", "expected", "chalk"] as const).filter((name) => rows.some((entry) => entry[name] !== null));
  return {
    kind: "table",
    id: "readings",
    title: t("sheet.readings.title"),
    note: burn === null || /^0\b/.test(burn) ? t("sheet.readings.plain") : t("sheet.readings.burned", { burn }),
    columns: [{ text: t("sheet.readings.pull"), share: 3 }, ...columns.map((name) => ({ text: t(`sheet.readings.${footprint?.answer.adjustment === null && name === "concrete" ? "mustRead" : name}`), figure: true, share: 3.4 }))],
    rows: rows.map((entry) => [entry.name, ...columns.map((name) => entry[name] ?? "")]),
  };
}

/** A pull is the same from either end. */
const pullName = (from: string, to: string) => (from < to ? `${from}${to}` : `${to}${from}`);

/** Pulls of a braced polygon as typed, burn included: by their corners, those between corners alone. */
function typedPulls(input: Readonly<Record<string, unknown>> | undefined, precision: Precision): Map<string, string> {
  const rows = Array.isArray(input?.readings) ? (input.readings as Record<string, unknown>[]) : [];
  return new Map(
    rows.flatMap(({ from, to, reading }): [string, string][] => {
      if (input === undefined || typeof from !== "string" || typeof to !== "string" || typeof reading !== "string" || reading.trim() === "") return [];
      return [[pullName(from.toUpperCase(), to.toUpperCase()), shownAs(reading, precision, unitOfInput(input), "inches")]];
    }),
  );
}

/** A chalk diagonal typed with the chalk lines, where no recheck says more. */
function typedChalk(input: Readonly<Record<string, unknown>> | undefined, name: "ac" | "bd"): Length | null {
  const typed = (input?.chalkDiagonals as Record<string, unknown> | undefined)?.[name];
  if (input === undefined || typeof typed !== "string") return null;
  try {
    return parseLength(typed, unitOfInput(input));
  } catch {
    return null;
  }
}

/** Where each chalk corner is marked: from the two slab edges that meet there, square to them. */
export function offsetsTable({ t, answers }: Context): Table | null {
  const offsets: Readonly<Record<string, Readonly<Record<string, LengthAnswer>>>> | undefined = answers.fit?.answer.offsets ?? answers.inset?.answer.offsets;
  if (offsets === undefined) return null;
  return {
    kind: "table",
    id: "offsets",
    title: t("sheet.offsets.title"),
    columns: [{ text: t("sheet.offsets.corner"), share: 1 }, ...[1, 2].map(() => ({ text: t("sheet.offsets.edge"), figure: true, share: 2 }))],
    rows: Object.entries(offsets).map(([corner, bySide]) => [corner, ...Object.entries(bySide).map(([side, length]) => `${byCorners(side)} ${withLean(length, t)}`)]),
  };
}

/** How long each chalk line is. */
export function linesTable({ t, answers }: Context): Table | null {
  const lines: readonly [string, string][] = Object.entries<LengthAnswer>(answers.fit?.answer.lines ?? answers.inset?.answer.lines ?? {}).map(([side, length]) => [side, withLean(length, t)]);
  if (lines.length === 0) return null;
  return { kind: "table", id: "lines", title: t("sheet.lines.title"), columns: [{ text: t("sheet.lines.line"), share: 1 }, { text: t("sheet.lines.length"), figure: true, share: 2 }], rows: lines.map(([side, text]) => [byCorners(side), text]) };
}

/** What goes under the plate at each reading, from the highest point. */
export function shimsTable({ t, answers }: Context): Table | null {
  if (answers.level === null) return null;
  const { shims, spread } = answers.level.answer;
  return {
    kind: "table",
    id: "level",
    title: t("sheet.level.title"),
    note: t("sheet.level.spread", { spread: spread.text }),
    columns: [{ text: t("sheet.level.reading"), share: 1 }, { text: t("sheet.level.wall"), share: 1 }, { text: t("sheet.level.station"), figure: true, share: 2 }, { text: t("sheet.level.shim"), figure: true, share: 2 }],
    rows: shims.map(({ index, wall, station, shim }) => [String(index + 1), wall === null ? "" : byCorners(wall), station?.text ?? "", withLean(shim, t)]),
  };
}
