import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { BoardKind, BoardProblem } from "@/calculators/plates/boards/board-problem";
import { materialBound } from "@/calculators/plates/boards/material-bound";
import { planBoards, type BoardsAnswer } from "@/calculators/plates/boards/plan-boards";
import type { JointWindows } from "@/calculators/plates/joints/joint-chains";
import { cuttingStockCases } from "@/tests/reference/plates-rows";
import { runs } from "@/tests/setup/runs";
import { bestByHighs } from "@/tests/reference/cutting-judge";

const always = () => true;
const single = (size: number) => ({ from: 0, to: size, ways: [[]], complete: true });
const endless = (capacity: number, cost: number): BoardKind => ({ capacity, cost, count: Infinity });

/** Every piece on one board, no board overfull, none used beyond its count, every joint in its window. */
function expectSound({ kinds, stretches, kerf }: BoardProblem, { plan, cost }: BoardsAnswer) {
  const sizes = stretches.flatMap((stretch, index) => {
    const windows = stretch.ways[plan!.ways[index]!]!;
    const joints = plan!.joints[index]!;
    expect(joints.length).toBe(windows.length);
    joints.forEach((at, place) => expect(windows[place]![0] <= at && at <= windows[place]![1] && Number.isInteger(at)).toBe(true));
    const ends = [stretch.from, ...joints, stretch.to];
    return ends.slice(1).map((end, place) => end - ends[place]! + kerf);
  });
  expect(plan!.boards.flatMap((board) => board.pieces).sort((a, b) => a - b)).toEqual(sizes.map((_, piece) => piece));
  for (const board of plan!.boards) expect(board.pieces.reduce((sum, piece) => sum + sizes[piece]!, 0)).toBeLessThanOrEqual(kinds[board.kind]!.capacity);
  kinds.forEach((kind, index) => expect(plan!.boards.filter((board) => board.kind === index).length).toBeLessThanOrEqual(kind.count));
  expect(plan!.boards.reduce((sum, board) => sum + kinds[board.kind]!.cost, 0)).toBe(cost);
}

test.each(cuttingStockCases)("$id $name is cut from $best, and that is proved", ({ capacity, sizes, best }) => {
  const problem: BoardProblem = { kinds: [endless(capacity, 1)], stretches: sizes.map(single), kerf: 0 };
  const answer = planBoards(problem, { goOn: always, starts: 200 });
  expect(answer).toMatchObject({ cost: best, bound: best, costProved: true, countProved: true });
  expectSound(problem, answer);
});

const kindsDrawn = fc.uniqueArray(fc.record({ capacity: fc.integer({ min: 40, max: 110 }), rate: fc.integer({ min: 8, max: 13 }), count: fc.integer({ min: 1, max: 12 }) }), { minLength: 1, maxLength: 3, selector: (kind) => kind.capacity });
const kindsOf = (drawn: { capacity: number; rate: number; count: number }[]): BoardKind[] => drawn.map(({ capacity, rate, count }) => ({ capacity, cost: Math.ceil((capacity * rate) / 10), count: count <= 4 ? count : Infinity }));

describe("boards agree with HiGHS", () => {
  test("on random cut lists, several kinds of board, some few", async () => {
    await fc.assert(
      fc.asyncProperty(kindsDrawn, fc.array(fc.integer({ min: 8, max: 75 }), { minLength: 1, maxLength: 6 }), fc.integer({ min: 0, max: 2 }), async (drawn, sizes, kerf) => {
        const problem: BoardProblem = { kinds: kindsOf(drawn), stretches: sizes.map(single), kerf };
        const answer = planBoards(problem, { goOn: always, starts: 20 });
        const judged = await bestByHighs(problem);
        if (judged === null) expect(answer).toMatchObject({ plan: null, impossible: true });
        else {
          expect({ cost: answer.cost, boards: answer.plan!.boards.length }).toEqual(judged);
          expect(answer).toMatchObject({ costProved: true, countProved: true, bound: judged.cost });
          expectSound(problem, answer);
        }
      }),
      { numRuns: runs(25), seed: 20260401 },
    );
  }, 600_000);

  const stretchesDrawn = fc.array(fc.record({ lengths: fc.array(fc.integer({ min: 15, max: 60 }), { minLength: 1, maxLength: 3 }), widths: fc.array(fc.integer({ min: 0, max: 9 }), { minLength: 4, maxLength: 4 }) }), { minLength: 1, maxLength: 3 });

  test("on random walls whose joints slide in their windows", async () => {
    await fc.assert(
      fc.asyncProperty(kindsDrawn, stretchesDrawn, fc.integer({ min: 0, max: 2 }), async (drawn, walls, kerf) => {
        const stretches = walls.map(({ lengths, widths }) => {
          const to = lengths.reduce((sum, length) => sum + length, 0);
          let at = 0;
          const windows = lengths.slice(0, -1).map((length, index): [number, number] => {
            at += length;
            return [at - Math.min(widths[index]!, 6), at + Math.min(widths[index + 1]!, 6)];
          });
          // A second way, its first joint elsewhere.
          const other: JointWindows | null = windows.length === 1 ? [[Math.max(1, windows[0]![0] - 9), Math.max(1, windows[0]![0] - 8)]] : null;
          return { from: 0, to, ways: other === null ? [windows] : [windows, other], complete: true };
        });
        const problem: BoardProblem = { kinds: kindsOf(drawn), stretches, kerf };
        const answer = planBoards(problem, { goOn: always, starts: 20 });
        const judged = await bestByHighs(problem);
        if (judged === null) expect(answer).toMatchObject({ plan: null, impossible: true });
        else {
          expect({ cost: answer.cost, boards: answer.plan!.boards.length }).toEqual(judged);
          expect(answer).toMatchObject({ costProved: true, countProved: true, bound: judged.cost });
          expectSound(problem, answer);
        }
      }),
      { numRuns: runs(15), seed: 20260402 },
    );
  }, 600_000);
});

test("bounds hold and plans are sound on larger random jobs, whenever the search is ended", () => {
  const piece = fc.record({ length: fc.integer({ min: 300, max: 2000 }), slack: fc.integer({ min: 0, max: 60 }) });
  fc.assert(
    fc.property(fc.array(fc.array(piece, { minLength: 1, maxLength: 4 }), { minLength: 5, maxLength: 15 }), fc.integer({ min: 1, max: 40 }), (walls, patience) => {
      const stretches = walls.map((pieces) => {
        const ends = pieces.map((_, index) => pieces.slice(0, index + 1).reduce((sum, { length }) => sum + length, 0));
        return { from: 0, to: ends.at(-1)!, ways: [ends.slice(0, -1).map((at, index): [number, number] => [at - pieces[index]!.slack, at + pieces[index]!.slack])], complete: true };
      });
      const problem: BoardProblem = { kinds: [endless(2200, 96), endless(1700, 72), endless(1200, 50)], stretches, kerf: 2 };
      let asked = 0;
      const answer = planBoards(problem, { goOn: () => (asked += 1) < patience * 40, starts: 3 });
      expectSound(problem, answer);
      expect(answer.bound).toBeGreaterThanOrEqual(answer.material!);
      expect(answer.cost).toBeGreaterThanOrEqual(answer.bound);
      expect(answer.costProved).toBe(answer.cost === answer.bound);
    }),
    { numRuns: 40, seed: 20260403 },
  );
});

test("the material bound is the least of every choice of boards, tried one by one", () => {
  fc.assert(
    fc.property(kindsDrawn, fc.integer({ min: 1, max: 400 }), (drawn, need) => {
      const kinds = kindsOf(drawn);
      let least: number | null = null;
      const choose = (index: number, left: number, cost: number): void => {
        if (left <= 0) least = least === null ? cost : Math.min(least, cost);
        if (left <= 0 || index === kinds.length) return;
        for (let take = 0; take <= Math.min(kinds[index]!.count, Math.ceil(left / kinds[index]!.capacity)); take += 1) choose(index + 1, left - take * kinds[index]!.capacity, cost + take * kinds[index]!.cost);
      };
      choose(0, need, 0);
      expect(materialBound(kinds, need, kinds.map((kind) => kind.cost))).toBe(least);
    }),
    { numRuns: 200, seed: 20260404 },
  );
});
