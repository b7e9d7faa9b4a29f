import { describe, expect, test } from "vitest";
import { footprintOperation, type FootprintAnswer } from "@/calculators/footprint";
import { readToward } from "@/calculators/footprint/toward";
import { signedArea } from "@/calculators/geometry/polygon";
import { answerTo } from "@/calculators/schema";
import { mahun, product, walkRows } from "../reference/footprint-rows";

const asked = (input: object) => answerTo(footprintOperation, input);
const answered = (input: object): FootprintAnswer => {
  const { answer, issues } = asked(input);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return footprintOperation.answer.parse(answer);
};
const codes = (input: object) => asked(input).issues.map(({ pointer, code }) => `${pointer} ${code}`);
const notes = (input: object) => answered(input).notes.map(({ code }) => code);
const lPlan = "E 40 ft, N 20 ft, W 16 ft, N 12 ft, W 24 ft, S 32 ft";

describe("a walk round the plan", () => {
  test.each(walkRows)("$id closes as the reference says", ({ walk, east, north, oneIn, squareFeet, perimeterFeet }) => {
    const answer = answered({ walk });
    expect([answer.closure!.east.in, answer.closure!.north.in, answer.closure!.oneIn]).toEqual([east, north, oneIn]);
    expect(answer.perimeter!.in).toBe(perimeterFeet * 12);
    if (squareFeet !== null) expect(answer.areaSquareFeet).toBe(squareFeet);
  });

  test("V07: area by coordinates agrees with Mahun's five points", () => {
    const counterClockwise = [...mahun.corners].map(({ north, east }) => ({ x: east * 12, y: north * 12 }));
    expect(Math.abs(Math.abs(signedArea(counterClockwise)) / 144 - mahun.squareFeet)).toBeLessThan(mahun.tolerance);
  });

  test("V08: a rectangle of 235.12 by 1126.40 ft has the right area, not the misprinted one", () => {
    const answer = answered({ walk: `E ${product.east} ft, N ${product.north} ft, W ${product.east} ft, S ${product.north} ft` });
    expect(Math.abs(answer.areaSquareFeet! - product.squareFeet)).toBeLessThan(0.01);
    expect(answer.areaSquareFeet).not.toBeCloseTo(product.misprint, 0);
  });

  test("rows, text, English, Spanish and bearings tell the same plan", () => {
    const rows = [["N", "20 ft"], ["west", "40 ft"], ["Sur", "20 ft"], ["ESTE", "40 ft"]].map(([toward, length]) => ({ toward, length }));
    const expected = answered({ runs: rows }).areaSquareFeet;
    for (const walk of ["N 20 ft; W 40 ft; S 20 ft; E 40 ft", "norte 20 pies\noeste 40 pies\nsur 20 pies\neste 40 pies", "N 0° E 20 ft, N 90° W 40 ft, 180° 20 ft, 90° 0' 0\" 40 ft"]) {
      expect(answered({ walk }).areaSquareFeet).toBe(expected);
    }
    expect(expected).toBe(800);
  });

  test.each([
    ["N 45° 30' 15\" E", 45 + 30 / 60 + 15 / 3600],
    ["S 30-15-10 O", 180 + 30 + 15 / 60 + 10 / 3600],
    ["135° 30'", 135.5],
    ["noroeste", 315],
    ["South-East", 135],
    ["N 90° E", 90],
    ["SO", 225],
  ])("%s is %d degrees from north", (text, degrees) => {
    const read = readToward(text);
    expect("toward" in read && [read.toward.degrees, read.rest]).toEqual([expect.closeTo(degrees, 9), ""]);
  });

  test("a bay with bearings closes, and its sides come back as walked", () => {
    const side = Math.SQRT2 * 24;
    const answer = answered({ walk: `E 10 ft, N 45 E ${side} in, N 8 ft, N 45 W ${side}, W 10 ft, S 45 W ${side}, S 8 ft, S 45 E ${side}` });
    expect(answer.closure!.distance.in).toBeLessThan(1e-6);
    expect(answer.corners.map(({ inside }) => inside)).not.toContain(true);
    expect(answer.lines[1]).toMatchObject({ toward: "N 45° E" });
    expect(answer.areaSquareFeet).toBeCloseTo((168 * 144 - 2 * 24 * 24) / 144, 6);
  });

  test("a run repeated by times, and going on in one line, is one side", () => {
    const answer = answered({ runs: [{ toward: "E", length: "10 ft", times: 4 }, { toward: "N", length: "20 ft" }, { toward: "W", length: "20 ft" }, { toward: "W", length: "20 ft" }, { toward: "S", length: "20 ft" }] });
    expect(answer.corners.map(({ x, y }) => [x, y])).toEqual([[0, 0], [480, 0], [480, 240], [0, 240]]);
    expect(answer.notes).toMatchObject([{ code: "collinear", run: 4 }]);
  });

  test("a closing leg left out is added and named", () => {
    const { notes: found, areaSquareFeet } = answered({ walk: "E 40 ft, N 20 ft, W 16 ft, N 12 ft, W 24 ft" });
    expect(found).toMatchObject([{ code: "closing-leg-added", toward: "S", length: { exact: "384" } }]);
    expect(areaSquareFeet).toBe(1088);
  });

  test("a clockwise walk is lettered counter-clockwise from the same corner", () => {
    const clockwise = answered({ walk: "N 32 ft, E 24 ft, S 12 ft, E 16 ft, S 20 ft, W 40 ft" });
    const straight = answered({ walk: lPlan });
    expect(clockwise.notes).toMatchObject([{ code: "clockwise" }]);
    expect(clockwise.corners).toEqual(straight.corners);
    expect(clockwise.lines.map(({ toward }) => toward)).toEqual(["E", "N", "W", "N", "W", "S"]);
  });

  test("a walk begun in the middle of a side moves A to the first corner", () => {
    expect(notes({ walk: "E 20 ft, N 20 ft, W 40 ft, S 20 ft, E 20 ft" })).toEqual(["start-on-side"]);
  });

  test("three corners make a plan, and are named", () => {
    const answer = answered({ walk: "E 30 ft, N 40 ft" + ", S 36° 52' 11.6\" W 50 ft" });
    expect(answer.notes.map(({ code }) => code)).toContain("three-corners");
    expect(answer.areaSquareFeet).toBeCloseTo(600, 1);
    expect(answer.checks).toEqual([]);
  });

  test("a small misclosure is shared out, square corners stay square, and each run that could be wrong is named", () => {
    const answer = answered({ walk: "E 40 ft, N 20 ft, W 15' 11\", N 12 ft, W 24 ft, S 32 ft" });
    expect(answer.notes).toMatchObject([{ code: "balanced", length: { in: 1 } }]);
    expect(new Set(answer.corners.map(({ angleDegrees }) => Math.round(angleDegrees! * 1e6) / 1e6))).toEqual(new Set([90, 270]));
    expect(answer.suspects.map(({ run, would }) => [run, would.text])).toEqual([[1, "39' 11\""], [3, "16' 0\""], [5, "24' 1\""]]);
  });

  test.each([
    ["an open walk", { walk: "E 40 ft, N 20 ft, W 30 ft, S 12 ft" }, ["/walk walk-open"]],
    ["two legs only", { walk: "E 40 ft, N 20 ft" }, ["/walk walk-open"]],
    ["one leg", { walk: "E 40 ft" }, ["/walk too-few-corners"]],
    ["a leg straight back", { runs: [{ toward: "E", length: "40 ft" }, { toward: "W", length: "10 ft" }] }, ["/runs/1 doubles-back"]],
    ["a walk that crosses itself", { walk: "E 40 ft, N 20 ft, W 30 ft, S 35 ft, W 10 ft, N 15 ft" }, ["/walk walk-crosses"]],
    ["a direction nobody knows", { walk: "E 40 ft, Q 20 ft" }, ["/walk walk-toward-unknown"]],
    ["a bearing without its east or west", { walk: "N 45° 20 ft" }, ["/walk walk-bearing-incomplete"]],
    ["a bearing past its quadrant", { runs: [{ toward: "N 95° E", length: "3" }] }, ["/runs/0/toward bearing-out-of-range"]],
    ["a leg without length", { walk: "E, N 20 ft" }, ["/walk walk-leg-length"]],
    ["a length that can be read two ways", { runs: [{ toward: "E", length: "3-1/2" }] }, ["/runs/0/length two-readings"]],
    ["no plan at all", {}, ["/runs plan-missing"]],
    ["two plans at once", { walk: lPlan, runs: [{ toward: "E", length: "40 ft" }] }, ["/walk plan-twice"]],
    ["an inset that uses a side up", { walk: lPlan, inset: "12 ft" }, ["/inset inset-swallows"]],
    ["an inset of a side that is not there", { walk: lPlan, inset: { ab: "1/2", bc: "1/2", cd: "1/2", de: "1/2", ef: "1/2", gh: "1/2" } }, ["/inset/gh side-unknown", "/inset/fa required"]],
    ["a bow past its side", { walk: lPlan, bows: [{ side: "bc", station: "21 ft", outward: "1/4" }] }, ["/bows/0/station station-past-side"]],
  ])("%s is refused by name", (_what, input, expected) => {
    expect(codes(input)).toEqual(expected);
  });

  test("no walk of any characters does anything but answer or refuse", () => {
    for (const text of ["", "°", ",,,,", "N".repeat(4000), "N 1,".repeat(1000), "E 40 ft, ".repeat(400), "N 45° 45' 45\" E ".repeat(200), "\u0000", "E 1e9", "×3", "E 5 x 0"]) {
      expect(() => asked({ walk: text })).not.toThrow();
    }
  });
});
