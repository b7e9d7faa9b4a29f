import { measure } from "../schema";
import type { CheckAnswer, CheckInput } from "./check-input";
import { bitAnswer, holeFault, holeSource, washerEdgeLimit, washerEdgeSource } from "./hardware";
import type { Wall } from "./judge";
import type { Bolt } from "./survey";

type Warning = CheckAnswer["warnings"][number];
const unsourced = { clause: null, source: null, status: null };

/** What breaks no rule yet wants a look: a shank half out of the third, a washer far from the sheathing, a bit too big, a bolt entered twice. */
export function boltWarnings(input: CheckInput, wall: Wall, all: readonly Bolt[]): Warning[] {
  const { precision } = input;
  const twice = all.flatMap(({ index, duplicateOf }): Warning[] => (duplicateOf === null ? [] : [{ code: "duplicate-bolt", bolt: index, other: duplicateOf, ...unsourced, limit: null, actual: null }]));
  const fault = holeFault(input.hole, wall.limits.diameter);
  const holes: Warning[] = fault === null ? [] : [{ code: fault.code, bolt: null, other: null, ...holeSource, limit: bitAnswer(fault.limit, precision), actual: bitAnswer(fault.actual, precision) }];
  const thirds = wall.bolts.flatMap((bolt) => shankWarning(wall, bolt, precision));
  const washers = input.shearWall === true ? wall.bolts.flatMap((bolt) => washerWarning(input, wall, bolt)) : [];
  return [...thirds, ...washers, ...holes, ...twice];
}

function shankWarning({ rule, plateWidth }: Wall, bolt: Bolt, precision: CheckInput["precision"]): Warning[] {
  const { middleThird } = rule;
  if (middleThird.value !== true || plateWidth === null || bolt.offset === null) return [];
  const [low, high] = [plateWidth.over(3), plateWidth.times(2).over(3)];
  if (bolt.offset.compare(low) < 0 || bolt.offset.compare(high) > 0) return []; // a finding already
  const half = bolt.diameter.over(2);
  const [inner, outer] = [bolt.offset.minus(half), bolt.offset.plus(half)];
  const [limit, actual] = inner.compare(low) < 0 ? [low, inner] : [high, outer];
  if (inner.compare(low) >= 0 && outer.compare(high) <= 0) return [];
  return [{ code: "shank-leaves-third", bolt: bolt.index, other: null, clause: middleThird.clause, source: middleThird.source, status: middleThird.status, limit: measure(limit, precision), actual: measure(actual, precision) }];
}

function washerWarning({ washer, precision }: CheckInput, { rule }: Wall, bolt: Bolt): Warning[] {
  const size = washer ?? rule.washer.size;
  if (size === null || size === undefined || bolt.offset === null) return [];
  const gap = bolt.offset.minus(size.over(2));
  return gap.compare(washerEdgeLimit) <= 0 ? [] : [{ code: "washer-edge", bolt: bolt.index, other: null, ...washerEdgeSource, limit: measure(washerEdgeLimit, precision), actual: measure(gap, precision) }];
}
