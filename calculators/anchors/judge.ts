import type { Length } from "../length";
import { isThickEnough, spacingFor, type FigureStatus, type Rule } from "../rules";
import type { FindingCode, Remedy } from "./check-input";
import type { Limits } from "./limits";
import { nearestMember } from "./members";
import { pieceOf, runsOf, type Bolt, type Piece } from "./survey";

/** One violation, still exact. */
export interface Violation {
  code: FindingCode;
  piece: Piece | null;
  bolt: Bolt | null;
  next: Bolt | null;
  clause: string | null;
  source: string | null;
  status: FigureStatus | null;
  limit: Length | number | null;
  actual: Length | number | null;
  remedy: Remedy;
}

export interface Wall {
  rule: Rule;
  limits: Limits;
  pieces: readonly Piece[];
  /** Neither engineered nor entered twice, in order along the wall. */
  bolts: readonly Bolt[];
  exception: Rule["shortWalls"][number] | null;
  plateWidth: Length | null;
  centres: readonly Length[];
  reach(diameter: Length): Length;
  neededProjection(diameter: Length): Length;
}

const unsourced = { clause: null, source: null, status: null };
const from = ({ clause, source, status }: { clause: string | null; source: string | null; status: FigureStatus | null }) => ({ clause, source, status });
const violation = (code: FindingCode, remedy: Remedy, more: Partial<Violation>): Violation => ({ code, remedy, piece: null, bolt: null, next: null, ...unsourced, limit: null, actual: null, ...more });

/**
 * Every violation of a wall's bolts, each test by itself: a bolt too near an end still counts as one of the piece's two
 * and for its spacing, so that one fault is told once.
 *
 * On centre distances run along touching pieces, across their joints. A rule that states no end distance is read as
 * wanting its spacing from the wall's ends too (our reading), and one that states no number as wanting one bolt at least.
 */
export function judgeWall(wall: Wall): Violation[] {
  const standing = wall.bolts.map((bolt) => ({ bolt, piece: pieceOf(wall.pieces, bolt) }));
  const on = (piece: Piece) => standing.filter((entry) => entry.piece === piece).map(({ bolt }) => bolt);
  const byPlace = judgePlaces(wall, on);
  const byBolt = standing.flatMap(({ bolt, piece }) => (piece === null ? [violation("off-piece", "no-plate-here", { bolt, actual: bolt.station })] : judgeBolt(wall, bolt, piece)));
  return [...byPlace, ...byBolt];
}

/** Number, ends and spacing. A short wall under an exception is asked that alone, unless it meets the rule anyway. */
function judgePlaces(wall: Wall, on: (piece: Piece) => Bolt[]): Violation[] {
  const { pieces, exception } = wall;
  const strict = [...pieces.flatMap((piece) => judgePiece(wall, piece, on(piece))), ...runsOf(pieces).flatMap((run) => judgeRun(wall, run, run.flatMap(on)))];
  if (exception === null || strict.length === 0) return strict;
  return exception.bolts === 0 ? [] : pieces.flatMap((piece) => judgeShortWall(exception, piece, on(piece)));
}

function judgePiece({ rule, limits, pieces }: Wall, piece: Piece, bolts: readonly Bolt[]): Violation[] {
  const found: Violation[] = [];
  const { endMinimum, endMaximum, wallEndMaximum, boltsPerPiece } = limits;
  const isTooShort = endMinimum !== null && (boltsPerPiece ?? 0) > 1 && piece.to.minus(piece.from).compare(endMinimum.times(2)) <= 0;
  if (boltsPerPiece !== null && bolts.length < boltsPerPiece) {
    found.push(violation("too-few", isTooShort ? "longer-piece" : "add-anchor", { piece, ...from(rule.boltsPerPiece), limit: boltsPerPiece, actual: bolts.length }));
  }
  const ends = endsOf(pieces, piece);
  for (const bolt of bolts) {
    const [near, end] = nearerEnd(piece, bolt);
    if (endMinimum !== null && near.compare(endMinimum) < 0) found.push(violation("near-end", isTooShort ? "longer-piece" : ends[end] ? "add-anchor" : "move-joint", { piece, bolt, ...from(rule.endMinimum), limit: endMinimum, actual: near }));
  }
  const [first, last] = [bolts[0], bolts.at(-1)];
  if (first === undefined || last === undefined) return found;
  const judgeEnd = (bolt: Bolt, distance: Length, isWallEnd: boolean) => {
    const most = isWallEnd ? wallEndMaximum : endMaximum;
    const figure = endMaximum !== null && most !== null && most.equals(endMaximum) ? rule.endMaximum : rule.foundationEndMaximum;
    if (most !== null && distance.compare(most) > 0) found.push(violation("far-end", "add-anchor", { piece, bolt, ...from(figure), limit: most, actual: distance }));
  };
  judgeEnd(first, first.station.minus(piece.from), ends.first);
  judgeEnd(last, piece.to.minus(last.station), ends.last);
  return found;
}

/** Which ends of a piece are ends of the wall. */
function endsOf(pieces: readonly Piece[], piece: Piece): { first: boolean; last: boolean } {
  return { first: piece === pieces[0], last: piece === pieces.at(-1) };
}

function nearerEnd({ from: start, to: end }: Piece, { station }: Bolt): [Length, "first" | "last"] {
  const [first, last] = [station.minus(start), end.minus(station)];
  return first.compare(last) <= 0 ? [first, "first"] : [last, "last"];
}

function judgeRun({ rule, limits }: Wall, run: readonly Piece[], bolts: readonly Bolt[]): Violation[] {
  const spacing = (a: Bolt, b?: Bolt) => spacingFor(rule, b === undefined || a.diameter.compare(b.diameter) < 0 ? a.diameter : b.diameter);
  const [start, end] = [run[0]!, run.at(-1)!];
  const [first, last] = [bolts[0], bolts.at(-1)];
  if (first === undefined || last === undefined) {
    if (limits.boltsPerPiece !== null || limits.spacing === null) return [];
    return [violation("too-few", "add-anchor", { piece: start, ...from(rule.spacing), limit: 1, actual: 0 })];
  }
  const found: Violation[] = [];
  const judgeGap = (piece: Piece | undefined, bolt: Bolt, next: Bolt | null, distance: Length) => {
    const figure = spacing(bolt, next ?? undefined);
    if (figure !== null && distance.compare(figure.value) > 0) found.push(violation("spacing", "add-anchor", { piece: piece ?? null, bolt, next, ...from(figure), limit: figure.value, actual: distance }));
  };
  if (limits.endMaximum === null && limits.wallEndMaximum === null) judgeGap(start, first, null, first.station.minus(start.from));
  for (const [index, bolt] of bolts.entries()) {
    const next = bolts[index + 1];
    if (next !== undefined) judgeGap(run.find(({ to }) => bolt.station.compare(to) <= 0), bolt, next, next.station.minus(bolt.station));
  }
  if (limits.endMaximum === null && limits.wallEndMaximum === null) judgeGap(end, last, null, end.to.minus(last.station));
  return found;
}

/** One bolt in the centre third of the piece; others beside it may stand anywhere. */
function judgeShortWall(exception: Rule["shortWalls"][number], piece: Piece, bolts: readonly Bolt[]): Violation[] {
  const third = piece.to.minus(piece.from).over(3);
  if (bolts.length === 0) return [violation("too-few", "add-anchor", { piece, ...from(exception), limit: 1, actual: 0 })];
  const distances = bolts.map((bolt) => ({ bolt, distance: nearerEnd(piece, bolt)[0] }));
  const best = distances.reduce((a, b) => (b.distance.compare(a.distance) > 0 ? b : a));
  return best.distance.compare(third) >= 0 ? [] : [violation("near-end", "add-anchor", { piece, bolt: best.bolt, ...from(exception), limit: third, actual: best.distance })];
}

/** What a bolt is judged by on its own: across the plate, under members, above the concrete, its size. */
function judgeBolt(wall: Wall, bolt: Bolt, piece: Piece): Violation[] {
  const { rule, plateWidth, centres } = wall;
  const found: Violation[] = [];
  if (rule.middleThird.value === true && plateWidth !== null && bolt.offset !== null) {
    const [low, high] = [plateWidth.over(3), plateWidth.times(2).over(3)];
    const bound = bolt.offset.compare(low) < 0 ? low : bolt.offset.compare(high) > 0 ? high : null;
    if (bound !== null) found.push(violation("middle-third", "add-anchor", { piece, bolt, ...from(rule.middleThird), limit: bound, actual: bolt.offset }));
  }
  if (rule.edgeCover.value !== null && bolt.slabOffset !== null) {
    const cover = bolt.slabOffset.minus(bolt.diameter.over(2));
    if (cover.compare(rule.edgeCover.value) < 0) found.push(violation("slab-edge", "ask-engineer", { piece, bolt, ...from(rule.edgeCover), limit: rule.edgeCover.value, actual: cover }));
  }
  const reach = wall.reach(bolt.diameter);
  const nearest = nearestMember(centres, bolt.station);
  if (nearest !== null && nearest.compare(reach) < 0) found.push(violation("under-joist", "move-joist", { piece, bolt, limit: reach, actual: nearest, status: "practice" }));
  const needed = wall.neededProjection(bolt.diameter);
  if (bolt.projection !== null && bolt.projection.compare(needed) < 0) found.push(violation("too-short", "extend-bolt", { piece, bolt, limit: needed, actual: bolt.projection, status: "practice" }));
  if (rule.diameter.value !== null && !isThickEnough(bolt.diameter, rule.diameter.value)) found.push(violation("diameter", "thicker-anchor", { piece, bolt, ...from(rule.diameter), limit: rule.diameter.value, actual: bolt.diameter }));
  return found;
}

/** A bolt that stands where the rule wants one and can be used there; what can be cured at the bolt itself is no bar. */
export function isSound(bolt: Bolt, violations: readonly Violation[]): boolean {
  const incurable: readonly FindingCode[] = ["near-end", "middle-third", "slab-edge", "diameter", "off-piece"];
  return !violations.some((found) => found.bolt === bolt && incurable.includes(found.code));
}
