import Fraction from "fraction.js";
import type { LengthUnit } from "./length";
import { builtFraction, kindOf, nameOf, unitOf } from "./length-characters";
import { LengthError } from "./length-error";

/** A typed length cut into the few words it can have. `whole` tells `28` from `28.0`, since only a whole number can carry a fraction. */
export type LengthToken =
  | { kind: "number"; value: Fraction; whole: boolean; text: string }
  | { kind: "fraction"; value: Fraction }
  | { kind: "unit"; unit: LengthUnit }
  | { kind: "slash" }
  | { kind: "dash" };

/** `tokens`, and `steps`: how many characters were looked at, so that a test can hold the reader to one pass. */
export interface TokenizedLength {
  tokens: LengthToken[];
  steps: number;
}

/**
 * Cuts a text into tokens in one pass, left to right, never going back.
 *
 * @throws LengthError `unexpected-text`, `sign`, or `two-readings` for a comma that may part thousands or decimals.
 */
export function tokenizeLength(text: string): TokenizedLength {
  const tokens: LengthToken[] = [];
  let position = 0;
  let steps = 0;
  let ambiguous: LengthError | undefined;

  /** The character here: two units long when it lies beyond the first plane. */
  function characterHere(): string {
    const code = text.charCodeAt(position);
    return code < 0xd800 || code > 0xdbff ? text.charAt(position) : String.fromCodePoint(text.codePointAt(position)!);
  }

  function kindHere() {
    steps += 1;
    return position < text.length ? kindOf(characterHere()) : "end";
  }

  function readNumber() {
    const start = position;
    let separators = "";
    for (let kind = kindHere(); kind === "digit" || kind === "point" || kind === "comma"; kind = kindHere()) {
      if (kind !== "digit") separators += text.charAt(position);
      position += 1;
    }
    const [first, second] = numberReadings(text.slice(start, position), separators);
    tokens.push(first);
    if (second === undefined || ambiguous !== undefined) return;
    const inPlace = (number: string) => (text.slice(0, start) + number + text.slice(position)).trim();
    ambiguous = new LengthError("two-readings", { first: inPlace(first.text), second: inPlace(second) });
  }

  function readWord() {
    const start = position;
    while (kindHere() === "letter") position += characterHere().length;
    const word = text.slice(start, position);
    const unit = unitOf(word);
    if (unit === undefined) throw new LengthError("unexpected-text", { found: word });
    tokens.push({ kind: "unit", unit });
    if (kindHere() !== "point") return;
    position += 1; // `ft.` and `in.` end in a stop; `5 ft.5 in` may mean 5 or .5, so no digit may follow it
    if (kindHere() === "digit") throw new LengthError("unexpected-text", { found: "." });
  }

  for (let kind = kindHere(); kind !== "end"; kind = kindHere()) {
    if (kind === "digit" || kind === "point" || kind === "comma") readNumber();
    else if (kind === "letter") readWord();
    else {
      const character = characterHere();
      position += character.length;
      if (kind === "fraction") tokens.push({ kind: "fraction", value: new Fraction(...builtFraction(character)) });
      else if (kind === "slash" || kind === "dash") tokens.push({ kind });
      else if (kind === "inch") tokens.push({ kind: "unit", unit: "in" });
      else if (kind === "feet") {
        const doubled = kindHere() === "feet"; // two single quotes are the inch mark
        if (doubled) position += 1;
        tokens.push({ kind: "unit", unit: doubled ? "in" : "ft" });
      } else if (kind === "plus") throw new LengthError("sign", {});
      else if (kind !== "space") throw new LengthError("unexpected-text", { found: nameOf(character) });
    }
  }
  if (ambiguous !== undefined) throw ambiguous;
  return { tokens, steps };
}

type NumberToken = LengthToken & { kind: "number" };

/**
 * Digits with their separators: `.` is the decimal point; `,` is one only where it cannot part thousands. Where it can be
 * either, the second reading comes along as text.
 */
function numberReadings(written: string, separators: string): [NumberToken, string?] {
  if (separators === "") return [{ kind: "number", value: new Fraction(BigInt(written)), whole: true, text: written }];
  const number = (text: string, whole: boolean): NumberToken => ({ kind: "number", value: new Fraction(text), whole, text });
  const unexpected = () => new LengthError("unexpected-text", { found: written });
  const groups = written.split(/[.,]/);
  if (groups.every((group) => group === "")) throw unexpected();
  const [head = "", ...rest] = groups;

  const partsThousands = head.length >= 1 && head.length <= 3 && !head.startsWith("0");
  if (separators.length === 1) {
    const tail = rest[0] ?? "";
    const decimal = `${head || "0"}.${tail || "0"}`;
    if (separators[0] === "." || tail.length !== 3 || !partsThousands) {
      if (separators[0] === "," && tail === "") throw unexpected();
      return [number(decimal, false)];
    }
    return [number(head + tail, true), decimal];
  }

  const decimals = separators.at(-1) === "." ? (rest.at(-1) ?? "") : null;
  const thousands = decimals === null ? rest : rest.slice(0, -1);
  const commas = decimals === null ? separators : separators.slice(0, -1);
  const grouped = partsThousands && !commas.includes(".") && thousands.every((group) => group.length === 3);
  if (!grouped) throw unexpected();
  return [number(head + thousands.join("") + (decimals === null ? "" : `.${decimals || "0"}`), decimals === null)];
}
