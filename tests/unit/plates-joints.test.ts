import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { placeAnchors } from "@/calculators/plates/joints/place-anchors";
import { isPlanned, planJoints } from "@/calculators/plates/joints/plan-joints";
import { runs } from "@/tests/setup/runs";
import type { PieceLimits, StandingBolt, Stretch } from "@/calculators/plates/joints/stretch";

/**
 * The judge: every whole position of every joint and every anchor is tried, one after another, on walls small enough
 * for that. It shares nothing with the search but the words of the rule.
 */
function exhaustive(stretch: Stretch, limits: PieceLimits) {
  const { from, to } = stretch;
  const counted = stretch.bolts.filter((bolt) => bolt.counts && bolt.at - from >= limits.clear && to - bolt.at >= limits.clear).map((bolt) => bolt.at);
  const mayJoint = (at: number) => stretch.bolts.every((bolt) => Math.abs(bolt.at - at) >= limits.clear);
  const mayAnchor = (at: number) => at - from >= limits.clear && to - at >= limits.clear && stretch.bolts.every((bolt) => Math.abs(bolt.at - at) >= limits.apart);

  const farthestAt = (at: number) => (at === from ? stretch.farthestAtStart : at === to ? stretch.farthestAtEnd : undefined) ?? limits.farthest;

  const known = new Map<string, number>();
  function anchorsIn(a: number, b: number): number {
    const key = `${a} ${b}`;
    if (known.has(key)) return known.get(key)!;
    // Walk the piece from left to right, one position at a time; remember the last bolt, how many, how many added.
    let states = new Map<string, { last: number | null; lastIsAdded: boolean; count: number; added: number }>();
    states.set("start", { last: null, lastIsAdded: false, count: 0, added: 0 });
    for (let at = a + 1; at < b; at += 1) {
      const next = new Map<string, { last: number | null; lastIsAdded: boolean; count: number; added: number }>();
      const keep = (state: { last: number | null; lastIsAdded: boolean; count: number; added: number }) => {
        const name = `${state.last} ${state.count}`;
        const other = next.get(name);
        if (other === undefined || state.added < other.added) next.set(name, state);
      };
      for (const state of states.values()) {
        const inReach = state.last === null ? at - a <= farthestAt(a) : at - state.last <= limits.spacing;
        const isBolt = counted.includes(at);
        if (isBolt) {
          if (at - a >= limits.clear && b - at >= limits.clear && inReach) keep({ last: at, lastIsAdded: false, count: Math.min(limits.perPiece, state.count + 1), added: state.added });
          continue;
        }
        keep(state);
        const isClear = at - a >= limits.clear && b - at >= limits.clear && mayAnchor(at) && (state.last === null || at - state.last >= limits.apart);
        if (isClear && inReach) keep({ last: at, lastIsAdded: true, count: Math.min(limits.perPiece, state.count + 1), added: state.added + 1 });
      }
      states = next;
    }
    let best = Infinity;
    for (const state of states.values()) if (state.last !== null && state.count >= limits.perPiece && b - state.last <= farthestAt(b) && b - state.last >= limits.clear) best = Math.min(best, state.added);
    known.set(key, best);
    return best;
  }

  const cost = new Map<number, { added: number; pieces: number }>([[from, { added: 0, pieces: 0 }]]);
  for (let b = from + 1; b <= to; b += 1) {
    if (b < to && !mayJoint(b)) continue;
    let best: { added: number; pieces: number } | null = null;
    for (const [a, before] of cost) {
      const isWhole = a === from && b === to;
      if (b - a > limits.longest || (!isWhole && b - a < limits.shortest)) continue;
      const here = { added: before.added + anchorsIn(a, b), pieces: before.pieces + 1 };
      if (Number.isFinite(here.added) && (best === null || here.added < best.added || (here.added === best.added && here.pieces < best.pieces))) best = here;
    }
    if (best !== null) cost.set(b, best);
  }
  return { least: cost.get(to) ?? null, anchorsIn, mayJoint };
}

const walls = fc.record({
  length: fc.integer({ min: 6, max: 90 }),
  bolts: fc.array(fc.record({ at: fc.integer({ min: 0, max: 90 }), counts: fc.boolean().map((b) => b) , sure: fc.boolean() }), { maxLength: 9 }),
  clear: fc.integer({ min: 1, max: 5 }),
  reach: fc.integer({ min: 0, max: 9 }),
  spacing: fc.integer({ min: 10, max: 40 }),
  perPiece: fc.integer({ min: 1, max: 3 }),
  apart: fc.integer({ min: 1, max: 5 }),
  shortest: fc.integer({ min: 1, max: 20 }),
  longest: fc.integer({ min: 15, max: 60 }),
  endless: fc.integer({ min: 0, max: 9 }),
  closer: fc.integer({ min: 0, max: 14 }),
});

function wallOf(drawn: typeof walls extends fc.Arbitrary<infer T> ? T : never): { stretch: Stretch; limits: PieceLimits } {
  const bolts = new Map<number, StandingBolt>();
  for (const bolt of drawn.bolts) if (bolt.at <= drawn.length) bolts.set(bolt.at, { at: bolt.at, counts: bolt.counts || bolt.sure });
  const limits: PieceLimits = {
    clear: drawn.clear,
    farthest: drawn.endless === 0 ? Infinity : drawn.clear + drawn.reach,
    spacing: drawn.endless === 1 ? Infinity : drawn.spacing,
    perPiece: drawn.perPiece,
    apart: drawn.apart,
    shortest: Math.min(drawn.shortest, drawn.longest),
    longest: drawn.longest,
  };
  // One wall in three wants its first bolt, or its last, nearer than a joint does.
  const atEnds = drawn.closer < 3 ? { farthestAtStart: drawn.clear + drawn.closer } : drawn.closer < 5 ? { farthestAtEnd: drawn.clear + drawn.closer } : {};
  return { stretch: { from: 0, to: drawn.length, bolts: [...bolts.values()], ...atEnds }, limits };
}

describe("joints of one stretch", () => {
  test("cost what an exhaustive search finds, on 400 random walls", () => {
    fc.assert(
      fc.property(walls, (drawn) => {
        const { stretch, limits } = wallOf(drawn);
        const judged = exhaustive(stretch, limits).least;
        const plan = planJoints(stretch, limits);
        expect(isPlanned(plan) ? { added: plan.added, pieces: plan.pieces } : null).toEqual(judged);
      }),
      { numRuns: runs(400), seed: 20260301 },
    );
  });

  test("may stand anywhere in their windows, whatever the others do, at the same cost", () => {
    fc.assert(
      fc.property(walls, fc.array(fc.nat({ max: 1000 }), { minLength: 12, maxLength: 12 }), (drawn, picks) => {
        const { stretch, limits } = wallOf(drawn);
        const plan = planJoints(stretch, limits);
        if (!isPlanned(plan)) return;
        const judge = exhaustive(stretch, limits);
        expect(plan.ways.length).toBeGreaterThan(0);
        for (const way of plan.ways) {
          const joints = way.map(([low, high], index) => low + Math.round(((high - low) * picks[index]!) / 1000));
          const ends = [stretch.from, ...joints, stretch.to];
          // A piece longer than any board cannot be cut: the boards see to that, not the windows.
          if (ends.slice(1).some((end, index) => end - ends[index]! > limits.longest)) continue;
          const added = ends.slice(1).map((end, index) => judge.anchorsIn(ends[index]!, end));
          expect(added.reduce((sum, count) => sum + count, 0)).toBe(plan.added);
          expect(joints.every(judge.mayJoint)).toBe(true);
          if (joints.length > 0) ends.slice(1).forEach((end, index) => expect(end - ends[index]!).toBeGreaterThanOrEqual(limits.shortest));
        }
      }),
      { numRuns: runs(200), seed: 20260302 },
    );
  });

  test("leave no joint out: some way reaches every position that costs least, while one joint is free", () => {
    fc.assert(
      fc.property(walls, (drawn) => {
        const { stretch, limits } = wallOf(drawn);
        const plan = planJoints(stretch, limits);
        if (!isPlanned(plan) || plan.pieces !== 2) return;
        const { anchorsIn, mayJoint } = exhaustive(stretch, limits);
        for (let at = stretch.from + 1; at < stretch.to; at += 1) {
          const longEnough = Math.min(at, stretch.to - at) >= limits.shortest && Math.max(at, stretch.to - at) <= limits.longest;
          const isBest = longEnough && mayJoint(at) && anchorsIn(0, at) + anchorsIn(at, stretch.to) === plan.added;
          expect(plan.ways.some(([window]) => window![0] <= at && at <= window![1])).toBe(isBest);
        }
      }),
      { numRuns: runs(300), seed: 20260303 },
    );
  });

  test("get just the anchors they cost, each where the rule wants it", () => {
    const taste = { endDistance: 6, graduations: [4, 2] };
    fc.assert(
      fc.property(walls, (drawn) => {
        const { stretch, limits } = wallOf(drawn);
        const plan = planJoints(stretch, limits);
        if (!isPlanned(plan)) return;
        const ends = [stretch.from, ...plan.ways[0]!.map(([low]) => low), stretch.to];
        let added = 0;
        ends.slice(1).forEach((end, index) => {
          const start = ends[index]!;
          const anchors = placeAnchors(plan.stretch, limits, [start, end], taste)!;
          added += anchors.length;
          const places = [...plan.stretch.bolts.filter((bolt) => bolt.counts && bolt.at > start && bolt.at < end).map((bolt) => bolt.at), ...anchors.map((anchor) => anchor.at)].sort((a, b) => a - b);
          expect(places.length).toBeGreaterThanOrEqual(limits.perPiece);
          expect(places[0]! - start).toBeLessThanOrEqual(index === 0 ? plan.stretch.farthestAtStart : limits.farthest);
          expect(end - places.at(-1)!).toBeLessThanOrEqual(index === ends.length - 2 ? plan.stretch.farthestAtEnd : limits.farthest);
          places.slice(1).forEach((place, at) => expect(place - places[at]!).toBeLessThanOrEqual(limits.spacing));
          for (const { at, window } of anchors) {
            expect(Math.min(at - start, end - at)).toBeGreaterThanOrEqual(limits.clear);
            expect(stretch.bolts.every((bolt) => Math.abs(bolt.at - at) >= limits.apart)).toBe(true);
            expect(window[0] <= at && at <= window[1]).toBe(true);
          }
        });
        expect(added).toBe(plan.added);
      }),
      { numRuns: runs(300), seed: 20260304 },
    );
  });

  test("with no place to stand name the joint, and the board with which they could", () => {
    // Bolts every 6 leave no joint with 4 clear of both; only a board as long as the wall does.
    const bolts = [6, 12, 18, 24, 30, 36, 42].map((at) => ({ at, counts: true }));
    const limits: PieceLimits = { clear: 4, farthest: 12, spacing: 72, perPiece: 2, apart: 3, shortest: 10, longest: 30 };
    const plan = planJoints({ from: 0, to: 48, bolts }, limits);
    expect(isPlanned(plan)).toBe(false);
    expect(plan).toMatchObject({ joint: 1, longestNeeded: 48 });
  });
});
