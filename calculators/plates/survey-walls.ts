import { boltsInOrder, type Bolt, type Piece } from "../anchors/survey";
import type { CheckInput } from "../anchors/check-input";
import { Length } from "../length";
import { CalculationError, type Issue } from "../schema";
import type { PlatesInput, WallInput } from "./input";

/** A wall as it will be plated: where its plate begins and ends, the parts nothing interrupts, and its bolts from the chalk. */
export interface SurveyedWall {
  index: number;
  name: string;
  input: WallInput;
  from: Length;
  to: Length;
  /** Parts of the sill between corners, openings and steps, in order. */
  parts: readonly Piece[];
  /** In order along the wall; those repeated and those in an opening are here too. */
  bolts: readonly Bolt[];
  straps: ReadonlySet<number>;
}

/**
 * The walls of a request, with corners, openings and steps settled.
 *
 * @throws CalculationError `same-name`, `not-a-wall-here`, `past-the-wall`, `piece-backwards`, `openings-overlap`, `inset-needed`, `no-plate-left`.
 */
export function surveyWalls(input: PlatesInput, plateWidth: Length, diameter: Length): SurveyedWall[] {
  const walls = input.walls ?? [];
  const issues: Issue[] = [];
  const names = walls.map((wall) => wall.name.toLowerCase());
  names.forEach((name, index) => {
    if (names.indexOf(name) !== index) issues.push({ pointer: `/walls/${index}/name`, code: "same-name", params: { name: walls[index]!.name } });
  });
  for (const [corner, through] of Object.entries(input.corners ?? {})) {
    const ok = through !== undefined && names.includes(through.toLowerCase()) && cornersOf(through)?.includes(corner) === true;
    if (through !== undefined && !ok) issues.push({ pointer: `/corners/${corner}`, code: "not-a-wall-here", params: { corner, wall: through } });
  }
  const surveyed = walls.map((wall, index) => surveyWall(input, wall, index, plateWidth, diameter, issues));
  if (issues.length > 0) throw new CalculationError(issues);
  return surveyed;
}

function surveyWall(input: PlatesInput, wall: WallInput, index: number, plateWidth: Length, diameter: Length, issues: Issue[]): SurveyedWall {
  const at = `/walls/${index}`;
  const corners = cornersOf(wall.name);
  const from = corners === null ? Length.zero : plateEnd(input, wall.name, corners[0]!, plateWidth);
  const to = wall.length.minus(corners === null ? Length.zero : plateEnd(input, wall.name, corners[1]!, plateWidth));
  const before = issues.length;
  wall.openings.forEach((opening, place) => {
    if (opening.from.compare(opening.to) >= 0) issues.push({ pointer: `${at}/openings/${place}/to`, code: "piece-backwards", params: {} });
    if (opening.to.compare(wall.length) > 0) issues.push({ pointer: `${at}/openings/${place}/to`, code: "past-the-wall", params: { wall: wall.name } });
  });
  wall.steps.forEach((step, place) => {
    if (step.compare(from) <= 0 || step.compare(to) >= 0) issues.push({ pointer: `${at}/steps/${place}`, code: "past-the-wall", params: { wall: wall.name } });
  });
  const openings = [...wall.openings].sort((a, b) => a.from.compare(b.from));
  openings.slice(1).forEach((opening, place) => {
    if (opening.from.compare(openings[place]!.to) < 0) issues.push({ pointer: `${at}/openings/${wall.openings.indexOf(opening)}/from`, code: "openings-overlap", params: { wall: wall.name } });
  });
  const parts = issues.length > before ? [] : partsOf(from, to, openings, wall.steps);
  if (issues.length === before && parts.length === 0) issues.push({ pointer: at, code: "no-plate-left", params: { wall: wall.name } });
  return { index, name: wall.name, input: wall, from, to, parts, bolts: boltsOf(input, wall, index, diameter, issues), straps: new Set(wall.bolts.flatMap((bolt, place) => (bolt.strap === true ? [place] : []))) };
}

/** The two corners of a wall named by them, such as A and B of `ab`; null for any other name. */
export function cornersOf(name: string): [string, string] | null {
  return /^[a-z]{2}$/i.test(name) ? [name[0]!.toUpperCase(), name[1]!.toUpperCase()] : null;
}

/**
 * How far in from the chalk corner a plate ends. At an outside corner the wall that runs through ends at the corner, the
 * other a plate's width short of it; at an inside corner the one that runs through goes a plate's width past, and the
 * other ends at the corner.
 */
function plateEnd(input: PlatesInput, name: string, corner: string, plateWidth: Length): Length {
  const through = input.corners?.[corner];
  if (through === undefined) return Length.zero;
  const isThrough = through.toLowerCase() === name.toLowerCase();
  if (input.insideCorners.includes(corner)) return isThrough ? plateWidth.negated() : Length.zero;
  return isThrough ? Length.zero : plateWidth;
}

function partsOf(from: Length, to: Length, openings: readonly { from: Length; to: Length }[], steps: readonly Length[]): Piece[] {
  const parts: Piece[] = [];
  const add = (start: Length, end: Length) => {
    let begin = start;
    for (const step of [...steps].sort((a, b) => a.compare(b))) {
      if (step.compare(begin) <= 0 || step.compare(end) >= 0) continue;
      parts.push({ index: parts.length, from: begin, to: step });
      begin = step;
    }
    if (begin.compare(end) < 0) parts.push({ index: parts.length, from: begin, to: end });
  };
  let begin = from;
  for (const opening of openings) {
    if (opening.from.compare(begin) > 0) add(begin, opening.from.compare(to) < 0 ? opening.from : to);
    if (opening.to.compare(begin) > 0) begin = opening.to;
  }
  add(begin, to);
  return parts;
}

/** The bolts of a wall from the chalk, read by the same rules as the as-poured check. Names are in order round the house, so the wall before has its first corner's inset. */
function boltsOf(input: PlatesInput, wall: WallInput, index: number, diameter: Length, issues: Issue[]): readonly Bolt[] {
  const walls = input.walls!;
  const own = wall.inset ?? input.inset;
  const corners = cornersOf(wall.name);
  const previous = corners === null ? undefined : walls.find((other) => cornersOf(other.name)?.[1] === corners[0]);
  const first = previous?.inset ?? input.inset ?? own;
  const inset = own === undefined || first === undefined ? undefined : { ab: own, bc: own, cd: own, da: first };
  const bolts = wall.bolts.map(({ strap, ...bolt }) => ({ ...bolt, engineered: bolt.engineered === true || strap === true }));
  try {
    return boltsInOrder({ bolts, inset, wall: "ab" } as unknown as CheckInput, diameter);
  } catch (error) {
    if (!(error instanceof CalculationError)) throw error;
    issues.push(...error.issues.map((issue) => ({ ...issue, params: { ...issue.params, wall: walls[index]!.name } })));
    return [];
  }
}
