import { distance, plus, scaled, direction, type Point } from "../../geometry/point";
import { cornerNames, type Corner, type Corners } from "../figure/corners";
import type { ReadingName } from "../input";

/** One end of a pull: a corner, or a mark so far from a corner toward its neighbour. */
export interface PullEnd {
  corner: Corner;
  toward: Corner | null;
  inches: number;
}

export interface Pull {
  kind: "again" | "new-side" | "triangle" | "mid";
  from: PullEnd;
  to: PullEnd;
}

export interface SeparatingPull extends Pull {
  /** What the pull shows, burn off, if that reading is the wrong one. */
  expected: readonly { suspect: ReadingName; inches: number }[];
  /** Whether it tells every two of them apart. */
  separatesAll: boolean;
}

/** What the slab is if that reading was the blunder. */
export interface Hypothesis {
  suspect: ReadingName;
  corners: Corners;
}

interface Options {
  /** As measured, for where marks go. */
  lengthOf: (name: string) => number | undefined;
  /** Two answers nearer than this cannot be told apart. */
  leastGap: number;
  /** Inches in one part of a 3-4-5: a foot, or 300 mm. */
  triangleUnit: number;
}

/**
 * The shortest pull whose reading differs between every two of the named blunders; where none parts all, the one that parts
 * most. Tried: the six readings again (the missing sides are new with two sides), a 3-4-5 of growing size at each corner,
 * and pulls to and between marks at half of a side. Each is computed in the figure that every blunder would leave.
 */
export function separatingPull(hypotheses: readonly Hypothesis[], { lengthOf, leastGap, triangleUnit }: Options): SeparatingPull | null {
  if (hypotheses.length === 0) return null;
  const own = hypotheses.map(({ suspect }) => suspect.toUpperCase());
  const pulls = hypotheses.length === 1 ? pullsAgain(lengthOf).filter(({ from, to }) => own.includes(from.corner + to.corner) || own.includes(to.corner + from.corner)) : [...pullsAgain(lengthOf), ...triangles(lengthOf, triangleUnit), ...midPulls(lengthOf)];
  const pairs = (hypotheses.length * (hypotheses.length - 1)) / 2;
  let best: { pull: Pull; expected: SeparatingPull["expected"]; parted: number; length: number } | null = null;
  for (const pull of pulls) {
    const expected = hypotheses.map(({ suspect, corners }) => ({ suspect, inches: distance(pointOf(pull.from, corners), pointOf(pull.to, corners)) }));
    const parted = countPairs(expected, leastGap);
    const length = Math.max(...expected.map(({ inches }) => inches));
    if (best === null || parted > best.parted || (parted === best.parted && length < best.length - 1e-9)) best = { pull, expected, parted, length };
  }
  if (best === null || (pairs > 0 && best.parted === 0)) return null;
  return { ...best.pull, expected: best.expected, separatesAll: best.parted === pairs };
}

function countPairs(expected: SeparatingPull["expected"], leastGap: number): number {
  let parted = 0;
  expected.forEach((one, index) => {
    for (const other of expected.slice(index + 1)) if (Math.abs(one.inches - other.inches) > leastGap) parted += 1;
  });
  return parted;
}

const at = (corner: Corner): PullEnd => ({ corner, toward: null, inches: 0 });
const next = (corner: Corner, steps: number): Corner => cornerNames[(cornerNames.indexOf(corner) + steps) % 4]!;

function pointOf({ corner, toward, inches }: PullEnd, corners: Corners): Point {
  return toward === null ? corners[corner] : plus(corners[corner], scaled(direction(corners[corner], corners[toward]), inches));
}

function pullsAgain(lengthOf: Options["lengthOf"]): Pull[] {
  const between: [Corner, Corner][] = [["A", "B"], ["B", "C"], ["C", "D"], ["D", "A"], ["A", "C"], ["B", "D"]];
  return between.map(([from, to]) => ({ kind: lengthOf(from + to) === undefined ? "new-side" : "again", from: at(from), to: at(to) }));
}

/** Length of a side as measured, or of its opposite when only two were. */
function sideLength(lengthOf: Options["lengthOf"], one: Corner, other: Corner): number {
  const name = next(one, 1) === other ? one + other : other + one;
  const opposite: Record<string, string> = { AB: "CD", CD: "AB", BC: "DA", DA: "BC" };
  return lengthOf(name) ?? lengthOf(opposite[name]!) ?? 0;
}

function triangles(lengthOf: Options["lengthOf"], unit: number): Pull[] {
  return cornerNames.flatMap((corner) => {
    const [along, back] = [next(corner, 1), next(corner, 3)];
    const [first, second] = [sideLength(lengthOf, corner, along), sideLength(lengthOf, corner, back)];
    const [three, four] = first < second ? [first, second] : [second, first];
    const most = Math.floor(Math.min(three / (3 * unit), four / (4 * unit)) + 1e-9);
    return Array.from({ length: Math.min(most, 60) }, (_, index): Pull => {
      const [short, long] = [3 * unit * (index + 1), 4 * unit * (index + 1)];
      return {
        kind: "triangle",
        from: { corner, toward: along, inches: first < second ? short : long },
        to: { corner, toward: back, inches: first < second ? long : short },
      };
    });
  });
}

function midPulls(lengthOf: Options["lengthOf"]): Pull[] {
  const mid = (corner: Corner): PullEnd => ({ corner, toward: next(corner, 1), inches: sideLength(lengthOf, corner, next(corner, 1)) / 2 });
  const toCorners = cornerNames.flatMap((corner) => [next(corner, 1), next(corner, 2)].map((side): Pull => ({ kind: "mid", from: at(corner), to: mid(side) })));
  const across: Pull[] = [{ kind: "mid", from: mid("A"), to: mid("C") }, { kind: "mid", from: mid("B"), to: mid("D") }];
  return [...toCorners, ...across];
}
