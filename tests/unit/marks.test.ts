import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { parseLength, printLength } from "@/calculators/length";
import { marksOperation, type MarksAnswer } from "@/calculators/marks";
import { answerTo } from "@/calculators/schema";
import { bayRows, fourHundred, markRows, nineteenTwo } from "@/tests/reference/marks-rows";
import { runs } from "@/tests/setup/runs";

function marks(request: object): MarksAnswer {
  const { answer, issues } = answerTo(marksOperation, request);
  expect(issues).toEqual([]);
  return answer!;
}
const exact = (text: string) => parseLength(text).toString();

test.each(markRows)("$id: $spacing in on centre, $thickness in thick", ({ spacing, thickness, marks: expected }) => {
  const answer = marks({ length: "20 ft", spacing, thickness });
  expect(answer.marks.slice(0, expected.length).map((mark) => mark.exact)).toEqual(expected.map(exact));
});

test("J05: old 2 in joists are marked at 15 and 17, both edges", () => {
  const { joists } = marks({ length: "20 ft", spacing: "16", thickness: "2" });
  expect([joists[1]!.mark.exact, joists[1]!.far.exact]).toEqual(["15", "17"]);
});

test.each(bayRows)("J04: 96 in at $spacing are $bays bays", ({ spacing, bays }) => {
  const answer = marks({ length: "96", spacing });
  expect(answer.bays).toBe(bays);
  expect(answer.lastBay.exact).toBe(exact(spacing)); // the last like the first
});

test("19.2 in marks are each rounded from zero", () => {
  const answer = marks({ length: "16 ft", spacing: "19.2" });
  expect(answer.marks.slice(0, 5).map((mark) => printLength(parseLength(mark.exact!), "1/16", "inches").replace('"', ""))).toEqual([...nineteenTwo]);
});

test("J06: adding up a rounded 19 3/16 five times comes to 95 15/16, not 96, and the answer says by how much", () => {
  const { stepping } = marks({ length: "9 ft", spacing: "19.2" }); // five centres: 19.2 to 96
  expect(stepping!.step.exact).toBe("307/16");
  expect(parseLength(stepping!.last.exact!).plus(parseLength("3/4")).toString()).toBe(exact("95 15/16"));
  expect(stepping!.off.exact).toBe("-1/16");
  expect(marks({ length: "9 ft", spacing: "16" }).stepping).toBeNull();
});

test("400 mm with 38 mm joists", () => {
  const answer = marks({ unit: "mm", precision: "1mm", length: 6000, spacing: 400, thickness: 38 });
  expect(answer.marks.slice(0, 6).map(({ mm }) => mm)).toEqual([...fourHundred]);
  expect(answer.sheetBreaks.map(({ at, onJoist }) => [at.mm, onJoist])).toEqual([[2400, true], [4800, true]]);
});

test("19.2 in is 487.68 mm, whatever one source prints", () => {
  expect(marks({ length: "96", spacing: "487.68 mm" }).marks.map((mark) => mark.exact)).toEqual(marks({ length: "96", spacing: "19.2" }).marks.map((mark) => mark.exact)); // U29
});

describe("the last bay", () => {
  test("is what is left, from the last centre to the end", () => {
    const answer = marks({ length: "100", spacing: "16" });
    expect(answer.lastBay.exact).toBe("4"); // centres to 96
    expect(answer.lastClear.exact).toBe("7/4"); // 98 1/2 less 96 3/4
  });
  test("leaves out a joist that would lie in the last one", () => {
    const answer = marks({ length: "96 1/2", spacing: "16" });
    expect(answer.marks.at(-1)!.exact).toBe(exact("79 1/4"));
    expect(answer.lastBayOver).toBe(false); // 95 − 79 1/4 = 15 3/4
  });
  test("has a joist tight against the last where it would be too wide without", () => {
    const answer = marks({ length: "97 1/2", spacing: "16" });
    expect(answer.joists.slice(-2).map(({ kind, mark }) => [kind, mark.exact])).toEqual([["tight", exact("94 1/2")], ["last", "96"]]);
    expect(answer.lastBayOver).toBe(false);
  });
});

describe("lapped joists", () => {
  test("shift the opposite wall's marks by a thickness", () => {
    const before = marks({ length: "20 ft", spacing: "16", lapped: true });
    expect(before.opposite!.slice(0, 3).map((mark) => mark.exact)).toEqual(["13 3/4", "29 3/4", "45 3/4"].map(exact));
    const after = marks({ length: "20 ft", spacing: "16", lapped: true, lap: "after" });
    expect(after.opposite!.slice(0, 3).map((mark) => mark.exact)).toEqual(["16 3/4", "32 3/4", "48 3/4"].map(exact));
  });
  test("with 2 in joists the first space is 2 in less on one side (Miller)", () => {
    const { marks: here, opposite } = marks({ length: "20 ft", spacing: "16", thickness: "2", lapped: true });
    expect(here[0]!.in - opposite![0]!.in).toBe(2);
  });
  test("keep clear of the opposite wall's own bolts", () => {
    const answer = marks({ length: "20 ft", spacing: "16", lapped: true, oppositeBolts: [{ station: "14" }], bolts: [{ station: "8" }] });
    expect(answer.conflicts.map(({ line, joist, bolt, hits }) => [line, joist, bolt, hits])).toEqual([["opposite", 1, 0, "bolt"]]);
  });
});

describe("collisions", () => {
  test("a bolt under a joist, a washer under its edge, and one that only touches", () => {
    // Joist 1 covers 15 1/4 to 16 3/4; washers 1 3/8 in.
    const hit = (station: string) => marks({ length: "20 ft", spacing: "16", bolts: [{ station }] }).conflicts.map(({ hits, overlap, move, toward }) => [hits, overlap.exact, move.exact, toward]);
    expect(hit("16")).toEqual([["bolt", "1/2", "23/16", "end"]]); // 16 + 11/16 − 15 1/4
    expect(hit("17 1/8")).toEqual([["washer", "5/16", "5/16", "start"]]); // 16 3/4 − (17 1/8 − 11/16)
    expect(hit("17 7/16")).toEqual([]); // its washer begins at 16 3/4
    expect(hit("8")).toEqual([]);
  });
  test("a plate washer of 3 in reaches further, and a clearance further still", () => {
    const at = (more: object) => marks({ length: "20 ft", spacing: "16", bolts: [{ station: "18 1/2" }], ...more }).conflicts.length;
    expect([at({}), at({ washer: "3" }), at({ washer: "3", clearance: "1/2" })]).toEqual([0, 0, 1]); // 17 is past 16 3/4; 16 1/2 is not
  });
  test("end joists collide too", () => {
    expect(marks({ length: "20 ft", spacing: "16", bolts: [{ station: "1" }, { station: "239" }] }).conflicts.map(({ joist, hits }) => [joist, hits])).toEqual([[0, "bolt"], [15, "bolt"]]);
  });
});

test.each([
  ["more marks than anyone makes", { length: "9000 ft", spacing: "1" }, "/spacing too-many-marks"],
  ["a wall shorter than its two end joists", { length: "2", spacing: "16" }, "/length shorter-than-joists"],
  ["a spacing of nothing", { length: "20 ft", spacing: "0" }, "/spacing zero"],
  ["no room to lap", { length: "20 ft", spacing: "16", first: "1", lapped: true }, "/first no-room-to-lap"],
])("%s is told", (_what, request, told) => {
  expect(answerTo(marksOperation, request).issues.map(({ pointer, code }) => `${pointer} ${code}`)).toContain(told);
});

const lines = fc.record({ length: fc.integer({ min: 30, max: 900 }), spacing: fc.constantFrom("12", "16", "19.2", "24", "400 mm", "600 mm", "13 7/32"), thickness: fc.constantFrom("1 1/2", "38 mm", "1 3/4", "2 1/2") });

test("no mark is ever further from its exact place than half a graduation, however many come before it", () => {
  fc.assert(
    fc.property(lines, fc.constantFrom("1/16", "1/8", "1/32", "1mm"), (line, precision) => {
      const answer = marks({ ...line, precision });
      const half = precision === "1mm" ? 0.5 / 25.4 : 1 / Number(precision.slice(2)) / 2;
      for (const mark of answer.marks) expect(Math.abs(parseLength(mark.text).toNumber() - mark.in)).toBeLessThanOrEqual(half + 1e-12);
    }),
    { numRuns: runs(100), seed: 20260701 },
  );
});

test("joists do not overlap, none stands further on centre than the spacing, and the first and last are flush", () => {
  fc.assert(
    fc.property(lines, (line) => {
      const { joists } = marks(line);
      const spacing = parseLength(line.spacing).toNumber();
      expect(joists[0]!.mark.in).toBe(0);
      expect(joists.at(-1)!.far.in).toBeCloseTo(line.length, 9);
      joists.slice(1).forEach((joist, index) => {
        expect(joist.mark.in).toBeGreaterThanOrEqual(joists[index]!.far.in - 1e-9);
        expect(joist.mark.in - joists[index]!.mark.in).toBeLessThanOrEqual(spacing + 1e-9);
      });
    }),
    { numRuns: runs(100), seed: 20260702 },
  );
});

test("what hits is just what overlaps, and the move it is told clears it", () => {
  fc.assert(
    fc.property(lines, fc.array(fc.integer({ min: 0, max: 14400 }), { maxLength: 20 }), (line, stations) => {
      const bolts = stations.map((station) => ({ station: station / 16 }));
      const { joists, conflicts } = marks({ ...line, bolts });
      joists.forEach((joist, place) =>
        bolts.forEach(({ station }, bolt) => {
          const overlap = Math.min(joist.far.in, station + 0.6875) - Math.max(joist.mark.in, station - 0.6875);
          const found = conflicts.find((conflict) => conflict.joist === place && conflict.bolt === bolt);
          expect(found !== undefined).toBe(overlap > 1e-9);
          if (found === undefined) return;
          const moved = (found.toward === "end" ? 1 : -1) * found.move.in;
          const after = Math.min(joist.far.in + moved, station + 0.6875) - Math.max(joist.mark.in + moved, station - 0.6875);
          expect(after).toBeLessThanOrEqual(1e-9);
        }),
      );
    }),
    { numRuns: runs(100), seed: 20260703 },
  );
});
