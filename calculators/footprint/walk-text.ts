import { LengthError, parseLength, type LengthUnit } from "../length";
import type { Issue } from "../schema";
import type { Leg } from "./leg";
import { readToward } from "./toward";

export const walkCharacterLimit = 4000;
export const mostLegs = 100;

/** Legs are parted by line ends, semicolons, or commas before a direction: a comma before a digit belongs to the length. */
const partings = /[\n\r;]+|,(?=\s{0,20}(?:\p{L}|\d{1,3}(?:\.\d{1,9})?\s{0,3}[°º˚])|\s{0,20}$)/u;
const repeat = /\s{0,20}[x×*]\s{0,20}(\d{1,3})$/iu;

/**
 * Reads a walk round the plan, `E 40 ft, N 20 ft, W 16 ft …`: each leg a direction and a length, with `x 3` to repeat it.
 *
 * Units: a bare number takes `unit`. Every faulty leg is told, each by its number.
 */
export function readWalk(text: string, unit: LengthUnit, pointer: string): { legs: Leg[]; issues: Issue[] } {
  if (text.length > walkCharacterLimit) return { legs: [], issues: [{ pointer, code: "walk-too-long", params: { limit: walkCharacterLimit } }] };
  const parts = text.split(partings).map((part) => part.trim()).filter((part) => part !== "");
  if (parts.length > mostLegs) return { legs: [], issues: [{ pointer, code: "too-many-legs", params: { limit: mostLegs } }] };
  const legs: Leg[] = [];
  const issues: Issue[] = [];
  parts.forEach((part, index) => {
    const leg = index + 1;
    const found = part.length > 40 ? `${part.slice(0, 40)}…` : part;
    const read = readToward(part);
    if ("problem" in read) {
      issues.push({ pointer, code: `walk-${read.problem}`, params: { leg, found } });
      return;
    }
    const times = repeat.exec(read.rest);
    const length = lengthOf(times === null ? read.rest : read.rest.slice(0, times.index), unit);
    if (length === null || (times !== null && Number(times[1]) === 0)) issues.push({ pointer, code: "walk-leg-length", params: { leg, found } });
    else legs.push({ toward: read.toward, length: length.times(times === null ? 1 : Number(times[1])), run: leg });
  });
  return { legs, issues };
}

function lengthOf(text: string, unit: LengthUnit) {
  try {
    const length = parseLength(text.replace(/^\s*:/, ""), unit);
    return length.isPositive() ? length : null;
  } catch (error) {
    if (error instanceof LengthError) return null;
    throw error;
  }
}
