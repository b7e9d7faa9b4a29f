import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { conversionsOperation } from "@/calculators/conversions";
import { precisions } from "@/calculators/length";
import { answerTo, inputFromQuery } from "@/calculators/schema";
import { bladeWindow } from "@/components/calculators/conversions/blade-window";
import { firstLines, foldLines, isLengthField, withoutBlankEnd } from "@/components/calculators/conversions/strip-fields";
import { inUnit } from "@/lib/client/calculator/form-fields";
import { runs } from "../setup/runs";

describe("the strip's fields", () => {
  test("a length worked on becomes the first line, and answers as before while the second is blank", () => {
    const fields = firstLines("13.89", "times");
    const input = withoutBlankEnd(inputFromQuery(Object.entries(fields)));
    expect(input).toEqual({ strip: [{ op: "add", value: "13.89" }] });
    expect(answerTo(conversionsOperation, input).answer?.total.exact).toBe("1389/100");
    expect(withoutBlankEnd(inputFromQuery(Object.entries(firstLines("", "add"))))).toEqual({});
  });

  test("a line left blank in the middle is asked for", () => {
    const input = withoutBlankEnd(inputFromQuery(Object.entries({ ...firstLines("1", "add"), "strip.2.op": "add", "strip.2.value": "2" })));
    expect(answerTo(conversionsOperation, input).issues.map(({ pointer, code }) => [pointer, code])).toEqual([["/strip/1/value", "required"]]);
  });

  test("a change of unit keeps the meaning of lengths and leaves factors alone", () => {
    const fields = { ...firstLines("12", "times", "8"), "strip.2.op": "subtract", "strip.2.value": "3 1/2", spaces: "4" };
    expect(inUnit({ fields, unit: "in", precision: "1/16" }, "mm", "1mm", isLengthField).fields).toEqual({ ...fields, "strip.0.value": "12 in", "strip.2.value": "3 1/2 in" });
  });

  test("a form without script sends a length and lines, blank ones among them", () => {
    expect(foldLines({ value: " 13.89 ", "strip.1.op": "add", "strip.1.value": "", "strip.3.op": "times", "strip.3.value": "8", "strip.2.op": "add", "strip.2.value": " ", precision: "1/16" })).toEqual({
      precision: "1/16",
      "strip.0.op": "add",
      "strip.0.value": "13.89",
      "strip.1.op": "times",
      "strip.1.value": "8",
    });
    expect(foldLines({ value: "1", "strip.1.op": "add", "strip.1.value": "", spaces: "3" })).toEqual({ value: "1", spaces: "3" });
  });
});

describe("the blade where the answer stands", () => {
  test.each(precisions)("at %s the reading is in sight, its graduation is drawn, and figures stand at whole inches or centimetres", (precision) => {
    const whole = precision.endsWith("mm") ? 1 / 2.54 : 1;
    const steps = precision.endsWith("mm") ? (precision === "1mm" ? 10 : 20) : Number(precision.slice(2));
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 120_000 * 2 }), (count) => {
        const reading = (count / steps) * whole;
        const tape = bladeWindow(reading, precision);
        const x = tape.at(reading);
        expect(x).toBeGreaterThanOrEqual(0);
        expect(x).toBeLessThanOrEqual(100);
        expect(tape.ticks.some((tick) => Math.abs(tick.x - x) < 1e-6)).toBe(true);
        for (const label of tape.labels) expect(label.x).toBeCloseTo(tape.at(label.count * whole), 6);
        if (tape.hook !== null) expect(Math.min(...tape.ticks.map((tick) => tick.x))).toBeCloseTo(tape.hook, 9);
      }),
      { numRuns: runs(100) },
    );
  });
});
