import { adjustNetwork, type AdjustedNetwork, type Observation } from "./distance-network";
import { direction, distance, minus, cross, plus, quarterTurn, scaled, type Point } from "./point";

/** At most so many ways of folding corners over are tried. */
const mostFoldings = 512;

/**
 * Every figure (up to a mirror image) that a rigid network of lengths can make, as far as placing points one by one from
 * two others finds them: two lengths cross at two places, and both are followed unless a third tells them apart.
 * Networks that cannot be placed so are settled from several round starts. Each is adjusted by least squares; the
 * nearest to the readings comes first. `mayBe` gives up a figure while only some of its points are placed.
 */
export function figuresOf(count: number, observations: readonly Observation[], tolerance: number, mayBe: (places: readonly (Point | undefined)[]) => boolean = () => true): AdjustedNetwork[] {
  const base = observations[0];
  if (base === undefined) return [];
  const lengths = new Map<string, number>();
  for (const { from, to, length } of observations) lengths.set(`${from}-${to}`, length).set(`${to}-${from}`, length);
  const starts: Point[][] = [];
  const follow = (places: readonly (Point | undefined)[], foldings: number): void => {
    if (starts.length >= mostFoldings || !mayBe(places)) return;
    const next = mostMeasured(count, places, lengths);
    if (next === null) {
      if (places.every((place) => place !== undefined)) starts.push(places as Point[]);
      return;
    }
    const choices = candidates(next, places, lengths, tolerance);
    for (const place of foldings === 0 ? choices.slice(0, 1) : choices) follow(places.with(next, place), foldings + 1);
  };
  const places = new Array<Point | undefined>(count).fill(undefined);
  places[base.from] = { x: 0, y: 0 };
  places[base.to] = { x: base.length, y: 0 };
  follow(places, 0);
  const settledFrom = starts.length > 0 ? starts : roundStarts(count, observations);
  const figures = settledFrom.map((start) => adjustNetwork(start, observations)).filter(({ points }) => points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y)));
  return figures.sort((a, b) => a.closure - b.closure);
}

function mostMeasured(count: number, places: readonly (Point | undefined)[], lengths: ReadonlyMap<string, number>): number | null {
  let best: number | null = null;
  let most = 1;
  for (let point = 0; point < count; point += 1) {
    if (places[point] !== undefined) continue;
    const known = places.filter((place, other) => place !== undefined && lengths.has(`${point}-${other}`)).length;
    if (known > most) [best, most] = [point, known];
  }
  return best;
}

/** One or two places for a point, from the two placed points that cross sharpest; a third length chooses when it clearly can. */
function candidates(point: number, places: readonly (Point | undefined)[], lengths: ReadonlyMap<string, number>, tolerance: number): Point[] {
  const known = places.flatMap((place, other) => (place !== undefined && lengths.has(`${point}-${other}`) ? [{ place, length: lengths.get(`${point}-${other}`)! }] : []));
  const pairs = known.flatMap((first, index) => known.slice(index + 1).map((second) => ({ first, second, ...crossings(first, second) })));
  const sharpest = pairs.reduce((a, b) => (b.height > a.height ? b : a));
  const misfit = (place: Point) => Math.sqrt(known.reduce((sum, { place: from, length }) => sum + (distance(from, place) - length) ** 2, 0));
  const [near, far] = [...sharpest.at].sort((a, b) => misfit(a) - misfit(b)) as [Point, Point];
  return misfit(far) > misfit(near) + 8 * tolerance || distance(near, far) < 1e-9 ? [near] : [near, far];
}

/** Where two lengths from two places cross, left and right of the line between; where they fall short, the middle between them. */
function crossings(first: { place: Point; length: number }, second: { place: Point; length: number }): { at: [Point, Point]; height: number } {
  const apart = distance(first.place, second.place);
  const along = direction(first.place, second.place);
  const foot = (first.length ** 2 - second.length ** 2 + apart ** 2) / (2 * apart);
  const height = Math.sqrt(Math.max(0, first.length ** 2 - foot ** 2));
  const base = plus(first.place, scaled(along, foot));
  const up = scaled(quarterTurn(along), height);
  return { at: [plus(base, up), minus(base, up)], height: height / Math.max(first.length, second.length) };
}

/** Starts for a network that no point-by-point placing reaches: a regular figure, then the same shaken by a fixed sequence. */
function roundStarts(count: number, observations: readonly Observation[]): Point[][] {
  const radius = observations.reduce((sum, { length }) => sum + length, 0) / observations.length / 1.5;
  let seed = 1;
  const shake = () => ((seed = (seed * 48271) % 2147483647) / 2147483647 - 0.5) * radius;
  return Array.from({ length: 24 }, (_, turn) =>
    Array.from({ length: count }, (_, index) => {
      const angle = (2 * Math.PI * index) / count - Math.PI / 2;
      const [x, y] = [radius * Math.cos(angle), radius * Math.sin(angle)];
      return turn === 0 ? { x, y } : { x: x + shake(), y: y + shake() };
    }),
  );
}

/** Turned so that one point is the origin and another on +x; mirrored when asked. */
export function settledAt(points: readonly Point[], mirrored: boolean, first: number, other: number): Point[] {
  const [origin, second] = [points[first]!, points[other]!];
  const along = direction(origin, second);
  return points.map((point) => {
    const from = minus(point, origin);
    const up = cross(along, from);
    return { x: along.x * from.x + along.y * from.y, y: mirrored ? -up : up };
  });
}
