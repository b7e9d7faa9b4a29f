import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { levelOperation, type LevelAnswer } from "@/calculators/level";
import { answerTo } from "@/calculators/schema";
import { fourHeights, onSetup, publishedLimits } from "@/tests/reference/level-rows";
import { runs } from "@/tests/setup/runs";

function level(request: object): LevelAnswer {
  const { answer, issues } = answerTo(levelOperation, request);
  expect(issues).toEqual([]);
  return answer!;
}
const codes = (request: object) => answerTo(levelOperation, request).issues.map(({ pointer, code }) => `${pointer} ${code}`);

test("E01: benchmark and backsight make the height of the instrument, less the rod the elevation", () => {
  const { benchmark, backsight, rod, height, elevation } = onSetup;
  const answer = level({ unit: "ft", setups: [{ backsight, readings: [{ rod }] }], benchmark: { elevation: benchmark } });
  expect(answer.instruments[0]!.height.in / 12).toBeCloseTo(height, 9);
  expect(answer.points[0]!.elevation.in / 12).toBeCloseTo(elevation, 9);
  expect(answer.arithmeticCheck.ok).toBe(true);
});

test.each(publishedLimits)("$id: the published tolerance is answered as printed", ({ tolerance, limits }) => {
  const answer = level({ setups: [{ backsight: 48, readings: [{ rod: 48 }] }], tolerance });
  expect(answer.tolerance!.limits.map(({ difference, within }) => ({ difference: difference.exact, within: within?.exact ?? null }))).toEqual(limits);
});

describe("E06", () => {
  const readings = fourHeights.rods.map((rod, index) => ({ wall: ["ab", "bc", "cd", "da"][index], station: 0, rod }));
  const setups = [{ backsight: "48", readings }];
  test("a larger rod reading is a lower point, and shims go up to the highest", () => {
    const answer = level({ setups });
    expect(answer.shims.map(({ shim }) => shim.exact)).toEqual([...fourHeights.shims]);
    expect([answer.high.index, answer.low.index, answer.spread.exact]).toEqual([0, 2, "1/2"]);
    expect(answer.verdict).toBeNull();
  });

  test("passes both half-inch limits on a plan of 28 by 24 ft", () => {
    expect(level({ setups, length: "28 ft", width: "24 ft", tolerance: "half-in-20-ft" }).verdict).toBe("within");
    expect(level({ setups, length: "28 ft", width: "24 ft", tolerance: [{ difference: "1/2" }] }).verdict).toBe("within");
  });

  test("closer together it fails a quarter inch in 10 ft, and names the pair", () => {
    const answer = level({ setups, length: "9 ft", width: "8 ft", tolerance: "quarter-in-10-ft" });
    expect(answer.verdict).toBe("out");
    // A and C stand √(108² + 96²) = 144.5 in apart, beyond 10 ft; B and C, 96 in apart, differ by 5/16.
    expect([answer.pairs[0]!.a, answer.pairs[0]!.b, answer.pairs[0]!.difference.exact, answer.pairs[0]!.distance?.exact]).toEqual([1, 2, "5/16", "96"]);
    expect(answer.pairsOut).toBe(1);
  });

  test("without the plan a pair over the limit cannot be judged, and none is condemned", () => {
    const answer = level({ setups, tolerance: [{ difference: "1/4", within: "10 ft" }] });
    expect(answer.verdict).toBe("unknown");
    expect(answer.unplaced).toEqual([0, 1, 2, 3]);
    expect(answer.pairs.filter(({ ok }) => ok === null).length).toBe(2); // 0–2 by 1/2, 1–2 by 5/16
  });
});

test("a turning point carries the height on; the benchmark shot again shows the misclosure", () => {
  // HI 100 + 4 = 104 ft; turning point at 104 − 5 = 99; HI 99 + 6 = 105; point at 105 − 5.5 = 99.5; benchmark back at 105 − 4.99 = 100.01.
  const answer = level({
    unit: "ft",
    setups: [
      { backsight: 4, readings: [{ rod: 4.5 }, { rod: 5, turn: true }] },
      { backsight: 6, readings: [{ rod: 5.5 }] },
    ],
    benchmark: { elevation: 100, closing: 4.99 },
  });
  expect(answer.points.map(({ elevation }) => elevation.in / 12)).toEqual([99.5, 99, 99.5]);
  expect(answer.instruments.map(({ on }) => on)).toEqual(["benchmark", "turn"]);
  expect(answer.misclosure!.exact).toBe("3/25"); // 0.01 ft
  expect(answer.closes).toBe(true); // 0.12 in within 1/8
  // 4 + 6 − 5 − 4.99 = 0.01
  expect([answer.arithmeticCheck.difference.exact, answer.arithmeticCheck.rise.exact, answer.arithmeticCheck.ok]).toEqual(["3/25", "3/25", true]);
});

test("falls run from each station to the next along its wall, and say one in how many", () => {
  const answer = level({
    setups: [{ backsight: 40, readings: [{ wall: "ab", station: "20 ft", rod: "40 1/2" }, { wall: "ab", station: 0, rod: 40 }, { wall: "bc", station: "4 ft", rod: 41 }] }],
  });
  expect(answer.falls.map(({ from, to, fall, distance, oneIn }) => [from, to, fall.exact, distance!.exact, oneIn])).toEqual([[1, 0, "1/2", "240", 480]]);
});

test("points of different walls are as far apart as the plan says", () => {
  const answer = level({
    corners: { A: { x: 0, y: 0 }, B: { x: 300, y: 0 }, C: { x: 300, y: 400 }, D: { x: 0, y: 400 } },
    setups: [{ backsight: 40, readings: [{ wall: "ab", station: 0, rod: 40 }, { wall: "cd", station: 0, rod: 41 }, { x: 0, y: 5, rod: 40 }] }],
    tolerance: [{ difference: "1/4" }],
  });
  expect(answer.pairs.map(({ a, b, distance }) => [a, b, distance!.in])).toEqual(expect.arrayContaining([[0, 1, 500], [0, 2, 5]])); // 3-4-5
});

test.each([
  ["two turning points in a set-up", { setups: [{ backsight: 1, readings: [{ rod: 1, turn: true }, { rod: 2, turn: true }] }] }, "/setups/0/readings one-turn-only"],
  ["corners with one left out", { corners: { A: { x: 0, y: 0 }, C: { x: 1, y: 1 }, D: { x: 0, y: 1 } }, setups: [{ backsight: 1, readings: [{ rod: 1 }] }] }, "/corners corners-in-order"],
  ["a wall that the plan lacks", { length: "20 ft", width: "10 ft", setups: [{ backsight: 1, readings: [{ rod: 1, wall: "ef", station: 1 }] }] }, "/setups/0/readings/0/wall wall-unknown"],
  ["an x without its y", { setups: [{ backsight: 1, readings: [{ rod: 1, x: 4 }] }] }, "/setups/0/readings/0/y half-a-place"],
  ["no readings", { setups: [{ backsight: 1, readings: [] }] }, "/setups/0/readings too-few"],
  ["no rod", { setups: [{ backsight: 1, readings: [{}] }] }, "/setups/0/readings/0/rod required"],
])("%s is told", (_what, request, told) => {
  expect(codes(request)).toContain(told);
});

const sixteenths = fc.integer({ min: 0, max: 64 }).map((count) => 40 + count / 16);
const points = fc.array(fc.record({ x: fc.integer({ min: 0, max: 500 }), y: fc.integer({ min: 0, max: 500 }), rod: sixteenths }), { minLength: 1, maxLength: 12 });

test("the verdict is that of every two points compared by hand", () => {
  fc.assert(
    fc.property(points, fc.integer({ min: 1, max: 40 }), fc.integer({ min: 20, max: 400 }), (readings, sixteenth, within) => {
      const answer = level({ setups: [{ backsight: 40, readings }], tolerance: [{ difference: sixteenth / 16, within }] });
      let out = 0;
      readings.forEach((a, index) =>
        readings.slice(index + 1).forEach((b) => {
          if (Math.hypot(a.x - b.x, a.y - b.y) <= within + 1e-9 && Math.abs(a.rod - b.rod) > sixteenth / 16) out += 1;
        }),
      );
      expect([answer.verdict, answer.pairsOut]).toEqual([out > 0 ? "out" : "within", out]);
    }),
    { numRuns: runs(200), seed: 20260601 },
  );
});

test("shims are never negative, one is nothing, and with its shim every point is as high as the highest", () => {
  fc.assert(
    fc.property(points, (readings) => {
      const answer = level({ setups: [{ backsight: 40, readings }] });
      expect(Math.min(...answer.shims.map(({ shim }) => shim.in))).toBe(0);
      for (const { elevation, shim } of answer.points) expect(elevation.in + shim.in).toBe(answer.high.elevation.in);
    }),
    { numRuns: runs(100), seed: 20260602 },
  );
});

test("the page check holds for any set-ups, and every elevation is what carrying it by hand gives", () => {
  const setups = fc.array(fc.record({ backsight: sixteenths, readings: fc.array(sixteenths, { minLength: 1, maxLength: 4 }), turns: fc.boolean() }), { minLength: 1, maxLength: 6 });
  fc.assert(
    fc.property(setups, fc.option(sixteenths, { nil: undefined }), (drawn, closing) => {
      const answer = level({ setups: drawn.map(({ backsight, readings, turns }) => ({ backsight, readings: readings.map((rod, index) => ({ rod, turn: turns && index === 0 })) })), benchmark: { elevation: 1000, closing } });
      expect(answer.arithmeticCheck.ok).toBe(true);
      let standing = 1000;
      const elevations = drawn.flatMap(({ backsight, readings, turns }) => {
        const height = standing + backsight;
        const here = readings.map((rod) => height - rod);
        standing = turns ? here[0]! : 1000;
        return here;
      });
      expect(answer.points.map(({ elevation }) => elevation.in)).toEqual(elevations);
    }),
    { numRuns: runs(100), seed: 20260603 },
  );
});
