import { Length } from "../length";
import { distanceBetween, type Place } from "./plan-places";
import type { Elevation } from "./reduce-readings";
import type { LevelLimit } from "./tolerances";

export interface JudgedPair {
  a: number;
  b: number;
  difference: Length;
  distance: Length | number | null;
  limit: LevelLimit;
  /** null: over the limit, were they near enough; how near they are cannot be told. */
  ok: boolean | null;
}

/**
 * Every two readings against every limit that holds at their distance. A difference on the limit is within it; so is a
 * distance on it. Worst first: by how much of the limit is used up.
 */
export function judgePairs(elevations: readonly Elevation[], places: readonly (Place | null)[], limits: readonly LevelLimit[]): JudgedPair[] {
  const pairs: JudgedPair[] = [];
  for (let first = 0; first < elevations.length; first += 1) {
    for (let second = first + 1; second < elevations.length; second += 1) {
      const [a, b] = [elevations[first]!, elevations[second]!];
      const difference = a.elevation.minus(b.elevation).magnitude();
      const distance = distanceBetween(a, b, places);
      const judged = limits.flatMap((limit): JudgedPair[] => {
        const holds = limit.within === null ? true : distance === null ? null : isNoMore(distance, limit.within);
        if (holds === false) return [];
        const over = difference.compare(limit.difference) > 0;
        return [{ a: a.index, b: b.index, difference, distance, limit, ok: !over ? true : holds === null ? null : false }];
      });
      const worst = judged.sort(byUse)[0];
      if (worst !== undefined) pairs.push(worst);
    }
  }
  return pairs.sort(byUse);
}

const rank = ({ ok }: JudgedPair) => (ok === false ? 0 : ok === null ? 1 : 2);
const shareUsed = ({ difference, limit }: JudgedPair) => difference.toNumber() / limit.difference.toNumber();

function byUse(one: JudgedPair, other: JudgedPair): number {
  return rank(one) - rank(other) || shareUsed(other) - shareUsed(one);
}

/** An irrational distance is right to 1e-9 in: that much over still counts as on the limit. */
function isNoMore(distance: Length | number, limit: Length): boolean {
  return distance instanceof Length ? distance.compare(limit) <= 0 : distance <= limit.toNumber() + 1e-9;
}
