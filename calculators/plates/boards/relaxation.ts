import { bestFill, type SizeCount } from "./best-fill";
import type { BoardKind, GoOn } from "./board-problem";
import { PatternMaster, type Column } from "./pattern-master";

/** The pattern problem with boards divisible: its bound, and its prices. */
export interface Relaxation {
  /** No plan costs less. Holds whatever the arithmetic did: it is read from prices that were checked pattern by pattern. */
  bound: number;
  /** What one more piece of each size costs, at the prices of the bound. */
  prices: readonly number[];
}

/**
 * The bound of Gilmore and Gomory by column generation, made safe as Farley showed: prices are scaled down until no
 * pattern is worth more than its board, so that their sum over all pieces cannot exceed the cost of any plan.
 */
export function relaxation(sizes: readonly SizeCount[], kinds: readonly BoardKind[], costs: readonly number[], goOn: GoOn, rounds = 2_000): Relaxation {
  const limited = kinds.flatMap((kind, index) => (Number.isFinite(kind.count) ? [index] : []));
  const most = Math.max(...costs, 1);
  const lack: Column[] = sizes.map((_, row) => ({ cost: most * 8, entries: [[row, 1]] }));
  const spare: Column[] = limited.map((_, index) => ({ cost: 0, entries: [[sizes.length + index, 1]] }));
  const master = new PatternMaster([...sizes.map((entry) => entry.count), ...limited.map((kind) => kinds[kind]!.count)], [...lack, ...spare]);
  let bound = 0;
  let best: readonly number[] = sizes.map(() => 0);
  for (let round = 0; round < rounds && goOn(); round += 1) {
    const prices = master.prices();
    const surplus = cheapestSurplus(prices, sizes.length);
    if (surplus !== null) {
      if (!master.enter({ cost: 0, entries: [[surplus, -1]] })) break;
      continue;
    }
    const value = Array.from(prices.subarray(0, sizes.length), (price) => Math.max(0, price));
    const worths = kinds.map((kind) => bestFill(sizes, kind.capacity, { value, nodes: 60_000 }));
    const proven = provenBound(sizes, kinds, costs, value, worths.map((worth) => worth.bound));
    if (proven > bound) {
      bound = proven;
      best = value;
    }
    let entering = -1;
    let bestGain = 1e-7 * most;
    kinds.forEach((kind, index) => {
      const rowPrice = limited.includes(index) ? prices[sizes.length + limited.indexOf(index)]! : 0;
      const gain = worths[index]!.value + rowPrice - costs[index]!;
      if (kind.count > 0 && gain > bestGain) {
        entering = index;
        bestGain = gain;
      }
    });
    if (entering === -1) break;
    const counts = worths[entering]!.counts;
    const entries: [number, number][] = counts.flatMap((count, row): [number, number][] => (count > 0 ? [[row, count]] : []));
    if (limited.includes(entering)) entries.push([sizes.length + limited.indexOf(entering), 1]);
    if (!master.enter({ cost: costs[entering]!, entries })) break;
  }
  return { bound, prices: best };
}

function cheapestSurplus(prices: Float64Array, rows: number): number | null {
  let best: number | null = null;
  for (let row = 0; row < rows; row += 1) if (prices[row]! < -1e-9 && (best === null || prices[row]! < prices[best]!)) best = row;
  return best;
}

/** The worth of all pieces at prices that no pattern of an unlimited kind exceeds; limited kinds give back what they gain. */
function provenBound(sizes: readonly SizeCount[], kinds: readonly BoardKind[], costs: readonly number[], value: readonly number[], worths: readonly number[]): number {
  const total = sizes.reduce((sum, entry, index) => sum + entry.count * value[index]!, 0);
  const unlimited = kinds.flatMap((kind, index) => (Number.isFinite(kind.count) ? [] : [costs[index]! / Math.max(worths[index]!, 1e-300)]));
  const scale = Math.min(1, ...unlimited);
  const given = kinds.reduce((sum, kind, index) => (Number.isFinite(kind.count) ? sum + kind.count * Math.max(0, worths[index]! * scale - costs[index]!) : sum), 0);
  return (total * scale - given) * (1 - 1e-9);
}
