import type { LengthUnit } from "./length";

/** What one character of a length means, whatever keyboard or word processor it came from. */

const feetMarks = "'\u2018\u2019\u201B\u2032\u00B4\u0060\u02B9\u02BC\u02C8\uFF07";
const inchMarks = "\"\u201C\u201D\u201F\u2033\u02BA\u3003\uFF02";
const dashes = "-\u00AD\u2010\u2011\u2012\u2013\u2014\u2015\u2212\uFE58\uFE63\uFF0D";
const slashes = "/\u2044\u2215\uFF0F";

const builtFractions: Readonly<Record<string, readonly [bigint, bigint]>> = {
  "\u00BD": [1n, 2n], "\u2153": [1n, 3n], "\u2154": [2n, 3n], "\u00BC": [1n, 4n], "\u00BE": [3n, 4n],
  "\u2155": [1n, 5n], "\u2156": [2n, 5n], "\u2157": [3n, 5n], "\u2158": [4n, 5n], "\u2159": [1n, 6n], "\u215A": [5n, 6n],
  "\u2150": [1n, 7n], "\u215B": [1n, 8n], "\u215C": [3n, 8n], "\u215D": [5n, 8n], "\u215E": [7n, 8n],
  "\u2151": [1n, 9n], "\u2152": [1n, 10n],
};

/** English and Spanish words for units, in lower case. */
const unitWords = new Map<string, LengthUnit>([
  ["ft", "ft"], ["foot", "ft"], ["feet", "ft"], ["pie", "ft"], ["pies", "ft"],
  ["in", "in"], ["ins", "in"], ["inch", "in"], ["inches", "in"], ["pulg", "in"], ["plg", "in"], ["pulgada", "in"], ["pulgadas", "in"],
  ["mm", "mm"], ["millimeter", "mm"], ["millimeters", "mm"], ["millimetre", "mm"], ["millimetres", "mm"], ["milímetro", "mm"], ["milímetros", "mm"], ["milimetro", "mm"], ["milimetros", "mm"],
  ["cm", "cm"], ["centimeter", "cm"], ["centimeters", "cm"], ["centimetre", "cm"], ["centimetres", "cm"], ["centímetro", "cm"], ["centímetros", "cm"], ["centimetro", "cm"], ["centimetros", "cm"],
  ["m", "m"], ["meter", "m"], ["meters", "m"], ["metre", "m"], ["metres", "m"], ["metro", "m"], ["metros", "m"],
]);

const whiteSpace = /^[\s\u00A0\u180E\u200B-\u200D\u2060\uFEFF]$/u;
const letter = /^\p{L}$/u;

export type CharacterKind = "space" | "digit" | "point" | "comma" | "dash" | "plus" | "slash" | "feet" | "inch" | "fraction" | "letter" | "other";

export function kindOf(character: string): CharacterKind {
  if (character >= "0" && character <= "9") return "digit";
  if (character === ".") return "point";
  if (character === ",") return "comma";
  if (character === "+") return "plus";
  if (dashes.includes(character)) return "dash";
  if (slashes.includes(character)) return "slash";
  if (feetMarks.includes(character)) return "feet";
  if (inchMarks.includes(character)) return "inch";
  if (Object.hasOwn(builtFractions, character)) return "fraction";
  if (whiteSpace.test(character)) return "space";
  if (letter.test(character)) return "letter";
  return "other";
}

export function builtFraction(character: string): readonly [bigint, bigint] {
  return builtFractions[character] ?? [0n, 1n];
}

export function unitOf(word: string): LengthUnit | undefined {
  return unitWords.get(word.toLowerCase());
}
