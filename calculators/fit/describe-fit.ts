import { asNumber } from "../footprint/walk-closure";
import { cornerName, sideName, sideNames } from "../geometry/corner-names";
import { cross, direction, distance, dot, minus, plus, scaled, type Point } from "../geometry/point";
import { around, insideAngles } from "../geometry/polygon";
import { provingDiagonals } from "../geometry/proving-diagonals";
import { graduation, Length } from "../length";
import { measure } from "../schema";
import type { FitAnswer } from "./answer";
import type { Laid } from "./best-fit";
import type { FitInput } from "./input";
import { bowAt, type Slab } from "./plan";
import { sideNumber } from "./slab-corners";
import { insetAlong, stretchesOf } from "./stretches";
import type { WantedPlan } from "./wanted-plan";
import type { Way } from "./way";

interface Described {
  input: FitInput;
  slab: Slab;
  insets: readonly Length[];
  plan: WantedPlan;
  chosen: Way;
  ways: readonly Way[];
}

/** The answer from the ways laid out: offsets, ranges, lines, checks, bolts, certificate, and the three ways side by side. */
export function describeFit({ input, slab, insets, plan, chosen, ways }: Described): FitAnswer {
  const { precision } = input;
  const show = (value: Length | number) => measure(value, precision);
  const { laid } = chosen;
  const count = slab.corners.length;
  const burn = input.burn ?? Length.zero;
  const { weights } = laid.certificate;
  const exactWorst = worstOf(chosen, insets);
  return {
    mode: chosen.mode,
    ...headOf(chosen, insets, show),
    overhangNeeded: laid.overhangNeeded === null ? null : show(laid.overhangNeeded),
    turnDegrees: chosen.exact === null ? (laid.angle * 180) / Math.PI : 0,
    corners: byCorner(laid.corners),
    slab: byCorner(slab.corners),
    offsets: offsetsOf(chosen, show),
    ranges: rangesOf(chosen, slab, precision, show),
    lines: Object.fromEntries(chosen.lengths.map((length, index) => [sideName(index, count), show(length)])),
    checks: checksOf(laid.corners, burn, show),
    bolts: boltsOf(input, slab, laid.corners, show),
    optimal: {
      proved: laid.certificate.proved,
      lowerBoundIn: Math.min(laid.certificate.lowerBound, asNumber(exactWorst)),
      gapIn: Math.max(0, asNumber(exactWorst) - laid.certificate.lowerBound),
      active: laid.places.flatMap((place, index) =>
        weights[index]! < 1e-6 ? [] : [{ ...whereOf(place, count, show), departureIn: offsetOf(chosen, index) - place.wanted, multiplier: weights[index]! }],
      ),
    },
    alternatives: ways.map((way) => ({
      way: way.way,
      mode: way.mode,
      ...headOf(way, insets, show),
      outOfSquareDegrees: outOfSquare(way.laid.corners, plan.points),
      diagonalDifference: count === 4 ? show(Math.abs(differenceOf(way.laid.corners) - differenceOf(plan.points))) : null,
      offsets: offsetsOf(way, show),
      lines: Object.fromEntries(way.lengths.map((length, index) => [sideName(index, count), show(length)])),
    })),
  };
}

type Show = (value: Length | number) => FitAnswer["worst"];

function headOf(way: Way, insets: readonly Length[], show: Show): Pick<FitAnswer, "worst" | "worstAt" | "fits" | "overhang"> {
  const { laid } = way;
  const departures = laid.places.map((place, index) => Math.abs(offsetOf(way, index) - place.wanted));
  const worstAt = laid.places[departures.reduce((best, value, index) => (value > departures[best]! + 1e-9 ? index : best), 0)]!;
  const least = Math.min(...laid.places.map((_, index) => offsetOf(way, index)));
  return { worst: show(worstOf(way, insets)), worstAt: whereOf(worstAt, laid.corners.length, show), fits: laid.fits, overhang: show(least < -1e-9 ? -least : Length.zero) };
}

/** Exact where the slab is true. */
function worstOf({ exact, laid }: Way, insets: readonly Length[]): Length | number {
  if (exact === null) return laid.worst < 1e-9 ? Length.zero : laid.worst;
  const departures = exact.flatMap(({ corners, edges }, side) => [...corners, ...edges].map((offset) => offset.minus(insets[side]!).magnitude()));
  return departures.reduce((most, departure) => (departure.compare(most) > 0 ? departure : most));
}

function offsetOf({ exact, laid }: Way, index: number): number {
  return exact === null ? laid.places[index]!.offset : exact.flatMap(({ corners, edges }) => [...corners, ...edges])[index]!.toNumber();
}

function whereOf({ side, corner, station }: Laid["places"][number], count: number, show: Show): FitAnswer["worstAt"] {
  return { side: sideName(side, count), corner: corner === null ? null : cornerName(corner), station: show(station) };
}

const byCorner = (points: readonly Point[]) => Object.fromEntries(points.map(({ x, y }, index) => [cornerName(index), { x, y }]));

function offsetsOf(way: Way, show: Show): FitAnswer["offsets"] {
  const count = way.laid.corners.length;
  const at = (side: number, corner: number) => {
    const place = way.laid.places.find((candidate) => candidate.side === side && candidate.corner === corner)!;
    return show(way.exact?.[side]?.corners[side === corner ? 0 : 1] ?? place.offset);
  };
  return Object.fromEntries(
    way.laid.corners.map((_, corner) => {
      const sides = [corner, (corner - 1 + count) % count].sort((a, b) => a - b);
      return [cornerName(corner), Object.fromEntries(sides.map((side) => [sideName(side, count), at(side, corner)]))];
    }),
  );
}

function rangesOf(way: Way, slab: Slab, precision: FitInput["precision"], show: Show): FitAnswer["ranges"] {
  const names = sideNames(slab.sides.length);
  return Object.fromEntries(
    slab.sides.map((side, index) => {
      const own = way.laid.places.flatMap((place, order) => (place.side === index && place.corner !== null ? [{ station: place.station, offset: offsetOf(way, order) }] : []));
      const knots = insetAlong(side, own[0]!, own[1]!);
      const least = knots.reduce((a, b) => (b.inset < a.inset ? b : a));
      const most = knots.reduce((a, b) => (b.inset > a.inset ? b : a));
      const stretches = stretchesOf(knots, slab.insets[index]!, graduation(precision).toNumber() / 2);
      return [names[index], { least: show(least.inset), most: show(most.inset), leastAt: show(least.station), mostAt: show(most.station), stretches: stretches.map(({ from, to, stands, most: by }) => ({ from: show(from), to: show(to), stands, most: show(by) })) }];
    }),
  );
}

function checksOf(corners: readonly Point[], burn: Length, show: Show): FitAnswer["checks"] {
  const pulls = corners.length === 4 ? [{ from: 0, to: 2, fixes: 2 }, { from: 1, to: 3, fixes: 3 }] : provingDiagonals(corners);
  return pulls.map(({ from, to, fixes }) => {
    const length = distance(corners[from]!, corners[to]!);
    return { from: cornerName(from), to: cornerName(to), fixes: cornerName(fixes), length: show(length), reading: show(length + burn.toNumber()) };
  });
}

/** Each bolt, measured from the real edge, as it stands to the chalk line. */
function boltsOf({ bolts = [] }: FitInput, slab: Slab, corners: readonly Point[], show: Show): FitAnswer["bolts"] {
  return bolts.map(({ wall, station, offset }, index) => {
    const number = sideNumber(wall, slab.sides.length, `/bolts/${index}/wall`);
    const side = slab.sides[number]!;
    const inward = offset.toNumber() - bowAt(side, station.toNumber());
    const at = plus(plus(side.from, scaled(side.along, station.toNumber())), scaled(side.inward, inward));
    const along = direction(corners[number]!, around(corners, number + 1));
    const from = minus(at, corners[number]!);
    return { wall: sideName(number, slab.sides.length), station: show(dot(along, from)), offset: show(cross(along, from)) };
  });
}

function outOfSquare(corners: readonly Point[], plan: readonly Point[]): number {
  const [is, wanted] = [insideAngles(corners), insideAngles(plan)];
  const most = Math.max(...is.map((angle, index) => Math.abs(angle - wanted[index]!)));
  return most < 1e-9 ? 0 : most;
}

const differenceOf = (corners: readonly Point[]) => distance(corners[0]!, corners[2]!) - distance(corners[1]!, corners[3]!);
