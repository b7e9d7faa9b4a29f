import Fraction from "fraction.js";
import { cornerNames, sideName } from "../geometry/corner-names";
import type { Length } from "../length";
import { squareRoot } from "../length";
import { CalculationError } from "../schema";
import type { LevelInput } from "./input";
import type { Elevation } from "./reduce-readings";

export interface Place {
  x: Length;
  y: Length;
}

/** The plan's corners in order, from `corners`, or from the sizes of a rectangle; none when neither was given. */
export function planCorners({ corners, length, width }: LevelInput): Place[] {
  if (corners !== undefined) {
    const names = Object.keys(corners).sort();
    const wanted = cornerNames(names.length);
    const wrong = names.length < 3 || names.some((name, index) => name !== wanted[index]);
    if (wrong) throw new CalculationError([{ pointer: "/corners", code: "corners-in-order", params: {} }]);
    return names.map((name) => corners[name]!);
  }
  if (length === undefined || width === undefined) return [];
  const zero = length.minus(length);
  return [
    { x: zero, y: zero },
    { x: length, y: zero },
    { x: length, y: width },
    { x: zero, y: width },
  ];
}

/**
 * Where each reading is on the plan: as given by x and y, or by its wall and station when the corners are known. Null where
 * neither tells. Exact when the wall runs along an axis, else to a double's accuracy.
 *
 * @throws CalculationError `wall-unknown`, `half-a-place`.
 */
export function placesOf(input: LevelInput, elevations: readonly Elevation[]): (Place | null)[] {
  const corners = planCorners(input);
  return elevations.map(({ reading, setup }) => {
    const place = input.setups[setup]!.readings.indexOf(reading);
    const pointer = `/setups/${setup}/readings/${place}`;
    if ((reading.x === undefined) !== (reading.y === undefined)) throw new CalculationError([{ pointer: `${pointer}/${reading.x === undefined ? "x" : "y"}`, code: "half-a-place", params: {} }]);
    if (reading.x !== undefined && reading.y !== undefined) return { x: reading.x, y: reading.y };
    if (reading.wall === undefined || reading.station === undefined || corners.length === 0) return null;
    const wall = corners.findIndex((_, index) => sideName(index, corners.length) === reading.wall!.toLowerCase());
    if (wall === -1) throw new CalculationError([{ pointer: `${pointer}/wall`, code: "wall-unknown", params: { wall: reading.wall } }]);
    const [from, to] = [corners[wall]!, corners[(wall + 1) % corners.length]!];
    const [dx, dy] = [to.x.minus(from.x), to.y.minus(from.y)];
    const length = squareRoot(dx.inches.mul(dx.inches).add(dy.inches.mul(dy.inches)));
    const inches = typeof length === "number" ? new Fraction(length) : length.inches;
    if (inches.n === 0n) return from;
    const share = reading.station.inches.div(inches);
    return { x: from.x.plus(dx.times(share)), y: from.y.plus(dy.times(share)) };
  });
}

/** How far apart two readings are on the plan; by their stations alone when they are on one wall. Null when it cannot be told. */
export function distanceBetween(a: Elevation, b: Elevation, places: readonly (Place | null)[]): Length | number | null {
  const [from, to] = [places[a.index] ?? null, places[b.index] ?? null];
  if (from !== null && to !== null) {
    const [dx, dy] = [to.x.minus(from.x).inches, to.y.minus(from.y).inches];
    return squareRoot(dx.mul(dx).add(dy.mul(dy)));
  }
  const { wall, station } = a.reading;
  if (wall === undefined || station === undefined || b.reading.station === undefined || wall.toLowerCase() !== b.reading.wall?.toLowerCase()) return null;
  return b.reading.station.minus(station).magnitude();
}
