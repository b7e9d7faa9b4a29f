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
 * The change of one reading that alone would close the figure: −w/aᵢ, repeated until nothing is left of w.
 * Null when no length in that place closes it.
 */
export function changeThatCloses(measured: Six, name: ReadingName): number | null {
  let six = measured;
  for (let round = 0; round < 60; round += 1) {
    const misclosure = misclosureOf(six);
    if (misclosure === null) return null;
    if (Math.abs(misclosure.w) < 1e-10 * measured[name]) return six[name] - measured[name];
    const next = six[name] - misclosure.w / misclosure.gradient[name];
    if (!(next > 0)) return null;
    six = { ...six, [name]: next };
  }
  return null;
}

export function sixOf(length: (name: ReadingName) => number): Six {
  return { ab: length("ab"), bc: length("bc"), cd: length("cd"), da: length("da"), ac: length("ac"), bd: length("bd") };
}
