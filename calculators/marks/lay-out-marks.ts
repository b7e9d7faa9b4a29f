import { Length, roundLength } from "../length";
import { CalculationError, measure } from "../schema";
import type { MarksAnswer } from "./answer";
import { findConflicts, type Conflict, type PlateBolt } from "./find-conflicts";
import type { MarksInput } from "./input";
import { layJoists, type Joist } from "./lay-joists";

const defaultThickness = Length.from(1.5);
const defaultDiameter = Length.from(0.5);
/** A 1/2 in cut washer is 1 3/8 in across (ASME B18.21.1 type A, from memory). */
const defaultWasher = Length.from(1.375);
const sheets = [Length.from(8, "ft"), Length.from(2400, "mm")] as const;

/**
 * Where the joists or studs land: running marks from one end, each from zero, and what they hit.
 *
 * Units: exact rational inches; texts are rounded each by itself, so that rounding never adds up (domain.md J06).
 * Source: near edges at spacing less half a thickness, so that a sheet begun at the outside of the rim breaks on a centre
 * (framing book page, J01; J02 with its misprint put right); lapped joists shift the opposite wall's marks by a
 * thickness (Modern Carpentry p. 246; Miller, J05).
 *
 * @throws CalculationError `too-many-marks`, `shorter-than-joists`.
 * @example 16 in on centre with 1 1/2 in joists begins 15 1/4, 31 1/4, 47 1/4, 63 1/4 (J01).
 */
export function layOutMarks(input: MarksInput): MarksAnswer {
  const { length, spacing, precision } = input;
  const thickness = input.thickness ?? defaultThickness;
  const first = input.first ?? spacing;
  const line = { length, spacing, thickness, first, most: input.mostMarks ?? 1000 };
  const joists = layJoists(line);
  const shift = input.lap === "before" ? thickness.negated() : thickness;
  const opposite = input.lapped === true ? layOpposite(line, shift) : null;
  const show = (value: Length) => measure(value, precision);
  const shown = ({ kind, mark }: Joist) => ({ kind, mark: show(mark), centre: show(mark.plus(thickness.over(2))), far: show(mark.plus(thickness)) });
  const clearance = input.clearance ?? Length.zero;
  const bolts = (list: MarksInput["bolts"]) => list.map((bolt): PlateBolt => ({ station: bolt.station, diameter: bolt.diameter ?? input.diameter ?? defaultDiameter, washer: bolt.washer ?? input.washer ?? defaultWasher }));
  const told = (found: readonly Conflict[], where: "here" | "opposite") => found.map(({ overlap, move, ...rest }) => ({ line: where, ...rest, overlap: show(overlap), move: show(move) }));
  const between = joists.slice(1, -1);
  const last = between.at(-1) ?? joists[0]!;
  const end = joists.at(-1)!;
  return {
    marks: between.map(({ mark }) => show(mark)),
    lastBay: show(length.minus(between.length === 0 ? Length.zero : last.mark.plus(thickness.over(2)))),
    lastClear: show(end.mark.minus(last.mark.plus(thickness))),
    lastBayOver: end.mark.minus(last.mark).compare(spacing) > 0,
    conflicts: [
      ...told(findConflicts(joists, bolts(input.bolts), thickness, clearance), "here"),
      ...(opposite === null ? [] : told(findConflicts(opposite, bolts(input.oppositeBolts), thickness, clearance), "opposite")),
    ],
    bolts: [
      ...bolts(input.bolts).map(({ station, washer }) => ({ line: "here" as const, station: show(station), washer: show(washer) })),
      ...(opposite === null ? [] : bolts(input.oppositeBolts).map(({ station, washer }) => ({ line: "opposite" as const, station: show(station), washer: show(washer) }))),
    ],
    joists: joists.map(shown),
    opposite: opposite === null ? null : opposite.slice(1, -1).map(({ mark }) => show(mark)),
    oppositeJoists: opposite === null ? null : opposite.map(shown),
    bays: joists.length - 1,
    sheetBreaks: sheetBreaks(input, joists, thickness, show),
    stepping: stepping(input, between, thickness, show),
  };
}

/** The opposite line: the same layout moved by a thickness, its end joists flush with the ends all the same. */
function layOpposite(line: Parameters<typeof layJoists>[0], shift: Length): Joist[] {
  const first = line.first.plus(shift);
  if (!first.isPositive()) throw new CalculationError([{ pointer: "/first", code: "no-room-to-lap", params: {} }]);
  return layJoists({ ...line, first });
}

/** Where sheets laid end to end from the start break, and whether a joist's centre is there. */
function sheetBreaks({ length, spacing, sheet }: MarksInput, joists: readonly Joist[], thickness: Length, show: (value: Length) => MarksAnswer["lastBay"]): MarksAnswer["sheetBreaks"] {
  const divides = (size: Length) => size.inches.div(spacing.inches).d === 1n;
  const size = sheet ?? sheets.find(divides) ?? sheets[0];
  const breaks: MarksAnswer["sheetBreaks"] = [];
  for (let at = size; at.compare(length) < 0 && breaks.length < 200; at = at.plus(size)) {
    const here = at;
    breaks.push({ at: show(here), onJoist: joists.some(({ mark }) => mark.plus(thickness.over(2)).equals(here)) });
  }
  return breaks;
}

/** What becomes of the last mark when the spacing is rounded first and then added up. */
function stepping({ spacing, precision, first }: MarksInput, between: readonly Joist[], thickness: Length, show: (value: Length) => MarksAnswer["lastBay"]): MarksAnswer["stepping"] {
  const { rounded } = roundLength(spacing, precision);
  const laid = between.filter(({ kind }) => kind === "layout");
  const last = laid.at(-1);
  if (last === undefined || rounded.equals(spacing) || first !== undefined) return null;
  const count = Math.round(last.mark.plus(thickness.over(2)).inches.div(spacing.inches).valueOf());
  const stepped = rounded.times(count).minus(thickness.over(2));
  return { step: show(rounded), last: show(stepped), off: show(stepped.minus(last.mark)) };
}
