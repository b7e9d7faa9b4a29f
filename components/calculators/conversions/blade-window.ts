import type { Precision } from "@/calculators/length";

/** The stretch of tape round a reading, in per cent of the drawing's width. Doubles serve: nothing here is read off again. */
export interface BladeWindow {
  ticks: readonly { key: number; x: number; height: number }[];
  /** Whole inches, or centimetres, with the figure that stands there. */
  labels: readonly { key: number; x: number; count: number }[];
  /** Where the tape begins, when the drawing reaches to its end. */
  hook: number | null;
  /** Where a length of so many inches stands. */
  at: (inches: number) => number;
}

const millimetre = 1 / 25.4;

/** Graduations of a whole (inch or centimetre), and how many wholes the drawing is wide. */
const scales: Readonly<Record<Precision, { steps: number; wholes: number }>> = {
  "1/2": { steps: 2, wholes: 5 },
  "1/4": { steps: 4, wholes: 4 },
  "1/8": { steps: 8, wholes: 3 },
  "1/16": { steps: 16, wholes: 2 },
  "1/32": { steps: 32, wholes: 1.25 },
  "1/64": { steps: 64, wholes: 0.75 },
  "1mm": { steps: 10, wholes: 4 },
  "0.5mm": { steps: 20, wholes: 2 },
};

const hookPart = 0.06;

export function bladeWindow(readingInches: number, precision: Precision): BladeWindow {
  const whole = precision.endsWith("mm") ? 10 * millimetre : 1;
  const { steps, wholes } = scales[precision];
  const middle = Math.round((readingInches / whole) * steps);
  const span = Math.round(wholes * steps);
  const showsEnd = middle < span / 2;
  const from = showsEnd ? -hookPart * span : middle - span / 2;
  const place = (graduations: number) => ((graduations - from) / span) * 100;
  const first = Math.max(0, Math.ceil(from));
  const counts = Array.from({ length: Math.floor(from + span) - first + 1 }, (_, index) => first + index);
  return {
    ticks: counts.map((count) => ({ key: count, x: place(count), height: tickHeight(count % steps, steps) })),
    labels: counts.filter((count) => count % steps === 0 && count > 0).map((count) => ({ key: count, x: place(count), count: count / steps })),
    hook: showsEnd ? place(0) : null,
    at: (inches) => place((inches / whole) * steps),
  };
}

/** The simpler the fraction, the longer its line, as on any tape. In pixels. */
function tickHeight(place: number, steps: number): number {
  const part = place / steps;
  if (part === 0) return 78;
  if (part === 0.5) return 60;
  if (steps === 10 || steps === 20) return Number.isInteger(part * 10) ? 38 : 22;
  const denominators = [4, 8, 16, 32, 64];
  const heights = [46, 34, 24, 17, 11];
  return heights[denominators.findIndex((denominator) => Number.isInteger(part * denominator))] ?? 11;
}
