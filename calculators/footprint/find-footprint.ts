import { cornerName, mostCorners } from "../geometry/corner-names";
import { cross, direction, dot, minus, type Point } from "../geometry/point";
import { around, perimeter } from "../geometry/polygon";
import { type Length } from "../length";
import { CalculationError, measure } from "../schema";
import { adjustReadings, changeAlone, closureLimit, defaultReadingError, type AdjustedReadings } from "./adjust-readings";
import type { FootprintAnswer } from "./answer";
import { bracedNetwork, type BracedNetwork } from "./braced-network";
import { closeWalk } from "./close-walk";
import { describeOutline, type Bow } from "./describe-outline";
import type { FootprintInput } from "./input";
import type { Leg } from "./leg";
import { readWalk } from "./walk-text";

/**
 * Any plan from a walk round it, or from the sides and diagonals of a braced polygon.
 *
 * Units: exact rational inches along the axes; bearings and adjusted readings are doubles, right to 1e-9 in.
 * Source: closure, coordinates and area by the usual traverse rules (domain.md 5.4, 5.5); the true inset by moved lines;
 * least squares by variation of coordinates, fixed corners by the rank of the rigidity matrix.
 *
 * @throws CalculationError by the faulty run, leg or reading.
 * @example E 40, N 20, W 16, N 12, W 24, S 32 ft closes on 1088 sq ft and 144 ft round (domain.md V05).
 */
export function findFootprint(input: FootprintInput): FootprintAnswer {
  const given = (["runs", "walk", "readings"] as const).filter((field) => (typeof input[field] === "string" ? input[field].trim() !== "" : (input[field]?.length ?? 0) > 0));
  if (given.length === 0) throw new CalculationError([{ pointer: "/runs", code: "plan-missing", params: {} }]);
  if (given.length > 1) throw new CalculationError([{ pointer: `/${given[1]!}`, code: "plan-twice", params: { first: given[0]!, second: given[1]! } }]);
  return given[0] === "readings" ? fromReadings(input) : fromWalk(input);
}

function fromWalk(input: FootprintInput): FootprintAnswer {
  const { outline, closure, walked, notes, suspects } = closeWalk(legsOf(input), (run) => (input.runs === undefined || input.runs.length === 0 ? "/walk" : run === 0 || run > input.runs.length ? "/runs" : `/runs/${run - 1}`), input.precision);
  if (outline.points.length > mostCorners) throw new CalculationError([{ pointer: input.walk === undefined ? "/runs" : "/walk", code: "too-many-corners", params: { limit: mostCorners } }]);
  const show = (value: Length | number) => measure(value, input.precision);
  return {
    closure: { east: show(closure.east), north: show(closure.north), distance: show(closure.distance), oneIn: closure.oneIn },
    perimeter: show(walked),
    ...describeOutline(outline, input),
    suspects: suspects.map(({ run, would }) => ({ run, would: show(would) })),
    adjustment: null,
    unfixed: [],
    fixWith: [],
    notes: notes.map(({ length, ...rest }) => ({ ...rest, length: length === null ? null : show(length) })),
  };
}

function legsOf({ runs, walk, unit }: FootprintInput): Leg[] {
  if (runs !== undefined && runs.length > 0) return runs.map(({ toward, length, times }, index) => ({ toward, length: length.times(times ?? 1), run: index + 1 }));
  const { legs, issues } = readWalk(walk ?? "", unit, "/walk");
  if (issues.length > 0) throw new CalculationError(issues);
  return legs;
}

function fromReadings(input: FootprintInput): FootprintAnswer {
  const network = bracedNetwork(input);
  const readingError = input.readingError?.toNumber() ?? defaultReadingError;
  const adjusted = adjustReadings(network, readingError, insideCorners(input.inside, network.corners));
  const { rigidity } = adjusted;
  const named = (pulls: readonly { from: number; to: number }[]) => pulls.map(({ from, to }) => ({ from: network.points[from]!.name, to: network.points[to]!.name }));
  const rest = {
    closure: null,
    suspects: [],
    adjustment: adjustmentOf(input, network, adjusted, readingError),
    unfixed: rigidity.unfixed.map(({ point, pulls }) => ({ corner: network.points[point]!.name, pulls: named(pulls.slice(0, 4)) })),
    fixWith: named(rigidity.fixWith),
  };
  const corners = network.points.flatMap((point, index) => (point.middle ? [] : [adjusted.places[index] ?? null]));
  if (corners.some((corner) => corner === null)) {
    return {
      ...rest,
      areaSquareFeet: null,
      areaSquareMetres: null,
      perimeter: null,
      corners: corners.map((corner, index) => ({ name: cornerName(index), x: corner?.x ?? null, y: corner?.y ?? null, inside: null, angleDegrees: null, chalk: null })),
      lines: [],
      checks: [],
      bows: [],
      notes: [],
    };
  }
  const points = corners as Point[];
  const sides = points.map((corner, index) => Math.hypot(around(points, index + 1).x - corner.x, around(points, index + 1).y - corner.y));
  const outline = { points, exact: null, sides, toward: points.map(() => null) };
  return {
    ...rest,
    perimeter: measure(perimeter(points), input.precision),
    ...describeOutline(outline, input, middlesRead(network, adjusted, points)),
    notes: points.length === 3 ? [{ code: "three-corners", run: null, toward: null, length: null }] : [],
  };
}

function insideCorners(text: string | undefined, corners: number): number[] | null {
  if (text === undefined || text.trim() === "") return null;
  const named = text.toUpperCase().split(/[\s,;]+/).filter(Boolean);
  const found = named.map((name) => (name.length === 1 ? name.charCodeAt(0) - 65 : -1));
  const wrong = found.findIndex((corner) => corner < 0 || corner >= corners);
  if (wrong >= 0) throw new CalculationError([{ pointer: "/inside", code: "point-unknown", params: { found: named[wrong]!.slice(0, 20) } }]);
  return [...new Set(found)].sort((a, b) => a - b);
}

/** Where a side's middle was read, how far it stands off the straight between the corners. */
function middlesRead({ points }: BracedNetwork, { places }: AdjustedReadings, corners: readonly Point[]): Bow[] {
  return points.flatMap((point, index) => {
    const place = places[index];
    if (!point.middle || place === null || place === undefined) return [];
    const from = corners[point.corner]!;
    const along = direction(from, around(corners, point.corner + 1));
    return [{ side: point.corner, station: dot(along, minus(place, from)), outward: -cross(along, minus(place, from)) }];
  });
}

function adjustmentOf(input: FootprintInput, network: BracedNetwork, adjusted: AdjustedReadings, readingError: number): NonNullable<FootprintAnswer["adjustment"]> {
  const { residuals, redundancy, closure } = adjusted;
  const used = residuals.filter((residual) => residual !== null).length;
  const limit = closureLimit(used, readingError);
  const contradictory = closure > limit;
  const ends = (input.readings ?? []).map(({ from, to }) => ({ from: from.trim().toUpperCase(), to: to.trim().toUpperCase() }));
  const burn = input.burn?.toNumber() ?? 0;
  const near = (change: number, slip: number) => slip > 0 && Math.abs(Math.abs(change) - slip) <= 3 / 16;
  return {
    spare: adjusted.spare,
    closureIn: closure,
    limitIn: limit,
    contradictory,
    readings: network.numbers.map((number, index) => {
      const residual = residuals[index] ?? null;
      const measured = network.measured[number]!;
      return { ...ends[number]!, measured: measure(measured, input.precision), adjusted: residual === null ? null : measure(measured.toNumber() + residual, input.precision), residualIn: residual };
    }),
    suspects: !contradictory
      ? []
      : network.numbers.flatMap((number, index) => {
          const residual = residuals[index] ?? null;
          const change = residual === null ? null : changeAlone(residual, redundancy[index] ?? 0);
          if (residual === null || change === null || Math.sqrt(Math.max(0, closure ** 2 - residual * change)) > limit) return [];
          return [{ ...ends[number]!, changeIn: change, likely: near(change, burn) ? ("burn" as const) : near(change, 12) ? ("foot" as const) : null }];
        }),
    otherShapes: adjusted.otherShapes.map((inside) => inside.map(cornerName)),
  };
}

