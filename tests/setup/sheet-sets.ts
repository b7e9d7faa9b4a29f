import { readFileSync } from "node:fs";
import { operations } from "@/calculators";
import { levelOperation } from "@/calculators/level";
import { marksOperation } from "@/calculators/marks";
import { platesOperation } from "@/calculators/plates";
import { answerTo, queryFromInput, type Operation } from "@/calculators/schema";
import { takeoffOperation } from "@/calculators/takeoff";
import { loadMessages } from "@/lib/client/i18n/load-messages";
import type { Locale } from "@/lib/client/i18n/locales";
import { createTranslate } from "@/lib/client/i18n/translate";
import { adapterOf } from "@/lib/client/set/calculations";
import { demoSet } from "@/lib/client/set/demo-set";
import { newSet } from "@/lib/client/set/new-set";
import type { SillSet } from "@/lib/client/set/schema";
import { fingerprint } from "@/lib/client/set/stage-state";
import { stagesWith } from "@/lib/client/set/stages";
import type { SheetFonts } from "@/lib/client/sheet/pdf/make-pdf";
import { sheetOf } from "@/lib/client/sheet/sheet-of";
import { sheetKeys, sheetNamespaces } from "@/lib/client/sheet/sheet-texts";
import type { Paper } from "@/lib/client/sheet/sheet";

/** Every operation of the job, registered or not yet. */
export const sheetOperations: ReadonlyMap<string, Operation> = new Map([...operations, ...[platesOperation, takeoffOperation, marksOperation, levelOperation].map((operation): [string, Operation] => [operation.path, operation as Operation])]);
export const sheetStages = stagesWith(["squareness", "footprint", "level", "inset", "fit", "anchors", "plates", "takeoff", "marks"]);

const now = "2026-11-30T15:20:00.000Z";

/** Answers a stage's input as its page would, with the real core. */
function answered(set: SillSet, slot: string, path: string, input: Record<string, unknown>, choice?: [string, string]): SillSet {
  const [, calculator = "", wall] = slot.split(".");
  const fields = Object.fromEntries(queryFromInput(input));
  const shape = { fields, unit: "in" as const, precision: "1/16" as const };
  const { answer, issues } = answerTo(sheetOperations.get(path)!, input);
  if (answer === null) throw new Error(`${slot}: ${JSON.stringify(issues)}`);
  const adapter = adapterOf(calculator);
  const asked = { fields, unit: shape.unit, input, wall };
  const result = { operation: path, core: "1.0.0", input, of: fingerprint(shape), key: adapter?.key(answer) ?? { tone: "good" as const, code: "", params: {} }, gives: adapter?.gives(answer, asked) ?? {}, layers: adapter?.layers(answer, asked) ?? {} };
  return { ...set, choices: choice === undefined ? set.choices : { ...set.choices, [choice[0]]: choice[1] }, calculations: { ...set.calculations, [slot]: { ...shape, taken: {}, result } } };
}

const insetOf = { length: "336", width: "264", inset: "7/16", burn: "1 in", slabDiagonals: { ac: "428 9/16", bd: "428 1/16" }, chalkDiagonals: { ac: "427 1/8", bd: "427 1/16" } };

/** The readings of the demo set, on concrete and chalk: the invented workshop slab of 28 by 22 ft. */
export function slabSet(): SillSet {
  const begun = answered(newSet("sheet", "Workshop slab, Quarry Lane", now), "concrete.squareness", "squareness", { length: "28'", width: "22'", burn: "1 in", diagonals: { ac: "428 9/16", bd: "428 1/16" }, tolerance: "3/16" });
  return answered(begun, "chalk.inset", "insets", insetOf, ["chalk", "inset"]);
}

function boltsOf(wall: string) {
  const { fields } = demoSet("x", "", now).calculations[`bolts.anchors.${wall}`]!;
  const rows = Object.keys(fields).filter((name) => /^bolts\.\d+\.station$/.test(name));
  return rows.map((_, index) => ({ station: fields[`bolts.${index}.station`]!, offset: fields[`bolts.${index}.offset`]! }));
}

const lengths: Readonly<Record<string, string>> = { ab: "335 1/8", bc: "263 1/8", cd: "335 1/8", da: "263 1/8" };
const plate = { plateWidth: "5 1/2", diameter: "1/2", rule: "us-irc" };

/** With the demo's bolts judged, wall by wall. */
export const boltSet = (): SillSet => Object.keys(lengths).reduce((set, wall) => answered(set, `bolts.anchors.${wall}`, "anchors/check", { ...plate, pieces: [{ from: "0", to: lengths[wall] }], bolts: boltsOf(wall) }), slabSet());

/** The whole job: plates, takeoff, floor marks and level too. */
export function wholeSet(): SillSet {
  const walls = Object.entries(lengths).map(([name, length]) => ({ name, length, bolts: boltsOf(name) }));
  const plated = answered(boltSet(), "plates.plates", "plates", { ...plate, walls, corners: { A: "ab", B: "bc", C: "cd", D: "da" }, stock: [{ length: "16 ft" }, { length: "12 ft" }], kerf: "1/8", timeLimit: 0.3 });
  const taken = answered(plated, "takeoff.takeoff", "takeoffs", { lumber: [{ length: "16 ft", count: 8 }], plateLength: "98 ft", pieceCount: 9, bolts: 24, newAnchors: 4, waste: 5 });
  const marked = answered(taken, "marks.marks", "marks", { length: "335 1/8", spacing: "16", bolts: boltsOf("ab").map(({ station }) => ({ station })) });
  return answered(marked, "concrete.level", "levels", { setups: [{ backsight: "60", readings: [{ wall: "ab", station: "0", rod: "48 1/4" }, { wall: "ab", station: "28'", rod: "48 1/2" }, { wall: "cd", station: "0", rod: "48 3/8" }, { wall: "cd", station: "28'", rod: "48 1/8" }] }] });
}

/** An L of six corners by runs, fitted by the best fit: more than four walls. */
export function ellSet(): SillSet {
  const begun = answered(newSet("ell", "House, lot 9", now), "concrete.footprint", "footprints", { walk: "E 40 ft, N 20 ft, W 16 ft, N 12 ft, W 24 ft, S 32 ft", inset: "1/2" }, ["concrete", "footprint"]);
  return answered(begun, "chalk.fit", "fits", { corners: { A: { x: "0", y: "0" }, B: { x: "480", y: "0.5" }, C: { x: "480", y: "240" }, D: { x: "288", y: "240" }, E: { x: "288", y: "384.25" }, F: { x: "0", y: "384" } }, walk: "E 39' 11\", N 19' 11\", W 16 ft, N 12 ft, W 23' 11\", S 31' 11\"", inset: "1/2" }, ["chalk", "fit"]);
}

export const sheetTranslate = (locale: Locale) => createTranslate(locale, loadMessages(locale, sheetNamespaces, sheetKeys));

export const sheetFor = (set: SillSet, { locale = "en", paper = "letter", metric = false }: { locale?: Locale; paper?: Paper; metric?: boolean } = {}) =>
  sheetOf(set, { stages: sheetStages, t: sheetTranslate(locale), precision: metric ? "1mm" : "1/16", paper, now: new Date("2026-12-01T00:00:00Z"), origin: "https://sillwright.example", operations: sheetOperations });

export const sheetFonts = (): SheetFonts => Object.fromEntries((["heading", "text", "bold", "figure", "figure-bold"] as const).map((role) => [role, new Uint8Array(readFileSync(`public/fonts/sheet-${role}.ttf`))])) as unknown as SheetFonts;
