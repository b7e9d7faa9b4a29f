import { sideName } from "../geometry/corner-names";
import { insetPolygon } from "../geometry/inset-polygon";
import { forSides } from "../geometry/per-side";
import { distance } from "../geometry/point";
import { around, insideAngles } from "../geometry/polygon";
import type { Length } from "../length";
import { CalculationError, measure } from "../schema";
import type { FitAnswer } from "./answer";
import { bestFit, followFit, heldFit, type Laid } from "./best-fit";
import { describeFit } from "./describe-fit";
import { exactOffsets, type ExactOffsets } from "./exact-fit";
import type { FitInput, Mode } from "./input";
import { slabOf, type Slab } from "./plan";
import { freePlacing, rigidPlacing } from "./poses";
import { sideNumber, slabCorners, type BuiltSlab } from "./slab-corners";
import { wantedPlan, type WantedPlan } from "./wanted-plan";
import type { Way } from "./way";

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
  return describeFit({ input, slab, insets, plan, chosen, ways });
}

type Bows = { station: Length; outward: Length }[][];

function bowsOf({ edges = [], precision }: FitInput, { points }: BuiltSlab): Bows {
  const bows: Bows = points.map(() => []);
  edges.forEach(({ wall, station, offset }, index) => {
    const side = sideNumber(wall, points.length, `/edges/${index}/wall`);
    const length = distance(points[side]!, around(points, side + 1));
    if (station.toNumber() > length) throw new CalculationError([{ pointer: `/edges/${index}/station`, code: "station-past-side", params: { most: measure(length, precision).text } }]);
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
