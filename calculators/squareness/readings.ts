import { Length } from "../length";
import { CalculationError, measure, type Issue } from "../schema";
import { diagonalNames, readingNames, sideNames, type ReadingName, type SquarenessInput } from "./input";
import { tapeCorrection, totalOf, type TapeCorrection } from "./tape/correct-tape";

/** A length exact where nothing irrational has touched it. */
export type Quantity = Length | number;

export const inches = (value: Quantity): number => (typeof value === "number" ? value : value.toNumber());
export const plus = (value: Quantity, more: Quantity): Quantity => (value instanceof Length && more instanceof Length ? value.plus(more) : inches(value) + inches(more));
export const less = (value: Quantity, other: Quantity): Quantity => (value instanceof Length && other instanceof Length ? value.minus(other) : inches(value) - inches(other));
export const magnitude = (value: Quantity): Quantity => (typeof value === "number" ? Math.abs(value) : value.magnitude());

export interface Measured {
  /** As the tape showed it; null for a size, which no tape in this input showed. */
  reading: Length | null;
  burn: Length;
  correction: TapeCorrection | null;
  /** Burn taken off, tape corrected. */
  actual: Quantity;
}

/** What was measured, by name: AB, DA and both diagonals, or all six. */
export type Measurements = Readonly<Partial<Record<ReadingName, Measured>> & Record<"ab" | "da" | "ac" | "bd", Measured>>;

export function hasFourSides(measurements: Measurements): boolean {
  return measurements.bc !== undefined && measurements.cd !== undefined;
}

/** Where the tape was held for a reading. */
export function burnOf({ burn, burns }: SquarenessInput, name: ReadingName): Length {
  return burns?.[name] ?? burn ?? Length.zero;
}

/**
 * Sizes and readings with burn and tape settled.
 *
 * @throws CalculationError `sides-and-sizes` when both ways were mixed, `burn-over-reading`, `tape-impossible` when its corrections eat up a reading.
 */
export function measurementsOf(input: SquarenessInput): Measurements {
  const { length, width, sides = {}, diagonals } = input;
  const issues = mixedWays(input);
  const found: Partial<Record<ReadingName, Measured>> = {};
  const read = (group: "sides" | "diagonals", name: ReadingName, reading: Length) => {
    const burn = burnOf(input, name);
    const held = reading.minus(burn);
    found[name] = { reading, burn, ...corrected(input, held) };
    if (!held.isPositive()) issues.push({ pointer: `/${group}/${name}`, code: "burn-over-reading", params: { burn: measure(burn, input.precision).text } });
  };
  for (const name of sideNames) if (sides[name] !== undefined) read("sides", name, sides[name]);
  const size = (value: Length): Measured => ({ reading: null, burn: Length.zero, correction: null, actual: value });
  if (length !== undefined) found.ab = size(length);
  if (width !== undefined) found.da = size(width);
  for (const name of diagonalNames) read("diagonals", name, diagonals[name]);
  if (issues.length === 0 && readingNames.some((name) => found[name] !== undefined && !(inches(found[name].actual) > 0))) {
    issues.push({ pointer: "/tape", code: "tape-impossible", params: {} });
  }
  if (issues.length > 0) throw new CalculationError(issues);
  return found as Measurements;
}

function corrected({ tape }: SquarenessInput, held: Length): Pick<Measured, "correction" | "actual"> {
  if (tape === undefined) return { correction: null, actual: held };
  const correction = tapeCorrection(tape, held.toNumber());
  const total = totalOf(correction);
  return { correction, actual: total === 0 ? held : held.toNumber() + total };
}

function mixedWays({ length, width, sides = {} }: SquarenessInput): Issue[] {
  if (sideNames.every((name) => sides[name] === undefined)) return [];
  return ([["/length", length], ["/width", width]] as const).flatMap(([pointer, size]) => (size === undefined ? [] : [{ pointer, code: "sides-and-sizes", params: {} }]));
}

/** The field of a reading or size, for an issue. */
export function pointerOf(measurements: Measurements, name: ReadingName): string {
  if (name === "ac" || name === "bd") return `/diagonals/${name}`;
  if (measurements[name]?.reading === null) return name === "ab" ? "/length" : "/width";
  return `/sides/${name}`;
}
