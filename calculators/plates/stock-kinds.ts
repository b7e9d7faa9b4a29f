import Fraction from "fraction.js";
import { Length } from "../length";
import { CalculationError } from "../schema";
import type { BoardKind } from "./boards/board-problem";
import type { PlatesInput } from "./input";
import type { Settled } from "./settle-limits";
import type { Units } from "./units";

/** The stock as the search sees it: lengths with trim and kerf settled, prices as whole numbers. */
export interface Stock {
  kinds: readonly BoardKind[];
  /** Each kind's place in the request. */
  places: readonly number[];
  /** What a piece can be at most, per kind. */
  usable: readonly number[];
  /** One whole unit of money is this much. */
  moneyUnit: number;
}

/**
 * Boards that give something once both ends are trimmed, and of which there are any.
 *
 * @throws CalculationError `no-stock-left` when there are none.
 */
export function stockKinds(input: PlatesInput, { kerf, trim }: Settled, units: Units): Stock {
  const useful = input.stock.flatMap((entry, place) => {
    const usable = entry.length.minus(trim.times(2));
    return usable.isPositive() && entry.count !== 0 ? [{ entry, place, usable: units.whole(usable) }] : [];
  });
  if (useful.length === 0) throw new CalculationError([{ pointer: "/stock", code: "no-stock-left", params: {} }]);
  const prices = useful.map(({ entry }) => (entry.price === undefined ? entry.length.inches : new Fraction(String(entry.price))));
  const shared = prices.reduce((common, price) => (common * price.d) / greatestCommon(common, price.d), 1n);
  // Prices of more than eight decimals are money nobody has: they are rounded there.
  const scale = shared > 100_000_000n ? 100_000_000n : shared;
  const costs = prices.map((price) => Number(price.mul(scale).round().valueOf()));
  return {
    kinds: useful.map(({ entry, usable }, index) => ({ capacity: usable + units.whole(kerf), cost: costs[index]!, count: entry.count ?? Infinity })),
    places: useful.map(({ place }) => place),
    usable: useful.map(({ usable }) => usable),
    moneyUnit: 1 / Number(scale),
  };
}

function greatestCommon(a: bigint, b: bigint): bigint {
  while (b !== 0n) [a, b] = [b, a % b];
  return a;
}

/** The longest piece any board gives. */
export function longestPiece({ usable }: Stock): number {
  return Math.max(...usable);
}

export function totalLength(lengths: readonly Length[]): Length {
  return lengths.reduce((sum, length) => sum.plus(length), Length.zero);
}
