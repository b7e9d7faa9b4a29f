import { describe, expect, test } from "vitest";
import { fitOperation, type FitAnswer } from "@/calculators/fit";
import { squarenessOperation } from "@/calculators/squareness";
import { answerTo } from "@/calculators/schema";

const asked = (input: object) => answerTo(fitOperation, input);
function answered(input: object): FitAnswer {
  const { answer, issues } = asked(input);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return fitOperation.answer.parse(answer);
}

const trueSlab = { A: { x: 0, y: 0 }, B: { x: 336, y: 0 }, C: { x: 336, y: 288 }, D: { x: 0, y: 288 } };
const size = { length: "27' 11\"", width: "23' 11\"" };
const lSlab = { A: { x: 0, y: 0 }, B: { x: "480 1/2", y: "-1/2" }, C: { x: 481, y: 240 }, D: { x: 288, y: 239 }, E: { x: "288 1/2", y: 384 }, F: { x: 0, y: 385 } };
const lWalk = "E 479, N 239, W 192, N 144, W 287, S 383";

describe("the three ways", () => {
  test("stand side by side, the same whichever is asked for", () => {
    const modes = ["size-held", "wall-held", "follow"] as const;
    const answers = modes.map((mode) => answered({ corners: lSlab, walk: lWalk, inset: "1/2", overhang: 2, mode }));
    for (const [index, mode] of modes.entries()) {
      const answer = answers[index]!;
      expect(answer.alternatives).toEqual(answers[0]!.alternatives);
      expect(answer.alternatives.map(({ way }) => way)).toEqual(["hold", "best", "follow"]);
      expect(answer.worst).toEqual(answer.alternatives.find((way) => way.mode === mode)!.worst);
    }
    const [hold, best, follow] = answers[0]!.alternatives;
    expect(best!.worst.in).toBeLessThanOrEqual(hold!.worst.in);
    expect([hold!.outOfSquareDegrees, best!.outOfSquareDegrees]).toEqual([0, 0]);
    expect(follow!.worst.in).toBeLessThan(1e-9);
    expect(follow!.outOfSquareDegrees).toBeGreaterThan(0.1);
  });

  test("a wall held runs along its slab edge at the wanted inset, at both ends", () => {
    for (const held of ["ab", "bc", "fa"]) {
      const { ranges } = answered({ corners: lSlab, walk: lWalk, inset: "7/16", mode: "wall-held", held, overhang: 2 });
      expect([ranges[held]!.least.in, ranges[held]!.most.in]).toEqual([expect.closeTo(7 / 16, 9), expect.closeTo(7 / 16, 9)]);
    }
  });

  test("sizes free never does worse than sizes held, and keeps square corners", () => {
    const heldAnswer = answered({ corners: lSlab, walk: lWalk, inset: "1/2", overhang: 2 });
    const free = answered({ corners: lSlab, walk: lWalk, inset: "1/2", overhang: 2, mode: "size-free" });
    expect(free.worst.in).toBeLessThanOrEqual(heldAnswer.worst.in + 1e-5);
    expect(free.alternatives[1]!.outOfSquareDegrees).toBe(0);
    expect(heldAnswer.lines.ab!.exact).toBe("479");
  });

  test("without a size the slab's own outline is made true", () => {
    const answer = answered({ corners: lSlab, inset: "1/2", overhang: 1 });
    expect(answer.mode).toBe("size-free");
    expect(answer.alternatives[1]!.outOfSquareDegrees).toBe(0);
  });
});

describe("what the crew is told", () => {
  test("offsets at a corner are its distances from both slab edges", () => {
    const answer = answered({ corners: lSlab, walk: lWalk, inset: "1/2", overhang: 2 });
    const place = (name: string) => ({ x: Number(answer.slab[name]!.x), y: Number(answer.slab[name]!.y) });
    for (const [corner, offsets] of Object.entries(answer.offsets)) {
      const chalk = answer.corners[corner]!;
      for (const [side, offset] of Object.entries(offsets)) {
        const [from, to] = [place(side[0]!.toUpperCase()), place(side[1]!.toUpperCase())];
        const length = Math.hypot(to.x - from.x, to.y - from.y);
        const square = ((to.x - from.x) * (chalk.y - from.y) - (to.y - from.y) * (chalk.x - from.x)) / length;
        expect(offset.in).toBeCloseTo(square, 9);
      }
    }
    expect(Object.keys(answer.offsets.A!)).toEqual(["ab", "fa"]);
  });

  test("sheathing stands proud where the inset is less than wanted and shy where it is more", () => {
    const { ranges } = answered({ corners: { ...trueSlab, B: { x: 336, y: "-1" } }, size, inset: "1/2", mode: "wall-held", held: "cd", overhang: 5 });
    expect(ranges.ab!.stretches.map(({ stands }) => stands)).toEqual(["shy"]);
    expect(ranges.ab!.stretches[0]!.most.in).toBeCloseTo(1, 2);
    const short = answered({ corners: { ...trueSlab, B: { x: 335, y: 0 }, C: { x: 335, y: 288 } }, size, inset: "1/2" }); // 335 of slab, 335 of chalk
    expect(short.ranges.bc!.stretches).toMatchObject([{ stands: "proud", most: { in: 0.5 } }]);
    expect(short.fits).toBe(true);
  });

  test("a bow shows in the range of its wall, and the fit takes it into account", () => {
    const straight = answered({ corners: trueSlab, size, inset: "1/2" });
    const bowed = answered({ corners: trueSlab, size, inset: "1/2", edges: [{ wall: "ab", station: "14 ft", offset: "-3/8" }] });
    expect(straight.worst.exact).toBe("0");
    expect(bowed.ranges.ab!.least.in).toBeLessThan(0.5);
    expect(bowed.ranges.ab!.leastAt.in).toBe(168);
    expect(bowed.worst.in).toBeCloseTo(3 / 16, 6); // half the bow: the plan moves in by the other half
    const kept = answered({ corners: trueSlab, size: { length: "27' 11\"", width: "23' 10\"" }, inset: "1/4", edges: [{ wall: "ab", station: "14 ft", offset: "-1" }] });
    expect(kept.fits).toBe(true);
    expect(kept.ranges.ab!.least.in).toBeGreaterThan(-1e-9);
  });

  test("each bolt is told from the chalk, on the real edge", () => {
    const { bolts } = answered({
      corners: trueSlab,
      size,
      inset: "1/2",
      bolts: [{ wall: "ab", station: "2 ft", offset: "2 3/4" }, { wall: "DA", station: 12, offset: 3 }],
    });
    expect(bolts.map(({ wall, station, offset }) => [wall, station.in, offset.in])).toEqual([["ab", expect.closeTo(23.5, 9), expect.closeTo(2.25, 9)], ["da", expect.closeTo(11.5, 9), expect.closeTo(2.5, 9)]]); // domain.md N07
  });

  test("a slab too small for the plan says so, by how much", () => {
    const answer = answered({ corners: trueSlab, size: { length: "28' 1\"", width: "24 ft" }, inset: 0 });
    expect(answer.fits).toBe(false);
    expect(answer.overhangNeeded!.in).toBeCloseTo(0.5, 3);
    expect(answered({ corners: trueSlab, size: { length: "28' 1\"", width: "24 ft" }, inset: 0, overhang: "1/2" }).fits).toBe(true);
  });

  test("the check diagonals are the chalk's, burn included", () => {
    const { checks } = answered({ corners: trueSlab, size: { length: 420 - 96, width: 243 }, inset: { ab: 22.5, bc: 6, cd: 22.5, da: 6 }, burn: 1 });
    expect(checks[0]).toMatchObject({ from: "A", to: "C", length: { in: 405 }, reading: { in: 406 } }); // 324² + 243² = 405²
  });
});

describe("the slab from readings", () => {
  test("stands where the squareness calculator puts it, with two sides and with four", () => {
    for (const readings of [
      { length: 336, width: 288, diagonals: { ac: "443 5/16", bd: "441 13/16" } },
      { sides: { ab: 337, bc: "289 1/8", cd: "337 1/4", da: 289 }, diagonals: { ac: "444 5/16", bd: "442 13/16" }, burn: 1 },
    ]) {
      const corners = answerTo(squarenessOperation, readings).answer!.corners;
      const { slab } = answered({ ...readings, size: { length: "27' 10\"", width: "23' 10\"" }, inset: 1, overhang: 2 });
      for (const name of ["A", "B", "C", "D"] as const) {
        expect(slab[name]!.x).toBeCloseTo(corners[name].x, 6);
        expect(slab[name]!.y).toBeCloseTo(corners[name].y, 6);
      }
    }
  });
});

describe("what cannot be laid is refused by name", () => {
  test.each([
    ["no slab", { size, inset: "1/2" }, "/corners slab-missing"],
    ["no size for a rigid piece", { corners: trueSlab, inset: "1/2", mode: "size-held" }, "/size required"],
    ["no inset", { corners: trueSlab, size }, "/inset required"],
    ["a rectangle on an L", { corners: lSlab, size, inset: "1/2" }, "/size size-needs-four"],
    ["an L on a rectangle", { corners: trueSlab, walk: lWalk, inset: "1/2" }, "/walk corners-differ"],
    ["an inside corner elsewhere", { corners: lSlab, walk: "E 479, N 383, W 192, S 144, W 287, S 239", inset: "1/2" }, "/walk turns-differ"],
    ["corners clockwise", { corners: { A: trueSlab.A, B: trueSlab.D, C: trueSlab.C, D: trueSlab.B }, size, inset: "1/2" }, "/corners corners-clockwise"],
    ["corners that cross", { corners: { ...trueSlab, C: trueSlab.D, D: trueSlab.C }, size, inset: "1/2" }, "/corners corners-cross"],
    ["a corner left out", { corners: { A: trueSlab.A, B: trueSlab.B, D: trueSlab.D }, size, inset: "1/2" }, "/corners corner-skipped"],
    ["a size and a walk", { corners: trueSlab, size, walk: lWalk, inset: "1/2" }, "/walk size-twice"],
    ["diagonals no slab has", { length: 336, width: 288, diagonals: { ac: 700, bd: 100 }, size, inset: "1/2" }, "/diagonals/ac diagonal-impossible"],
    ["sizes without diagonals", { length: 336, width: 288, size, inset: "1/2" }, "/diagonals required"],
    ["a wall that is not there", { corners: trueSlab, size, inset: "1/2", held: "ef" }, "/held side-unknown"],
    ["an edge place past its wall", { corners: trueSlab, size, inset: "1/2", edges: [{ wall: "ab", station: "30 ft", offset: 0 }] }, "/edges/0/station station-past-side"],
    ["a bolt on no wall", { corners: trueSlab, size, inset: "1/2", bolts: [{ wall: "xy", station: 1, offset: 1 }] }, "/bolts/0/wall side-unknown"],
    ["an inset that swallows the slab", { corners: trueSlab, size, inset: "13 ft" }, "/inset inset-swallows"],
  ])("%s", (_what, input, expected) => {
    expect(asked(input).issues.map(({ pointer, code }) => `${pointer} ${code}`)).toContain(expected);
  });
});
