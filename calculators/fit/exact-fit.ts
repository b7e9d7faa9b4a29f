import Fraction from "fraction.js";
import type { ExactPoint } from "../footprint/outline";
import { around } from "../geometry/polygon";
import { Length } from "../length";

interface Bow {
  station: Length;
  outward: Length;
}

/** Offsets of a true slab, exact: by side, its first corner's, its second's, and those at places along it. */
export type ExactOffsets = { corners: [Length, Length]; edges: Length[] }[];

/**
 * The fit of a plan along the axes on a slab along the axes, turned by nothing, in exact numbers: east and north come apart,
 * and each is the middle of what its sides ask. Null when slab or plan is not true, or they are turned against each other.
 *
 * `plan` null: the sizes are free, and every chalk line takes the middle of what its own edge asks.
 */
export function exactOffsets(slab: readonly ExactPoint[], plan: readonly ExactPoint[] | null, insets: readonly Length[], bows: readonly (readonly Bow[])[]): ExactOffsets | null {
  const sides = axisSides(slab);
  const wanted = plan === null ? null : axisSides(plan);
  if (sides === null || (plan !== null && (wanted === null || wanted.some(({ level, forward }, index) => level !== sides[index]!.level || forward !== sides[index]!.forward)))) return null;
  // Offset of side k = sign·(chalk − edge), plus a bow where one was read; chalk = the plan's place + slide.
  const rest = (index: number): Length => {
    const { at, sign } = sides[index]!;
    return wanted === null ? insets[index]! : wanted[index]!.at.minus(at).times(sign);
  };
  const asked = (level: boolean, only?: number) =>
    sides.flatMap((side, index) => {
      if (side.level !== level || (only !== undefined && index !== only)) return [];
      return [Length.zero, ...bows[index]!.map(({ outward }) => outward)].map((outward) => rest(index).plus(outward).minus(insets[index]!).times(side.sign));
    });
  const middle = (departures: readonly Length[]) => {
    const sorted = [...departures].sort((a, b) => a.compare(b));
    return sorted[0]!.plus(sorted.at(-1)!).over(new Fraction(-2));
  };
  return sides.map((side, index) => {
    const slide = middle(asked(side.level, wanted === null ? index : undefined)).times(side.sign);
    const offset = rest(index).plus(slide);
    return { corners: [offset, offset], edges: bows[index]!.map(({ outward }) => offset.plus(outward)) };
  });
}

/** Each side's place across its run, and the sign of the way into the plan; null when one is not along an axis. */
function axisSides(corners: readonly ExactPoint[]): { level: boolean; forward: boolean; at: Length; sign: 1 | -1 }[] | null {
  const sides = corners.map((corner, index) => {
    const next = around(corners, index + 1);
    const level = next.y.equals(corner.y);
    if (!level && !next.x.equals(corner.x)) return null;
    const forward = level ? next.x.compare(corner.x) > 0 : next.y.compare(corner.y) > 0;
    return { level, forward, at: level ? corner.y : corner.x, sign: (level === forward ? 1 : -1) as 1 | -1 };
  });
  return sides.includes(null) ? null : (sides as NonNullable<(typeof sides)[number]>[]);
}
