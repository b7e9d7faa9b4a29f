import { Length } from "../../length";
import { lengthsOf, type Corners } from "../figure/corners";
import type { SquarenessInput } from "../input";
import { inches, type Quantity } from "../readings";
import { presetIds, presets, type Preset, type PresetId } from "./presets";

/** What a tolerance lets pass on this slab. */
export interface Allowed {
  difference: Quantity;
  taper: Quantity;
}

/** The legs of the published triangle, and the hypotenuse it should have, in inches. */
const legs = [144, 192] as const;
const hypotenuse = 240;

/** The plan with opposite sides equal that stands nearest: what a limit on angles or diagonals is turned into a difference on. */
interface Plan {
  length: number;
  width: number;
}

/**
 * A preset in diagonals' difference, on a slab whose opposite sides match.
 *
 * Source: AC² − BD² = 4·AB·DA·cos A. At the triangle's limit cos A = (12² + 16² − hypotenuse²)/(2·12·16), the closed corner
 * being the tighter; a diagonal short by its share leaves AC² = 2T² − BD².
 * @example the 12 by 16 ft triangle lets the diagonals of 28 by 24 ft differ by 1.896 in (domain.md 2.2: 1.9).
 */
export function allowedBy(preset: Preset, plan: Plan): Allowed {
  const { length, width } = plan;
  const squares = length ** 2 + width ** 2;
  const differenceAt = (cosine: number) => Math.sqrt(squares + 2 * length * width * cosine) - Math.sqrt(Math.max(0, squares - 2 * length * width * cosine));
  const { kind } = preset;
  const difference = (): Quantity => {
    if (kind.of === "difference") return kind.most;
    if (kind.of === "corner") return differenceAt((legs[0] ** 2 + legs[1] ** 2 - (hypotenuse - kind.plusOrMinusInches) ** 2) / (2 * legs[0] * legs[1]));
    const short = Math.sqrt(squares) * (1 - kind.share);
    return Math.sqrt(2 * squares - short ** 2) - short;
  };
  return { difference: difference(), taper: preset.taper };
}

/** Opposite sides' means. */
export function planOf(corners: Corners): Plan {
  const { ab, bc, cd, da } = lengthsOf(corners);
  return { length: (ab + cd) / 2, width: (bc + da) / 2 };
}

export function everyPreset(corners: Corners): ({ id: PresetId; preset: Preset } & Allowed)[] {
  const plan = planOf(corners);
  return presetIds.map((id) => ({ id, preset: presets[id], ...allowedBy(presets[id], plan) }));
}

/** What the input's tolerance allows; null without one. */
export function allowedFor({ tolerance, taperTolerance }: SquarenessInput, corners: Corners): Allowed | null {
  if (tolerance === undefined) return null;
  if (tolerance instanceof Length) return { difference: tolerance, taper: taperTolerance ?? tolerance };
  const allowed = allowedBy(presets[tolerance], planOf(corners));
  return { difference: allowed.difference, taper: taperTolerance ?? allowed.taper };
}

/** Doubles of equal lengths part by less than this. */
const same = 1e-9;

export const exceedings = ["difference", "corner", "diagonal", "length-taper", "width-taper"] as const;
export type Exceeding = (typeof exceedings)[number];

/** In what the slab goes past the tolerance: judged as the preset is worded, at every corner or on each diagonal. */
export function exceeded(input: SquarenessInput, allowed: Allowed, slab: { corners: Corners; angles: readonly number[]; difference: Quantity; targetDiagonal: number; tapers: readonly [number, number] | null }): Exceeding[] {
  const kind = typeof input.tolerance === "string" ? presets[input.tolerance].kind : null;
  const found: Exceeding[] = [];
  if (kind?.of === "corner") {
    if (slab.angles.some((degrees) => Math.abs(triangleAt(degrees) - hypotenuse) > kind.plusOrMinusInches + same)) found.push("corner");
  } else if (kind?.of === "diagonal") {
    const { ac, bd } = lengthsOf(slab.corners);
    if ([ac, bd].some((diagonal) => Math.abs(diagonal - slab.targetDiagonal) > kind.share * slab.targetDiagonal + same)) found.push("diagonal");
  } else if (inches(slab.difference) > inches(allowed.difference) + same) found.push("difference");
  slab.tapers?.forEach((taper, index) => {
    if (taper > inches(allowed.taper) + same) found.push(index === 0 ? "length-taper" : "width-taper");
  });
  return found;
}

/** The hypotenuse of the 12 by 16 ft triangle laid in a corner of so many degrees. */
export function triangleAt(degrees: number): number {
  return Math.sqrt(legs[0] ** 2 + legs[1] ** 2 - 2 * legs[0] * legs[1] * Math.cos((degrees * Math.PI) / 180));
}
