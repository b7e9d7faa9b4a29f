import type { AdjustedNetwork, Observation } from "../geometry/distance-network";
import { figuresOf, settledAt } from "../geometry/place-network";
import type { Point } from "../geometry/point";
import { around, crossingSides, insideAngles, segmentsMeet, signedArea } from "../geometry/polygon";
import { rigidityOf, type Rigidity } from "../geometry/rigidity";
import { CalculationError } from "../schema";
import type { BracedNetwork } from "./braced-network";

export interface AdjustedReadings {
  /** The points that are fixed, A at the origin and B on +x where both are; null for the others. */
  places: (Point | null)[];
  /** By reading; null where a reading goes to a point that is not fixed. */
  residuals: (number | null)[];
  redundancy: (number | null)[];
  closure: number;
  /** How many readings more than the fixed points need. */
  spare: number;
  rigidity: Rigidity;
  /** Inside corners of every other figure that the same readings make as well, for the caller to name. */
  otherShapes: number[][];
}

export const defaultReadingError = 0.125;

/** Errors of at most e in m readings leave a closure of at most √m·e (2.45 e for the six of a quadrilateral), since adjusting only ever takes away. */
export const closureLimit = (readings: number, readingError: number) => Math.sqrt(readings) * readingError;

/**
 * Places the points of a braced polygon by least squares, as far as the readings fix them.
 *
 * Source: variation of coordinates (Gauss-Newton on the lengths, equal weights); which points are fixed by the rank of the
 * lengths' rigidity matrix at a general figure, and again at the one found. Several figures can fit: corners fold over. Of
 * those whose outline is simple and within the readings' error of the best, it takes the one with the inside corners named,
 * else with corners nearest to multiples of 45 degrees, and tells of the others.
 *
 * @throws CalculationError `no-outline` when no figure of these readings has a simple outline (or one with those inside corners).
 */
export function adjustReadings(network: BracedNetwork, readingError: number, inside: readonly number[] | null): AdjustedReadings {
  const { points, observations, corners } = network;
  const mayPull = ({ from, to }: Observation | { from: number; to: number }) => !(points[from]!.middle && points[to]!.middle);
  const general = rigidityOf(generalFigure(network), observations, mayPull);
  const fixed = general.fixed;
  const index = new Map(fixed.map((point, order) => [point, order]));
  const used = observations.filter(({ from, to }) => index.has(from) && index.has(to)).map(({ from, to, length }) => ({ from: index.get(from)!, to: index.get(to)!, length }));
  if (fixed.length < 3) return nothingFixed(network, general);
  const wholeOutline = points.every((point, order) => point.middle || index.has(order));
  const cornerOrder = wholeOutline ? points.flatMap((point, order) => (point.middle ? [] : [index.get(order)!])) : null;
  const shapes = outlines(fixed.length, used, cornerOrder, readingError, corners);
  const matching = inside === null || cornerOrder === null ? shapes : shapes.filter((shape) => String(shape.inside) === String(inside));
  const chosen = matching[0];
  if (chosen === undefined) throw new CalculationError([{ pointer: inside === null ? "/readings" : "/inside", code: "no-outline", params: {} }]);
  const found = rigidityOf(chosen.figure.points, used, (pull) => mayPull({ from: fixed[pull.from]!, to: fixed[pull.to]! }), flattest);
  const rigidity = found.unfixed.length === 0 ? general : joinedRigidity(general, found, fixed);
  const firm = new Set(rigidity.fixed);
  const order = new Map(fixed.filter((point) => firm.has(point)).map((point) => [point, index.get(point)!]));
  const cornersFirst = [...order.entries()].sort(([a], [b]) => Number(points[a]!.middle) - Number(points[b]!.middle) || a - b).map(([, own]) => own);
  const turned = settledAt(chosen.figure.points, chosen.mirrored, cornersFirst[0] ?? 0, cornersFirst[1] ?? 1);
  let next = 0;
  const ofReading = observations.map(({ from, to }) => (index.has(from) && index.has(to) ? next++ : null));
  return {
    places: points.map((_, point) => (order.has(point) ? turned[order.get(point)!]! : null)),
    residuals: ofReading.map((own) => (own === null ? null : chosen.figure.residuals[own]!)),
    redundancy: ofReading.map((own) => (own === null ? null : chosen.figure.redundancy[own]!)),
    closure: chosen.figure.closure,
    spare: used.length - (2 * fixed.length - 3),
    rigidity,
    otherShapes: inside === null ? shapes.slice(1).map((shape) => shape.inside) : [],
  };
}

/** Two pulls that cross flatter than about this (radians, half a degree) move a corner a hundred times the tape's error. */
const flattest = 0.01;

interface Shape {
  figure: AdjustedNetwork;
  mirrored: boolean;
  inside: number[];
  /** How far the corners are from multiples of 45 degrees, on average. */
  unusual: number;
}

/** Every figure with a simple outline that fits about as well as the best; the one with the most usual corners first, then the fewest inside ones. */
function outlines(count: number, used: readonly Observation[], cornerOrder: readonly number[] | null, readingError: number, corners: number): Shape[] {
  const figures = figuresOf(count, used, readingError, (places) => cornerOrder === null || !crossesSoFar(cornerOrder.map((point) => places[point])));
  if (cornerOrder === null) {
    const best = figures[0];
    return best === undefined ? [] : [{ figure: best, mirrored: signedArea(best.points) < 0, inside: [], unusual: 0 }];
  }
  const simple = figures.flatMap((figure): Shape[] => {
    const outline = cornerOrder.map((point) => figure.points[point]!);
    if (crossingSides(outline) !== null) return [];
    const mirrored = signedArea(outline) < 0;
    const angles = insideAngles(mirrored ? outline.map(({ x, y }) => ({ x, y: -y })) : outline);
    return [{ figure, mirrored, inside: angles.flatMap((angle, corner) => (angle > 180 ? [corner] : [])), unusual: angles.reduce((sum, angle) => sum + Math.abs(angle - 45 * Math.round(angle / 45)), 0) / corners }];
  });
  const best = Math.min(...simple.map(({ figure }) => figure.closure));
  const near = simple.filter(({ figure }) => figure.closure <= best + closureLimit(used.length, readingError));
  const distinct = near.filter((shape, order) => near.findIndex((other) => String(other.inside) === String(shape.inside)) === order);
  return distinct.sort((a, b) => Math.round((a.unusual - b.unusual) / 2) || a.inside.length - b.inside.length || a.figure.closure - b.figure.closure);
}

function crossesSoFar(outline: readonly (Point | undefined)[]): boolean {
  const sides = outline.map((from, order) => [from, around(outline, order + 1)] as const);
  return sides.some(([a, b], first) =>
    sides.some(([c, d], second) => second > first + 1 && !(first === 0 && second === sides.length - 1) && a !== undefined && b !== undefined && c !== undefined && d !== undefined && segmentsMeet(a, b, c, d)),
  );
}

/** Corners anywhere but on a special figure, by a fixed sequence; middles on their sides, as they are in the work. */
function generalFigure({ points, corners }: BracedNetwork): Point[] {
  let seed = 20;
  const random = () => (seed = (seed * 48271) % 2147483647) / 2147483647;
  const at = Array.from({ length: corners }, (_, corner) => {
    const angle = (2 * Math.PI * (corner + 0.6 * random())) / corners;
    const radius = 1 + random();
    return { x: radius * Math.cos(angle), y: radius * Math.sin(angle) };
  });
  return points.map(({ corner, middle }) => {
    const from = at[corner]!;
    const to = around(at, corner + 1);
    return middle ? { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 } : from;
  });
}

/** At the figure found (say, corners in one line) less may be fixed than in general. */
function joinedRigidity(general: Rigidity, found: Rigidity, fixed: readonly number[]): Rigidity {
  const own = (pull: { from: number; to: number }) => ({ from: fixed[pull.from]!, to: fixed[pull.to]! });
  return {
    fixed: found.fixed.map((point) => fixed[point]!),
    unfixed: [...found.unfixed.map(({ point, pulls }) => ({ point: fixed[point]!, pulls: pulls.map(own) })), ...general.unfixed].sort((a, b) => a.point - b.point),
    fixWith: [...found.fixWith.map(own), ...general.fixWith],
  };
}

function nothingFixed({ points, observations }: BracedNetwork, rigidity: Rigidity): AdjustedReadings {
  const none = observations.map(() => null);
  const all = points.map((_, point) => point).filter((point) => !rigidity.unfixed.some((other) => other.point === point));
  return { places: points.map(() => null), residuals: none, redundancy: none, closure: 0, spare: 0, rigidity: { ...rigidity, unfixed: [...rigidity.unfixed, ...all.map((point) => ({ point, pulls: [] }))].sort((a, b) => a.point - b.point) }, otherShapes: [] };
}

/** What one reading alone would have to change by for the rest to agree as well as they can; null where nothing checks it. */
export function changeAlone(residual: number, redundancy: number): number | null {
  return redundancy === 0 ? null : residual / redundancy;
}

