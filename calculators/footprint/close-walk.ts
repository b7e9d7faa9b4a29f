import { Length, printLength, type Precision } from "../length";
import { crossingSides, signedArea } from "../geometry/polygon";
import { CalculationError } from "../schema";
import { balance } from "./balance";
import type { Leg } from "./leg";
import { note, type Note, type Outline } from "./outline";
import { printToward, stepToward, towardAt, type Axis } from "./toward";
import { asNumber, closureOf, type Closure } from "./walk-closure";

export interface ClosedWalk {
  outline: Outline;
  /** Of the walk as given, with a closing leg added where one was left out. */
  closure: Closure;
  walked: Length;
  notes: Note[];
  /** Of a walk along the axes that misses: what each run alone would have to be. */
  suspects: { run: number; would: Length }[];
}

/** A walk that misses by more than one part in this many has a leg wrong or left out; a tape does far better. */
const worstClosure = 50;

/**
 * Turns a walk round the plan into a closed counter-clockwise outline.
 *
 * Legs that go on in one line are joined; a closing leg left out is added (along the axes an odd number of sides shows it);
 * a small misclosure is shared out, in proportion to the legs; a clockwise walk is lettered the other way from its A.
 *
 * @throws CalculationError `too-few-corners`, `doubles-back`, `walk-open` or `walk-crosses`, each by the run.
 */
export function closeWalk(given: readonly Leg[], pointer: (run: number) => string, precision: Precision): ClosedWalk {
  const notes: Note[] = [];
  const legs = joined(given, notes, pointer);
  const whole = withClosingLeg(legs, notes, pointer, precision);
  const closure = closureOf(whole);
  const walked = whole.reduce((sum, leg) => sum.plus(leg.length), Length.zero);
  const suspects = asNumber(closure.distance) === 0 ? [] : suspectRuns(whole, closure);
  const sides = startAtCorner(whole, notes);
  if (sides.length < 3) throw new CalculationError([{ pointer: pointer(0), code: "too-few-corners", params: { corners: sides.length } }]);
  if (asNumber(closure.distance) > 0) notes.push(note("balanced", { length: closure.distance }));
  const outline = balance(sides, closure);
  const crossing = crossingSides(outline.points);
  if (crossing !== null) {
    const [first, second] = crossing.map((index) => sides[index]!.run || given.length + 1) as [number, number];
    throw new CalculationError([{ pointer: pointer(second), code: "walk-crosses", params: { first, second } }]);
  }
  if (sides.length === 3) notes.push(note("three-corners"));
  if (signedArea(outline.points) > 0) return { outline, closure, walked, notes, suspects };
  notes.push(note("clockwise"));
  return { outline: turnedRound(outline), closure, walked, notes, suspects };
}

/** Legs that go on in the same direction become one; a leg straight back is refused. */
function joined(given: readonly Leg[], notes: Note[], pointer: (run: number) => string): Leg[] {
  const legs: Leg[] = [];
  for (const leg of given) {
    const last = legs.at(-1);
    const change = last === undefined ? 90 : turnBetween(last, leg);
    if (change === 180) throw new CalculationError([{ pointer: pointer(leg.run), code: "doubles-back", params: { run: leg.run } }]);
    if (last === undefined || change !== 0) legs.push(leg);
    else {
      legs[legs.length - 1] = { ...last, length: last.length.plus(leg.length) };
      if (leg.run !== last.run) notes.push(note("collinear", { run: leg.run }));
    }
  }
  return legs;
}

/** In degrees, 0 to 180, told to a billionth. */
function turnBetween(first: Leg, second: Leg): number {
  const turned = towardAt(second.toward.degrees - first.toward.degrees).degrees;
  const least = Math.min(turned, 360 - turned);
  return least < 1e-9 ? 0 : least > 180 - 1e-9 ? 180 : least;
}

function withClosingLeg(legs: readonly Leg[], notes: Note[], pointer: (run: number) => string, precision: Precision): Leg[] {
  const { east, north, distance, oneIn } = closureOf(legs);
  const refuse = () => {
    const back = towardAt((Math.atan2(-asNumber(east), -asNumber(north)) * 180) / Math.PI);
    return new CalculationError([{ pointer: pointer(0), code: "walk-open", params: { toward: printToward(back), distance: printLength(distance, precision) } }]);
  };
  const added = (leg: Leg) => {
    notes.push(note("closing-leg-added", { toward: printToward(leg.toward), length: leg.length }));
    return [...legs, leg];
  };
  const axes = legs.every(({ toward }) => toward.axis !== null);
  if (legs.length < 2 || asNumber(distance) === 0) return [...legs];
  if (axes && legs.length % 2 === 1 && turnBetween(legs[0]!, legs.at(-1)!) !== 90) {
    const leg = closingAlongAxis(legs, east as Length, north as Length);
    if (leg === null && turnBetween(legs[0]!, legs.at(-1)!) === 0 && oneIn! >= worstClosure) return [...legs];
    const missing = closureOf(leg === null ? legs : [...legs, leg]);
    if (leg !== null && (missing.oneIn === null || missing.oneIn >= worstClosure)) return added(leg);
    throw refuse();
  }
  if (oneIn === null || oneIn >= worstClosure) return [...legs];
  if (axes) throw refuse();
  const toward = towardAt((Math.atan2(-asNumber(east), -asNumber(north)) * 180) / Math.PI);
  return added({ toward, length: Length.from(Math.round(asNumber(distance) * 1e9) / 1e9), run: 0 });
}

/** The leg across the first and last ones that an odd walk along the axes lacks; null when they already meet. */
function closingAlongAxis(legs: readonly Leg[], east: Length, north: Length): Leg | null {
  const upright = legs[0]!.toward.axis === "E" || legs[0]!.toward.axis === "W";
  const gap = upright ? north : east;
  if (gap.isZero()) return null;
  const axis: Axis = upright ? (gap.isPositive() ? "S" : "N") : gap.isPositive() ? "W" : "E";
  return { toward: towardAt({ N: 0, E: 90, S: 180, W: 270 }[axis]), length: gap.magnitude(), run: 0 };
}

/** A walk begun in the middle of a side: A moves on to the first corner. */
function startAtCorner(legs: readonly Leg[], notes: Note[]): Leg[] {
  const [first, last] = [legs[0], legs.at(-1)];
  if (first === undefined || last === undefined || legs.length < 3 || turnBetween(last, first) !== 0) return [...legs];
  notes.push(note("start-on-side", { run: first.run }));
  return [...legs.slice(1, -1), { ...first, length: first.length.plus(last.length) }];
}

function suspectRuns(legs: readonly Leg[], { east, north }: Closure): ClosedWalk["suspects"] {
  if (typeof east === "number" || typeof north === "number") return [];
  return legs.flatMap(({ toward, length, run }) => {
    const { east: stepEast, north: stepNorth } = stepToward(toward);
    const miss = stepEast !== 0 ? east.times(stepEast) : north.times(stepNorth);
    const would = length.minus(miss);
    return run === 0 || miss.isZero() || !would.isPositive() ? [] : [{ run, would }];
  });
}

/** The same plan lettered counter-clockwise from the same A. */
function turnedRound({ points, exact, sides, toward }: Outline): Outline {
  const back = <Item>(items: readonly Item[]) => [items[0]!, ...items.slice(1).reverse()];
  const opposite = { N: "S", S: "N", E: "W", W: "E" } as const;
  const turned = (text: string | null) => text && text.replace(/[NSEW]/g, (letter) => opposite[letter as Axis]);
  return { points: back(points), exact: exact && back(exact), sides: [...sides].reverse(), toward: [...toward].reverse().map(turned) };
}
