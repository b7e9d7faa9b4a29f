import { parseLength, printLength, type LengthStyle, type LengthUnit, type Precision } from "@/calculators/length";
import type { LengthAnswer } from "@/calculators/schema/measure";
import type { Translate } from "@/lib/client/i18n/translate";
import type { SillSet } from "@/lib/client/set/schema";
import type { Stage } from "@/lib/client/set/stages";
import type { Answers } from "./answers";
import { contentWidth, type Paper } from "./sheet";

/** What every part of the sheet is made from. */
export interface Context {
  set: SillSet;
  stages: readonly Stage[];
  answers: Answers;
  t: Translate;
  precision: Precision;
  metric: boolean;
  paper: Paper;
  width: number;
}

export const contextOf = (parts: Omit<Context, "width">): Context => ({ ...parts, width: contentWidth(parts.paper) });

/** A wall or pull by its corners, as crews write it: `A-B`. */
export const byCorners = (name: string) => (/^[a-z]{2}$/i.test(name) ? [...name.toUpperCase()].join("-") : name.toUpperCase());

/** With what the graduation hides: `1/2" strong`. */
export const withLean = ({ text, lean }: Pick<LengthAnswer, "text" | "lean">, t: Translate) => (lean === "exact" ? text : `${text} ${t(`common.lean.${lean}`)}`);

/** A reading as a tape that counts inches shows it: `428 9/16"`. */
export function onTape({ in: inches, exact }: Pick<LengthAnswer, "in" | "exact">, precision: Precision): string {
  return printLength(exact === null ? inches : parseLength(`${exact} in`), precision, "inches");
}

/** A running figure as a tape that counts inches shows it, without its mark: `183 1/2`, or `4661` in millimetres. The unit is told once, beside. */
export const runningFigure = (length: Pick<LengthAnswer, "in" | "exact">, precision: Precision) => onTape(length, precision).replace(/"$| mm$/, "");

/** A length typed or published, in the sheet's own form; as it stands where it cannot be read. */
export function shownAs(text: string, precision: Precision, unit: LengthUnit = "in", style: LengthStyle = "feet-inches"): string {
  try {
    return printLength(parseLength(text, unit), precision, style);
  } catch {
    return text;
  }
}

export const unitOfInput = (input: Readonly<Record<string, unknown>>): LengthUnit => (["in", "ft", "mm", "cm", "m"] as const).find((unit) => unit === input.unit) ?? "in";
