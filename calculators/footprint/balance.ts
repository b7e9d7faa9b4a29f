import type Fraction from "fraction.js";
import { Length } from "../length";
import { distance, type Point } from "../geometry/point";
import { around } from "../geometry/polygon";
import type { Leg } from "./leg";
import type { ExactPoint, Outline } from "./outline";
import { printToward, stepToward } from "./toward";
import { asNumber, type Closure } from "./walk-closure";

/**
 * The corners of a walk, its misclosure shared out among the legs in proportion to their lengths: along the axes the east
 * part among the east and west legs alone and the north part among the others, so that square corners stay square;
 * else over all legs (the compass rule).
 */
export function balance(legs: readonly Leg[], closure: Closure): Outline {
  const toward = legs.map((leg) => printToward(leg.toward));
  const { east, north } = closure;
  if (typeof east !== "number" && typeof north !== "number") {
    const exact = balancedExactly(legs, east, north);
    const points = exact.map(({ x, y }) => ({ x: x.toNumber(), y: y.toNumber() }));
    const sides = exact.map((corner, index) => {
      const next = around(exact, index + 1);
      return next.x.minus(corner.x).magnitude().plus(next.y.minus(corner.y).magnitude());
    });
    return { points, exact, sides, toward };
  }
  const missEast = asNumber(east);
  const missNorth = asNumber(north);
  const total = legs.reduce((sum, leg) => sum + leg.length.toNumber(), 0);
  let here: Point = { x: 0, y: 0 };
  const points = legs.map(({ toward: bearing, length }) => {
    const corner = here;
    const step = stepToward(bearing);
    const inches = length.toNumber();
    here = { x: here.x + step.east * inches - (missEast * inches) / total, y: here.y + step.north * inches - (missNorth * inches) / total };
    return corner;
  });
  const unmoved = missEast === 0 && missNorth === 0;
  return { points, exact: null, sides: unmoved ? legs.map((leg) => leg.length) : points.map((corner, index) => distance(corner, around(points, index + 1))), toward };
}

function balancedExactly(legs: readonly Leg[], east: Length, north: Length): ExactPoint[] {
  const along = (upright: boolean) => legs.filter(({ toward }) => (toward.axis === "N" || toward.axis === "S") === upright).reduce((sum, leg) => sum.plus(leg.length), Length.zero);
  const eastWest = along(false);
  const northSouth = along(true);
  const share = (miss: Length, length: Length, total: Length): Length => (total.isZero() ? Length.zero : Length.from(miss.inches.mul(length.inches).div(total.inches as Fraction)));
  let here: ExactPoint = { x: Length.zero, y: Length.zero };
  return legs.map(({ toward, length }) => {
    const corner = here;
    const step = stepToward(toward);
    here =
      step.east !== 0
        ? { x: here.x.plus(length.times(step.east)).minus(share(east, length, eastWest)), y: here.y }
        : { x: here.x, y: here.y.plus(length.times(step.north)).minus(share(north, length, northSouth)) };
    return corner;
  });
}
