import { cross, direction, dot, plus, minus, quarterTurn, rotated, scaled, turn, type Point } from "../geometry/point";
import { around } from "../geometry/polygon";
import type { Pose, Slab } from "./plan";

/** A way of laying the plan on the slab: the pose at each angle, and bounds on how poses bend between angles. */
export interface Placing {
  unknowns: number;
  /** `angle` turns the plan from where its AB runs along the slab's. */
  poseAt(angle: number): Pose;
  /** Directions of the plan's sides at angle 0. */
  directions: readonly Point[];
  /** Lengths that the plan's sides have at least. */
  sideLengths: readonly number[];
  /** At most |d²beta/dangle²|. */
  bend: number;
  /** At most the sum over unknowns of |d alpha/dangle|, at corners and at places along an edge. */
  swing: { corner: number; edge: number };
}

/** The plan as one rigid piece: it may slide both ways. */
export function rigidPlacing(slab: Slab, plan: readonly Point[]): Placing {
  const start = turn(direction(plan[0]!, plan[1]!), slab.sides[0]!.along);
  const centre = mean(plan);
  const home = mean(slab.corners);
  const shape = plan.map((corner) => rotated(minus(corner, centre), start));
  const reach = Math.max(...shape.map(({ x, y }) => Math.hypot(x, y)));
  const gain = plan.map(() => [{ x: 1, y: 0 }, { x: 0, y: 1 }]);
  const directions = shape.map((corner, index) => direction(corner, around(shape, index + 1)));
  const longest = Math.max(...slab.sides.map(({ length }) => length));
  return {
    unknowns: 2,
    poseAt: (angle) => ({ base: shape.map((corner) => plus(rotated(corner, angle), home)), gain, along: directions.map((along) => rotated(along, angle)) }),
    directions,
    sideLengths: shape.map((corner, index) => Math.hypot(around(shape, index + 1).x - corner.x, around(shape, index + 1).y - corner.y)),
    bend: reach + (hasBows(slab) ? 4 * (reach + longest) : 0),
    swing: { corner: 0, edge: 3 },
  };
}

/** The plan's angles held and its sizes free: each chalk line may slide by itself. An unknown is a line's shift from the middle of its slab edge, inset as wanted. */
export function freePlacing(slab: Slab, plan: readonly Point[]): Placing {
  const start = turn(direction(plan[0]!, plan[1]!), slab.sides[0]!.along);
  const directions = plan.map((corner, index) => rotated(direction(corner, around(plan, index + 1)), start));
  const middles = slab.sides.map(({ from, along, length }) => plus(from, scaled(along, length / 2)));
  const count = plan.length;
  const sharpest = Math.min(...directions.map((along, index) => Math.abs(cross(around(directions, index - 1), along))));
  const diameter = Math.max(...slab.corners.flatMap((a) => slab.corners.map((b) => Math.hypot(a.x - b.x, a.y - b.y)))) + 4 * Math.max(...slab.insets.map(Math.abs));
  const poseAt = (angle: number): Pose => {
    const along = directions.map((item) => rotated(item, angle));
    const inward = along.map(quarterTurn);
    const lines = middles.map((middle, index) => dot(inward[index]!, middle) + slab.insets[index]!);
    const base: Point[] = [];
    const gain = along.map((_, index): Point[] => {
      const before = (index - 1 + count) % count;
      const sine = cross(inward[before]!, inward[index]!);
      const shifts = along.map(() => ({ x: 0, y: 0 }));
      shifts[before] = scaled({ x: inward[index]!.y, y: -inward[index]!.x }, 1 / sine);
      shifts[index] = scaled({ x: -inward[before]!.y, y: inward[before]!.x }, 1 / sine);
      base.push(plus(scaled(shifts[before]!, lines[before]!), scaled(shifts[index]!, lines[index]!)));
      return shifts;
    });
    return { base, gain, along };
  };
  const nominal = poseAt(0).base;
  return {
    unknowns: count,
    poseAt,
    directions,
    sideLengths: nominal.map((corner, index) => Math.hypot(around(nominal, index + 1).x - corner.x, around(nominal, index + 1).y - corner.y)),
    bend: ((hasBows(slab) ? 8 : 3) * diameter) / sharpest,
    swing: { corner: 2 / sharpest, edge: 6 / sharpest },
  };
}

/** A placing with one chalk line held along its slab edge at the wanted inset: one angle, and what is left to slide. */
export function heldPose(slab: Slab, placing: Placing, held: number): Pose {
  const angle = turn(placing.directions[held]!, slab.sides[held]!.along);
  const pose = placing.poseAt(angle);
  const side = slab.sides[held]!;
  if (placing.unknowns > 2) {
    return { ...pose, gain: pose.gain.map((steps) => steps.filter((_, index) => index !== held)) };
  }
  const off = slab.insets[held]! - dot(side.inward, minus(pose.base[held]!, side.from));
  return { ...pose, base: pose.base.map((corner) => plus(corner, scaled(side.inward, off))), gain: pose.gain.map(() => [side.along]) };
}

export function heldAngle(slab: Slab, placing: Placing, held: number): number {
  return turn(placing.directions[held]!, slab.sides[held]!.along);
}

const hasBows = (slab: Slab) => slab.sides.some(({ bows }) => bows.length > 0);

function mean(points: readonly Point[]): Point {
  return scaled(points.reduce(plus, { x: 0, y: 0 }), 1 / points.length);
}
