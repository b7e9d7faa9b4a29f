import { describe, expect, test } from "vitest";
import { fitOperation, type FitAnswer } from "@/calculators/fit";
import { answerTo } from "@/calculators/schema";
import { leastWorst } from "../reference/fit-judge";
import { fitRows } from "../reference/fit-rows";
import { houseShape, sequence, shaken, type Spot } from "../reference/random-plans";
import { runs } from "../setup/runs";

const letter = (index: number) => String.fromCharCode(65 + index);
const cornersOf = (slab: readonly Spot[]) => Object.fromEntries(slab.map(({ x, y }, index) => [letter(index), { x, y }]));
const walkOf = (plan: readonly Spot[]) =>
  plan
    .map((from, index) => {
      const to = plan[(index + 1) % plan.length]!;
      const [x, y] = [to.x - from.x, to.y - from.y];
      return `${x > 0 ? "E" : x < 0 ? "W" : y > 0 ? "N" : "S"} ${Math.abs(x + y)}`;
    })
    .join("\n");

function answered(input: object): FitAnswer {
  const { answer, issues } = answerTo(fitOperation, input);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return fitOperation.answer.parse(answer);
}

const slabs = Math.max(500, runs(500) / 5); // 500 in every run; npm run prove tries 2500
const swept = 8;

describe("the best fit", () => {
  test.each(fitRows)("$what", ({ input, worst, offsets }) => {
    const answer = answered(input);
    expect(answer.worst.exact).toBe(worst);
    expect(answer.turnDegrees).toBe(0);
    for (const [corner, sides] of Object.entries(offsets)) {
      for (const [side, exact] of Object.entries(sides)) expect(answer.offsets[corner]![side]!.exact).toBe(exact);
    }
  });

  test(`of ${slabs} random slabs, corners out by up to 3 in, is what HiGHS finds at its angle, and no angle of a sweep betters it`, () => {
    const random = sequence(31);
    let proved = 0;
    for (let round = 0; round < slabs; round += 1) {
      const shape = houseShape(random);
      const slab = shaken(shape, random, 3 * random());
      const sizesFree = random() < 0.35;
      const inset = 0.5;
      const [long, wide] = [Math.max(...shape.map(({ x }) => x)), Math.max(...shape.map(({ y }) => y))];
      // The chalk as wanted: half an inch in all round, and a little longer or shorter, since slabs are.
      const grown = { x: Math.round((random() - 0.5) * 16) / 8, y: Math.round((random() - 0.5) * 16) / 8 };
      const plan = shape.map(({ x, y }) => ({ x: x === 0 ? 0 : x === long ? x - 1 + grown.x : x - 1, y: y === 0 ? 0 : y === wide ? y - 1 + grown.y : y - 1 }));
      const overhang = random() < 0.3 ? 0 : 12;
      const answer = answered({ corners: cornersOf(slab), walk: walkOf(plan), inset, overhang, mode: sizesFree ? "size-free" : "size-held" });
      const judged = { slab, plan, insets: slab.map(() => inset), sizesFree, overhang: answer.fits ? overhang : null };
      const turn = (answer.turnDegrees * Math.PI) / 180;
      const atAngle = leastWorst(judged, turn);
      expect(Math.abs(answer.worst.in - atAngle!)).toBeLessThan(1e-6);
      for (let step = 0; step < swept; step += 1) {
        // Half of the sweep close by, half as far as corners can turn a wall.
        const away = (step % 2 === 0 ? 0.0005 : 0.02) * (2 * random() - 1);
        const other = leastWorst(judged, turn + away);
        if (other !== null) expect(other).toBeGreaterThan(answer.worst.in - 1e-4);
      }
      expect(answer.optimal.gapIn).toBeLessThan(1.5e-5);
      if (answer.optimal.proved) proved += 1;
    }
    expect(proved).toBe(slabs);
  }, 120_000);

  test("comes with multipliers that add up to one, on places that all stand at the worst departure", () => {
    const random = sequence(32);
    for (let round = 0; round < runs(60); round += 1) {
      const shape = houseShape(random);
      const answer = answered({ corners: cornersOf(shaken(shape, random, 2)), walk: walkOf(shape.map(({ x, y }) => ({ x: Math.max(0, x - 1), y: Math.max(0, y - 1) }))), inset: "1/2", overhang: 24 });
      const { active } = answer.optimal;
      expect(active.reduce((sum, { multiplier }) => sum + multiplier, 0)).toBeCloseTo(1, 6);
      for (const { departureIn } of active) expect(Math.abs(departureIn)).toBeCloseTo(answer.worst.in, 4);
    }
  });

  test("keeps the overhang limit wherever it says it fits, and where it does not it says the least that would do", () => {
    const random = sequence(33);
    let short = 0;
    for (let round = 0; round < runs(60); round += 1) {
      const shape = houseShape(random);
      const slab = shaken(shape, random, 2);
      const input = { corners: cornersOf(slab), walk: walkOf(shape.map(({ x, y }) => ({ x: Math.max(0, x - 1), y: Math.max(0, y - 1) }))), inset: "1/2" };
      const answer = answered(input);
      if (answer.fits) {
        expect(answer.overhang.in).toBeLessThan(1e-6);
        continue;
      }
      short += 1;
      const needed = answer.overhangNeeded!.in;
      expect(answered({ ...input, overhang: needed + 1e-4 }).fits).toBe(true);
      expect(answered({ ...input, overhang: Math.max(0, needed - 1e-3) }).fits).toBe(false);
    }
    expect(short).toBeGreaterThan(5);
  }, 60_000);
});
