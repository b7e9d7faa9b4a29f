import Fraction from "fraction.js";
import { isMetric, Length, type Precision } from "../length";
import type { Rule } from "../rules";
import { measure } from "../schema";

/**
 * Holes and nuts, with their sources.
 * Hole: NDS, 1/32 to 1/16 in over the bolt (second-hand: civilengineeringx.com/bdac/bolts; deckmagazine.com quoting JLC). The US
 * Navy's builder course bores 1/4 in over (NAVEDTRA 14044 p. 1-2, read): a genuine conflict, the stricter is the default.
 * Nut: a hex nut is about 7/8 of the bolt's diameter high (ASME B18.2.2, from memory).
 */
export const holeSource = { clause: "NDS, bolt holes", source: "civilengineeringx.com/bdac/bolts; deckmagazine.com quoting JLC on the NDS", status: "second-hand" } as const;
export const washerEdgeSource = { clause: "SDPWS, washer within 1/2 in of the sheathed edge", source: "buildastrawbalehouse.com/tag/seismic", status: "second-hand" } as const;

const over = { least: Length.from(new Fraction(1, 32)), most: Length.from(new Fraction(1, 16)), navy: Length.from(new Fraction(1, 4)) };
export const washerEdgeLimit = Length.from(0.5);
const ordinaryWasher = Length.from(0.125);
const defaultPlate = Length.from(1.5);

export function holeRange(diameter: Length) {
  return { least: diameter.plus(over.least), most: diameter.plus(over.most), navy: diameter.plus(over.navy) };
}

export function nutHeight(diameter: Length): Length {
  return diameter.times(new Fraction(7, 8));
}

/** What a bolt must stand above the concrete: plate, washer and the whole nut. A squeezed sealer counts for nothing. */
export function neededProjection(rule: Rule, diameter: Length, plateThickness: Length | undefined, washerThickness: Length | undefined): Length {
  return (plateThickness ?? defaultPlate).plus(washerThickness ?? rule.washer.thickness ?? ordinaryWasher).plus(nutHeight(diameter));
}

/** The bit that was asked about, when it is not in the range. */
export function holeFault(hole: Length | undefined, diameter: Length) {
  if (hole === undefined) return null;
  const { least, most } = holeRange(diameter);
  if (hole.compare(most) > 0) return { code: "hole-too-big", limit: most, actual: hole } as const;
  if (hole.compare(least) < 0) return { code: "hole-too-small", limit: least, actual: hole } as const;
  return null;
}

/** Bits come in 32nds whatever the layout is rounded to. */
export function bitAnswer(value: Length, precision: Precision) {
  return measure(value, isMetric(precision) ? "0.5mm" : "1/32");
}
