import { other, withBurn } from "../burn-field";

/**
 * The page's fields beside the API's own: a tolerance of `other` stands for the text in `toleranceOther`; `pulled` is
 * whether two sides or four were pulled. Without script that choice shows no other fields, so that `withoutScript` lets the
 * sides typed speak for themselves.
 */
export const sides = ["ab", "bc", "cd", "da"] as const;
export const diagonals = ["ac", "bd"] as const;
export const readings = [...sides, ...diagonals] as const;
export type Side = (typeof sides)[number];
export type Reading = (typeof readings)[number];

export const tolerancePresets = ["triangle-12-16-20", "three-quarters-per-100-ft", "practice-1-8", "practice-3-16", "practice-1-4"] as const;

type Tree = Record<string, unknown>;
type Value = (name: string) => string;

const treeOf = (value: unknown): Tree => (typeof value === "object" && value !== null && !Array.isArray(value) ? (value as Tree) : {});

/** The page's input as the API takes it. */
export function prepareSquareness(input: Tree): Tree {
  const { pulled, tolerance, toleranceOther, tape, withoutScript, diagonals: pair, sides: given, length, width, ...rest } = input;
  const four = pulled === "four" || (given !== undefined && (pulled !== "two" || withoutScript !== undefined));
  const sized = four ? { sides: given } : { length, width };
  const prepared: Tree = {
    ...withBurn(rest),
    ...sized,
    // Sides not typed yet are asked for by name, as are diagonals.
    diagonals: treeOf(pair),
    tolerance: tolerance === other ? toleranceOther : tolerance,
    tape: tapeOf(treeOf(tape), rest.unit),
  };
  if (four && given === undefined) prepared.sides = {};
  return Object.fromEntries(Object.entries(prepared).filter(([, value]) => value !== undefined));
}

/** A tape with no figures of its own is none; its figures are of the page's units unless told. */
function tapeOf({ system, ...figures }: Tree, unit: unknown): Tree | undefined {
  if (Object.keys(figures).length === 0) return undefined;
  return { system: system ?? (unit === "mm" ? "metric" : "imperial"), ...figures };
}

/** Which limit is in use: a length that is none of the named ones is `other`. */
export function toleranceChosen(value: Value): { choice: string; text: string } {
  const tolerance = value("tolerance").trim();
  if (tolerance === other) return { choice: other, text: value("toleranceOther") };
  if (tolerance === "" || tolerancePresets.some((preset) => preset === tolerance)) return { choice: tolerance, text: "" };
  return { choice: other, text: tolerance };
}

export function pullsFourSides(value: Value): boolean {
  const pulled = value("pulled");
  const given = sides.some((side) => value(`sides.${side}`) !== "");
  return pulled === "four" || (given && (pulled !== "two" || value("withoutScript") !== ""));
}

const lengths = /^(length|width|burn|burnOther|tolerance|toleranceOther|taperTolerance|readingError|(sides|diagonals|burns)\..+|tape\.(nominalLength|trueLength|span))$/;

export function isLengthField(name: string): boolean {
  return lengths.test(name);
}
