import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { z } from "zod";
import { Length, parseLength } from "@/calculators/length";
import { answerTo, CalculationError, calculatorInput, choiceField, defineOperation, flagField, issuesOf, lengthAnswer, lengthField, measure, numberField, pointerTo } from "@/calculators/schema";
import { runs } from "../setup/runs";

const length = (sign?: "positive" | "not-negative" | "any") => lengthField({ sign, description: "A length", example: "28 ft" });
const input = calculatorInput({
  width: length(),
  burn: length("not-negative").optional(),
  offset: length("any").optional(),
  diagonals: z.strictObject({ ac: length(), bd: length() }).optional(),
  bolts: z.array(z.strictObject({ station: length() })).max(3).optional(),
  side: choiceField(["ab", "bc"], { description: "A side" }).optional(),
  count: numberField({ minimum: 1, maximum: 9, whole: true, description: "How many", example: 3 }).optional(),
  warmth: numberField({ minimum: -50, maximum: 150, description: "Degrees", example: 68 }).optional(),
  wet: flagField({ description: "Whether wet" }).optional(),
});

function issues(request: unknown) {
  const parsed = input.safeParse(request);
  return parsed.success ? [] : issuesOf(parsed.error);
}
const codes = (request: unknown) => issues(request).map(({ pointer, code }) => `${pointer} ${code}`);

describe("faults of an input", () => {
  test("all are told at once, each with its pointer", () => {
    expect(
      codes({ unit: "yd", precision: "1/3", width: "28 7", burn: "-1", diagonals: { ac: "", bd: "20000 ft", ad: "1" }, bolts: [{ station: "1" }, {}, { station: true }], side: "xy", count: "2.5", warmth: "hot", wet: "maybe", __proto: 1 }),
    ).toEqual([
      "/unit not-one-of",
      "/precision not-one-of",
      "/width two-readings",
      "/burn negative",
      "/diagonals/ac empty",
      "/diagonals/ad unknown-field",
      "/bolts/1/station required",
      "/bolts/2/station expected-length",
      "/side not-one-of",
      "/count expected-whole-number",
      "/warmth expected-number",
      "/wet expected-flag",
      "/__proto unknown-field",
      "/diagonals/bd out-of-range",
    ]);
  });

  test("each comes with the figures its sentence needs", () => {
    expect(issues({ width: "28 7", count: 12, side: "q", bolts: Array.from({ length: 4 }, () => ({ station: 1 })), extra: 1 })).toEqual([
      { pointer: "/width", code: "two-readings", params: { first: `28' 7"`, second: "28.7" } },
      { pointer: "/bolts", code: "too-many", params: { maximum: 3 } },
      { pointer: "/side", code: "not-one-of", params: { options: "ab, bc" } },
      { pointer: "/count", code: "too-big", params: { maximum: 9 } },
      { pointer: "/extra", code: "unknown-field", params: { field: "extra" } },
    ]);
  });

  test.each([[null], [3], ["28 ft"], [[]], [undefined]])("%j is no input at all", (request) => {
    expect(codes(request)).toEqual([request === undefined ? " required" : " expected-object"]);
  });

  test("wrong shapes inside are told where they are", () => {
    expect(codes({ width: ["28 ft"], diagonals: [], bolts: {} })).toEqual(["/width expected-length", "/diagonals expected-object", "/bolts expected-array"]);
    expect(codes({ width: null })).toEqual(["/width expected-length"]);
    expect(codes({ width: Number.NaN })).toEqual(["/width expected-length"]);
  });

  test("an object's prototype is no field and is not touched", () => {
    const request: unknown = JSON.parse(`{"width": 1, "__proto__": {"burn": "9"}, "constructor": {"prototype": {"polluted": true}}}`);
    expect(codes(request)).toEqual(["/__proto__ unknown-field", "/constructor unknown-field"]);
    expect(({} as { polluted?: boolean }).polluted).toBeUndefined();
    expect(input.safeParse({ width: 1 }).data).not.toHaveProperty("burn");
  });

  test("a pointer escapes what RFC 6901 says", () => {
    expect(pointerTo(["a/b", "c~d", 0])).toBe("/a~1b/c~0d/0");
    expect(codes({ width: 1, "a/b~c": 1 })).toEqual(["/a~1b~0c unknown-field"]);
  });

  test("whatever JSON is sent, it is read or refused with issues, and nothing is thrown", () => {
    fc.assert(
      fc.property(fc.oneof(fc.jsonValue(), fc.record({ width: fc.jsonValue(), diagonals: fc.jsonValue(), bolts: fc.jsonValue(), unit: fc.jsonValue() })), (request) => {
        const parsed = input.safeParse(request);
        if (parsed.success) return;
        const found = issuesOf(parsed.error);
        expect(found.length).toBeGreaterThan(0);
        for (const { pointer, code } of found) {
          expect(pointer).toMatch(/^(\/.*)?$/s);
          expect(code).toMatch(/^[a-z][a-z-]*$/);
        }
      }),
      { numRuns: runs(1000) },
    );
  });
});

describe("units are settled", () => {
  test("bare numbers take the input's unit, texts with a unit keep theirs, at any depth", () => {
    const settled = input.parse({ unit: "mm", width: "8724.9", offset: "-7/16 in", diagonals: { ac: 25.4, bd: "1 ft" }, bolts: [{ station: "254" }] });
    expect([settled.width, settled.offset, settled.diagonals?.ac, settled.diagonals?.bd, settled.bolts?.[0]?.station].map(String)).toEqual(["687/2", "-7/16", "1", "12", "10"]);
  });

  test("inches to 1/16 unless told otherwise", () => {
    expect(input.parse({ width: 3 })).toMatchObject({ unit: "in", precision: "1/16" });
  });

  test("a range that only the unit shows is told too", () => {
    expect(codes({ width: "4000" })).toEqual([]);
    expect(codes({ width: "4000", unit: "m" })).toEqual(["/width out-of-range"]);
    expect(codes({ width: 1e308, burn: "28 7" })).toEqual(["/burn two-readings", "/width out-of-range"]);
  });

  test("signs are judged by the field", () => {
    expect(codes({ width: 0 })).toEqual(["/width zero"]);
    expect(codes({ width: -1 })).toEqual(["/width negative"]);
    expect(codes({ width: 1, burn: 0, offset: "-1" })).toEqual([]);
  });
});

describe("numbers and flags", () => {
  const count = (value: unknown) => input.safeParse({ width: 1, count: value }).data?.count;
  const warmth = (value: unknown) => input.safeParse({ width: 1, warmth: value }).data?.warmth;
  test("a number is one, or the text of one", () => {
    expect([count(3), count("3"), count(" 3 "), count("3.0"), warmth("-4.5"), warmth("\u22124"), warmth(".5"), warmth("1e1"), warmth("-0")]).toEqual([3, 3, 3, 3, -4.5, -4, 0.5, 10, 0]);
  });
  test.each([["", "expected-number"], ["3 ft", "expected-number"], ["0x3", "expected-number"], ["Infinity", "expected-number"], ["1,5", "expected-number"], [true, "expected-number"], ["1".repeat(40), "expected-number"], [0, "too-small"], [10, "too-big"], [2.5, "expected-whole-number"]])("%j is refused: %s", (value, code) => {
    expect(codes({ width: 1, count: value })).toEqual([`/count ${code}`]);
  });
  test("a flag is true or false, or the word", () => {
    expect([true, "true", false, "false"].map((wet) => input.parse({ width: 1, wet }).wet)).toEqual([true, true, false, false]);
    for (const wet of ["yes", 1, "", null, "TRUE"]) expect(codes({ width: 1, wet })).toEqual(["/wet expected-flag"]);
  });
});

describe("answers", () => {
  test("a length answers as product.md's contract has it", () => {
    expect(lengthAnswer.parse(measure(parseLength(`28' 7 1/2"`), "1/16"))).toEqual({ in: 343.5, exact: "687/2", text: `28' 7 1/2"`, mm: 8724.9, lean: "exact" });
    expect(lengthAnswer.parse(measure(Math.sqrt(2) * 336, "1/16"))).toMatchObject({ exact: null, text: `39' 7 3/16"`, lean: "scant" }); // 475.1758 in
    expect(lengthAnswer.parse(measure(Length.from(1), "0.5mm"))).toMatchObject({ text: "25.5 mm", mm: 25.4, lean: "scant" });
  });

  test("what a calculator finds wrong comes back as issues; what it did not expect is thrown on", () => {
    const operation = (calculate: () => Record<string, never>) => defineOperation({ id: "x", path: "x", input, answer: z.object(), calculate, examples: [] });
    const issue = { pointer: "/width", code: "too-small", params: { minimum: 4 } };
    const finds = operation(() => {
      throw new CalculationError([issue]);
    });
    const breaks = operation(() => {
      throw new TypeError("a slip");
    });
    expect(answerTo(finds, { width: 1 })).toEqual({ answer: null, issues: [issue] });
    expect(answerTo(finds, {}).issues).toEqual([{ pointer: "/width", code: "required", params: {} }]);
    expect(() => answerTo(breaks, { width: 1 })).toThrow(TypeError);
  });
});
