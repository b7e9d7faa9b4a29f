import highsLoader from "highs";
import { describe, expect, test } from "vitest";
import { solveLinearProgram, type Condition } from "@/calculators/fit/linear-program";
import { placesOf, slabOf } from "@/calculators/fit/plan";
import { freePlacing, rigidPlacing } from "@/calculators/fit/poses";
import { houseShape, sequence, shaken } from "../reference/random-plans";
import { runs } from "../setup/runs";

const highs = await highsLoader();

function byHighs(cost: readonly number[], conditions: readonly Condition[], box: number): number | null {
  const line = (row: readonly number[]) => row.map((value, index) => `${value < 0 ? "-" : "+"} ${Math.abs(value).toFixed(15)} x${index}`).join(" ");
  const text = `Minimize\n obj: ${line(cost)}\nSubject To\n${conditions.map(({ row, bound }, index) => ` c${index}: ${line(row)} >= ${bound.toFixed(15)}`).join("\n")}\nBounds\n${cost.map((_, index) => ` -${box} <= x${index} <= ${box}`).join("\n")}\nEnd\n`;
  const solved = highs.solve(text, { primal_feasibility_tolerance: 1e-10, dual_feasibility_tolerance: 1e-10 });
  return solved.Status === "Optimal" ? solved.ObjectiveValue : null;
}

describe("the linear program", () => {
  test("agrees with HiGHS on random programs, and on which have no answer", () => {
    const random = sequence(41);
    let without = 0;
    for (let round = 0; round < runs(300); round += 1) {
      const unknowns = 1 + Math.floor(random() * 8);
      const whole = random() < 0.3; // whole numbers make ties
      const value = () => (whole ? Math.round(random() * 4 - 2) : random() * 2 - 1);
      const cost = Array.from({ length: unknowns }, value);
      const conditions = Array.from({ length: Math.floor(random() * 30) }, () => ({ row: Array.from({ length: unknowns }, value), bound: value() * (random() < 0.2 ? 1 : -2) }));
      const ours = solveLinearProgram(cost, conditions, 50);
      const theirs = byHighs(cost, conditions, 50);
      expect(ours === null).toBe(theirs === null);
      if (ours === null || theirs === null) {
        without += 1;
        continue;
      }
      expect(Math.abs(ours.value - theirs)).toBeLessThan(1e-7 * (1 + Math.abs(theirs)));
      for (const { row, bound } of conditions) expect(row.reduce((sum, item, index) => sum + item * ours.x[index]!, -bound)).toBeGreaterThan(-1e-8);
    }
    expect(without).toBeGreaterThan(3);
  });

  test("proves its optimum: multipliers that are not negative carry the whole cost where the box does not", () => {
    const random = sequence(42);
    for (let round = 0; round < runs(100); round += 1) {
      const unknowns = 2 + Math.floor(random() * 4);
      // z at least each of many planes, both ways: bounded by them alone.
      const planes = Array.from({ length: 20 }, () => ({ row: Array.from({ length: unknowns }, () => random() * 2 - 1), at: random() * 4 }));
      const conditions = planes.flatMap(({ row, at }) => [{ row: [...row, 1], bound: at }, { row: [...row.map((item) => -item), 1], bound: -at }]);
      const cost = [...new Array<number>(unknowns).fill(0), 1];
      const solved = solveLinearProgram(cost, conditions, 1e5)!;
      expect(Math.min(...solved.multipliers)).toBeGreaterThanOrEqual(0);
      cost.forEach((item, index) => expect(conditions.reduce((sum, { row }, order) => sum + row[index]! * solved.multipliers[order]!, 0)).toBeCloseTo(item, 9));
      expect(conditions.reduce((sum, { bound }, order) => sum + bound * solved.multipliers[order]!, 0)).toBeCloseTo(solved.value, 9);
    }
  });
});

describe("the bounds the search rests on", () => {
  test("hold: between two angles no offset bends further from its chord, and no coefficient swings further, than they say", () => {
    const random = sequence(43);
    for (let round = 0; round < runs(150); round += 1) {
      const shape = houseShape(random);
      const corners = shaken(shape, random, 3);
      const bows = corners.map(() => (random() < 0.5 ? [{ station: 60 + 60 * random(), outward: random() - 0.5 }] : []));
      const slab = slabOf(corners, corners.map(() => 0.5), bows);
      for (const placing of [rigidPlacing(slab, shape), freePlacing(slab, shape)]) {
        const from = (random() - 0.5) * 0.1;
        const width = random() * 0.05;
        const at = (part: number) => placesOf(slab, placing.poseAt(from + part * width));
        const [low, high, middle, some] = [at(0), at(1), at(0.5), at(random())];
        const part = random();
        at(part).forEach(({ beta }, index) => expect(Math.abs(beta - (low[index]!.beta + part * (high[index]!.beta - low[index]!.beta)))).toBeLessThanOrEqual((placing.bend * width * width) / 8 + 1e-9));
        some.forEach(({ alpha, corner }, index) => {
          const swung = alpha.reduce((sum, item, order) => sum + Math.abs(item - middle[index]!.alpha[order]!), 0);
          expect(swung).toBeLessThanOrEqual(((corner === null ? placing.swing.edge : placing.swing.corner) * width) / 2 + 1e-12);
        });
      }
    }
  });
});
