import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { squarenessOperation, type SquarenessAnswer } from "@/calculators/squareness";
import { misclosureOf } from "@/calculators/squareness/figure/braced-quadrilateral";
import { answerTo } from "@/calculators/schema";
import { adjustByCoordinates, names, type SixReadings } from "@/tests/reference/squareness-judge";
import { adjustedRows } from "@/tests/reference/squareness-rows";

const ask = (request: object): SquarenessAnswer => {
  const { answer, issues } = answerTo(squarenessOperation, request);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return answer as SquarenessAnswer;
};
const request = ({ ac, bd, ...sides }: SixReadings) => ({ sides, diagonals: { ac, bd } });

/** Slabs up to 3 to 1, corners up to 4 in out, each reading up to 3/4 in off. */
const slabs = fc
  .record({
    length: fc.integer({ min: 120, max: 900 }),
    slender: fc.double({ min: 1 / 3, max: 3, noNaN: true }),
    out: fc.array(fc.double({ min: -4, max: 4, noNaN: true }), { minLength: 4, maxLength: 4 }),
    noise: fc.array(fc.double({ min: -0.75, max: 0.75, noNaN: true }), { minLength: 6, maxLength: 6 }),
  })
  .map(({ length, slender, out, noise }) => {
    const width = length * slender;
    const points = [[0, 0], [length, 0], [length + out[0]!, width + out[1]!], [out[2]!, width + out[3]!]] as const;
    const between = (i: number, j: number) => Math.hypot(points[i]![0] - points[j]![0], points[i]![1] - points[j]![1]);
    const ends = { ab: [0, 1], bc: [1, 2], cd: [2, 3], da: [3, 0], ac: [0, 2], bd: [1, 3] } as const;
    return Object.fromEntries(names.map((name, index) => [name, between(ends[name][0], ends[name][1]) + noise[index]!])) as SixReadings;
  });

describe("the braced quadrilateral", () => {
  test.each(adjustedRows)("$id is adjusted as the row says", (row) => {
    const answer = ask({ sides: row.sides, diagonals: row.diagonals });
    for (const name of names) expect(Math.abs(answer.readings[name]!.adjusted!.in - row.adjusted[name]), name).toBeLessThan(row.id === "Q07" ? 1e-9 : 2e-4);
    if ("angles" in row) for (const corner of ["A", "B", "C", "D"] as const) expect(Math.abs(answer.corners[corner].angleDegrees - row.angles[corner]), corner).toBeLessThan(row.id === "Q07" ? 1e-9 : 2e-4);
  });

  test("Q07: a 3-4-5 rectangle has nothing to correct", () => {
    const answer = ask({ sides: { ab: 480, bc: 360, cd: 480, da: 360 }, diagonals: { ac: 600, bd: 600 }, tolerance: "1/8" });
    expect([answer.closureIn < 1e-9, answer.shape, answer.verdict, answer.suspects]).toEqual([true, "square", "square", []]);
  });

  test("agrees with an independent least-squares solution to 1e-6 in on hundreds of slabs", () => {
    fc.assert(
      fc.property(slabs, (six) => {
        const judge = adjustByCoordinates(six);
        const answer = ask(request(six));
        for (const name of names) expect(Math.abs(answer.readings[name]!.adjusted!.in - judge.adjusted[name])).toBeLessThan(1e-6);
        expect(Math.abs(answer.closureIn - judge.closure)).toBeLessThan(1e-6);
      }),
      { numRuns: 400 },
    );
  });

  test("its corners are as far apart as the adjusted readings", () => {
    fc.assert(
      fc.property(slabs, (six) => {
        const { corners: at, readings } = ask(request(six));
        const ends = { ab: ["A", "B"], bc: ["B", "C"], cd: ["C", "D"], da: ["D", "A"], ac: ["A", "C"], bd: ["B", "D"] } as const;
        for (const name of names) {
          const [from, to] = ends[name];
          expect(Math.hypot(at[from].x - at[to].x, at[from].y - at[to].y)).toBeCloseTo(readings[name]!.adjusted!.in, 8);
        }
        expect(at.A.angleDegrees + at.B.angleDegrees + at.C.angleDegrees + at.D.angleDegrees).toBeCloseTo(360, 8);
      }),
    );
  });

  test("closure is |w|/|a| and each residual −aᵢw/|a|², to first order", () => {
    fc.assert(
      fc.property(slabs, (six) => {
        const { w, gradient } = misclosureOf(six)!;
        const size = Math.sqrt(names.reduce((sum, name) => sum + gradient[name] ** 2, 0));
        const answer = ask(request(six));
        const bend = (w * w) / 100 + 1e-9; // what the condition's curvature may add on slabs of 40 in and more
        expect(Math.abs(answer.closureIn - Math.abs(w) / size)).toBeLessThan(bend);
        for (const name of names) expect(Math.abs(answer.readings[name]!.residualIn! + (gradient[name] * w) / size ** 2)).toBeLessThan(bend);
      }),
    );
  });

  test("the gradient is the slope of the condition", () => {
    fc.assert(
      fc.property(slabs, fc.constantFrom(...names), (six, name) => {
        const at = (step: number) => misclosureOf({ ...six, [name]: six[name] + step })!.w;
        expect(misclosureOf(six)!.gradient[name]).toBeCloseTo((at(1e-3) - at(-1e-3)) / 2e-3, 4);
      }),
    );
  });

  test("readings that are each within their error never contradict each other", () => {
    const careful = fc.array(fc.constantFrom(-0.125, 0.125), { minLength: 6, maxLength: 6 });
    fc.assert(
      fc.property(slabs, careful, (six, errors) => {
        const { adjusted } = adjustByCoordinates(six);
        const read = Object.fromEntries(names.map((name, index) => [name, adjusted[name] + errors[index]!])) as SixReadings;
        const answer = ask(request(read));
        expect(answer.verdict).toBeNull();
        expect(answer.closureIn).toBeLessThan(answer.closureLimitIn);
      }),
    );
  });

  test("a reading error three times as large is borne when it is told, and contradicts when it is not", () => {
    const six = { ab: 480, bc: 360, cd: 480, da: 360, ac: 600.75, bd: 600.75 };
    expect(ask(request(six)).verdict).toBe("contradictory");
    expect(ask({ ...request(six), readingError: "3/8" }).verdict).toBeNull();
  });
});
