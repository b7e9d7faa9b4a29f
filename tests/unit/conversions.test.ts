import fc from "fast-check";
import Fraction from "fraction.js";
import { describe, expect, test } from "vitest";
import { conversionsAnswer, conversionsOperation } from "@/calculators/conversions";
import { Length, parseLength, precisions, roundLength } from "@/calculators/length";
import { answerTo } from "@/calculators/schema";
import { decimalFootTexts, feetInchesTexts, stripRows } from "../reference/conversions";
import { runs } from "../setup/runs";

function converted(request: object) {
  const { answer, issues } = answerTo(conversionsOperation, request);
  expect(issues).toEqual([]);
  return conversionsAnswer.parse(answer);
}

function issuesOf(request: unknown) {
  return answerTo(conversionsOperation, request).issues.map(({ pointer, code }) => `${pointer} ${code}`);
}

describe("one length in every form", () => {
  test.each(decimalFootTexts)("$id: $value is $decimalFeet", ({ value, decimalFeet }) => {
    expect(converted({ value }).decimalFeet.text).toBe(decimalFeet);
  });

  test.each(feetInchesTexts)("$id: $value ft is $feetInches", ({ value, feetInches }) => {
    expect(converted({ value, unit: "ft" }).feetInches.text).toBe(feetInches);
  });

  test("28' 7 1/2\" in all of them, as product.md's contract has it", () => {
    expect(converted({ value: `28' 7 1/2"` })).toMatchObject({
      total: { in: 343.5, exact: "687/2", text: `28' 7 1/2"`, mm: 8724.9, lean: "exact" },
      feetInches: { text: `28' 7 1/2"`, errorIn: 0 },
      inches: { text: `343 1/2"`, errorIn: 0 },
      decimalFeet: { value: 28.625, text: "28.6250 ft", errorIn: 0 },
      decimalInches: { value: 343.5, text: "343.5000 in", errorIn: 0 },
      millimetres: { value: 8724.9, text: "8724.9 mm", errorIn: 0 },
      centimetres: { value: 872.49, text: "872.49 cm", errorIn: 0 },
      metres: { value: 8.7249, text: "8.7249 m", errorIn: 0 },
      strip: null,
      spacing: null,
    });
  });

  test("to metric precisions, millimetres are rounded to them and inches to 1/16", () => {
    expect(converted({ value: `8' 3 5/16"`, precision: "1mm" })).toMatchObject({ total: { text: "2523 mm" }, feetInches: { text: `8' 3 5/16"` }, millimetres: { text: "2523 mm" }, metres: { text: "2.523 m" } });
    expect(converted({ value: `8' 3 5/16"`, precision: "0.5mm" })).toMatchObject({ millimetres: { text: "2522.5 mm" }, centimetres: { text: "252.25 cm" }, metres: { text: "2.5225 m" } });
  });

  test("nothing and less than nothing keep their form", () => {
    expect(converted({ value: "0" }).metres.text).toBe("0.0000 m");
    expect(converted({ value: "-1/64" })).toMatchObject({ feetInches: { text: `0"` }, decimalFeet: { text: "-0.0013 ft" }, millimetres: { text: "-0.4 mm" } });
    expect(converted({ value: "-0.0001" })).toMatchObject({ decimalFeet: { text: "0.0000 ft" } });
  });

  test("each form read back differs from the length by the error it states, and by no more than half its last figure", () => {
    fc.assert(
      fc.property(fc.integer({ min: -10_000_000, max: 10_000_000 }), fc.constantFrom(1, 3, 7, 64, 1000), fc.constantFrom(...precisions), (top, bottom, precision) => {
        const length = Length.from(new Fraction(top, bottom * 100));
        const answer = converted({ value: `${length.toString()} in`, precision });
        for (const [form, step] of [[answer.decimalFeet, 0.0012], [answer.decimalInches, 0.0001], [answer.millimetres, 1 / 25.4], [answer.centimetres, 1 / 25.4], [answer.metres, 1 / 25.4], [answer.feetInches, 0.5], [answer.inches, 0.5]] as const) {
          const readBack = parseLength(form.text).minus(length).toNumber();
          expect(readBack).toBeCloseTo(form.errorIn, 10);
          expect(Math.abs(readBack)).toBeLessThanOrEqual(step / 2 + 1e-12);
        }
        expect(answer.feetInches.lean).toBe(answer.feetInches.errorIn === 0 ? "exact" : answer.feetInches.errorIn < 0 ? "strong" : "scant");
      }),
      { numRuns: runs(150) },
    );
  });
});

describe("tape arithmetic", () => {
  test.each(stripRows)("$id: $first times $factor is $text", ({ first, factor, totalIn, text }) => {
    const answer = converted({ strip: [{ op: "add", value: first }, { op: "times", value: factor }] });
    expect(answer.total.in).toBeCloseTo(totalIn, 12);
    expect(answer.total.text).toBe(text);
  });
  test("D21 in feet is 13.98", () => {
    expect(converted({ strip: [{ op: "add", value: "13.42" }, { op: "times", value: 12.5 }] }).decimalFeet.value).toBeCloseTo(13.98, 2);
  });

  test("every line tells its running total, exact: a third three times is the whole again", () => {
    const answer = converted({
      strip: [{ op: "add", value: `10' 0"` }, { op: "divide", value: 3 }, { op: "divide", value: "7" }, { op: "times", value: "21" }, { op: "subtract", value: `9' 11 1/2"` }],
    });
    expect(answer.strip?.map(({ op, factor, length, total }) => [op, factor ?? length?.text, total.exact])).toEqual([
      ["add", `10' 0"`, "120"],
      ["divide", "3", "40"],
      ["divide", "7", "40/7"],
      ["times", "21", "120"],
      ["subtract", `9' 11 1/2"`, "1/2"],
    ]);
    expect(answer.total).toEqual(answer.strip?.at(-1)?.total);
  });

  test("J06: 19.2 five times is 96, where five rounded 19 3/16 make 95 15/16", () => {
    expect(converted({ strip: [{ op: "add", value: "19.2" }, { op: "times", value: "5" }] }).total.exact).toBe("96");
    expect(converted({ strip: [{ op: "add", value: "19 3/16" }, { op: "times", value: "5" }] }).total.exact).toBe("1535/16");
  });

  test("a factor keeps its meaning whatever unit bare numbers have", () => {
    for (const unit of ["in", "ft", "mm", "m"]) expect(converted({ unit, strip: [{ op: "add", value: "1 in" }, { op: "times", value: "10 1/3" }] }).total.exact).toBe("31/3");
  });

  test("the strip gives what exact arithmetic gives, whatever the lines", () => {
    const lines = fc.array(fc.tuple(fc.constantFrom("add", "subtract", "times", "divide"), fc.integer({ min: -40, max: 40 }), fc.integer({ min: 1, max: 16 })), { minLength: 1, maxLength: 12 });
    fc.assert(
      fc.property(lines, (strip) => {
        let total = new Fraction(0);
        let answerable = true;
        for (const [op, top, bottom] of strip) {
          const value = new Fraction(top, bottom);
          if (op === "divide" && top === 0) answerable = false;
          else if (op === "add") total = total.add(value);
          else if (op === "subtract") total = total.sub(value);
          else total = op === "times" ? total.mul(value) : total.div(value);
          if (total.abs().compare(120_000) > 0) answerable = false;
        }
        fc.pre(answerable);
        const answer = converted({ strip: strip.map(([op, top, bottom]) => ({ op, value: `${top}/${bottom}` })) });
        expect(answer.total.exact).toBe(total.toFraction());
      }),
      { numRuns: runs(150) },
    );
  });
});

describe("equal spaces", () => {
  test("marks run from zero, each rounded by itself, and the last is the length", () => {
    const { spacing, total } = converted({ value: `10' 0"`, spaces: 7 });
    expect(spacing?.each.exact).toBe("120/7");
    expect(spacing?.marks.map(({ text }) => text)).toEqual([`1' 5 1/8"`, `2' 10 5/16"`, `4' 3 7/16"`, `5' 8 9/16"`, `7' 1 11/16"`, `8' 6 7/8"`, `10' 0"`]); // k·120/7 in, by hand
    expect(spacing?.marks.at(-1)?.exact).toBe(total.exact);
  });

  test("no mark is off by more than half a graduation, however many", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 100_000 }), fc.integer({ min: 2, max: 100 }), (sixteenths, count) => {
        const length = Length.from(new Fraction(sixteenths, 16));
        const { spacing } = converted({ value: `${length.toString()} in`, spaces: count });
        spacing?.marks.forEach(({ exact, text }, index) => {
          const mark = length.times(index + 1).over(count);
          expect(exact).toBe(mark.toString());
          expect(parseLength(text).equals(roundLength(mark, "1/16").rounded)).toBe(true);
        });
      }),
      { numRuns: runs(20) },
    );
  });
});

describe("what is refused, and where", () => {
  const add = { op: "add", value: "1" };
  test.each([
    [{}, ["/value nothing-to-convert"]],
    [{ spaces: 3 }, ["/value nothing-to-convert"]],
    [{ value: "1", strip: [add] }, ["/strip value-and-strip"]],
    [{ value: "28 7" }, ["/value two-readings"]],
    [{ strip: [] }, ["/strip too-few"]],
    [{ strip: Array.from({ length: 101 }, () => add) }, ["/strip too-many"]],
    [{ strip: [add, { op: "divide", value: "0" }] }, ["/strip/1/value divide-by-zero"]],
    [{ strip: [add, { op: "divide", value: 0 }, { op: "times", value: "2 ft" }] }, ["/strip/1/value divide-by-zero", "/strip/2/value number-without-unit"]],
    [{ strip: [{ op: "plus", value: "x" }, { op: "add" }, { value: "1" }] }, ["/strip/0/op not-one-of", "/strip/0/value unexpected-text", "/strip/1/value required", "/strip/2/op required"]],
    [{ strip: [add, { op: "times", value: "1000" }, { op: "times", value: "1000" }] }, ["/strip/2/value out-of-range"]],
    [{ strip: [add], spaces: "2.5" }, ["/spaces expected-whole-number"]],
    [{ strip: [add], spaces: 1 }, ["/spaces too-small"]],
    [{ strip: [add], spaces: 101 }, ["/spaces too-big"]],
    [{ value: "1", values: "2" }, ["/values unknown-field"]],
    [{ strip: [{ ...add, note: "x" }] }, ["/strip/0/note unknown-field"]],
    [{ strip: { 0: add } }, ["/strip expected-array"]],
  ])("%j: %j", (request, expected) => {
    expect(issuesOf(request)).toEqual(expected);
  });

  test("a strip that grows ever finer is stopped, and soon", () => {
    const started = performance.now();
    const strip = [add, ...Array.from({ length: 99 }, (_, index) => ({ op: "divide", value: `${999_999_000 + index}/${999_998_000 - index}` }))];
    expect(issuesOf({ strip })).toEqual([expect.stringMatching(/^\/strip\/\d+\/value running-total-too-fine$/)]);
    expect(performance.now() - started).toBeLessThan(500);
  });
});
