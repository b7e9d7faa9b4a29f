import Fraction from "fraction.js";
import { describe, expect, test } from "vitest";
import { Length, graduation, parseLength, printExact, printLength, roundLength, squareRoot } from "@/calculators/length";
import { decimalFeetRows, exactRows, printedRows } from "../reference/length";

describe("rows of domain.md section 14", () => {
  test.each(exactRows)("$id: $text is exactly $value $unit", ({ text, unit, value }) => {
    expect(parseLength(text).in(unit).equals(new Fraction(value))).toBe(true);
  });

  test.each(decimalFeetRows)("$id: $text is $feet ft", ({ text, feet, within }) => {
    expect(Math.abs(parseLength(text).toNumber("ft") - feet)).toBeLessThanOrEqual(within);
  });

  test.each(printedRows)("$id: $text to $precision prints $printed", ({ text, precision, printed }) => {
    expect(printLength(parseLength(text), precision)).toBe(printed);
  });

  // The US survey foot is 1200/3937 m: POB; Federal Register 85 FR 62698
  const surveyFoot = Length.from(new Fraction(1200, 3937), "m");
  const foot = Length.from(1, "ft");
  test("U03: 1 US survey foot is 1200/3937 m", () => {
    expect(surveyFoot.in("m").equals(new Fraction(1200, 3937))).toBe(true);
    expect(Math.abs(surveyFoot.toNumber("m") - 0.3048006096)).toBeLessThan(1e-10);
  });
  test("U04: a survey foot is 2 parts in a million longer than a foot", () => {
    expect(Math.abs(surveyFoot.inches.div(foot.inches).sub(1).valueOf() - 2e-6)).toBeLessThan(1e-9);
  });
  test("U05: over a mile they part by 0.01056 ft", () => {
    expect(Math.abs(surveyFoot.minus(foot).times(5280).toNumber("ft") - 0.01056)).toBeLessThan(1e-5);
  });
  test("U13: 6.37 ft is 6 ft 4.44 in", () => {
    expect(Length.from(6.37, "ft").minus(Length.from(6, "ft")).inches.equals(new Fraction("4.44"))).toBe(true);
  });
});

describe("printing, rounded once", () => {
  test("11 31/32 at 1/16 prints 1' 0\", scant", () => {
    const length = parseLength("11 31/32");
    expect(printLength(length, "1/16")).toBe(`1' 0"`);
    expect(printLength(length, "1/16", "inches")).toBe(`12"`);
    expect(roundLength(length, "1/16").lean).toBe("scant");
    expect(printLength(length, "1/32")).toBe(`11 31/32"`);
  });

  test("minus nothing is nothing, without a sign", () => {
    for (const zero of [parseLength("-0"), Length.from(-0), Length.zero.negated(), parseLength(`-0' 0"`)]) {
      expect(zero.isNegative()).toBe(false);
      expect(zero.toString()).toBe("0");
      expect(Object.is(zero.toNumber(), 0)).toBe(true);
      for (const precision of ["1/16", "1mm"] as const) expect(printLength(zero, precision)).not.toContain("-");
    }
    expect(printLength(parseLength("-1/64"), "1/16")).toBe(`0"`);
    expect(printLength(-0.001, "1/16")).toBe(`0"`);
    expect(printLength(-0.001, "1mm")).toBe("0 mm");
    expect(roundLength(-0.001, "1/16").lean).toBe("scant");
  });

  // NIST HB 44 s. 10.3: a tie goes to the even graduation
  test.each([
    ["1/32", "1/16", `0"`, "strong"],
    ["3/32", "1/16", `1/8"`, "scant"],
    ["5/32", "1/16", `1/8"`, "strong"],
    ["7/32", "1/16", `1/4"`, "scant"],
    ["-1/32", "1/16", `0"`, "scant"],
    ["-3/32", "1/16", `-1/8"`, "strong"],
    ["11 31/32", "1/16", `1' 0"`, "scant"],
    ["1/4", "1/2", `0"`, "strong"],
    ["3/4", "1/2", `1"`, "scant"],
    ["1/128", "1/64", `0"`, "strong"],
    ["0.5 mm", "1mm", "0 mm", "strong"],
    ["1.5 mm", "1mm", "2 mm", "scant"],
    ["0.75 mm", "0.5mm", "1 mm", "scant"],
    ["1.25 mm", "0.5mm", "1 mm", "strong"],
    ["5/16", "1/16", `5/16"`, "exact"],
    ["0.32", "1/16", `5/16"`, "strong"],
    ["0.3", "1/16", `5/16"`, "scant"],
  ] as const)("%s at %s prints %s, %s", (text, precision, printed, lean) => {
    const length = parseLength(text);
    expect([printLength(length, precision), roundLength(length, precision).lean]).toEqual([printed, lean]);
  });

  test("a double rounds as its exact value does, ties too", () => {
    expect(printLength(0.03125, "1/16")).toBe(`0"`);
    expect(printLength(0.09375, "1/16")).toBe(`1/8"`);
    expect(roundLength(Math.sqrt(2), "1/16")).toMatchObject({ lean: "scant" }); // 1.41421 beside 1 7/16
    expect(roundLength(3.0000000001, "1/16").lean).toBe("exact");
  });

  test("inches below one after feet keep their 0, since 7' 7/8\" is too near 7' 7 8\"", () => {
    expect(printLength(parseLength("84 7/8"), "1/16")).toBe(`7' 0 7/8"`);
    expect(printExact(parseLength("84 1/3"))).toBe(`7' 0 1/3"`);
    expect(printLength(parseLength("7/8"), "1/16")).toBe(`7/8"`);
    expect(printLength(parseLength("84"), "1/16")).toBe(`7' 0"`);
  });

  test("metric prints millimetres, whole or half", () => {
    expect(printLength(parseLength("8724.9 mm"), "1mm")).toBe("8725 mm");
    expect(printLength(parseLength("8724.6 mm"), "0.5mm")).toBe("8724.5 mm");
    expect(printLength(parseLength("-8724.6 mm"), "0.5mm", "inches")).toBe("-8724.5 mm");
  });
});

describe("a length is a value", () => {
  test("nothing can change one", () => {
    const length = parseLength("7 1/2");
    expect(() => Object.assign(length.inches, { n: 1n })).toThrow(TypeError);
    expect(() => Object.assign(length, { inches: new Fraction(1) })).toThrow(TypeError);
    expect(() => Object.assign(graduation("1/16").inches, { n: 5n })).toThrow(TypeError);
    expect(length.plus(length).toString()).toBe("15");
    expect(length.toString()).toBe("15/2");
  });

  test("a number means the decimal it prints as, small, large or between", () => {
    expect(Length.from(0.1).toString()).toBe("1/10");
    expect(Length.from(1e-7).inches.equals(new Fraction(1, 10_000_000))).toBe(true);
    expect(Length.from(1.5e21).toString()).toBe("1500000000000000000000");
    expect(() => Length.from(Number.NaN)).toThrow(RangeError);
    expect(() => Length.from(Number.POSITIVE_INFINITY)).toThrow(RangeError);
  });

  test("nothing is divided by zero", () => {
    expect(() => Length.from(1).over(0)).toThrow(RangeError);
    expect(() => Length.from(1).over(new Fraction(0))).toThrow(RangeError);
  });
});

describe("square roots", () => {
  // D01 to D05: 3-4-5 triangles of the handbooks named in domain.md
  test.each([[6, 8, 10], [12, 16, 20], [300, 400, 500], [9, 12, 15], [30, 40, 50], [336, 252, 420]])("legs %d and %d make exactly %d", (a, b, c) => {
    expect(squareRoot(new Fraction(a * a + b * b))).toEqual(Length.from(c));
  });

  test("fractions too, and what is irrational is the nearest double", () => {
    expect(squareRoot(new Fraction(9, 16))).toEqual(Length.from(0.75));
    expect(squareRoot(new Fraction(0))).toEqual(Length.zero);
    expect(squareRoot(new Fraction(2))).toBe(Math.SQRT2);
    expect(() => squareRoot(new Fraction(-1))).toThrow(RangeError);
  });

  test("figures longer than a double holds stay exact", () => {
    const long = new Fraction(10n ** 400n + 1n, 3n ** 700n);
    expect(squareRoot(long.mul(long))).toEqual(Length.from(long));
    const third = new Fraction(10n ** 400n, 3n * 10n ** 400n + 1n);
    expect(Length.from(third).toNumber()).toBeCloseTo(1 / 3, 15);
    expect(squareRoot(third)).toBeCloseTo(Math.sqrt(1 / 3), 14);
  });
});
