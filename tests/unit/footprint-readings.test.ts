import { inv, matrix, multiply, transpose, type Matrix } from "mathjs";
import { describe, expect, test } from "vitest";
import { footprintOperation, type FootprintAnswer } from "@/calculators/footprint";
import { squarenessOperation } from "@/calculators/squareness";
import { answerTo } from "@/calculators/schema";
import { quadrilateralRows } from "../reference/footprint-rows";
import { rectilinear, sequence, shaken, type Spot } from "../reference/random-plans";
import { runs } from "../setup/runs";

const letter = (index: number) => String.fromCharCode(65 + index);
const asked = (input: object) => answerTo(footprintOperation, input);
const answered = (input: object): FootprintAnswer => {
  const { answer, issues } = asked(input);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return footprintOperation.answer.parse(answer);
};
const pullOf = (plan: readonly Spot[], from: number, to: number) => Math.hypot(plan[from]!.x - plan[to]!.x, plan[from]!.y - plan[to]!.y);
const reading = (name: string, value: number | string) => ({ from: name[0]!, to: name[1]!, reading: value });
const sixOf = (six: Record<string, number>) => Object.entries(six).map(([name, value]) => reading(name, value));

interface Pull {
  from: number;
  to: number;
}

/** All sides and a share of the diagonals, with at least `spare` more than needed. */
function pullsOf(plan: readonly Spot[], random: () => number, spare: number): Pull[] {
  const sides = plan.map((_, index) => ({ from: index, to: (index + 1) % plan.length }));
  const diagonals = plan.flatMap((_, from) => plan.flatMap((__, to) => (to > from + 1 && !(from === 0 && to === plan.length - 1) ? [{ from, to }] : [])));
  const order = diagonals.map((pull) => ({ pull, at: random() })).sort((a, b) => a.at - b.at);
  return [...sides, ...order.map(({ pull }) => pull)].slice(0, Math.max(2 * plan.length - 3 + spare, Math.ceil(plan.length * 2.4)));
}

/** An independent least squares by mathjs: normal equations from numerical derivatives of the lengths, started at the true plan. */
function adjustedByMathjs(plan: readonly Spot[], pulls: readonly Pull[], lengths: readonly number[]): number[] {
  let unknowns = plan.flatMap(({ x, y }) => [x, y]);
  const free = unknowns.map((_, index) => index).filter((index) => index !== 0 && index !== 1 && index !== 3); // A held, B on its line
  const lengthsAt = (values: readonly number[]) => pulls.map(({ from, to }) => Math.hypot(values[2 * from]! - values[2 * to]!, values[2 * from + 1]! - values[2 * to + 1]!));
  for (let round = 0; round < 8; round += 1) {
    const now = lengthsAt(unknowns);
    const slopes = now.map((_, row) => free.map((index) => (lengthsAt(unknowns.with(index, unknowns[index]! + 1e-4))[row]! - lengthsAt(unknowns.with(index, unknowns[index]! - 1e-4))[row]!) / 2e-4));
    const a = matrix(slopes);
    const rest = matrix(lengths.map((length, index) => length - now[index]!));
    const step = (multiply(multiply(inv(multiply(transpose(a), a)), transpose(a)), rest) as Matrix).toArray() as number[];
    unknowns = unknowns.map((value, index) => (free.includes(index) ? value + step[free.indexOf(index)]! : value));
  }
  return lengthsAt(unknowns);
}

describe("readings of a braced polygon", () => {
  test.each(quadrilateralRows)("$id adjusts as the reference says", ({ readings, adjusted, tolerance }) => {
    const { adjustment } = answered({ readings: sixOf(readings) });
    for (const { from, to, adjusted: found } of adjustment!.readings) expect(Math.abs(found!.in - adjusted[(from + to).toLowerCase() as keyof typeof adjusted])).toBeLessThan(tolerance);
  });

  test("of a quadrilateral adjust as the squareness calculator adjusts them", () => {
    const random = sequence(21);
    for (let round = 0; round < runs(60); round += 1) {
      const long = 200 + random() * 400;
      const wide = 150 + random() * 300;
      const plan = shaken([{ x: 0, y: 0 }, { x: long, y: 0 }, { x: long, y: wide }, { x: 0, y: wide }], random, 4);
      const six = Object.fromEntries(["ab", "bc", "cd", "da", "ac", "bd"].map((name) => [name, Math.round((pullOf(plan, name.charCodeAt(0) - 97, name.charCodeAt(1) - 97) + (random() - 0.5) / 4) * 32) / 32]));
      const ours = answered({ readings: sixOf(six) }).adjustment!;
      const { ac, bd, ...sides } = six;
      const theirs = answerTo(squarenessOperation, { sides, diagonals: { ac, bd } }).answer!; // its own condition adjustment, not this one
      expect(ours.closureIn).toBeCloseTo(theirs.closureIn, 7);
      for (const { from, to, adjusted } of ours.readings) expect(Math.abs(adjusted!.in - theirs.readings[(from + to).toLowerCase() as "ab"].adjusted!.in)).toBeLessThan(1e-6);
    }
  });

  test("of any polygon adjust as an independent solution by mathjs does", () => {
    const random = sequence(22);
    let compared = 0;
    for (let round = 0; round < runs(40); round += 1) {
      const plan = shaken(rectilinear(random), random, 3);
      const pulls = pullsOf(plan, random, 2);
      const lengths = pulls.map(({ from, to }) => pullOf(plan, from, to) + (random() - 0.5) / 8);
      const inside = plan.flatMap((at, index) => {
        const [before, after] = [plan[(index - 1 + plan.length) % plan.length]!, plan[(index + 1) % plan.length]!];
        return (at.x - before.x) * (after.y - at.y) - (at.y - before.y) * (after.x - at.x) < 0 ? [letter(index)] : [];
      });
      const { answer } = asked({ readings: pulls.map(({ from, to }, index) => ({ from: letter(from), to: letter(to), reading: lengths[index]! })), ...(inside.length > 0 ? { inside: inside.join(", ") } : {}) });
      if (answer === null || answer.unfixed.length > 0) continue; // pulls that leave a corner loose: another test
      compared += 1;
      const expected = adjustedByMathjs(plan, pulls, lengths);
      answer.adjustment!.readings.forEach(({ adjusted }, index) => expect(Math.abs(adjusted!.in - expected[index]!)).toBeLessThan(1e-6));
    }
    expect(compared).toBeGreaterThan(runs(40) / 2);
  });

  test("without error come back as the plan they were pulled on, whatever its shape", () => {
    const random = sequence(23);
    let whole = 0;
    for (let round = 0; round < runs(40); round += 1) {
      const plan = rectilinear(random);
      const pulls = pullsOf(plan, random, 3);
      const answer = answered({ readings: pulls.map(({ from, to }) => ({ from: letter(from), to: letter(to), reading: Number(pullOf(plan, from, to).toFixed(9)) })) });
      if (answer.unfixed.length > 0 || answer.adjustment!.otherShapes.length > 0) continue;
      whole += 1;
      answer.corners.forEach(({ x, y }, index) => expect(Math.hypot(x! - (plan[index]!.x - plan[0]!.x), y! - (plan[index]!.y - plan[0]!.y))).toBeLessThan(1e-4));
    }
    expect(whole).toBeGreaterThan(runs(40) / 2);
  });

  const l: Spot[] = [{ x: 0, y: 0 }, { x: 480, y: 0 }, { x: 480, y: 240 }, { x: 288, y: 240 }, { x: 288, y: 384 }, { x: 0, y: 384 }];
  const pulled = (names: string, plan = l) => names.split(" ").map((name) => reading(name, Number(pullOf(plan, name.charCodeAt(0) - 65, name.charCodeAt(1) - 65).toFixed(9))));
  const sides = "AB BC CD DE EF FA";

  test("one pull short names the corners that are loose and the pulls that would fix them", () => {
    const answer = answered({ readings: pulled(`${sides} AC AD`) });
    expect(answer.unfixed.map(({ corner }) => corner)).toEqual(["E", "F"]);
    expect(answer.unfixed[0]!.pulls).toContainEqual({ from: "A", to: "E" });
    expect(answer.fixWith).toHaveLength(1);
    expect(answer.corners.filter(({ x }) => x !== null).map(({ name }) => name)).toEqual(["A", "B", "C", "D"]);
    const [{ from, to }] = answer.fixWith as [{ from: string; to: string }];
    expect(answered({ readings: [...pulled(`${sides} AC AD`), ...pulled(from + to)] }).unfixed).toEqual([]);
  });

  test("sides alone fix nothing, and as many pulls as are missing are asked for", () => {
    const answer = answered({ readings: pulled(sides) });
    expect(answer.unfixed).toHaveLength(6);
    expect(answer.fixWith).toHaveLength(3); // 2n − 3 = 9, and 6 were read
    expect(answered({ readings: [...pulled(sides), ...answer.fixWith.flatMap(({ from, to }) => pulled(from + to))] }).unfixed).toEqual([]);
  });

  test("that make two plans say so, and the inside corner named chooses", () => {
    const readings = pulled(`${sides} BD AD DF`);
    const answer = answered({ readings });
    expect(answer.adjustment).toMatchObject({ spare: 0 });
    expect(answer.adjustment!.otherShapes.length).toBeGreaterThan(0);
    expect(answer.areaSquareFeet).toBeCloseTo(1088, 5); // the one with square corners
    expect(answered({ readings, inside: "E" }).corners.map(({ inside }) => inside)).toEqual([false, false, false, false, true, false]);
    expect(asked({ readings, inside: "B" }).issues).toMatchObject([{ pointer: "/inside", code: "no-outline" }]);
  });

  test("a hexagon with its three long diagonals, which no corner-by-corner placing reaches, is solved too", () => {
    expect(answered({ readings: pulled(`${sides} AD BE CF`) }).areaSquareFeet).toBeCloseTo(1088, 5);
  });

  test("a missed burn is named among the suspects, and the figure is called contradictory", () => {
    const readings = pulled(`${sides} AC AD AE BF CE BD`).map((one) => ({ ...one, reading: one.reading as number + 1 }));
    readings[7] = { ...readings[7]!, reading: (readings[7]!.reading as number) - 1 };
    const { adjustment } = answered({ readings, burn: "1" });
    expect(adjustment!.contradictory).toBe(true);
    expect(adjustment!.suspects[0]).toBeDefined();
    const named = adjustment!.suspects.find(({ from, to }) => from + to === "AD");
    expect(named).toMatchObject({ likely: "burn" });
    expect(named!.changeIn).toBeCloseTo(1, 2);
  });

  test("a middle read from two corners of its side alone is loose; a pull across fixes its bow", () => {
    const middle = { x: 240, y: -0.5 };
    const to = (corner: Spot) => Number(Math.hypot(corner.x - middle.x, corner.y - middle.y).toFixed(9));
    const half = [{ from: "A", to: "AB", reading: to(l[0]!) }, { from: "AB", to: "B", reading: to(l[1]!) }];
    const loose = answered({ readings: [...pulled(`${sides} AC AD AE BF`), ...half] });
    expect(loose.unfixed.map(({ corner }) => corner)).toEqual(["AB"]);
    const { bows, unfixed } = answered({ readings: [...pulled(`${sides} AC AD AE BF`), ...half, { from: "D", to: "AB", reading: to(l[3]!) }], inset: "1/2" });
    expect(unfixed).toEqual([]);
    expect(bows).toHaveLength(1);
    expect(bows[0]!.outward.in).toBeCloseTo(0.5, 4);
    expect(bows[0]!.toChalk!.in).toBeCloseTo(1, 4);
  });

  test.each([
    ["a reading no longer than its burn", { readings: [...pulled("AB BC CA")].map((one, index) => (index === 1 ? { ...one, reading: 1 } : one)), burn: 1 }, "/readings/1/reading burn-over-reading"],
    ["a reading longer than the way round", { readings: [reading("AB", 100), reading("BC", 100), reading("CA", 250)] }, "/readings/2/reading longer-than-others"],
    ["a point that is no corner", { readings: [reading("AB", 100), { from: "A", to: "Q7", reading: 3 }] }, "/readings/1/to point-unknown"],
    ["a corner left out", { readings: [reading("AB", 100), reading("BD", 100), reading("DA", 100)] }, "/readings corner-skipped"],
    ["a pull from a corner to itself", { readings: [reading("AB", 100), reading("BC", 100), reading("CA", 100), reading("BB", 3)] }, "/readings/3/to same-point"],
    ["two corners only", { readings: [reading("AB", 100)] }, "/readings too-few-corners"],
  ])("%s is refused by name", (_what, input, expected) => {
    expect(asked(input).issues.map(({ pointer, code }) => `${pointer} ${code}`)).toContain(expected);
  });
});
