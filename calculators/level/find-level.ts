import { Length } from "../length";
import { measure } from "../schema";
import type { LevelAnswer } from "./answer";
import type { LevelInput } from "./input";
import { judgePairs } from "./judge-pairs";
import { distanceBetween, placesOf } from "./plan-places";
import { reduceReadings, type Elevation } from "./reduce-readings";
import { presetIds, presets, type LevelLimit } from "./tolerances";

const defaultClosing = Length.from(0.125);
const defaultPairs = 12;

/**
 * How level the concrete is: elevations from the rod, shims from the highest point, and whether any two points are
 * further apart in height than the tolerance allows at their distance on the plan.
 *
 * Units: exact rational inches; distances between points of different walls are irrational, right to 1e-9 in.
 * Source: height of instrument = benchmark + backsight, elevation = height − rod (levelling course text, domain.md E01);
 * page check: sum of backsights − sum of foresights = last − first elevation (NAVEDTRA 14071), which proves the arithmetic
 * and not the field work. Tolerances: see `tolerances`.
 *
 * @throws CalculationError `one-turn-only`, `corners-in-order`, `wall-unknown`, `half-a-place`.
 * @example A benchmark at 820.00 ft, backsight 8.42 ft, rod 1.20 ft: the point is at 827.22 ft (E01).
 */
export function findLevel(input: LevelInput): LevelAnswer {
  const { elevations, instruments, misclosure, check } = reduceReadings(input);
  const places = placesOf(input, elevations);
  const high = elevations.reduce((best, other) => (other.elevation.compare(best.elevation) > 0 ? other : best));
  const low = elevations.reduce((best, other) => (other.elevation.compare(best.elevation) < 0 ? other : best));
  const limits = limitsOf(input.tolerance);
  const pairs = limits === null ? [] : judgePairs(elevations, places, limits);
  const closingTolerance = input.closingTolerance ?? defaultClosing;
  const show = (length: Length | number) => measure(length, input.precision);
  const orNull = (length: Length | number | null) => (length === null ? null : show(length));
  const difference = check.backsights.minus(check.foresights);
  const isOut = pairs.some(({ ok }) => ok === false);

  const pointOf = ({ index, setup, reading, elevation }: Elevation): LevelAnswer["high"] => ({
    index,
    setup,
    wall: reading.wall ?? null,
    station: orNull(reading.station ?? null),
    x: places[index]?.x.toNumber() ?? null,
    y: places[index]?.y.toNumber() ?? null,
    elevation: show(elevation),
    shim: show(high.elevation.minus(elevation)),
    turn: reading.turn === true,
  });
  const points = elevations.map(pointOf);
  return {
    high: points[high.index]!,
    low: points[low.index]!,
    spread: show(high.elevation.minus(low.elevation)),
    shims: points.map(({ index, wall, station, shim }) => ({ index, wall, station, shim })),
    points,
    instruments: instruments.map(({ height, on }) => ({ height: show(height), on })),
    misclosure: orNull(misclosure),
    closes: misclosure === null ? null : misclosure.magnitude().compare(closingTolerance) <= 0,
    closingTolerance: show(closingTolerance),
    arithmeticCheck: { backsights: show(check.backsights), foresights: show(check.foresights), difference: show(difference), rise: show(check.rise), ok: difference.equals(check.rise) },
    verdict: limits === null ? null : isOut ? "out" : pairs.some(({ ok }) => ok === null) ? "unknown" : "within",
    tolerance: limits === null ? null : { id: presetIds.find((id) => id === input.tolerance) ?? null, limits: limits.map((limit) => ({ difference: show(limit.difference), within: orNull(limit.within) })) },
    pairs: pairs.slice(0, input.mostPairs ?? defaultPairs).map(({ a, b, difference: by, distance, limit, ok }) => ({ a, b, difference: show(by), distance: orNull(distance), limit: show(limit.difference), within: orNull(limit.within), ok })),
    pairsOut: pairs.filter(({ ok }) => ok === false).length,
    falls: fallsOf(elevations, places, show),
    unplaced: points.filter(({ x }) => x === null).map(({ index }) => index),
  };
}

function limitsOf(tolerance: LevelInput["tolerance"]): readonly LevelLimit[] | null {
  if (tolerance === undefined) return null;
  if (typeof tolerance === "string") return presets[tolerance].limits;
  return tolerance.map(({ difference, within }) => ({ difference, within: within ?? null }));
}

/** From each station to the next along its wall; readings without a station in the order given. */
function fallsOf(elevations: readonly Elevation[], places: ReturnType<typeof placesOf>, show: (length: Length | number) => LevelAnswer["spread"]): LevelAnswer["falls"] {
  const byWall = new Map<string, Elevation[]>();
  for (const entry of elevations) {
    const wall = entry.reading.wall?.toLowerCase() ?? "";
    byWall.set(wall, [...(byWall.get(wall) ?? []), entry]);
  }
  return [...byWall.values()].flatMap((entries) => {
    const inOrder = entries.every(({ reading }) => reading.station !== undefined) ? [...entries].sort((a, b) => a.reading.station!.compare(b.reading.station!)) : entries;
    return inOrder.slice(1).map((to, index) => {
      const from = inOrder[index]!;
      const fall = from.elevation.minus(to.elevation);
      const distance = distanceBetween(from, to, places);
      const run = distance === null ? null : distance instanceof Length ? distance.toNumber() : distance;
      return { from: from.index, to: to.index, fall: show(fall), distance: distance === null ? null : show(distance), oneIn: run === null || run === 0 || fall.isZero() ? null : run / Math.abs(fall.toNumber()) };
    });
  });
}
