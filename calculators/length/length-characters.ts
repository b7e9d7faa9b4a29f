import type { LengthUnit } from "./length";

/** What one character of a length means, whatever keyboard or word processor it came from. */

const feetMarks = "'\u2018\u2019\u201B\u2032\u00B4\u0060\u02B9\u02BC\u02C8\uFF07";
const inchMarks = "\"\u201C\u201D\u201F\u2033\u02BA\u3003\uFF02";
/** Every Unicode dash, the minus sign, and two that look like one. A soft hyphen is none: it is seen at a line's end only. */
const dash = /^[\p{Pd}\u2212\u2043\u02D7]$/u;
const slashes = "/\u2044\u2215\uFF0F";

const builtFractions: Readonly<Record<string, readonly [bigint, bigint]>> = {
  "\u00BD": [1n, 2n], "\u2153": [1n, 3n], "\u2154": [2n, 3n], "\u00BC": [1n, 4n], "\u00BE": [3n, 4n],
  "\u2155": [1n, 5n], "\u2156": [2n, 5n], "\u2157": [3n, 5n], "\u2158": [4n, 5n], "\u2159": [1n, 6n], "\u215A": [5n, 6n],
  "\u2150": [1n, 7n], "\u215B": [1n, 8n], "\u215C": [3n, 8n], "\u215D": [5n, 8n], "\u215E": [7n, 8n],
  "\u2151": [1n, 9n], "\u2152": [1n, 10n],
};

/** English and Spanish words for units, in lower case and without accents. */
const unitWords = new Map<string, LengthUnit>(
  Object.entries({
    ft: "ft foot feet pie pies",
    in: "in ins inch inches pulg plg pulgada pulgadas",
    mm: "mm mms millimeter millimeters millimetre millimetres milimetro milimetros",
    cm: "cm cms centimeter centimeters centimetre centimetres centimetro centimetros",
    m: "m mt mts meter meters metre metres metro metros",
  } satisfies Record<LengthUnit, string>).flatMap(([unit, words]) => words.split(" ").map((word): [string, LengthUnit] => [word, unit as LengthUnit])),
);

/** What parts two words without ink: spaces, the zero-width ones that come with pasted text, and the left-to-right mark. */
const whiteSpace = /^[\s\u180E\u200B-\u200E\u2060]$/u;
const letter = /^[\p{L}\p{M}]$/u;
const visible = /^[\p{L}\p{N}\p{P}\p{S}]$/u;

export type CharacterKind = "space" | "digit" | "point" | "comma" | "dash" | "plus" | "slash" | "feet" | "inch" | "fraction" | "letter" | "other";

function classify(character: string): CharacterKind {
  if (character >= "0" && character <= "9") return "digit";
  if (character === ".") return "point";
  if (character === ",") return "comma";
  if (character === "+") return "plus";
  if (dash.test(character)) return "dash";
  if (slashes.includes(character)) return "slash";
  if (feetMarks.includes(character)) return "feet";
  if (inchMarks.includes(character)) return "inch";
  if (Object.hasOwn(builtFractions, character)) return "fraction";
  if (whiteSpace.test(character)) return "space";
  if (letter.test(character)) return "letter";
  return "other";
}

/** Most characters typed are of these, and looking them up is several times faster than asking every question again. */
const plainKinds = Array.from({ length: 128 }, (_, code) => classify(String.fromCharCode(code)));

export function kindOf(character: string): CharacterKind {
  return plainKinds[character.charCodeAt(0)] ?? classify(character);
}

export function builtFraction(character: string): readonly [bigint, bigint] {
  return builtFractions[character] ?? [0n, 1n];
}

export function unitOf(word: string): LengthUnit | undefined {
  return unitWords.get(word.normalize("NFD").replace(/\p{M}/gu, "").toLowerCase());
}

/** A character as a sentence can name it: itself, or `U+00AD` when it cannot be seen. */
export function nameOf(character: string): string {
  return visible.test(character) ? character : `U+${character.codePointAt(0)!.toString(16).toUpperCase().padStart(4, "0")}`;
}
