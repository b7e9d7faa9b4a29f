import { readingNames, type ReadingName } from "../input";
import { misclosureOf, type Six } from "./braced-quadrilateral";

export interface Adjusted {
  adjusted: Six;
  /** Adjusted less measured. */
  residuals: Six;
  /** Root of the sum of the squared residuals: |w|/|a| where the condition is straight, and exact where it bends. */
  closure: number;
}

const rounds = 200;
const settled = 1e-12;

/**
 * Least squares, equal weights: the nearest six lengths that one flat figure has.
 *
 * Source: condition adjustment with correction −aᵢ·w/|a|², the condition and its gradient a taken afresh at each round, at the
 * figure found so far (w then being w + a·(measured − found)), until nothing moves by 1e-12 of the size.
 * Null when the rounds leave every figure or do not settle: readings that no slab comes near.
 */
export function adjustQuadrilateral(measured: Six): Adjusted | null {
  const size = Math.max(...readingNames.map((name) => measured[name]));
  let found = measured;
  for (let round = 0; round < rounds; round += 1) {
    const misclosure = misclosureOf(found);
    if (misclosure === null) return null;
    const { w, gradient } = misclosure;
    const reached = readingNames.reduce((sum, name) => sum + gradient[name] * (measured[name] - found[name]), w);
    const weight = readingNames.reduce((sum, name) => sum + gradient[name] ** 2, 0);
    const next = sixOf((name) => measured[name] - (gradient[name] * reached) / weight);
    if (readingNames.some((name) => !(next[name] > 0))) return null;
    const moved = Math.max(...readingNames.map((name) => Math.abs(next[name] - found[name])));
    found = next;
    if (moved <= settled * size) {
      const residuals = sixOf((name) => found[name] - measured[name]);
      return { adjusted: found, residuals, closure: Math.hypot(...readingNames.map((name) => residuals[name])) };
    }
  }
  return null;
}

/**
 * Two triangles on one base, each as its apex's distances from the base's two ends; the reading in question is the distance
 * between the apexes, on the same side of the base for a side, on both sides for a diagonal.
 */
const triangles: Readonly<Record<ReadingName, { base: ReadingName; one: readonly [ReadingName, ReadingName]; other: readonly [ReadingName, ReadingName]; sign: 1 | -1 }>> = {
  ab: { base: "cd", one: ["ac", "da"], other: ["bc", "bd"], sign: 1 },
  bc: { base: "da", one: ["bd", "ab"], other: ["cd", "ac"], sign: 1 },
  cd: { base: "ab", one: ["ac", "bc"], other: ["da", "bd"], sign: 1 },
  da: { base: "bc", one: ["ab", "ac"], other: ["bd", "cd"], sign: 1 },
  ac: { base: "bd", one: ["ab", "da"], other: ["bc", "cd"], sign: -1 },
  bd: { base: "ac", one: ["ab", "bc"], other: ["da", "cd"], sign: -1 },
};

/**
 * The change of one reading that alone would close the figure: to first order −w/aᵢ, here exactly, from the figure of the
 * other five, since a foot or a slip of digits is too far for a slope. Null when the other five make no figure.
 */
export function changeThatCloses(measured: Six, name: ReadingName): number | null {
  const { base, one, other, sign } = triangles[name];
  const first = apexOf(measured[base], measured[one[0]], measured[one[1]]);
  const second = apexOf(measured[base], measured[other[0]], measured[other[1]]);
  if (first === null || second === null) return null;
  return Math.hypot(first.along - second.along, first.up - sign * second.up) - measured[name];
}

/** Where the apex stands, along the base from its first end and square to it; null when there is no triangle. */
function apexOf(base: number, fromFirst: number, fromSecond: number): { along: number; up: number } | null {
  const along = (base * base + fromFirst * fromFirst - fromSecond * fromSecond) / (2 * base);
  const square = fromFirst * fromFirst - along * along;
  return square > 0 ? { along, up: Math.sqrt(square) } : null;
}

export function sixOf(length: (name: ReadingName) => number): Six {
  return { ab: length("ab"), bc: length("bc"), cd: length("cd"), da: length("da"), ac: length("ac"), bd: length("bd") };
}
