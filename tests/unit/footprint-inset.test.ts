import { differenceD, FillRule, EndType, inflatePathsD, JoinType, type PathD } from "clipper2-ts";
import { describe, expect, test } from "vitest";
import { footprintOperation } from "@/calculators/footprint";
import { insetPolygon } from "@/calculators/geometry/inset-polygon";
import { signedArea, around, perimeter } from "@/calculators/geometry/polygon";
import { provingDiagonals } from "@/calculators/geometry/proving-diagonals";
import { rigidityOf } from "@/calculators/geometry/rigidity";
import { answerTo } from "@/calculators/schema";
import { cornerRows } from "../reference/footprint-rows";
import { convex, rectilinear, sequence, type Spot } from "../reference/random-plans";
import { runs } from "../setup/runs";

const path = (plan: readonly Spot[]): PathD => plan.map(({ x, y }) => ({ x, y }));

/** Every corner of one outline is a corner of the other, to a hundred-thousandth (the library rounds to six places). */
function expectSameOutline(ours: readonly Spot[], theirs: readonly Spot[]) {
  expect(ours.length).toBe(theirs.length);
  for (const corner of ours) expect(Math.min(...theirs.map(({ x, y }) => Math.hypot(x - corner.x, y - corner.y)))).toBeLessThan(1e-5);
}

describe("the true inset", () => {
  test("agrees with Clipper2 on random rectilinear and convex plans", () => {
    const random = sequence(11);
    let compared = 0;
    for (let round = 0; round < runs(400); round += 1) {
      const plan = round % 2 === 0 ? rectilinear(random) : convex(random);
      const inset = (random() < 0.3 ? -1 : 1) * (1 / 16 + random() * 12);
      const ours = insetPolygon(plan, plan.map(() => inset));
      const theirs = inflatePathsD([path(plan)], -inset, JoinType.Miter, EndType.Polygon, 50, 6);
      if (ours.corners === null) {
        // Refused: a side was used up, so the library's outline has lost corners, or parted.
        expect(theirs.length !== 1 || theirs[0]!.length < plan.length).toBe(true);
        continue;
      }
      compared += 1;
      expect(theirs.length).toBe(1);
      expectSameOutline(ours.corners, theirs[0]!);
    }
    expect(compared).toBeGreaterThan(runs(400) * 0.8);
  });

  test("with another thickness on each side it is what is left when Clipper2 cuts a strip off every side", () => {
    const random = sequence(12);
    for (let round = 0; round < runs(150); round += 1) {
      const plan = round % 2 === 0 ? rectilinear(random) : convex(random);
      const insets = plan.map(() => 1 / 16 + random() * 6);
      const ours = insetPolygon(plan, insets);
      if (ours.corners === null) continue;
      const strips = plan.map((from, index): PathD => {
        const to = around(plan, index + 1);
        const length = Math.hypot(to.x - from.x, to.y - from.y);
        const along = { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
        const inward = { x: -along.y, y: along.x };
        // In a convex plan a strip is a half-plane; along the axes it ends at an outside corner, and past an inside one goes on to the neighbour's moved line.
        const reach = (corner: number, other: number) => (round % 2 === 1 ? 2000 : isInside(plan, corner) ? insets[(other + plan.length) % plan.length]! : 0);
        const [back, ahead] = [reach(index, index - 1), reach((index + 1) % plan.length, index + 1)];
        const at = (run: number, deep: number) => ({ x: from.x + along.x * run + inward.x * deep, y: from.y + along.y * run + inward.y * deep });
        return [at(-back, -1e-3), at(length + ahead, -1e-3), at(length + ahead, insets[index]!), at(-back, insets[index]!)];
      });
      const left = differenceD([path(plan)], strips, FillRule.NonZero, 6).filter((piece) => Math.abs(signedArea(piece)) > 1);
      expect(left.length).toBe(1);
      expect(Math.abs(Math.abs(signedArea(left[0]!)) - signedArea(ours.corners))).toBeLessThan(1e-3 * perimeter(plan) * 2);
      for (const corner of ours.corners) expect(Math.min(...left[0]!.map(({ x, y }) => Math.hypot(x - corner.x, y - corner.y)))).toBeLessThan(1e-2);
    }
  });

  test.each(cornerRows)("$id: at $degrees degrees the chalk corner stands $fromCorner in from the slab's", ({ degrees, inset, fromCorner }) => {
    const angle = (degrees * Math.PI) / 180;
    const plan = [{ x: 0, y: 0 }, { x: 300, y: 0 }, { x: 300, y: 300 }, { x: 300 * Math.cos(angle), y: 300 * Math.sin(angle) }];
    const corner = insetPolygon(plan, plan.map(() => inset)).corners![0]!;
    expect(Math.abs(Math.hypot(corner.x, corner.y) - fromCorner)).toBeLessThan(1e-4);
  });

  test("of a plan along the axes is exact, and an inside corner gives what an outside corner takes", () => {
    const { answer } = answerTo(footprintOperation, { walk: "E 40 ft, N 20 ft, W 16 ft, N 12 ft, W 24 ft, S 32 ft", inset: "7/16" });
    expect(answer!.lines.map(({ side, chalk }) => [side, chalk!.exact])).toEqual([
      ["ab", "3833/8"], // 480 − 7/8
      ["bc", "1913/8"], // 240 − 7/8
      ["cd", "192"], // an outside and an inside corner
      ["de", "144"],
      ["ef", "2297/8"], // 288 − 7/8
      ["fa", "3065/8"], // 384 − 7/8
    ]);
  });

  test("a bow outward widens the way to the chalk, one inward narrows it", () => {
    const { answer } = answerTo(footprintOperation, { walk: "E 40 ft, N 20 ft, W 40 ft, S 20 ft", inset: "1/2", bows: [{ side: "ab", outward: "3/8" }, { side: "bc", station: "5 ft", outward: "-1/4" }] });
    expect(answer!.bows.map(({ station, toChalk }) => [station.exact, toChalk!.exact])).toEqual([["240", "7/8"], ["60", "1/4"]]);
    expect(answer!.lines[0]!.middle).toMatchObject({ station: { exact: "240" }, x: 240, y: 0 });
  });
});

describe("the check diagonals", () => {
  test("are n − 3, stay inside, and with the sides fix every corner; without any one of them some corner is free", () => {
    const random = sequence(13);
    for (let round = 0; round < runs(120); round += 1) {
      const plan = round % 3 === 0 ? convex(random) : rectilinear(random);
      const diagonals = provingDiagonals(plan);
      expect(diagonals.length).toBe(plan.length - 3);
      const sides = plan.map((_, index) => ({ from: index, to: (index + 1) % plan.length }));
      expect(rigidityOf(plan, [...sides, ...diagonals]).unfixed).toEqual([]);
      for (const left of diagonals) expect(rigidityOf(plan, [...sides, ...diagonals.filter((other) => other !== left)]).unfixed).not.toEqual([]);
    }
  });

  test("a corner moved by half an inch shows in one of the pulls that place it", () => {
    const random = sequence(14);
    for (let round = 0; round < runs(60); round += 1) {
      const plan = rectilinear(random);
      const pulls = [...plan.map((_, index) => ({ from: index, to: (index + 1) % plan.length })), ...provingDiagonals(plan)];
      const turned = random() * 2 * Math.PI;
      const moved = Math.floor(random() * plan.length);
      const built = plan.map(({ x, y }, index) => (index === moved ? { x: x + Math.cos(turned) / 2, y: y + Math.sin(turned) / 2 } : { x, y }));
      const length = (points: readonly Spot[], { from, to }: { from: number; to: number }) => Math.hypot(points[from]!.x - points[to]!.x, points[from]!.y - points[to]!.y);
      const most = Math.max(...pulls.map((pull) => Math.abs(length(built, pull) - length(plan, pull))));
      expect(most).toBeGreaterThan(1 / 16);
    }
  });

  test("of a four-sided plan both are given, with the burn in what the tape must read", () => {
    const { answer } = answerTo(footprintOperation, { walk: "E 28 ft, N 21 ft, W 28 ft, S 21 ft", burn: "1" });
    expect(answer!.checks).toMatchObject([{ from: "A", to: "C", length: { exact: "420" }, reading: { exact: "421" } }, { from: "B", to: "D", length: { exact: "420" } }]);
  });
});

function isInside(plan: readonly Spot[], corner: number): boolean {
  const [before, at, after] = [around(plan, corner - 1), around(plan, corner), around(plan, corner + 1)];
  return (at.x - before.x) * (after.y - at.y) - (at.y - before.y) * (after.x - at.x) < 0;
}
