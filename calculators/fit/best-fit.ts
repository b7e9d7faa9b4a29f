import { minimax, type Minimax, type Question } from "./minimax";
import { cornersAt, placesOf, type Place, type Pose, type Slab } from "./plan";
import { heldAngle, heldPose, type Placing } from "./poses";
import { balanceAt, searchAngle, type Found } from "./search-angle";
import type { Point } from "../geometry/point";

/** A plan laid on the slab. */
export interface Laid {
  corners: Point[];
  /** Every place the inset is judged at, with its offset. */
  places: (Place & { offset: number })[];
  /** Turned from where its AB runs along the slab's, in radians. */
  angle: number;
  worst: number;
  /** Whether the overhang limit is kept. */
  fits: boolean;
  /** The least overhang that any pose needs, when the limit cannot be kept; inches. */
  overhangNeeded: number | null;
  certificate: Certificate;
}

export interface Certificate {
  proved: boolean;
  /** No pose has a smaller worst departure. */
  lowerBound: number;
  /** The places on which it hangs: their weights add up to 1 and balance every slide and the turn. */
  weights: number[];
}

/** How near (inches) the search comes to the best there is. */
const gap = { rigid: 1e-7, free: 1e-5 };
/** Places that do not decide the worst departure are made as good as they can be, as far as this much searching goes. */
const rest = { gap: 1e-4, intervals: 60, levels: 3 };

/** Settled places keep this much room (inches), so that rounding cannot shut the figure found out. */
const slack = 1e-9;

/**
 * The best fit: the pose whose worst departure from the wanted inset is least, then, of those, whose worst departure at
 * the places still free to move is least, and so on. Overhang is kept within its limit where any pose can.
 */
export function bestFit(slab: Slab, placing: Placing, overhang: number): Laid {
  const count = placesOf(slab, placing.poseAt(0)).length;
  const settled = new Array<number | null>(count).fill(null);
  const wanted = placing.unknowns > 2 ? gap.free : gap.rigid;
  const free = searchAngle(slab, placing, { overhang: null, settled }, wanted);
  if (free === null) throw new Error("The fit without limits has no answer");
  const limited = withinOverhang(slab, placing, overhang, free, settled, wanted);
  const question: Question = { overhang: limited.kept ? overhang : null, settled };
  const found = limited.found;
  const weights = balanceAt(slab, placing, question, found.angle) ?? found.weights;
  const turned = settleRest(slab, placing, question, found, weights).angle;
  const best = minimax(placesOf(slab, placing.poseAt(turned)), placing.unknowns, question);
  // Where a limit leaves hardly any angle, rounding can let the rest turn the plan away from its best.
  const keeps = best !== null && best.worst <= found.worst + 2 * slack;
  const angle = keeps ? turned : found.angle;
  const pose = placing.poseAt(angle);
  const places = placesOf(slab, pose);
  const first = keeps ? best : (minimax(places, placing.unknowns, question) ?? found);
  return { ...laidOut(slab, pose, restAt(places, placing.unknowns, question, first).unknowns, angle), fits: limited.fits, overhangNeeded: limited.needed, certificate: { proved: found.proved, lowerBound: found.lowerBound, weights } };
}

/** One chalk line along its slab edge at the wanted inset; what is left slides to where the worst departure is least. */
export function heldFit(slab: Slab, placing: Placing, held: number, overhang: number): Laid {
  const pose = heldPose(slab, placing, held);
  const unknowns = pose.gain[0]!.length;
  const places = placesOf(slab, pose);
  const limits: Question = { overhang, settled: places.map(() => null) };
  const kept = minimax(places, unknowns, limits);
  const question = kept === null ? { ...limits, overhang: null } : limits;
  const first = kept ?? minimax(places, unknowns, question);
  if (first === null) throw new Error("The held fit has no answer");
  const last = restAt(places, unknowns, question, first);
  const needed = kept === null ? (minimax(places, unknowns, { ...question, leastOverhang: true })?.worst ?? null) : null;
  return { ...laidOut(slab, pose, last.unknowns, heldAngle(slab, placing, held)), fits: kept !== null, overhangNeeded: needed, certificate: { proved: true, lowerBound: first.worst, weights: first.weights } };
}

/** The chalk parallel to every slab edge at the wanted inset. */
export function followFit(slab: Slab, corners: Point[], overhang: number): Laid {
  const pose: Pose = { base: corners, gain: corners.map(() => []), along: slab.sides.map(({ along }) => along) };
  const laid = laidOut(slab, pose, [], 0);
  const most = Math.max(...laid.places.map(({ offset }) => -offset));
  return { ...laid, fits: most <= overhang + 1e-9, overhangNeeded: most <= overhang + 1e-9 ? null : most, certificate: { proved: true, lowerBound: laid.worst, weights: laid.places.map(() => 0) } };
}

function laidOut(slab: Slab, pose: Pose, unknowns: readonly number[], angle: number): Pick<Laid, "corners" | "places" | "angle" | "worst"> {
  const corners = cornersAt(pose, unknowns);
  const places = placesOf(slab, { base: corners, gain: corners.map(() => []), along: pose.along }).map((place) => ({ ...place, offset: place.beta }));
  return { corners, places, angle, worst: Math.max(...places.map(({ offset, wanted }) => Math.abs(offset - wanted))) };
}

function withinOverhang(slab: Slab, placing: Placing, overhang: number, free: Found, settled: readonly (number | null)[], wanted: number): { found: Found; kept: boolean; fits: boolean; needed: number | null } {
  const places = placesOf(slab, placing.poseAt(free.angle));
  const most = Math.max(...places.map(({ alpha, beta }) => -alpha.reduce((sum, item, index) => sum + item * free.unknowns[index]!, beta)));
  const least = most <= overhang - 1e-9 ? null : searchAngle(slab, placing, { overhang: null, settled, leastOverhang: true }, 1e-5, { starts: [0, free.angle] });
  if (least !== null && least.worst > overhang + 1e-9) return { found: free, kept: false, fits: false, needed: least.worst };
  const kept = searchAngle(slab, placing, { overhang, settled }, wanted, { starts: [free.angle, ...(least === null ? [] : [least.angle])] });
  return kept === null ? { found: free, kept: false, fits: most <= overhang + 1e-9, needed: least?.worst ?? null } : { found: kept, kept: true, fits: true, needed: null };
}

/** At one angle: places that decide the worst keep it; the others are asked again, until nothing is free to move. */
function restAt(places: readonly Place[], unknowns: number, question: Question, first: Minimax): Minimax {
  let last = first;
  const settled = [...question.settled];
  for (let level = 0; level < unknowns + 1 && last.worst > 1e-9; level += 1) {
    const worst = last.worst;
    last.weights.forEach((weight, place) => {
      if (weight > 1e-6) settled[place] ??= worst + slack;
    });
    const next = minimax(places, unknowns, { ...question, settled });
    if (next === null) break;
    last = next;
  }
  return last;
}

/** The same over all angles: places that decide the worst keep it; the others are asked again. */
function settleRest(slab: Slab, placing: Placing, question: Question, found: Found, firstWeights: readonly number[]): Found {
  const settled = [...question.settled];
  let last = found;
  let weights = firstWeights;
  for (let level = 0; level < rest.levels && last.worst > 1e-9; level += 1) {
    const worst = last.worst;
    const deciding = weights.flatMap((weight, place) => (weight > 1e-6 && settled[place] === null ? [place] : []));
    if (deciding.length === 0) break;
    for (const place of deciding) settled[place] = worst + slack;
    if (settled.every((limit) => limit !== null)) break;
    const next = searchAngle(slab, placing, { ...question, settled }, rest.gap, { starts: [last.angle], intervals: rest.intervals });
    if (next === null) break;
    last = next;
    weights = balanceAt(slab, placing, { ...question, settled }, last.angle) ?? last.weights;
  }
  return last;
}
