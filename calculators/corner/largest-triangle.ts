/** A right triangle in whole numbers: `along` the first leg and `up` the second, as a multiple of a primitive triple. */
export interface WholeTriangle {
  along: number;
  up: number;
  across: number;
  primitive: readonly [number, number, number];
  times: number;
}

/**
 * The whole-number right triangle with the longest hypotenuse whose legs fit in `most.along` and `most.up`; of equal ones the
 * one with the greater area, then the one that is longer along. Null where not even a 3-4-5 fits.
 *
 * Source: Euclid: every primitive triple is m² − n², 2mn, m² + n² with m > n coprime and not both odd; the largest multiple of
 * each, either way round, is looked at.
 * @example 28 by 22 takes 28-21-35.
 */
export function largestTriangle(most: { along: number; up: number }): WholeTriangle | null {
  let best: WholeTriangle | null = null;
  const consider = (first: number, second: number, across: number) => {
    const times = Math.min(Math.floor(most.along / first), Math.floor(most.up / second));
    if (times < 1) return;
    const found: WholeTriangle = { along: first * times, up: second * times, across: across * times, primitive: [Math.min(first, second), Math.max(first, second), across], times };
    if (best === null || isLarger(found, best)) best = found;
  };
  const [short, long] = [Math.min(most.along, most.up), Math.max(most.along, most.up)];
  // Both legs grow with m, and the even one is at least 2n(n + 1): past these bounds nothing fits.
  for (let n = 1; 2 * n * (n + 1) <= long; n += 1) {
    for (let m = n + 1; ; m += 2) {
      const [odd, even] = [m * m - n * n, 2 * m * n];
      if (Math.max(odd, even) > long || Math.min(odd, even) > short) break;
      if (greatestCommonDivisor(m, n) !== 1) continue;
      const across = m * m + n * n;
      consider(odd, even, across);
      consider(even, odd, across);
    }
  }
  return best;
}

function isLarger(one: WholeTriangle, other: WholeTriangle): boolean {
  if (one.across !== other.across) return one.across > other.across;
  const areas = one.along * one.up - other.along * other.up;
  return areas !== 0 ? areas > 0 : one.along > other.along;
}

function greatestCommonDivisor(a: number, b: number): number {
  return b === 0 ? a : greatestCommonDivisor(b, a % b);
}
