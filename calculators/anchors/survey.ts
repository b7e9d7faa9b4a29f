import { Length } from "../length";
import { CalculationError, type Issue } from "../schema";
import type { CheckInput } from "./check-input";

/** A plate piece, in the order along the wall; `index` is its place in the request. */
export interface Piece {
  index: number;
  from: Length;
  to: Length;
}

/** A bolt as it stands from the chalk; `index` is its place in the request. */
export interface Bolt {
  index: number;
  station: Length;
  /** From the chalk line, which is the plate's outer edge. */
  offset: Length | null;
  /** From the slab edge, where it is known. */
  slabOffset: Length | null;
  projection: Length | null;
  diameter: Length;
  engineered: boolean;
  converted: boolean;
  /** The bolt that this one repeats. */
  duplicateOf: number | null;
}

const before = { ab: "da", bc: "ab", cd: "bc", da: "cd" } as const;

/** The insets that hold at the wall's first corner: its own, and that of the wall before it. */
export function insetsAt({ inset, wall }: Pick<CheckInput, "inset" | "wall">): { own: Length; first: Length } | null {
  if (inset === undefined) return null;
  return inset instanceof Length ? { own: inset, first: inset } : { own: inset[wall], first: inset[before[wall]] };
}

/** @throws CalculationError `piece-backwards`, `pieces-overlap`. */
export function piecesInOrder(input: Pick<CheckInput, "pieces">): Piece[] {
  const issues: Issue[] = [];
  const pieces = input.pieces.map(({ from, to }, index): Piece => ({ index, from, to }));
  for (const { index, from, to } of pieces) if (from.compare(to) >= 0) issues.push({ pointer: `/pieces/${index}/to`, code: "piece-backwards", params: {} });
  pieces.sort((a, b) => a.from.compare(b.from));
  if (issues.length === 0) {
    pieces.forEach((piece, place) => {
      const previous = pieces[place - 1];
      if (previous !== undefined && piece.from.compare(previous.to) < 0) issues.push({ pointer: `/pieces/${piece.index}/from`, code: "pieces-overlap", params: { piece: piece.index + 1, other: previous.index + 1 } });
    });
  }
  if (issues.length > 0) throw new CalculationError(issues);
  return pieces;
}

/**
 * The bolts from the chalk, in order along the wall. A bolt measured from the slab moves by that corner's insets: its
 * station by the inset of the wall before, its offset by the wall's own (square corners; a racked corner adds offset × cot A,
 * below 1/64 in at half a degree and 2 in).
 *
 * @throws CalculationError `inset-needed`.
 */
export function boltsInOrder(input: CheckInput, diameter: Length): Bolt[] {
  const insets = insetsAt(input);
  const issues: Issue[] = [];
  const bolts = input.bolts.map((bolt, index): Bolt => {
    const fromSlab = bolt.from === "slab";
    if (fromSlab && insets === null) issues.push({ pointer: "/inset", code: "inset-needed", params: { bolt: index + 1 } });
    const offset = bolt.offset ?? null;
    const { own, first } = insets ?? { own: Length.zero, first: Length.zero };
    return {
      index,
      station: fromSlab ? bolt.station.minus(first) : bolt.station,
      offset: offset === null ? null : fromSlab ? offset.minus(own) : offset,
      slabOffset: offset === null ? null : fromSlab ? offset : insets === null ? null : offset.plus(own),
      projection: bolt.projection ?? null,
      diameter: bolt.diameter ?? diameter,
      engineered: bolt.engineered ?? false,
      converted: fromSlab,
      duplicateOf: null,
    };
  });
  if (issues.length > 0) throw new CalculationError(issues.slice(0, 1));
  bolts.sort((a, b) => a.station.compare(b.station) || a.index - b.index);
  return bolts.map((bolt, place) => ({ ...bolt, duplicateOf: bolts.slice(0, place).find((other) => isSame(bolt, other))?.index ?? null }));
}

/** One bolt entered twice: the same station, and no offset that tells them apart. */
function isSame(bolt: Bolt, other: Bolt): boolean {
  if (!bolt.station.equals(other.station) || bolt.engineered !== other.engineered) return false;
  return bolt.offset === null || other.offset === null || bolt.offset.equals(other.offset);
}

/** Stretches of touching pieces, as places in the ordered list. */
export function runsOf(pieces: readonly Piece[]): Piece[][] {
  const runs: Piece[][] = [];
  for (const piece of pieces) {
    const run = runs.at(-1);
    if (run !== undefined && run.at(-1)!.to.equals(piece.from)) run.push(piece);
    else runs.push([piece]);
  }
  return runs;
}

/** The piece a bolt stands on; at a joint the earlier one. */
export function pieceOf(pieces: readonly Piece[], { station }: Bolt): Piece | null {
  return pieces.find(({ from, to }) => station.compare(from) >= 0 && station.compare(to) <= 0) ?? null;
}
