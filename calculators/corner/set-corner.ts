import { graduation, isMetric, Length, squareRoot } from "../length";
import { measure } from "../schema";
import type { CornerAnswer } from "./answer";
import type { CornerInput } from "./input";
import { largestTriangle } from "./largest-triangle";

const foot = Length.from(1, "ft");
const hundredMillimetres = Length.from(100, "mm");

/**
 * The diagonal that squares a corner of two legs, and the largest whole-number triangle inside them.
 *
 * Units: lengths are exact rational inches; the diagonal is exact where it is rational. The triangle is in whole feet, or in
 * whole 100 mm when unit or precision is metric.
 * Source: Pythagoras; `largestTriangle`. A diagonal c that is δ off turns the corner by c·δ/(a·b), which swings the end of a
 * leg b by c·δ/a (first order).
 *
 * @example 28 and 22 ft: 35 ft 7 5/16 in, and the triangle 28-21-35, a 3-4-5 taken seven times.
 */
export function setCorner({ legs, burn = Length.zero, unit, precision }: CornerInput): CornerAnswer {
  const [first, second] = legs as [Length, Length];
  const show = (value: Length | number) => measure(value, precision);
  const diagonal = squareRoot(first.inches.mul(first.inches).add(second.inches.mul(second.inches)));
  const step = graduation(precision).toNumber();
  const metric = isMetric(precision) || (unit !== "in" && unit !== "ft");
  const whole = metric ? hundredMillimetres : foot;
  const counted = (leg: Length) => Number(leg.inches.div(whole.inches).floor());
  const found = largestTriangle({ along: counted(first), up: counted(second) });
  return {
    legs: { first: show(first), second: show(second) },
    diagonal: show(diagonal),
    reading: show(typeof diagonal === "number" ? diagonal + burn.toNumber() : diagonal.plus(burn)),
    swingIn: (inches(diagonal) * step) / first.toNumber(),
    triangle:
      found === null
        ? null
        : {
            a: show(whole.times(found.along)),
            b: show(whole.times(found.up)),
            c: show(whole.times(found.across)),
            reading: show(whole.times(found.across).plus(burn)),
            counts: [found.along, found.up, found.across],
            unit: metric ? "100 mm" : "ft",
            primitive: [...found.primitive],
            times: found.times,
            swingIn: ((found.across * step) / (found.along * found.up)) * (second.toNumber() / whole.toNumber()),
          },
  };
}

function inches(value: Length | number): number {
  return typeof value === "number" ? value : value.toNumber();
}
