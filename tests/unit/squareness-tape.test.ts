import { describe, expect, test } from "vitest";
import { squarenessOperation, type SquarenessAnswer } from "@/calculators/squareness";
import { answerTo } from "@/calculators/schema";
import { tapeRows } from "@/tests/reference/squareness-rows";

const ask = (request: object): SquarenessAnswer => {
  const { answer, issues } = answerTo(squarenessOperation, request);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return squarenessOperation.answer.parse(answer);
};
/** A slab one of whose diagonals reads so many feet; only the correction of that reading is looked at. */
const corrected = (feet: number, tape: object) => ask({ sides: { ab: `${feet * 0.8} ft`, da: `${feet * 0.6} ft` }, diagonals: { ac: `${feet} ft`, bd: `${feet} ft` }, tape }).readings.ac;

describe("a steel tape's correction", () => {
  test.each(tapeRows)("$id: $feet ft are corrected by $correction ft", ({ feet, tape, part, correction, within }) => {
    const parts = corrected(feet, tape).correctionIn!;
    expect(Math.abs(parts[part] / 12 - correction)).toBeLessThanOrEqual(within);
    expect(parts.total).toBeCloseTo(parts.length + parts.temperature + parts.pull + parts.sag, 12);
  });

  test("each reading is corrected for its length between the marks, burn taken off first; sizes never", () => {
    const answer = ask({ length: "40 ft", width: "30 ft", diagonals: { ac: "601", bd: "601" }, burn: "1", tape: { nominalLength: "100 ft", trueLength: "100 ft 1/2 in" } });
    expect(answer.readings.ac.correctionIn?.total).toBeCloseTo((600 * 0.5) / 1200, 12);
    expect([answer.readings.ab.correctionIn, answer.readings.ab.measured.exact]).toEqual([null, "480"]);
    expect(answer.readings.ac.reading?.exact).toBe("601");
  });

  test("the reading to aim at is what this tape will show", () => {
    const tape = { nominalLength: "100 ft", trueLength: "100 ft 1/2 in", temperature: 98, pull: 12, weight: 2.8, span: "25 ft" };
    const answer = ask({ length: "40 ft", width: "30 ft", diagonals: { ac: "600", bd: "600" }, burn: "1", tape });
    const shown = answer.target.reading.in;
    const check = ask({ length: "40 ft", width: "30 ft", diagonals: { ac: shown, bd: shown }, burn: "1", tape });
    expect(check.readings.ac.measured.in).toBeCloseTo(600, 9);
  });

  test("metric figures of the same tape give the same correction", () => {
    const imperial = corrected(100, { temperature: 95, standardTemperature: 68, expansion: 0.00000645, pull: 20, standardPull: 10, section: 0.006, weight: 1.2, span: "50 ft" }).correctionIn!;
    // 35 C, 20 C; 0.45359237 kg a pound; 645.16 sq mm a square inch; pounds per 100 ft to kg per 100 m
    const metric = corrected(100, { system: "metric", temperature: 35, standardTemperature: 20, expansion: 0.00000645 * 1.8, pull: 9.0718474, standardPull: 4.5359237, section: 0.006 * 645.16, weight: (1.2 * 0.45359237) / 0.3048, span: "15.24 m" }).correctionIn!;
    for (const part of ["temperature", "pull", "sag", "total"] as const) expect(Math.abs(metric[part] / imperial[part] - 1)).toBeLessThan(1e-5); // convert-units' pound has six digits
  });

  test("a tape that is warm alike for both diagonals leaves their difference", () => {
    const cold = ask({ length: "40 ft", width: "30 ft", diagonals: { ac: "600", bd: "599 1/2" } });
    const warm = ask({ length: "40 ft", width: "30 ft", diagonals: { ac: "600", bd: "599 1/2" }, tape: { temperature: 98 } });
    expect(warm.difference.text).toBe(cold.difference.text);
    expect(warm.difference.exact).toBeNull();
  });

  test("without figures it corrects nothing and keeps lengths exact", () => {
    expect(ask({ length: "40 ft", width: "30 ft", diagonals: { ac: "600", bd: "600" }, tape: {} }).difference.exact).toBe("0");
  });

  test.each([
    [{ trueLength: "100 ft" }, "/tape/nominalLength"],
    [{ pull: 12, weight: 2.8 }, "/tape/span"],
    [{ weight: 2.8, span: "50 ft" }, "/tape/pull"],
    [{ pull: 12, section: 0.01 }, "/tape/standardPull"],
    [{ standardTemperature: 60 }, "/tape/temperature"],
  ])("%j asks for the field that belongs to it", (tape, pointer) => {
    const { issues } = answerTo(squarenessOperation, { length: "40 ft", width: "30 ft", diagonals: { ac: "600", bd: "600" }, tape });
    expect(issues).toEqual([{ pointer, code: "required", params: {} }]);
  });
});
