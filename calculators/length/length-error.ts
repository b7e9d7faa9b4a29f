/**
 * What can be wrong with a typed length. A code never changes with language; each has a sentence in the message files
 * that says what to type instead, built with the params named here.
 */
export interface LengthProblems {
  /** Nothing was typed. */
  empty: Record<string, never>;
  /** More than 64 characters. */
  "too-many-characters": { limit: number };
  /** A character or word that no length has. */
  "unexpected-text": { found: string };
  /** It stops in the middle: `7/`, `28' 7/`. */
  incomplete: Record<string, never>;
  /** A fraction finer than one over `limit`: no tape has it, and sums of such would grow without end. */
  "too-fine": { limit: number };
  /** A fraction over nothing. */
  "zero-denominator": Record<string, never>;
  /** Inches of 12 or more after feet; `carried` is the same length written with the feet carried. */
  "inches-over-twelve": { carried: string };
  /** `28.5' 7"`: the decimal foot already holds the inches. `first` drops the inches, `second` the decimals. */
  "decimal-feet-then-inches": { first: string; second: string };
  /** `3 5/4`: `carried` is what it would add up to. */
  "improper-fraction": { carried: string };
  /** `3.5 1/2` or `1.5/2`: a decimal and a fraction together. */
  "decimal-with-fraction": Record<string, never>;
  /** A plus, a second sign, or a sign inside. */
  sign: Record<string, never>;
  /** It can be read two ways: `3-1/2`, `28 7`, `1,234`. */
  "two-readings": { first: string; second: string };
  /** Two unlike units, or more text after a whole length. */
  "mixed-units": Record<string, never>;
  /** Beyond 10 000 ft either way. */
  "out-of-range": { limit: string };
}

export type LengthProblemCode = keyof LengthProblems;

/** The only error that reading a length throws. */
export class LengthError<Code extends LengthProblemCode = LengthProblemCode> extends Error {
  override readonly name = "LengthError";

  constructor(
    readonly code: Code,
    readonly params: LengthProblems[Code],
  ) {
    super(code);
  }
}
