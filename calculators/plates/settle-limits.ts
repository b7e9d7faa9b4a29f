import { crowded, defaultEndDistance, diameterOf, limitsOf, type Limits } from "../anchors/limits";
import { isMetric, graduation, Length } from "../length";
import { ruleOf, type Rule } from "../rules";
import type { PlatesInput } from "./input";

/** The figures a whole job is planned with, exact. */
export interface Settled {
  rule: Rule;
  limits: Limits;
  diameter: Length;
  plateWidth: Length;
  kerf: Length;
  trim: Length;
  shortest: Length;
  bit: Length;
  /** Kept between a joint and any hole. */
  clear: Length;
  /** Kept between an added anchor and any bolt. */
  apart: Length;
  endDistance: Length;
  /** From the coarsest: what stations are best marked on. */
  graduations: readonly Length[];
}

const eighth = Length.from(0.125);
const sixteenth = Length.from(0.0625);
const defaultWidth = Length.from(5.5);

export function settle(input: PlatesInput): Settled {
  const rule = ruleOf(input.rule);
  const diameter = diameterOf(rule, input.diameter);
  const limits = limitsOf(rule, diameter);
  const bit = input.bit ?? diameter.plus(sixteenth);
  // Where the rule states no end distance, a joint still cannot run through a hole.
  const clear = limits.endMinimum ?? bit.over(2);
  const asked = input.endDistance ?? defaultEndDistance;
  const endDistance = asked.compare(clear) < 0 ? clear : limits.endMaximum !== null && asked.compare(limits.endMaximum) > 0 ? limits.endMaximum : asked;
  const finest = graduation(input.precision);
  const coarser = isMetric(input.precision) ? [Length.from(10, "mm"), Length.from(5, "mm")] : [1, 0.5, 0.25, 0.125].map((inches) => Length.from(inches));
  return {
    rule,
    limits,
    diameter,
    plateWidth: input.plateWidth ?? defaultWidth,
    kerf: input.kerf ?? eighth,
    trim: input.trim ?? Length.zero,
    shortest: input.shortest ?? Length.zero,
    bit,
    clear,
    apart: input.clearOfBolts ?? crowded,
    endDistance,
    graduations: [...coarser.filter((step) => step.compare(finest) > 0), finest],
  };
}
