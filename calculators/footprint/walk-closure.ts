import { Length, squareRoot } from "../length";
import type { Leg } from "./leg";
import { stepToward } from "./toward";

/** Where the walk ends, east and north of where it began: exact while every leg runs along an axis. */
export interface Closure {
  east: Length | number;
  north: Length | number;
  distance: Length | number;
  /** The walk's length over the distance by which it misses: 1 in how many. Null when it closes. */
  oneIn: number | null;
}

/** Closer than this (inches) a walk with bearings has closed: below what doubles add up to. */
export const closed = 1e-6;

export function closureOf(legs: readonly Leg[]): Closure {
  const walked = legs.reduce((sum, leg) => sum.plus(leg.length), Length.zero).toNumber();
  if (legs.every(({ toward }) => toward.axis !== null)) {
    const east = sumOf(legs, "E", "W");
    const north = sumOf(legs, "N", "S");
    const distance = squareRoot(east.inches.mul(east.inches).add(north.inches.mul(north.inches)));
    const miss = asNumber(distance);
    return { east, north, distance, oneIn: miss === 0 ? null : walked / miss };
  }
  const steps = legs.map((leg) => ({ step: stepToward(leg.toward), inches: leg.length.toNumber() }));
  const east = steps.reduce((sum, { step, inches }) => sum + step.east * inches, 0);
  const north = steps.reduce((sum, { step, inches }) => sum + step.north * inches, 0);
  const miss = Math.hypot(east, north);
  return miss < closed ? { east: 0, north: 0, distance: 0, oneIn: null } : { east, north, distance: miss, oneIn: walked / miss };
}

function sumOf(legs: readonly Leg[], ahead: string, back: string): Length {
  return legs.reduce((sum, { toward, length }) => (toward.axis === ahead ? sum.plus(length) : toward.axis === back ? sum.minus(length) : sum), Length.zero);
}

export const asNumber = (value: Length | number): number => (typeof value === "number" ? value : value.toNumber());
