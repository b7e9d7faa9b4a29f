import { cornerName, sideName, sideNames } from "../geometry/corner-names";
import { insetPolygon } from "../geometry/inset-polygon";
import { forSides } from "../geometry/per-side";
import { cross, direction, distance, dot, minus, plus, scaled, type Point } from "../geometry/point";
import { around, insideAngles } from "../geometry/polygon";
import { provingDiagonals } from "../geometry/proving-diagonals";
import { graduation, Length } from "../length";
import { CalculationError, measure } from "../schema";
import { asNumber } from "../footprint/walk-closure";
import type { FitAnswer } from "./answer";
import { bestFit, followFit, heldFit, type Laid } from "./best-fit";
import { exactOffsets, type ExactOffsets } from "./exact-fit";
import type { FitInput, Mode } from "./input";
import { bowAt, slabOf, type Slab } from "./plan";
import { freePlacing, rigidPlacing } from "./poses";
import { sideNumber, slabCorners, type BuiltSlab } from "./slab-corners";
import { insetAlong, stretchesOf } from "./stretches";
import { wantedPlan, type WantedPlan } from "./wanted-plan";

/** A way laid out, with the exact figures where slab and plan are true. */
interface Way {
  way: "hold" | "best" | "follow";
  mode: Mode;
  laid: Laid;
  lengths: (Length | number)[];
  exact: ExactOffsets | null;
}

/**
 * The wanted plan laid on the slab as built.
 *
 * Units: inches. Offsets are square to the slab edge; on a true slab they are exact rationals, else doubles whose worst
 * departure is within 1e-5 in of the least there is (1e-7 for a plan moved as one piece); `optimal` bounds it each time.
 * Source: minimax fit; a linear program at each angle, branch and bound over the angle (see `searchAngle`), derived here.
 *
 * @throws CalculationError by the field: see `slabCorners`, `wantedPlan`, and `inset-swallows`, `side-unknown`, `station-past-side`.
 * @example A true 28 by 24 ft slab carries 27' 11" by 23' 11" with 1/2 in all round and a worst departure of 0.
 */
export function layPlan(input: FitInput): FitAnswer {
  const built = slabCorners(input);
  const plan = wantedPlan(input, built);
  const mode: Mode = input.mode ?? (plan.sized ? "size-held" : "size-free");
  if (mode === "size-held" && !plan.sized) throw new CalculationError([{ pointer: "/size", code: "required", params: {} }]);
  const count = built.points.length;
  const insets = forSides(input.inset, count, "/inset");
  const bows = bowsOf(input, built);
  const slab = slabOf(built.points, insets.map((inset) => inset.toNumber()), bows.map((list) => list.map(({ station, outward }) => ({ station: station.toNumber(), outward: outward.toNumber() }))));
  const held = input.held === undefined ? 0 : sideNumber(input.held, count, "/held");
  const ways = layWays({ input, built, plan, mode, slab, insets, bows, held });
  const chosen = ways.find((way) => way.mode === mode)!;
  return answerOf(input, built, slab, insets, plan, chosen, ways);
}

type Bows = { station: Length; outward: Length }[][];

function bowsOf({ edges = [] }: FitInput, { points }: BuiltSlab): Bows {
  const bows: Bows = points.map(() => []);
  edges.forEach(({ wall, station, offset }, index) => {
    const side = sideNumber(wall, points.length, `/edges/${index}/wall`);
    const length = distance(points[side]!, around(points, side + 1));
    if (station.toNumber() > length) throw new CalculationError([{ pointer: `/edges/${index}/station`, code: "station-past-side", params: { inches: length } }]);
    bows[side]!.push({ station, outward: offset });
  });
  return bows.map((list) => list.sort((a, b) => a.station.compare(b.station)));
}

interface Job {
  input: FitInput;
  built: BuiltSlab;
  plan: WantedPlan;
  mode: Mode;
  slab: Slab;
  insets: Length[];
  bows: Bows;
  held: number;
}

/** Hold a wall, best fit (the size as the mode says), follow the concrete. */
function layWays({ input, built, plan, mode, slab, insets, bows, held }: Job): Way[] {
  const overhang = input.overhang?.toNumber() ?? 0;
  const rigid = plan.sized && mode !== "size-free";
  const placing = rigid ? rigidPlacing(slab, plan.points) : freePlacing(slab, plan.points);
  const follow = insetPolygon(built.points, slab.insets);
  if (follow.corners === null) throw new CalculationError([{ pointer: "/inset", code: "inset-swallows", params: { side: sideName(follow.swallowed, built.points.length).toUpperCase() } }]);
  const lengthsOf = (laid: Laid, own: boolean) => (own && rigid && plan.exact !== null ? exactLengths(plan.exact) : laid.corners.map((corner, index) => distance(corner, around(laid.corners, index + 1))));
  const best = bestFit(slab, placing, overhang);
  const exact = built.exact === null || Math.abs(best.angle) > 1e-7 ? null : agreeing(best, exactOffsets(built.exact, rigid ? plan.exact : null, insets, bows));
  const hold = heldFit(slab, placing, held, overhang);
  const followed = followFit(slab, follow.corners, overhang);
  const bestLengths = exact !== null && !rigid ? trueLengths(built, exact) : lengthsOf(best, true);
  return [
    { way: "hold", mode: "wall-held", laid: hold, lengths: lengthsOf(hold, true), exact: null },
    { way: "best", mode: rigid ? "size-held" : "size-free", laid: best, lengths: bestLengths, exact },
    { way: "follow", mode: "follow", laid: followed, lengths: lengthsOf(followed, false), exact: null },
  ];
}

/** The exact offsets, when they are those found (an overhang limit or a turn can make others better). */
function agreeing(laid: Laid, exact: ExactOffsets | null): ExactOffsets | null {
  if (exact === null) return null;
  const all = exact.flatMap(({ corners, edges }) => [...corners, ...edges]);
  return laid.places.every(({ offset }, index) => Math.abs(offset - all[index]!.toNumber()) < 1e-4) ? exact : null;
}

function exactLengths(corners: NonNullable<WantedPlan["exact"]>): Length[] {
  return corners.map((corner, index) => {
    const next = around(corners, index + 1);
    return next.x.minus(corner.x).magnitude().plus(next.y.minus(corner.y).magnitude());
  });
}

/** On a true slab: each slab edge less what its neighbours' chalk lines take (an inside corner gives). */
function trueLengths({ exact, points }: BuiltSlab, offsets: ExactOffsets): Length[] {
  const turns = insideAngles(points).map((angle) => (angle > 180 ? -1 : 1));
  return exactLengths(exact!).map((length, index) => {
    const next = (index + 1) % points.length;
    const before = (index - 1 + points.length) % points.length;
    return length.minus(offsets[before]!.corners[1].times(turns[index]!)).minus(offsets[next]!.corners[0].times(turns[next]!));
  });
}

function answerOf(input: FitInput, built: BuiltSlab, slab: Slab, insets: readonly Length[], plan: WantedPlan, chosen: Way, ways: readonly Way[]): FitAnswer {
  const { precision } = input;
  const show = (value: Length | number) => measure(value, precision);
  const { laid } = chosen;
  const count = built.points.length;
  const burn = input.burn ?? Length.zero;
  const { weights } = laid.certificate;
  const exactWorst = worstOf(chosen, insets);
  return {
    mode: chosen.mode,
    ...headOf(chosen, insets, show),
    overhangNeeded: laid.overhangNeeded === null ? null : show(laid.overhangNeeded),
    turnDegrees: chosen.exact === null ? (laid.angle * 180) / Math.PI : 0,
    corners: byCorner(laid.corners),
    slab: byCorner(built.points),
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
