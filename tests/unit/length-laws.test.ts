import fc from "fast-check";
import Fraction from "fraction.js";
import { unit as mathUnit } from "mathjs";
import { describe, expect, test } from "vitest";
import {
  Length, LengthError, LengthReader, graduation, lengthUnits, parseLength, precisions, printExact, printLength, readLength, roundLength, tokenizeLength, type LengthStyle,
} from "@/calculators/length";
import { runs } from "../setup/runs";

const styles: LengthStyle[] = ["feet-inches", "inches"];
const forms = precisions.flatMap((precision) => styles.map((style) => ({ precision, style })));

/** Lengths within 9 999 ft of a fraction a tape has, a decimal, or thirds and the like. */
const lengths = fc
  .tuple(fc.integer({ min: -119_000_000, max: 119_000_000 }), fc.constantFrom(1, 2, 3, 7, 16, 32, 64, 127, 1000, 25_400))
  .map(([top, bottom]) => Length.from(new Fraction(top, bottom * 1000)))
  .filter((length) => length.magnitude().compare(Length.from(9_999, "ft")) < 0);
const typedPieces = fc.constantFrom(..."0123456789'\"-/., ½⅞′″’ftinmcpulg+\u00AD\u202F–´".split(""), "28", "7", "1/2", "ft", " ", "16");

describe("printing and reading", () => {
  test.each(forms)("at $precision in $style, reading what was printed gives the rounded length, and prints the same", ({ precision, style }) => {
    fc.assert(
      fc.property(lengths, (length) => {
        const printed = printLength(length, precision, style);
        const read = parseLength(printed);
        expect(read.equals(roundLength(length, precision).rounded)).toBe(true);
        expect(printLength(read, precision, style)).toBe(printed);
      }),
      { numRuns: runs(200) },
    );
  });

  test.each(precisions)("at %s, rounding is to a graduation no farther than half of one, and lean has the remainder's sign", (precision) => {
    fc.assert(
      fc.property(lengths, (length) => {
        const { rounded, lean } = roundLength(length, precision);
        const remainder = length.minus(rounded);
        expect(rounded.inches.div(graduation(precision).inches).d).toBe(1n);
        expect(remainder.magnitude().times(2).compare(graduation(precision))).toBeLessThanOrEqual(0);
        expect(lean).toBe(remainder.isZero() ? "exact" : remainder.isPositive() ? "strong" : "scant");
      }),
      { numRuns: runs(200) },
    );
  });

  test.each(precisions)("at %s, a double rounds as the exact length it stands for", (precision) => {
    fc.assert(
      fc.property(fc.integer({ min: -4_000_000, max: 4_000_000 }), (count) => {
        const exact = Length.from(new Fraction(count, 512)); // a double holds it exactly
        const fromDouble = roundLength(count / 512, precision);
        if (precision.endsWith("mm")) expect(fromDouble.rounded.minus(roundLength(exact, precision).rounded).isZero()).toBe(true);
        else expect(fromDouble.rounded.equals(roundLength(exact, precision).rounded)).toBe(true);
      }),
      { numRuns: runs(200) },
    );
  });

  test("an exact print is read back as itself", () => {
    fc.assert(
      fc.property(lengths, fc.constantFrom(...styles), (length, style) => {
        expect(parseLength(printExact(length, style)).equals(length)).toBe(true);
        expect(parseLength(`${length.toString()} in`).equals(length)).toBe(true);
      }),
      { numRuns: runs(500) },
    );
  });
});

describe("arithmetic", () => {
  test("addition associates and commutes, and taking away undoes it", () => {
    fc.assert(
      fc.property(lengths, lengths, lengths, (a, b, c) => {
        expect(a.plus(b).plus(c).equals(a.plus(b.plus(c)))).toBe(true);
        expect(a.plus(b).equals(b.plus(a))).toBe(true);
        expect(a.plus(b).minus(b).equals(a)).toBe(true);
      }),
      { numRuns: runs(500) },
    );
  });

  test("metric to inches and back is exact, in every unit", () => {
    fc.assert(
      fc.property(fc.integer({ min: -1e9, max: 1e9 }), fc.integer({ min: 0, max: 6 }), fc.constantFrom(...lengthUnits), (digits, places, unit) => {
        const value = new Fraction(BigInt(digits), 10n ** BigInt(places));
        const length = Length.from(value, unit);
        expect(length.in(unit).equals(value)).toBe(true);
        for (const other of lengthUnits) expect(Length.from(length.in(other), other).equals(length)).toBe(true);
      }),
      { numRuns: runs(500) },
    );
  });

  test("mathjs converts to the same figures, to its own accuracy", () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 1e5, noNaN: true }), fc.constantFrom(...lengthUnits), fc.constantFrom(...lengthUnits), (value, from, to) => {
        const theirs = mathUnit(value, from === "in" ? "inch" : from).toNumber(to === "in" ? "inch" : to);
        const ours = Length.from(value, from).toNumber(to);
        expect(Math.abs(ours - theirs)).toBeLessThanOrEqual(4e-15 * Math.abs(theirs));
      }),
      { numRuns: runs(500) },
    );
  });
});

describe("any text whatever", () => {
  const onlyLengthErrors = (text: string) => {
    try {
      const length = parseLength(text);
      expect(length.magnitude().compare(Length.from(10_000, "ft"))).toBeLessThanOrEqual(0);
    } catch (error) {
      expect(error).toBeInstanceOf(LengthError);
    }
  };

  test("text of any bytes, any Unicode or near misses, up to 200 characters, throws nothing but LengthError", () => {
    const bytes = fc.uint8Array({ maxLength: 200 }).map((values) => String.fromCharCode(...values));
    const lone = fc.array(fc.integer({ min: 0, max: 0xffff }), { maxLength: 200 }).map((values) => String.fromCharCode(...values));
    const unicode = fc.string({ unit: "binary", maxLength: 100 });
    const nearMisses = fc.array(typedPieces, { maxLength: 60 }).map((pieces) => pieces.join("").slice(0, 200));
    for (const texts of [bytes, lone, unicode, nearMisses]) fc.assert(fc.property(texts, onlyLengthErrors), { numRuns: runs(1500) });
  });

  test("within the limit of 64 characters too", () => {
    fc.assert(fc.property(fc.array(typedPieces, { maxLength: 24 }).map((pieces) => pieces.join("").slice(0, 64)), onlyLengthErrors), { numRuns: runs(5000) });
  });

  test("a text read twice reads the same", () => {
    fc.assert(
      fc.property(fc.array(typedPieces, { maxLength: 12 }).map((pieces) => pieces.join("")), (text) => {
        const attempt = () => {
          try {
            return parseLength(text).toString();
          } catch (error) {
            return (error as LengthError).code;
          }
        };
        expect(attempt()).toBe(attempt());
      }),
      { numRuns: runs(500) },
    );
  });
});

describe("one pass", () => {
  // Past the limit of 64 characters on purpose: the walk itself must stay linear, whatever the limit.
  const longTexts = ["9", "9 ", "½", "' ", "ft", "1/", "- ", "9,", ".", "1 1/2 ", "28' 7 1/2\"", "\u202F"];

  test.each(longTexts)("characters of %j repeated are looked at no more than three times each, and the end likewise", (piece) => {
    for (const times of [1, 10, 100, 1000]) {
      const text = piece.repeat(times);
      try {
        expect(tokenizeLength(text).steps).toBeLessThanOrEqual(3 * text.length + 3);
      } catch (error) {
        expect(error).toBeInstanceOf(LengthError); // refused on the way: fewer steps still
      }
    }
  });

  test("no text is looked at more than three times a character", () => {
    fc.assert(
      fc.property(fc.array(typedPieces, { maxLength: 200 }).map((pieces) => pieces.join("")), (text) => {
        try {
          expect(tokenizeLength(text).steps).toBeLessThanOrEqual(3 * text.length + 3);
        } catch (error) {
          expect(error).toBeInstanceOf(LengthError);
        }
      }),
      { numRuns: runs(1000) },
    );
  });

  test("the walk never returns to a token it has passed, and looks at each a bounded number of times", () => {
    fc.assert(
      fc.property(fc.array(typedPieces, { maxLength: 40 }).map((pieces) => pieces.join("")), (text) => {
        const looks = new Map<number, number>();
        let farthest = 0;
        try {
          const { tokens } = tokenizeLength(text);
          const watched = new Proxy(tokens, {
            get(target, key, receiver) {
              if (typeof key === "string" && /^\d+$/.test(key)) {
                const index = Number(key);
                expect(index).toBeGreaterThanOrEqual(farthest - 1); // it peeks one ahead, never back
                farthest = Math.max(farthest, index);
                looks.set(index, (looks.get(index) ?? 0) + 1);
              }
              return Reflect.get(target, key, receiver) as unknown;
            },
          });
          new LengthReader(watched).read();
        } catch (error) {
          if (!(error instanceof LengthError)) throw error;
        }
        expect(Math.max(0, ...looks.values())).toBeLessThanOrEqual(12);
      }),
      { numRuns: runs(2000) },
    );
  });

  test("reading is a matter of microseconds, whatever the text", () => {
    const texts = ["28' 7 1/2\"", "9".repeat(64), "1/".repeat(32), "½".repeat(64), `${"9".repeat(31)}/${"7".repeat(9)}`, "8,7249 m"];
    const started = performance.now();
    for (let round = 0; round < 200; round += 1) {
      for (const text of texts) {
        try {
          readLength(text);
        } catch (error) {
          expect(error).toBeInstanceOf(LengthError);
        }
      }
    }
    expect((performance.now() - started) / (200 * texts.length)).toBeLessThan(1); // ms each; a pass that backtracks takes seconds
  });
});
