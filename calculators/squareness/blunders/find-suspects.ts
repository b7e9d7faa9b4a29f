import type { Length } from "../../length";
import type { Corners } from "../figure/corners";
import type { Figure } from "../figure/solve-figure";
import type { ReadingName } from "../input";
import type { Measurements } from "../readings";
import { digitSlips } from "./digit-slips";

export const blunders = ["burn-missed", "burn-twice", "burn-unsaid", "foot-misread", "digits-swapped", "six-for-nine"] as const;
export type Blunder = (typeof blunders)[number];

export interface Suspect {
  reading: ReadingName;
  /** Inches to add to it; that alone closes the figure. */
  change: number;
  likely: Blunder;
  /** The slab as it is if so. */
  corners: Corners;
}

/** A change this near a blunder's size, in inches, may be that blunder. */
export const slipWithin = 3 / 16;

interface Context {
  commonBurn: Length;
  metric: boolean;
  closedBy: Figure["closedBy"];
}

/**
 * Every reading that one blunder could explain: the change that alone would close the figure is within 3/16 in of the burn
 * (missed, or taken twice; or held there though none was told), of 12 in, or of a slip of digits in the reading as read.
 * One redundancy cannot tell which, so all that fit are named, the closest fit first. Slips under 3/8 in are no blunders.
 */
export function findSuspects(measurements: Measurements, { commonBurn, metric, closedBy }: Context): Suspect[] {
  const named = (Object.keys(measurements) as ReadingName[]).flatMap((name): (Suspect & { miss: number })[] => {
    const { reading, burn, actual } = measurements[name]!;
    const closed = closedBy(name);
    if (closed === null) return [];
    const { change, corners } = closed;
    if (Math.abs(change) < slipWithin) return []; // nearer to none than to the least blunder
    const asRead = reading ?? (typeof actual === "number" ? null : actual);
    const slips: { likely: Blunder; inches: number }[] = [
      ...burnSlips(burn.toNumber(), commonBurn.toNumber(), metric),
      { likely: "foot-misread", inches: 12 },
      { likely: "foot-misread", inches: -12 },
      ...(asRead === null ? [] : digitSlips(asRead, metric).map(({ kind, inches: size }) => ({ likely: kind, inches: size }))),
    ];
    const best = slips
      .filter((slip) => Math.abs(slip.inches) >= 2 * slipWithin)
      .map(({ likely, inches: size }) => ({ likely, miss: Math.abs(change - size) }))
      .reduce<{ likely: Blunder; miss: number } | null>((least, slip) => (least === null || slip.miss < least.miss - 1e-9 ? slip : least), null);
    return best !== null && best.miss <= slipWithin ? [{ reading: name, change, corners, ...best }] : [];
  });
  return named.sort((a, b) => a.miss - b.miss).map(({ reading, change, likely, corners }) => ({ reading, change, likely, corners }));
}

/** A burn told but not held leaves the length short; held twice, long. Where none was told, it may have been held all the same. */
function burnSlips(own: number, common: number, metric: boolean): { likely: Blunder; inches: number }[] {
  if (own > 0) return [{ likely: "burn-missed", inches: own }, { likely: "burn-twice", inches: -own }];
  return [{ likely: "burn-unsaid", inches: -(common > 0 ? common : metric ? 100 / 25.4 : 1) }];
}
