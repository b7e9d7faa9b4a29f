import Fraction from "fraction.js";
import { Length } from "../length";
import type { PlatesAnswer } from "../plates/answer";
import { CalculationError, type Issue } from "../schema";
import type { TakeoffInput } from "./input";

/** What there is to order for, whichever way it came. */
export interface Quantities {
  /** Longest first. */
  lumber: readonly { length: Length; count: number }[];
  plateLength: Length;
  plateLengthAssumed: boolean;
  pieces: number;
  bolts: number;
  boltsToCast: number;
  newAnchors: number;
  plateWashers: boolean;
  holes: number;
  diameter: Length | null;
}

/**
 * From a plates answer, or from quantities typed.
 *
 * @throws CalculationError `plates-or-lumber` when neither or both came, `plates-incomplete` when an answer lacks a part.
 */
export function quantitiesOf(input: TakeoffInput): Quantities {
  const beside = input.boards !== undefined || input.pieces !== undefined;
  const ways = [input.plates !== undefined, beside, input.lumber !== undefined].filter(Boolean).length;
  if (ways !== 1) throw new CalculationError([{ pointer: "/lumber", code: "plates-or-lumber", params: {} }]);
  if (input.lumber !== undefined) return typed(input, input.lumber);
  if (input.plates !== undefined) return ofPlates(input, input.plates);
  const lacking = (["boards", "pieces", "addedAnchors"] as const).filter((name) => input[name] === undefined);
  if (lacking.length > 0) throw new CalculationError(lacking.map((name): Issue => ({ pointer: `/${name}`, code: "required", params: {} })));
  return ofPlates(input, { boards: input.boards!, pieces: input.pieces!, addedAnchors: input.addedAnchors!, washer: input.washer ?? null, limits: input.limits });
}

type Needed = Pick<PlatesAnswer, "boards" | "pieces" | "addedAnchors"> & { washer: PlatesAnswer["washer"]; limits?: PlatesAnswer["limits"] | undefined };

function ofPlates(input: TakeoffInput, { boards, pieces, addedAnchors, washer, limits }: Needed): Quantities {
  const counts = new Map<string, number>();
  for (const { stock } of boards) counts.set(exactOf(stock), (counts.get(exactOf(stock)) ?? 0) + 1);
  const holes = pieces.flatMap((piece) => piece.holes);
  return {
    lumber: longestFirst([...counts].map(([exact, count]) => ({ length: lengthOf(exact), count }))),
    plateLength: pieces.reduce((sum, { length }) => sum.plus(lengthOf(exactOf(length))), Length.zero),
    plateLengthAssumed: false,
    pieces: pieces.length,
    bolts: holes.filter(({ kind }) => kind !== "added").length,
    boltsToCast: input.boltsToCast ?? 0,
    newAnchors: addedAnchors.length,
    plateWashers: input.plateWashers ?? washer !== null,
    holes: holes.length,
    diameter: limits === undefined ? null : lengthOf(exactOf(limits.diameter)),
  };
}

function typed(input: TakeoffInput, lumber: NonNullable<TakeoffInput["lumber"]>): Quantities {
  const counts = new Map<string, { length: Length; count: number }>();
  for (const { length, count } of lumber) counts.set(length.toString(), { length, count: count + (counts.get(length.toString())?.count ?? 0) });
  const boards = longestFirst([...counts.values()]);
  const bolts = (input.bolts ?? 0) + (input.boltsToCast ?? 0);
  return {
    lumber: boards,
    plateLength: input.plateLength ?? boards.reduce((sum, { length, count }) => sum.plus(length.times(count)), Length.zero),
    plateLengthAssumed: input.plateLength === undefined,
    pieces: input.pieceCount ?? boards.reduce((sum, { count }) => sum + count, 0),
    bolts: input.bolts ?? 0,
    boltsToCast: input.boltsToCast ?? 0,
    newAnchors: input.newAnchors ?? 0,
    plateWashers: input.plateWashers ?? false,
    holes: bolts + (input.newAnchors ?? 0),
    diameter: null,
  };
}

const longestFirst = <Entry extends { length: Length }>(entries: Entry[]) => entries.sort((a, b) => b.length.compare(a.length));
const exactOf = (length: { exact: string | null; in: number }) => length.exact ?? String(length.in);
const lengthOf = (exact: string) => Length.from(new Fraction(exact));
