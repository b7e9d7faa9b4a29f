import { weights, type BoardPlan, type BoardProblem, type GoOn } from "./board-problem";
import { groupBySize } from "./greedy-pack";
import { fewestBoards, materialBound } from "./material-bound";
import { bigPiecePrices, pricedBound, risingPrices } from "./priced-bound";
import { relaxation } from "./relaxation";
import { Search } from "./search";

export interface BoardsAnswer {
  /** Null when the stock does not suffice, or no plan was found. */
  plan: BoardPlan | null;
  cost: number;
  /** What the material alone costs at least; null when all boards together hold too little. */
  material: number | null;
  /** No plan costs less. At least `material`; `cost` when that is proved best. */
  bound: number;
  costProved: boolean;
  /** No plan costs as little with fewer boards. */
  countProved: boolean;
  /** Without a plan: true when it is proved that there is none. */
  impossible: boolean;
}

export interface BoardOptions {
  /** False ends the search with the best plan so far. */
  goOn: GoOn;
  /** Fresh starts at most. */
  starts: number;
  onBetter?: (cost: number, bound: number) => void;
}

/** Pieces of which every sharing-out can still be looked at. */
const fewEnough = 12;

/**
 * Stage 2: the cheapest boards, then the fewest, with the joints free in their windows. The plan is the best found until
 * `goOn` ends it or a bound proves it best; the bounds hold wherever the joints stand.
 */
export function planBoards(problem: BoardProblem, { goOn, starts, onBetter }: BoardOptions): BoardsAnswer {
  const { kinds, stretches, kerf } = problem;
  const pieces = stretches.reduce((sum, stretch) => sum + (stretch.ways[0]?.length ?? 0) + 1, 0);
  const costs = kinds.map((kind) => kind.cost);
  const need = stretches.reduce((sum, stretch) => sum + stretch.to - stretch.from, 0) + pieces * kerf;
  const material = materialBound(kinds, need, costs);
  if (material === null) return { plan: null, cost: 0, material, bound: 0, costProved: false, countProved: false, impossible: true };
  const step = costs.reduce(greatestDivisor);
  const search = new Search(problem, weights(kinds, pieces));
  const single = kinds.map((kind) => ({ ...kind, cost: 1 }));
  const leastCount = Math.ceil(pricedBound({ ...problem, kinds: single }, bigPiecePrices(single)) - 1e-6);
  const countAt = (cost: number) => Math.max(leastCount, fewestBoards(kinds, need, cost));
  let bound = material;
  let floor = 0;
  const raise = (found: number) => {
    bound = Math.max(bound, Math.ceil(found / step - 1e-6) * step);
    floor = bound * (pieces + 1) + countAt(bound);
  };
  raise(pricedBound(problem, bigPiecePrices(kinds)));
  search.attemptFirst({ floor, rounds: 200, goOn, seed: 1 });
  const told = () => onBetter?.(search.cost(), bound);
  told();
  const pricesOfBest = () => {
    const groups = groupBySize(search.sizes).map((group) => ({ size: group.size, count: group.pieces.length }));
    const relaxed = relaxation(groups, kinds, costs, goOn);
    const isFixed = stretches.every((stretch) => stretch.complete && stretch.ways.length === 1 && stretch.ways[0]!.length === 0);
    raise(isFixed ? relaxed.bound : pricedBound(problem, risingPrices(groups.map((group, index) => ({ size: group.size, worth: relaxed.prices[index]! })))));
  };
  if (search.best !== null && search.weight > floor) pricesOfBest();
  const everything = pieces <= fewEnough && search.weight > floor && search.everyPlan(floor, goOn);
  for (let start = 0; start < starts && !everything && search.weight > floor && goOn(); start += 1) {
    search.attemptOther({ floor, rounds: 100 + 50 * start, goOn, seed: start + 2 });
    if (start === 1 && search.best !== null) pricesOfBest();
    told();
  }
  const plan = search.best;
  if (plan === null) return { plan, cost: 0, material, bound, costProved: false, countProved: false, impossible: everything };
  const cost = search.cost();
  const costProved = everything || cost <= bound;
  const countProved = everything || (costProved && plan.boards.length <= countAt(cost));
  return { plan, cost, material, bound: costProved ? cost : bound, costProved, countProved, impossible: false };
}

function greatestDivisor(a: number, b: number): number {
  while (b !== 0) [a, b] = [b, a % b];
  return Math.max(1, a);
}
