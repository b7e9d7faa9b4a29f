import type { BoardKind } from "./board-problem";

/**
 * The least cost of boards that hold `need` in all, as if pieces could be cut anywhere: no plan is cheaper, wherever the
 * joints stand. Null when all boards together do not hold it.
 *
 * Exact; when more than `nodes` steps would be needed, the bound of the fractional problem, rounded up.
 */
export function materialBound(kinds: readonly BoardKind[], need: number, costs: readonly number[], nodes = 200_000): number | null {
  if (need <= 0) return 0;
  const order = kinds.map((_, index) => index).sort((a, b) => costs[a]! / kinds[a]!.capacity - costs[b]! / kinds[b]!.capacity || kinds[b]!.capacity - kinds[a]!.capacity);
  if (order.reduce((sum, index) => sum + kinds[index]!.capacity * kinds[index]!.count, 0) < need) return null;
  let best = Infinity;
  let steps = 0;
  /** What the rest costs at least, boards divisible. */
  const fractional = (place: number, left: number): number => {
    let cost = 0;
    for (let index = place; index < order.length && left > 0; index += 1) {
      const kind = kinds[order[index]!]!;
      const share = Math.min(left, kind.capacity * kind.count);
      cost += (share * costs[order[index]!]!) / kind.capacity;
      left -= share;
    }
    return left > 0 ? Infinity : cost;
  };
  const search = (place: number, left: number, cost: number): void => {
    if (left <= 0) {
      best = Math.min(best, cost);
      return;
    }
    steps += 1;
    if (place === order.length || steps > nodes || cost + fractional(place, left) > best - 1 + 1e-6) return;
    const kind = kinds[order[place]!]!;
    const most = Math.min(kind.count, Math.ceil(left / kind.capacity));
    for (let take = most; take >= 0; take -= 1) search(place + 1, left - take * kind.capacity, cost + take * costs[order[place]!]!);
  };
  search(0, need, 0);
  const least = Math.ceil(fractional(0, need) - 1e-6);
  return steps > nodes ? least : best;
}

/** The fewest boards that hold `need` at no more than `budget`; a bound on the number of boards of any plan that cheap. */
export function fewestBoards(kinds: readonly BoardKind[], need: number, budget: number, nodes = 100_000): number {
  const order = kinds.map((_, index) => index).sort((a, b) => kinds[b]!.capacity - kinds[a]!.capacity);
  const cheapestRate = Math.min(...kinds.map((kind) => kind.cost / kind.capacity));
  let best = Infinity;
  let steps = 0;
  const search = (place: number, left: number, money: number, boards: number): void => {
    if (left <= 0) {
      best = Math.min(best, boards);
      return;
    }
    steps += 1;
    if (place === order.length || steps > nodes) return;
    const kind = kinds[order[place]!]!;
    if (boards + Math.ceil(left / kind.capacity) >= best || left * cheapestRate > money + 1e-6) return;
    const most = Math.min(kind.count, Math.ceil(left / kind.capacity), kind.cost > 0 ? Math.floor(money / kind.cost) : Infinity);
    for (let take = most; take >= 0; take -= 1) search(place + 1, left - take * kind.capacity, money - take * kind.cost, boards + take);
  };
  search(0, need, budget, 0);
  const largest = kinds[order[0]!]!.capacity;
  return steps > nodes || !Number.isFinite(best) ? Math.ceil(need / largest) : best;
}
