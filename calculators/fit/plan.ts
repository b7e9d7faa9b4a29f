import { cross, direction, dot, minus, plus, quarterTurn, scaled, type Point } from "../geometry/point";
import { around } from "../geometry/polygon";

/** The concrete as it stands: corners counter-clockwise, its sides, and where its edges depart from the straight. */
export interface Slab {
  corners: readonly Point[];
  sides: readonly SlabSide[];
  /** Wanted inset of each side. */
  insets: readonly number[];
}

export interface SlabSide {
  from: Point;
  along: Point;
  /** Into the slab. */
  inward: Point;
  length: number;
  /** Read places of a bowed edge, in order: positive outward stands outside the string. */
  bows: readonly { station: number; outward: number }[];
}

export function slabOf(corners: readonly Point[], insets: readonly number[], bows: readonly (readonly { station: number; outward: number }[])[]): Slab {
  const sides = corners.map((from, index): SlabSide => {
    const to = around(corners, index + 1);
    const along = direction(from, to);
    return { from, along, inward: quarterTurn(along), length: Math.hypot(to.x - from.x, to.y - from.y), bows: [...bows[index]!].sort((a, b) => a.station - b.station) };
  });
  return { corners, sides, insets };
}

/** How far the edge stands outside its string at a station, in a straight line between the places read. */
export function bowAt({ bows, length }: SlabSide, station: number): number {
  const knots = [{ station: 0, outward: 0 }, ...bows, { station: length, outward: 0 }];
  const next = knots.findIndex((knot) => knot.station >= station);
  if (next <= 0) return 0;
  const [low, high] = [knots[next - 1]!, knots[next]!];
  const part = high.station === low.station ? 1 : (station - low.station) / (high.station - low.station);
  return low.outward + part * (high.outward - low.outward);
}

/** Where the chalk's corners stand at one angle: a base, and how each unknown moves it. */
export interface Pose {
  base: Point[];
  /** By corner, then by unknown. */
  gain: Point[][];
  /** Direction of each chalk line. */
  along: Point[];
}

/** One place where the inset is judged: offset = alpha · unknowns + beta, to be near `wanted`. */
export interface Place {
  side: number;
  /** The corner it is at, or null at a read place along the edge. */
  corner: number | null;
  /** Distance along the slab's edge; of a corner's place where the base stands. */
  station: number;
  alpha: number[];
  beta: number;
  wanted: number;
}

/**
 * Every place where the inset counts: both corners of each chalk line, and each read place of a bowed edge. At a corner
 * the offset is the chalk corner's distance from the slab edge's line, square to it; along the edge it is the chalk
 * line's distance from the edge at that station, square to the string.
 */
export function placesOf(slab: Slab, pose: Pose): Place[] {
  const count = slab.corners.length;
  return slab.sides.flatMap((side, index) => {
    const wanted = slab.insets[index]!;
    const at = (corner: number, axis: Point) => ({ alpha: pose.gain[corner]!.map((gain) => dot(axis, gain)), beta: dot(axis, minus(pose.base[corner]!, side.from)) });
    const corners = [index, (index + 1) % count].map((corner): Place => ({ side: index, corner, station: at(corner, side.along).beta, ...at(corner, side.inward), wanted }));
    const slope = cross(side.along, pose.along[index]!) / dot(side.along, pose.along[index]!);
    const square = at(index, side.inward);
    const run = at(index, side.along);
    const edges = side.bows.map(({ station, outward }): Place => ({
      side: index,
      corner: null,
      station,
      alpha: square.alpha.map((item, order) => item - slope * run.alpha[order]!),
      beta: square.beta + (station - run.beta) * slope + outward,
      wanted,
    }));
    return [...corners, ...edges];
  });
}

export function cornersAt({ base, gain }: Pose, unknowns: readonly number[]): Point[] {
  return base.map((corner, index) => gain[index]!.reduce((sum, step, order) => plus(sum, scaled(step, unknowns[order]!)), corner));
}
