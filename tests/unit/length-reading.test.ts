import { describe, expect, test } from "vitest";
import { LengthError, parseLength, readLength } from "@/calculators/length";
import { acceptedLengths, refusedLengths } from "../reference/accepted-lengths";

function refusalOf(text: string): { code: string; params: object } {
  try {
    return { code: `read as ${parseLength(text).toString()}`, params: {} };
  } catch (error) {
    if (!(error instanceof LengthError)) throw error;
    return { code: error.code, params: error.params };
  }
}

describe("what is accepted", () => {
  test.each(acceptedLengths)("%j is %s in", (text, inches) => {
    expect(parseLength(text).toString()).toBe(inches);
  });

  const codePoints = Array.from({ length: 0x11000 }, (_, code) => String.fromCodePoint(code));
  test.each(codePoints.filter((character) => /\p{Zs}|\s/u.test(character)))("the space %j parts words", (space) => {
    expect(parseLength(`28${space}ft${space}7${space}1/2${space}in`).toString()).toBe("687/2");
  });

  test.each(codePoints.filter((character) => /\p{Pd}/u.test(character)))("the dash %j stands between feet and inches and is a minus before them", (dash) => {
    expect(parseLength(`28'${dash}7 1/2"`).toString()).toBe("687/2");
    expect(parseLength(`${dash}7 1/2`).toString()).toBe("-15/2");
  });

  test("a bare number takes the field's unit, and a number with a unit keeps its own", () => {
    expect(parseLength("113", "in").in("ft").toString()).toBe("9.41(6)");
    expect(parseLength("113", "mm").in("mm").toString()).toBe("113");
    expect(parseLength("2", "ft").toString()).toBe("24");
    expect(parseLength("1.5", "m").in("mm").toString()).toBe("1500");
    expect(parseLength("1/2", "cm").in("mm").toString()).toBe("5");
    for (const unit of ["in", "ft", "mm", "cm", "m"] as const) expect(parseLength(`2' 1"`, unit).toString()).toBe("25");
    expect(readLength("7 1/2").bare).toBe(true);
    expect(readLength("7 1/2 in").bare).toBe(false);
  });
});

describe("what is refused, each with its code and what its sentence needs", () => {
  test.each(refusedLengths)("%j is refused as %s", (text, code, params) => {
    expect(refusalOf(text)).toEqual(params === undefined ? { code, params: expect.anything() } : { code, params });
  });

  test.each(refusedLengths.filter(([, code]) => code === "two-readings"))("both readings offered for %j can be typed, and differ", (text, _code, params) => {
    const { first, second } = params as { first: string; second: string };
    const readings = [first, second].filter((reading) => refusalOf(reading).code.startsWith("read as") || refusalOf(reading).code === "out-of-range" || refusalOf(reading).code === "inches-over-twelve");
    expect(readings).toHaveLength(2);
    expect(first).not.toBe(second);
  });

  test.each(refusedLengths.filter(([, , params]) => params !== undefined && "carried" in params))("the carried form offered for %j can be typed", (_text, _code, params) => {
    expect(refusalOf((params as { carried: string }).carried).code).toMatch(/^read as/);
  });
});
