import { remainingWays, type LeastCost, type PieceGraph } from "./best-joints";
import type { Interval } from "./intervals";
import type { PieceLimits } from "./stretch";
import { image, type Zone } from "./zone";

/** One way to joint a stretch at the least cost: each joint's window, in which it may stand whatever the other joints do in theirs. */
export type JointWindows = readonly Interval[];

/** Ways beyond these are not looked at; the answer then no longer claims that no other could save a board. */
export const mostWays = 200;

/**
 * The different ways to joint a stretch at the least cost, each as its joints' windows. `complete` is false when there
 * are more than `mostWays`, or when joints that depend on one another had to be given narrower windows than they have together.
 *
 * Within the windows every piece keeps the rule and its least length; that it is no longer than a board is left to
 * the cutting, which knows the boards.
 */
export function jointWindows(graph: PieceGraph, limits: PieceLimits, cost: LeastCost): { ways: JointWindows[]; complete: boolean } {
  const remaining = remainingWays(graph);
  const last = graph.places.length - 1;
  const ways: JointWindows[] = [];
  const seen = new Set<string>();
  let complete = true;
  let full = false;
  const walk = (place: number, from: Interval, added: number, pieces: number, zones: Zone[]): void => {
    if (place === last) {
      const found = independentWindows(zones, graph.stretch.from, graph.stretch.to, limits.longest);
      if (found === null) return;
      const { windows, narrowed } = found;
      if (narrowed) complete = false;
      if (seen.has(windows.join())) return;
      if (ways.length >= mostWays) {
        complete = false;
        full = true;
        return;
      }
      seen.add(windows.join());
      ways.push(windows);
      return;
    }
    for (const { to, way } of graph.pieces[place]!) {
      if (ways.length >= mostWays && full) return;
      for (const next of remaining(to, added - way.added, pieces - 1)) {
        const reached = image(way.ends, from);
        if (reached === null) continue;
        const both: Interval = [Math.max(reached[0], next[0]), Math.min(reached[1], next[1])];
        if (both[0] <= both[1]) walk(to, both, added - way.added, pieces - 1, [...zones, { ...way.ends, b: [Math.max(way.ends.b[0], both[0]), Math.min(way.ends.b[1], both[1])] }]);
      }
    }
  };
  walk(0, graph.places[0]!.within, cost.added, cost.pieces, []);
  return { ways, complete };
}

/**
 * Windows that do not depend on one another, out of the zones of the pieces in a row: bounds are first made as tight as
 * their neighbours make them, then where two joints could come too near or stand too far apart each window gives way
 * by half. Null when the zones leave no joints at all.
 */
function independentWindows(zones: readonly Zone[], from: number, to: number, longest: number): { windows: JointWindows; narrowed: boolean } | null {
  const low = [from, ...zones.slice(1).map((zone, index) => Math.max(zone.a[0], zones[index]!.b[0])), to];
  const high = [from, ...zones.slice(1).map((zone, index) => Math.min(zone.a[1], zones[index]!.b[1])), to];
  const tighten = (): boolean => {
    for (let index = 1; index < low.length; index += 1) {
      low[index] = Math.max(low[index]!, low[index - 1]! + zones[index - 1]!.apart[0]);
      high[index] = Math.min(high[index]!, high[index - 1]! + zones[index - 1]!.apart[1]);
    }
    for (let index = low.length - 2; index >= 0; index -= 1) {
      low[index] = Math.max(low[index]!, low[index + 1]! - zones[index]!.apart[1]);
      high[index] = Math.min(high[index]!, high[index + 1]! - zones[index]!.apart[0]);
    }
    return low.every((value, index) => value <= high[index]!);
  };
  if (!tighten()) return null;
  let narrowed = false;
  for (let changed = true; changed; ) {
    changed = false;
    for (let index = 0; index < zones.length; index += 1) {
      const [least, most] = zones[index]!.apart;
      const tooNear = least - (low[index + 1]! - high[index]!);
      if (tooNear > 0) {
        const [first, second] = shares(tooNear, high[index]! - low[index]!, high[index + 1]! - low[index + 1]!);
        high[index]! -= first;
        low[index + 1]! += second;
        changed = true;
      }
      const tooFar = most >= longest ? 0 : high[index + 1]! - low[index]! - most;
      if (tooFar > 0) {
        const [first, second] = shares(tooFar, high[index]! - low[index]!, high[index + 1]! - low[index + 1]!);
        low[index]! += first;
        high[index + 1]! -= second;
        changed = true;
      }
      narrowed ||= changed;
      if (changed && !tighten()) return null;
    }
  }
  return { windows: low.slice(1, -1).map((value, index): Interval => [value, high[index + 1]!]), narrowed };
}

/** Splits what two windows must give up together, no window more than it has. */
function shares(amount: number, first: number, second: number): [number, number] {
  const half = Math.min(first, Math.floor(amount / 2));
  const rest = Math.min(second, amount - half);
  return [amount - rest, rest];
}
