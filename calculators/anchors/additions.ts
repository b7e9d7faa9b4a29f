import { Length } from "../length";
import { spacingFor } from "../rules";
import { evenOut, fewestBolts, type Demand, type Need } from "./fewest-bolts";
import { isSound, type Violation, type Wall } from "./judge";
import { endDistanceWithin } from "./limits";
import { without, type Span } from "./spans";
import { runsOf, type Bolt, type Piece } from "./survey";
import { Ticks } from "./ticks";

export interface Additions {
  added: { piece: Piece; station: Length }[];
  /** Pieces that nothing added can put right. */
  unfixable: { piece: Piece; tooShort: boolean }[];
}

interface AdditionOptions {
  /** Every bolt in the concrete, engineered ones too: a new hole keeps clear of them. */
  inConcrete: readonly Bolt[];
  clearOfBolts: Length;
  endDistance: Length | undefined;
  /** Stations are moved to whole marks of this where they may be. */
  mark: Length;
}

/**
 * The fewest added anchors that satisfy the rule beside the sound bolts, and where (see `fewestBolts`; then evened out).
 * They keep clear of members and of what stands in the concrete. The strictest spacing of the bolts present holds.
 */
export function fewestAdditions(wall: Wall, violations: readonly Violation[], options: AdditionOptions): Additions {
  const { pieces, limits, exception } = wall;
  if (exception?.bolts === 0) return { added: [], unfixable: [] };
  const sound = wall.bolts.filter((bolt) => isSound(bolt, violations));
  const spacing = strictestSpacing(wall, sound);
  const reach = wall.reach(limits.diameter);
  const thirds = pieces.map(({ from, to }) => to.minus(from).over(3));
  const ends = options.endDistance ?? endDistanceWithin(limits.endMinimum, limits.wallEndMaximum);
  const figures = [spacing, limits.endMinimum, limits.endMaximum, limits.wallEndMaximum, limits.diameter, reach, options.clearOfBolts, options.mark, ends];
  const ticks = new Ticks([...pieces.flatMap(({ from, to }) => [from, to]), ...thirds, ...wall.centres, ...options.inConcrete.map(({ station }) => station), ...figures.filter((figure): figure is Length => figure instanceof Length)]);

  const demand: Demand = {
    standing: sound.map(({ station }) => ticks.floor(station)),
    allowed: allowedSpans(wall, options, reach, ticks),
    spacing: spacing === null || exception !== null ? null : ticks.floor(spacing),
    runs: runsOf(pieces).map((run): Span => [ticks.ceil(run[0]!.from), ticks.floor(run.at(-1)!.to)]),
    needs: needsOf(wall, spacing, ticks),
    apart: Math.max(1, ticks.ceil(limits.diameter)),
  };
  const placement = fewestBolts(demand);
  const endTicks = ticks.floor(ends);
  const evened = evenOut(demand, placement, Math.max(1, ticks.floor(options.mark)), (bolt, left, right) => {
    const { from, to } = pieceAt(pieces, ticks, bolt);
    const [start, end] = [ticks.ceil(from), ticks.floor(to)];
    if (left !== null && left >= start && right !== null && right <= end) return (left + right) / 2;
    if ((left === null || left < start) && (right === null || right > end)) return (start + end) / 2;
    return left === null || left < start ? start + endTicks : end - endTicks;
  });
  return {
    added: evened.map((tick) => ({ piece: pieceAt(pieces, ticks, tick), station: ticks.toLength(tick) })),
    unfixable: unfixableOf(wall, placement.unmet, ticks),
  };
}

/** A rule met already by an exception asks for no more; else the needs are those of the rule. */
function needsOf({ pieces, limits, exception, rule }: Wall, spacing: Length | null, ticks: Ticks): Need[] {
  const needs: Need[] = [];
  pieces.forEach((piece, place) => {
    const touches = pieces[place - 1]?.to.equals(piece.from) === true; // a bolt at a joint is the earlier piece's
    const [low, high] = [ticks.ceil(piece.from) + (touches ? 1 : 0), ticks.floor(piece.to)];
    if (exception !== null) {
      const third = piece.to.minus(piece.from).over(3);
      needs.push({ low: ticks.ceil(piece.from.plus(third)), high: ticks.floor(piece.to.minus(third)), count: 1 });
      return;
    }
    if (limits.boltsPerPiece !== null && limits.boltsPerPiece > 0) needs.push({ low, high, count: limits.boltsPerPiece });
    const first = place === 0 ? limits.wallEndMaximum : limits.endMaximum;
    const last = place === pieces.length - 1 ? limits.wallEndMaximum : limits.endMaximum;
    if (first !== null) needs.push({ low, high: Math.min(high, ticks.floor(piece.from.plus(first))), count: 1 });
    if (last !== null) needs.push({ low: Math.max(low, ticks.ceil(piece.to.minus(last))), high, count: 1 });
  });
  if (exception !== null || spacing === null) return needs;
  for (const run of runsOf(pieces)) {
    const [start, end] = [run[0]!.from, run.at(-1)!.to];
    const [low, high] = [ticks.ceil(start), ticks.floor(end)];
    if (limits.boltsPerPiece === null) needs.push({ low, high, count: 1 });
    if (limits.endMaximum !== null || limits.wallEndMaximum !== null || rule.spacing.value === null) continue;
    needs.push({ low, high: Math.min(high, ticks.floor(start.plus(spacing))), count: 1 }, { low: Math.max(low, ticks.ceil(end.minus(spacing))), high, count: 1 });
  }
  return needs;
}

function allowedSpans({ pieces, limits, centres, exception }: Wall, { inConcrete, clearOfBolts }: AdditionOptions, reach: Length, ticks: Ticks): Span[] {
  const edge = exception !== null ? Length.zero : (limits.endMinimum ?? Length.zero);
  let spans = pieces.flatMap(({ from, to }): Span[] => {
    const [low, high] = [ticks.ceil(from.plus(edge)), ticks.floor(to.minus(edge))];
    return low > high ? [] : [[low, high]];
  });
  for (const centre of centres) spans = without(spans, ticks.floor(centre), ticks.ceil(reach));
  for (const { station } of inConcrete) spans = without(spans, ticks.floor(station), ticks.ceil(clearOfBolts));
  return spans;
}

function strictestSpacing({ rule, limits }: Wall, sound: readonly Bolt[]): Length | null {
  const all = [limits.spacing, ...sound.map(({ diameter }) => spacingFor(rule, diameter)?.value ?? null)].filter((value): value is Length => value !== null);
  return all.reduce<Length | null>((least, value) => (least === null || value.compare(least) < 0 ? value : least), null);
}

function pieceAt(pieces: readonly Piece[], ticks: Ticks, tick: number): Piece {
  return pieces.find(({ to }) => tick <= ticks.floor(to)) ?? pieces.at(-1)!;
}

function unfixableOf({ pieces, limits }: Wall, unmet: readonly (Need | { after: number })[], ticks: Ticks): Additions["unfixable"] {
  const places = new Set(unmet.map((demand) => pieceAt(pieces, ticks, "after" in demand ? demand.after : demand.high)));
  return [...places].map((piece) => {
    const { endMinimum, boltsPerPiece } = limits;
    const tooShort = endMinimum !== null && (boltsPerPiece ?? 0) > 1 && piece.to.minus(piece.from).compare(endMinimum.times(2).plus(limits.diameter)) < 0;
    return { piece, tooShort };
  });
}
