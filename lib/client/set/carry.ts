import type { SillSet, Texts } from "./schema";
import { chosenFor, wallsOf, type Slot, type Stage } from "./stages";

/** What an earlier calculation gives, or null while it has no answer. */
export type GivesOf = (slotId: string) => Texts | null;

type Taker = (gives: { concrete: Texts | null; chalk: Texts | null; bolts: (wall: string) => Texts | null; plates: Texts | null; concreteBy: string; chalkBy: string; walls: readonly string[] }, slot: Slot) => Texts | null;

const pick = (gives: Texts, names: Readonly<Record<string, string>>): Texts =>
  Object.fromEntries(Object.entries(names).flatMap(([field, name]) => (gives[name] === undefined || gives[name] === "" ? [] : [[field, gives[name]]])));

const under = (gives: Texts, start: string): Texts => Object.fromEntries(Object.entries(gives).filter(([name]) => name.startsWith(start)));

/** Four walls of which opposite ones are alike can be rechecked by two sizes; others by their four sides. */
function chalkSizes(chalk: Texts, walls: readonly string[]): Texts {
  if (walls.length !== 4) return {};
  const [ab, bc, cd, da] = walls.map((wall) => chalk[`line.${wall}`] ?? "");
  return ab === cd && bc === da ? { length: ab!, width: bc! } : {};
}

/** The pulls a recheck of any plan asks for: every chalk line, then the diagonals that prove its corners. Their readings are still to come. */
function chalkPulls(chalk: Texts, walls: readonly string[]): Texts {
  const checks = Object.keys(under(chalk, "check.")).map((name) => name.slice("check.".length));
  const pulls = [...walls, ...(checks.length === 0 && walls.length === 4 ? ["ac", "bd"] : checks)].filter((name) => /^[a-z]{2}$/.test(name));
  const rows = pulls.flatMap((name, index): [string, string][] => [[`readings.${index}.from`, name[0]!.toUpperCase()], [`readings.${index}.to`, name[1]!.toUpperCase()]]);
  return { by: "readings", inset: "0 in", ...Object.fromEntries(rows), ...pick(chalk, { burn: "burn", inside: "inside" }) };
}

/** The fields that each calculation takes from those before it, with the values they have now; null while those have no answer. */
const takers: Readonly<Record<string, Taker>> = {
  "concrete.level": ({ concrete }) => concrete && pick(concrete, { length: "length", width: "width" }),
  "chalk.inset": ({ concrete }) => concrete && pick(concrete, { length: "length", width: "width", burn: "burn", ...(concrete.tapered === "true" ? {} : { "slabDiagonals.ac": "ac", "slabDiagonals.bd": "bd" }) }),
  "chalk.fit": ({ concrete, concreteBy }) => {
    if (concrete === null) return null;
    if (concreteBy === "footprint") return { ...under(concrete, "corners."), ...pick(concrete, { walk: "walk", burn: "burn" }) };
    const sides = under(concrete, "sides.");
    return { ...(Object.keys(sides).length > 0 ? sides : pick(concrete, { length: "length", width: "width" })), ...pick(concrete, { "diagonals.ac": "ac", "diagonals.bd": "bd", burn: "burn" }) };
  },
  "recheck.squareness": ({ chalk, walls }) => chalk && { ...chalkSizes(chalk, walls), ...pick(chalk, { burn: "burn", "diagonals.ac": "ac", "diagonals.bd": "bd" }) },
  "recheck.footprint": ({ chalk, walls }) => chalk && chalkPulls(chalk, walls),
  "bolts.anchors": ({ chalk }, { wall = "ab" }) => chalk && { ...pick(chalk, { "pieces.0.to": `line.${wall}`, inset: `inset.${wall}` }), mode: "check", ...(["ab", "bc", "cd", "da"].includes(wall) ? { wall } : {}) },
  "plates.plates": ({ chalk, bolts, walls }) =>
    chalk && {
      ...Object.fromEntries(
        walls.flatMap((wall, index) => {
          const own = Object.entries(under(bolts(wall) ?? {}, "bolts.")).map(([name, text]): [string, string] => [`walls.${index}.${name}`, text]);
          return [[`walls.${index}.name`, wall], [`walls.${index}.length`, chalk[`line.${wall}`] ?? ""] as [string, string], ...own];
        }),
      ),
      ...Object.fromEntries((chalk.inside ?? "").split(", ").flatMap((corner) => (corner === "" ? [] : [[`inside.${corner}`, "true"]]))),
      ...pick(bolts(walls[0] ?? "ab") ?? {}, { rule: "rule", diameter: "diameter", plateWidth: "plateWidth" }),
    },
  "takeoff.takeoff": ({ plates }) => plates && Object.fromEntries(Object.entries(under(plates, "takeoff.")).map(([name, text]) => [name.slice("takeoff.".length), text])),
  "marks.marks": ({ chalk, bolts, walls }) => {
    const wall = walls[0] ?? "ab";
    const stations = Object.entries(bolts(wall) ?? {}).filter(([name]) => /^bolts\.\d+\.station$/.test(name));
    return chalk && { ...pick(chalk, { length: `line.${wall}` }), ...Object.fromEntries(stations) };
  },
};

/** The values a calculation would take now, without blanks; null while there is nothing to take them from. */
export function carriedInto(set: SillSet, stages: readonly Stage[], slot: Slot, givesOf: GivesOf = (id) => set.calculations[id]?.result?.gives ?? null): Texts | null {
  const taker = takers[`${slot.stage}.${slot.calculator}`];
  if (taker === undefined) return {};
  const by = (name: Stage["name"]) => {
    const stage = stages.find((known) => known.name === name);
    return stage === undefined ? "" : chosenFor(set, stage);
  };
  const [concreteBy, chalkBy] = [by("concrete"), by("chalk")];
  const taken = taker(
    {
      concrete: givesOf(`concrete.${concreteBy}`),
      chalk: givesOf(`chalk.${chalkBy}`),
      bolts: (wall) => givesOf(`bolts.${by("bolts")}.${wall}`),
      plates: givesOf(`plates.${by("plates")}`),
      concreteBy,
      chalkBy,
      walls: wallsOf(set),
    },
    slot,
  );
  return taken === null ? null : Object.fromEntries(Object.entries(taken).filter(([, text]) => text !== ""));
}

/** Whether two takings say the same. */
export function sameTexts(a: Texts, b: Texts): boolean {
  const names = Object.keys(a);
  return names.length === Object.keys(b).length && names.every((name) => a[name] === b[name]);
}

/** The names whose carried value is another now than when it was taken. */
export function changedSince(set: SillSet, stages: readonly Stage[], slot: Slot): string[] {
  const taken = set.calculations[slot.id]?.taken ?? {};
  if (Object.keys(taken).length === 0) return [];
  const now = carriedInto(set, stages, slot);
  if (now === null) return [];
  return [...new Set([...Object.keys(taken), ...Object.keys(now)])].filter((name) => taken[name] !== now[name]);
}

/**
 * The change that takes the values as they are now: every one of them, even over a value typed since. What was taken before,
 * is taken no longer and was left as it came goes; what the person added stays.
 */
export function takingPatch(set: SillSet, slot: Slot, now: Texts): { fields: Record<string, string | null>; taken: Texts } {
  const calculation = set.calculations[slot.id];
  const gone = Object.entries(calculation?.taken ?? {}).flatMap(([name, text]): [string, null][] => (now[name] === undefined && calculation?.fields[name] === text ? [[name, null]] : []));
  return { fields: { ...Object.fromEntries(gone), ...now }, taken: now };
}

/** Whether the values may be taken without asking: nothing was taken yet, and none of their fields says otherwise. */
export function mayTakeQuietly(set: SillSet, slot: Slot, now: Texts): boolean {
  const calculation = set.calculations[slot.id];
  if (calculation === undefined) return true;
  return Object.keys(calculation.taken).length === 0 && Object.keys(now).every((name) => ["", now[name]].includes(calculation.fields[name] ?? ""));
}
