import { Length } from "../length";
import { CalculationError, measure, type Issue } from "../schema";
import type { Observation } from "../geometry/distance-network";
import type { FootprintInput } from "./input";

/** A corner, or the middle of a side; the points of a network in order round the plan: A, AB, B, BC … */
export interface NetworkPoint {
  name: string;
  /** 0 for A; a middle carries its side's first corner. */
  corner: number;
  middle: boolean;
}

export interface BracedNetwork {
  corners: number;
  points: NetworkPoint[];
  observations: Observation[];
  /** As read less burn; null while not pulled. */
  measured: (Length | null)[];
  /** For each observation, the number of its reading. */
  numbers: number[];
}

interface Named {
  corner: number;
  /** The side's second corner, for a middle. */
  second: number | null;
}

/**
 * The readings of a braced polygon as a network of points.
 *
 * @throws CalculationError at the reading: `point-unknown`, `same-point`, `burn-over-reading`, `longer-than-others`; at
 * /readings: `corner-skipped`, `too-few-corners`.
 */
export function bracedNetwork({ readings = [], burn, burns = {}, readingError, precision }: FootprintInput): BracedNetwork {
  const issues: Issue[] = [];
  const named = readings.map(({ from, to }, index) =>
    (["from", "to"] as const).map((end) => {
      const found = pointNamed(end === "from" ? from : to);
      if (found === null) issues.push({ pointer: `/readings/${index}/${end}`, code: "point-unknown", params: { found: (end === "from" ? from : to).slice(0, 20) } });
      return found;
    }),
  );
  if (issues.length > 0) throw new CalculationError(issues);
  const ends = named as [Named, Named][];
  const corners = cornerCount(ends.flat());
  const points = pointsInOrder(ends.flat(), corners);
  const at = (point: Named) => points.findIndex(({ corner, middle }) => (point.second === null ? !middle && corner === point.corner : middle && corner === point.corner));
  const burnByPair = new Map(Object.entries(burns).map(([pair, length]) => [pair.toLowerCase(), length]));
  const measured = readings.map(({ reading, from, to }, index) => {
    if (reading === undefined) return null;
    const [first, second] = [from, to].map((name) => name.trim().toLowerCase()) as [string, string];
    const held = burnByPair.get(first + second) ?? burnByPair.get(second + first) ?? burn ?? Length.zero;
    const actual = reading.minus(held);
    if (!actual.isPositive()) issues.push({ pointer: `/readings/${index}/reading`, code: "burn-over-reading", params: { burn: measure(held, precision).text } });
    return actual;
  });
  const numbers = measured.flatMap((length, index) => (length === null ? [] : [index]));
  const observations = numbers.map((index) => ({ from: at(ends[index]![0]), to: at(ends[index]![1]), length: measured[index]!.toNumber() }));
  ends.forEach(([from, to], index) => {
    if (at(from) === at(to)) issues.push({ pointer: `/readings/${index}/to`, code: "same-point", params: { point: points[at(from)]?.name ?? "" } });
  });
  if (issues.length === 0) issues.push(...tooLong(points.length, observations, numbers, 3 * (readingError?.toNumber() ?? 0.125), precision));
  if (issues.length > 0) throw new CalculationError(issues);
  return { corners, points, observations, measured, numbers };
}

function pointNamed(text: string): Named | null {
  const name = text.trim().toUpperCase();
  if (!/^[A-Z]{1,2}$/.test(name)) return null;
  const [corner, second] = [...name].map((letter) => letter.charCodeAt(0) - 65) as [number, number?];
  return { corner, second: second ?? null };
}

/** As many corners as the letters go up to; each letter below must be there, and a middle must name neighbours. */
function cornerCount(named: readonly Named[]): number {
  const letters = new Set(named.flatMap(({ corner, second }) => (second === null ? [corner] : [corner, second])));
  const corners = Math.max(-1, ...letters) + 1;
  const missing = Array.from({ length: corners }, (_, index) => index).find((index) => !letters.has(index));
  const issue = (code: string, params: Issue["params"]) => new CalculationError([{ pointer: "/readings", code, params }]);
  if (missing !== undefined) throw issue("corner-skipped", { corner: String.fromCharCode(65 + missing), last: String.fromCharCode(64 + corners) });
  if (corners < 3) throw issue("too-few-corners", { corners });
  const far = named.find(({ corner, second }) => second !== null && second !== (corner + 1) % corners);
  if (far !== undefined) throw issue("point-unknown", { found: String.fromCharCode(65 + far.corner) + String.fromCharCode(65 + far.second!) });
  return corners;
}

function pointsInOrder(named: readonly Named[], corners: number): NetworkPoint[] {
  return Array.from({ length: corners }, (_, corner) => corner).flatMap((corner): NetworkPoint[] => {
    const name = String.fromCharCode(65 + corner);
    const next = String.fromCharCode(65 + ((corner + 1) % corners));
    const middle = named.some((point) => point.second !== null && point.corner === corner);
    return [{ name, corner, middle: false }, ...(middle ? [{ name: name + next, corner, middle: true }] : [])];
  });
}

/** No length can exceed the way round by others: the shortest ways between all points (Bellman and Ford). */
function tooLong(count: number, observations: readonly Observation[], numbers: readonly number[], slack: number, precision: FootprintInput["precision"]): Issue[] {
  return observations.flatMap(({ from, to, length }, index) => {
    const way = Array.from({ length: count }, (_, point) => (point === from ? 0 : Infinity));
    const others = observations.filter((_, other) => other !== index);
    for (let round = 0; round < count; round += 1) {
      for (const other of others) {
        way[other.to] = Math.min(way[other.to]!, way[other.from]! + other.length);
        way[other.from] = Math.min(way[other.from]!, way[other.to]! + other.length);
      }
    }
    const most = way[to]!;
    return length > most + slack ? [{ pointer: `/readings/${numbers[index]}/reading`, code: "longer-than-others", params: { most: measure(most, precision).text } }] : [];
  });
}
