import { fewestBolts, type Need } from "../anchors/fewest-bolts";
import { isSound, judgeWall, type Wall } from "../anchors/judge";
import { shortWallException } from "../anchors/limits";
import type { Bolt, Piece } from "../anchors/survey";
import { spacingFor } from "../rules";
import type { Length } from "../length";
import type { Interval } from "./joints/intervals";
import { planJoints, type JointPlan, type NoJointPlan } from "./joints/plan-joints";
import { layOut, type PieceLimits, type StandingBolt, type Stretch } from "./joints/stretch";
import type { Settled } from "./settle-limits";
import type { SurveyedWall } from "./survey-walls";
import type { Units } from "./units";

/** A part of a wall with its limits, in whole units, and what stage 1 makes of it. */
export interface PlannedStretch {
  wall: SurveyedWall;
  part: Piece;
  limits: PieceLimits;
  plan: JointPlan | NoJointPlan;
  /** Anchors placed before the joints were: for a rule that asks for spacing along the wall and not by piece. */
  placedBefore: readonly number[];
}

/** The wall as the as-poured check would judge it, its pieces being `pieces`. */
export function wallToJudge(wall: SurveyedWall, pieces: readonly Piece[], settled: Settled, bolts: readonly Bolt[]): Wall {
  const { rule, limits, plateWidth } = settled;
  const exception = shortWallException(rule, wall.input.length, wall.input.joinsOffsetPanels);
  return { rule, limits, pieces, bolts, exception, plateWidth, centres: [], reach: () => limits.diameter, neededProjection: () => limits.diameter };
}

/** Bolts the rule may count: neither engineered nor entered twice. */
export const judgedBolts = (wall: SurveyedWall) => wall.bolts.filter((bolt) => !bolt.engineered && bolt.duplicateOf === null);

/** The bolts of a wall that count: sound by the as-poured check, the wall's parts being its pieces. */
export function soundBolts(wall: SurveyedWall, settled: Settled): ReadonlySet<Bolt> {
  const bolts = judgedBolts(wall);
  const violations = judgeWall(wallToJudge(wall, wall.parts, settled, bolts));
  return new Set(bolts.filter((bolt) => isSound(bolt, violations)));
}

/** Stage 1 for every part of a wall, no piece longer than `longest`. */
export function planWall(wall: SurveyedWall, settled: Settled, units: Units, longest: number): PlannedStretch[] {
  const sound = soundBolts(wall, settled);
  const exception = shortWallException(settled.rule, wall.input.length, wall.input.joinsOffsetPanels);
  return wall.parts.map((part, place): PlannedStretch => {
    const [from, to] = [units.whole(part.from), units.whole(part.to)];
    const holes = wall.bolts.filter((bolt) => bolt.duplicateOf === null && !wall.straps.has(bolt.index));
    const standing = holes.map((bolt): StandingBolt => ({ at: units.whole(bolt.station), counts: sound.has(bolt) }));
    const limits = pieceLimits(settled, units, longest, [...sound]);
    const bare: Stretch = { from, to, bolts: standing };
    if (exception !== null) return shortWall(wall, part, bare, limits, exception.bolts);
    const isFirst = place === 0;
    const isLast = place === wall.parts.length - 1;
    const wallEnd = settled.limits.wallEndMaximum === null ? Infinity : units.floor(settled.limits.wallEndMaximum);
    if (settled.limits.endMaximum !== null) {
      const stretch = { ...bare, farthestAtStart: isFirst ? wallEnd : limits.farthest, farthestAtEnd: isLast ? wallEnd : limits.farthest };
      return { wall, part, limits, plan: planJoints(stretch, limits), placedBefore: [] };
    }
    return spacedAlong(wall, part, bare, limits, isFirst ? wallEnd : Infinity, isLast ? wallEnd : Infinity);
  });
}

function pieceLimits({ rule, limits, diameter, clear, apart, shortest }: Settled, units: Units, longest: number, sound: readonly Bolt[]): PieceLimits {
  const orEndless = (value: Length | null) => (value === null ? Infinity : units.floor(value));
  // Bolts of several sizes: the strictest spacing of those present.
  const spacings = [limits.spacing, ...sound.map((bolt) => spacingFor(rule, bolt.diameter)?.value ?? null)].map(orEndless);
  return {
    clear: units.ceil(clear),
    farthest: orEndless(limits.endMaximum),
    spacing: Math.min(...spacings),
    // A rule that states no number still means the plate to be held.
    perPiece: Math.max(1, limits.boltsPerPiece ?? 1),
    apart: Math.max(units.ceil(apart), units.ceil(diameter), 1),
    shortest: units.ceil(shortest),
    longest,
  };
}

/**
 * A rule that states no end distance asks for its spacing along the whole part, ends included, wherever the joints are.
 * Anchors for that are placed first, the fewest; then joints, each piece holding its bolts.
 */
function spacedAlong(wall: SurveyedWall, part: Piece, bare: Stretch, limits: PieceLimits, atStart: number, atEnd: number): PlannedStretch {
  const { from, to, bolts } = bare;
  const reachStart = Math.min(atStart, limits.spacing);
  const reachEnd = Math.min(atEnd, limits.spacing);
  const needs: Need[] = [{ low: from, high: to, count: 1 }];
  if (Number.isFinite(reachStart)) needs.push({ low: from, high: Math.min(to, from + reachStart), count: 1 });
  if (Number.isFinite(reachEnd)) needs.push({ low: Math.max(from, to - reachEnd), high: to, count: 1 });
  const standing = bolts.filter((bolt) => bolt.counts && bolt.at >= from && bolt.at <= to).map((bolt) => bolt.at).sort((a, b) => a - b);
  const allowed = freePlaces([from + limits.clear, to - limits.clear], bolts, limits.apart);
  const { added } = fewestBolts({ standing, allowed, spacing: Number.isFinite(limits.spacing) ? limits.spacing : null, runs: [[from, to]], needs, apart: limits.apart });
  const byPiece: PieceLimits = { ...limits, farthest: Infinity, spacing: Infinity };
  const stretch: Stretch = { from, to, bolts: [...bolts, ...added.map((at) => ({ at, counts: true }))] };
  return { wall, part, limits: byPiece, plan: planJoints(stretch, byPiece), placedBefore: added };
}

function freePlaces([low, high]: Interval, bolts: readonly StandingBolt[], apart: number): Interval[] {
  let places: Interval[] = low <= high ? [[low, high]] : [];
  for (const { at } of bolts) places = places.flatMap(([start, end]) => (at + apart <= start || at - apart >= end ? [[start, end] as Interval] : ([[start, at - apart], [at + apart, end]] as Interval[]).filter(([from, to]) => from <= to)));
  return places;
}

/** A whole short wall under an exception: one piece, no joint; no bolt, or one in its middle third. */
function shortWall(wall: SurveyedWall, part: Piece, bare: Stretch, limits: PieceLimits, bolts: number): PlannedStretch {
  const third = Math.ceil((bare.to - bare.from) / 3);
  const alone: PieceLimits = { ...limits, clear: bolts === 0 ? 0 : third, farthest: Infinity, spacing: Infinity, perPiece: bolts };
  const plan = bolts > 0 ? planJoints(bare, alone) : { stretch: layOut(bare, alone), added: 0, pieces: 1, ways: [[]], complete: true };
  return { wall, part, limits: alone, plan, placedBefore: [] };
}
