import type { Length, LengthUnit } from "./length";
import { LengthError } from "./length-error";
import { LengthReader } from "./length-reader";
import { tokenizeLength } from "./length-tokens";
import type { ReadLength } from "./read-length";

export const characterLimit = 64;

/**
 * Reads a typed length: feet and inches, inches, fractions, decimals or metric, in English or Spanish marks.
 *
 * Units: a bare number takes `unit`. Exact; nothing is rounded. One pass over the text, no backtracking.
 *
 * @throws LengthError with one of the codes of `LengthProblems`, and nothing else, for any text.
 * @example parseLength(`28' 7 1/2"`) is 343 1/2 in, and so are `28-7 1/2`, `343.5` and `8724.9 mm`.
 */
export function parseLength(text: string, unit: LengthUnit = "in"): Length {
  return readLength(text).in(unit);
}

/** As `parseLength`, for a text whose unit is settled later. */
export function readLength(text: string): ReadLength {
  if (text.length > characterLimit) throw new LengthError("too-many-characters", { limit: characterLimit });
  return new LengthReader(tokenizeLength(text).tokens).read();
}
