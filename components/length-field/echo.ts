import type { LengthUnit, Precision } from "@/calculators/length";
import type * as lengthCore from "@/lib/client/core/length";

export type LengthCore = typeof lengthCore;

/** What the right end of a field says of the text typed so far. */
export interface Echo {
  kind: "actual" | "inches" | "plain";
  text: string;
}

const footMark = /['\u2018\u2019\u2032\u00B4`]|f|pie/i;
const metricWord = /m/i;

/**
 * The other way to say what was typed: a bare number of inches in feet and inches, so that 113 cannot pass for 11 ft 3; feet
 * in inches; millimetres in metres. With a burn, the actual length. Null while the text reads as no length.
 */
export function echoOf(core: LengthCore, text: string, unit: LengthUnit, precision: Precision, burn?: string): Echo | null {
  try {
    const read = core.readLength(text);
    const length = read.in(unit);
    const held = burn === undefined || burn.trim() === "" ? null : core.parseLength(burn, unit);
    const metricField = unit !== "in" && unit !== "ft";
    const metricText = metricWord.test(text) || (read.bare && metricField);
    const print = (value: typeof length) => (metricField || metricText || !isTapeFraction(value.inches.d) ? core.printLength(value, precision) : core.printExact(value));
    if (held !== null && !held.isZero()) return { kind: "actual", text: print(length.minus(held)) };
    if (metricField) {
      if (!metricText) return { kind: "plain", text: core.printLength(length, precision) };
      const metres = length.in("m");
      return { kind: "plain", text: unit === "m" && read.bare ? `${length.in("mm").toString()} mm` : `${metres.toString()} m` };
    }
    if (footMark.test(text) && !metricText) {
      const inches = isTapeFraction(length.inches.d) ? core.printExact(length, "inches") : core.printLength(length, precision, "inches");
      return { kind: "inches", text: inches.replace(/"$/, "") };
    }
    return { kind: "plain", text: print(length) };
  } catch (error) {
    if (error instanceof core.LengthError) return null;
    throw error;
  }
}

/** Whether a denominator is one a tape has. */
function isTapeFraction(denominator: bigint): boolean {
  return denominator <= 64n && (denominator & (denominator - 1n)) === 0n;
}
