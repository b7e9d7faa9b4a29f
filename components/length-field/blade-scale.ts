import type { Length, LengthUnit, Precision } from "@/calculators/length";
import type { LengthCore } from "./echo";

/** The stretch of tape under a field: one whole inch, or one centimetre, with a little beyond on both sides. */
export interface BladeTick {
  /** Graduations from the first labelled one; negative before it. */
  index: number;
  /** Per cent of the blade's width. */
  x: number;
  /** How long it is drawn, in pixels. */
  length: number;
  whole: boolean;
}

/** Where the two labelled graduations stand, in per cent of the width. */
export const bladeStart = 7.2;
export const bladeEnd = 92.8;

/** Graduations in the stretch, by precision. */
export const bladeSteps: Readonly<Record<Precision, number>> = { "1/2": 2, "1/4": 4, "1/8": 8, "1/16": 16, "1/32": 32, "1/64": 64, "1mm": 10, "0.5mm": 20 };

export function bladeTicks(precision: Precision): BladeTick[] {
  const steps = bladeSteps[precision];
  const width = (bladeEnd - bladeStart) / steps;
  const beyond = Math.floor(bladeStart / width);
  return Array.from({ length: steps + 2 * beyond + 1 }, (_, place) => {
    const index = place - beyond;
    return { index, x: round(bladeStart + index * width), length: tickLength(index, steps), whole: index % steps === 0 };
  });
}

/** As on any tape: the simpler the fraction, the longer its line. */
function tickLength(index: number, steps: number): number {
  const part = (((index % steps) + steps) % steps) / steps;
  if (part === 0) return 46;
  if (part === 0.5) return 36;
  if (steps === 10 || steps === 20) return Number.isInteger(part * 10) ? 22 : 13;
  if (Number.isInteger(part * 4)) return 28;
  if (Number.isInteger(part * 8)) return 20;
  return Number.isInteger(part * 16) ? 13 : Number.isInteger(part * 32) ? 9 : 6;
}

function round(value: number): number {
  return Math.round(value * 1000) / 1000;
}

/** A reading on its blade: the stretch begins at `start` (inches or millimetres), and the mark stands at `x` per cent. */
export interface BladeReading {
  length: Length;
  start: Length;
  labels: readonly [string, string];
  x: number;
}

/** Null when nothing readable is typed, or a negative length. */
export function bladeReading(core: LengthCore, text: string, unit: LengthUnit, precision: Precision): BladeReading | null {
  try {
    const length = core.parseLength(text, unit);
    if (length.isNegative()) return null;
    const stretch = core.isMetric(precision) ? core.Length.from(10, "mm") : core.Length.from(1);
    const count = length.inches.div(stretch.inches).floor();
    const start = stretch.times(count);
    const labelUnit = core.isMetric(precision) ? "mm" : "in";
    const label = (value: Length) => value.in(labelUnit).toString();
    const part = length.minus(start).inches.div(stretch.inches).valueOf();
    return { length, start, labels: [label(start), label(start.plus(stretch))], x: round(bladeStart + part * (bladeEnd - bladeStart)) };
  } catch (error) {
    if (error instanceof core.LengthError) return null;
    throw error;
  }
}

/** The next graduation up or down; from between two graduations, the nearer one that way. */
export function nudged(core: LengthCore, length: Length, precision: Precision, graduations: number): Length {
  const step = core.graduation(precision);
  const count = length.inches.div(step.inches);
  const from = graduations > 0 ? count.floor() : count.ceil();
  const next = step.times(from.add(graduations));
  return next.isNegative() ? core.Length.zero : next;
}

/** A length written the way the field's text was: feet and inches where it had feet, a bare number where it was bare. */
export function writtenLike(core: LengthCore, text: string, length: Length, unit: LengthUnit, precision: Precision): string {
  if (core.isMetric(precision)) {
    const millimetres = length.in("mm").toString();
    return unit === "mm" && !/m/i.test(text) ? millimetres : `${millimetres} mm`;
  }
  if (/['\u2018\u2019\u2032\u00B4`]|f|pie/i.test(text) && length.inches.compare(12) >= 0) return core.printExact(length);
  const inches = core.printExact(length, "inches");
  return unit === "in" && !/["\u201C\u201D\u2033]|in|pul/i.test(text) ? inches.replace(/"$/, "") : inches;
}
