import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { cornerOperation, largestTriangle, type CornerAnswer } from "@/calculators/corner";
import { answerTo } from "@/calculators/schema";
import { diagonalRows, printedRows, wholeRows } from "@/tests/reference/corner-rows";

const ask = (request: object): CornerAnswer => {
  const { answer, issues } = answerTo(cornerOperation, request);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return cornerOperation.answer.parse(answer);
};
const issuesFor = (request: object) => answerTo(cornerOperation, request).issues.map(({ pointer, code }) => `${pointer} ${code}`);

describe("the diagonal of a corner", () => {
  test.each(diagonalRows)("$id: $legs $unit give $diagonal", ({ unit, legs, diagonal, within }) => {
    const perUnit = { ft: 12, in: 1, mm: 1 / 25.4 }[unit];
    const answer = ask({ unit, legs });
    expect(Math.abs(answer.diagonal.in / perUnit - diagonal)).toBeLessThanOrEqual(within + 1e-12);
    if (within === 0) expect(answer.diagonal.exact).not.toBeNull();
  });

  test.each(printedRows)("$id: $legs ft as printed, within 1/32 in", ({ legs, inches }) => {
    expect(Math.abs(ask({ unit: "ft", legs }).diagonal.in - inches)).toBeLessThanOrEqual(1 / 32);
  });

  test.each(wholeRows)("D29: %i, %i, %i stays exact, and is its own largest triangle", (a, b, c) => {
    const answer = ask({ unit: "ft", legs: [a, b] });
    expect(answer.diagonal.exact).toBe(String(c * 12));
    expect(answer.triangle?.counts).toEqual([a, b, c]);
  });

  test("only `reading` holds the burn, and it is exact where the diagonal is", () => {
    const answer = ask({ legs: ["30 ft", "40 ft"], burn: "1 in" });
    expect([answer.diagonal.exact, answer.reading.exact, answer.triangle?.reading.exact]).toEqual(["600", "601", "601"]);
  });

  test("a reading one graduation off swings the second leg's end as told", () => {
    const answer = ask({ legs: ["28 ft", "22 ft"] });
    // the law of cosines with the diagonal 1/16 in long
    const off = Math.acos((336 ** 2 + 264 ** 2 - (answer.diagonal.in + 1 / 16) ** 2) / (2 * 336 * 264)) - Math.PI / 2;
    expect(answer.swingIn).toBeCloseTo(264 * off, 4);
    const inTriangle = Math.acos((336 ** 2 + 252 ** 2 - (420 + 1 / 16) ** 2) / (2 * 336 * 252)) - Math.PI / 2;
    expect(answer.triangle?.swingIn).toBeCloseTo(264 * inTriangle, 4);
  });
});

/** Every pair of whole legs, tried one by one: no triple is generated. */
function bruteForce(along: number, up: number): { across: number; area: number } | null {
  let best: { across: number; area: number } | null = null;
  for (let a = 1; a <= along; a += 1) {
    for (let b = 1; b <= up; b += 1) {
      const across = Math.round(Math.hypot(a, b));
      if (across * across !== a * a + b * b) continue;
      if (best === null || across > best.across || (across === best.across && a * b > best.area)) best = { across, area: a * b };
    }
  }
  return best;
}

describe("the largest whole-number triangle", () => {
  test("28 and 22 ft take 21-28-35, the 28 along the first leg", () => {
    const { triangle } = ask({ legs: ["28 ft", "22 ft"] });
    expect(triangle).toMatchObject({ counts: [28, 21, 35], unit: "ft", primitive: [3, 4, 5], times: 7, a: { text: "28' 0\"" }, b: { text: "21' 0\"" }, c: { text: "35' 0\"" } });
    expect(ask({ legs: ["22 ft", "28 ft"] }).triangle?.counts).toEqual([21, 28, 35]);
  });

  test("no pair of whole legs inside has a longer hypotenuse, nor an equal one a greater area", () => {
    for (let along = 1; along <= 70; along += 1) {
      for (let up = 1; up <= 70; up += 1) {
        const found = largestTriangle({ along, up });
        expect(found && { across: found.across, area: found.along * found.up }, `${along} by ${up}`).toEqual(bruteForce(along, up));
      }
    }
  });

  test("it is right-angled, fits, and is the multiple of a primitive triple it says", () => {
    fc.assert(
      fc.property(fc.integer({ min: 4, max: 30000 }), fc.integer({ min: 4, max: 30000 }), (along, up) => {
        const found = largestTriangle({ along, up })!;
        expect(found.along ** 2 + found.up ** 2).toBe(found.across ** 2);
        expect(found.along <= along && found.up <= up).toBe(true);
        expect(found.primitive.map((count) => count * found.times)).toEqual([Math.min(found.along, found.up), Math.max(found.along, found.up), found.across]);
        const [a, b] = found.primitive;
        const divisor = (x: number, y: number): number => (y === 0 ? x : divisor(y, x % y));
        expect(divisor(a, b)).toBe(1);
      }),
      { numRuns: 40 },
    );
  });

  test("part of a foot is not used, and legs under 3 by 4 ft have none", () => {
    expect(ask({ legs: ["28' 11 15/16\"", "22 ft"] }).triangle?.counts).toEqual([28, 21, 35]);
    expect(ask({ legs: ["3' 11 15/16\"", "30 ft"] }).triangle?.counts).toEqual([3, 4, 5]);
    expect(ask({ legs: ["3' 11 15/16\"", "3' 11 15/16\""] }).triangle).toBeNull();
    expect(ask({ legs: ["2 ft", "100 ft"] }).triangle).toBeNull();
  });

  test("metric legs take whole 100 mm", () => {
    expect(ask({ unit: "mm", precision: "1mm", legs: ["8534", "6706"] }).triangle).toMatchObject({ unit: "100 mm", counts: bruteMetric(85, 67) });
  });
});

function bruteMetric(along: number, up: number): number[] {
  const best = bruteForce(along, up)!;
  for (let a = 1; a <= along; a += 1) for (let b = 1; b <= up; b += 1) if (a * a + b * b === best.across ** 2 && a * b === best.area) return [a, b, best.across];
  return [];
}

describe("legs that cannot be read", () => {
  test.each([
    [{}, ["/legs required"]],
    [{ legs: ["28 ft"] }, ["/legs too-few"]],
    [{ legs: ["28 ft", "0"] }, ["/legs/1 zero"]],
    [{ legs: ["28 ft", "x"], burn: "-1" }, ["/legs/1 unexpected-text", "/burn negative"]],
  ])("%j is refused field by field", (request, issues) => {
    expect(issuesFor(request)).toEqual(issues);
  });
});
