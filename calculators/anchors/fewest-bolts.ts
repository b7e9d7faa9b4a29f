import { contains, lastUpTo, nearestTo, type Span } from "./spans";

/** What the bolts of a wall must satisfy, in whole ticks. */
export interface Demand {
  /** Bolts that stand already and count. */
  standing: readonly number[];
  /** Where one may be added. */
  allowed: readonly Span[];
  /** Greatest distance between neighbours within a run of touching pieces. */
  spacing: number | null;
  runs: readonly Span[];
  /** Each stretch must hold so many bolts. */
  needs: readonly Need[];
  /** Added bolts stand at least this far apart. */
  apart: number;
}

export interface Need {
  low: number;
  high: number;
  count: number;
}

export interface Placement {
  added: number[];
  /** What no bolts in the allowed places can satisfy. */
  unmet: (Need | { after: number })[];
}

/** A place for one more bolt: no further along than `deadline`, not before `low`. `ahead`: for the sake of a need still further along. */
type Gap = { deadline: number; low: number; after: number; ahead: boolean } | { deadline: number; low: number; need: Need };

/**
 * The fewest bolts to add so that every need and the spacing are met.
 *
 * Method: take the demand whose last chance comes first, and place a bolt as far along as that allows. It is the fewest:
 * in any solution the bolt that meets this demand stands no further along, and moving it up to here can only help what
 * follows. (A test compares with trying everything.) Demands that nothing can meet are set aside and named.
 */
export function fewestBolts(demand: Demand): Placement {
  const added: number[] = [];
  const unmet: Placement["unmet"] = [];
  const given = new Set<string>();
  for (let round = 0; round < 5000; round += 1) {
    const gap = firstGap(demand, added, given);
    if (gap === null) break;
    const place = lastFree(demand, added, gap.deadline);
    if (place !== null && place >= gap.low) {
      added.push(place);
    } else {
      given.add(keyOf(gap));
      if ("need" in gap) unmet.push(gap.need);
      else if (!gap.ahead) unmet.push({ after: gap.after });
    }
  }
  return { added: added.sort((a, b) => a - b), unmet };
}

const keyOf = (gap: Gap) => ("need" in gap ? `need ${gap.need.low} ${gap.need.high}` : `${gap.ahead ? "ahead" : "gap"} ${gap.after}`);

function firstGap(demand: Demand, added: readonly number[], given: ReadonlySet<string>): Gap | null {
  const { standing, spacing, runs, needs, apart } = demand;
  const all = [...standing, ...added].sort((a, b) => a - b);
  const afterBolt = (bolt: number) => bolt + (added.includes(bolt) ? apart : 1);
  let first: Gap | null = null;
  const offer = (gap: Gap) => {
    if ((first === null || gap.deadline < first.deadline) && !given.has(keyOf(gap))) first = gap;
  };
  for (const need of needs) {
    if (countWithin(all, need.low, need.high) >= need.count) continue;
    const run = runs.find(([start, end]) => need.high >= start && need.high <= end);
    const last = run === undefined ? undefined : all.findLast((bolt) => bolt >= run[0] && bolt <= run[1]);
    if (spacing === null || last === undefined || last + spacing >= need.high) {
      offer({ deadline: need.high, low: need.low, need });
      continue;
    }
    // A bolt further along than one spacing from the last needs another between: that one comes first.
    const step: Gap = { deadline: last + spacing, low: afterBolt(last), after: last, ahead: true };
    const back = lastFree(demand, added, last);
    if (!given.has(keyOf(step))) offer(step);
    else offer({ deadline: back !== null && back >= need.low ? last : need.high, low: need.low, need });
  }
  if (spacing === null) return first;
  for (const [start, end] of runs) {
    const past = firstFrom(all, end + 1);
    for (let index = firstFrom(all, start) + 1; index < past; index += 1) {
      const before = all[index - 1]!;
      if (all[index]! - before > spacing) offer({ deadline: before + spacing, low: afterBolt(before), after: before, ahead: false });
    }
  }
  return first;
}

/** The last allowed place up to a deadline that keeps its distance from the bolts already added. */
function lastFree({ allowed, apart }: Demand, added: readonly number[], deadline: number): number | null {
  let place = lastUpTo(allowed, deadline);
  for (let round = 0; place !== null && round <= added.length; round += 1) {
    const here: number = place;
    const near = added.find((bolt) => Math.abs(bolt - here) < apart);
    if (near === undefined) return here;
    place = lastUpTo(allowed, near - apart);
  }
  return place;
}

/** How many of the bolts in order stand in [low, high]. */
function countWithin(bolts: readonly number[], low: number, high: number): number {
  return Math.max(0, firstFrom(bolts, high + 1) - firstFrom(bolts, low));
}

function firstFrom(bolts: readonly number[], place: number): number {
  let [low, high] = [0, bolts.length];
  while (low < high) {
    const middle = (low + high) >> 1;
    if (bolts[middle]! < place) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** Whether these bolts meet every need and the spacing. */
export function isMet(demand: Demand, added: readonly number[]): boolean {
  return firstGap(demand, added, new Set()) === null;
}

/**
 * The same number of bolts, moved toward even distances as far as every demand allows, on marks of `step` where they
 * may stand. `ideal` says where a bolt without a neighbour on one side would best stand.
 */
export function evenOut(demand: Demand, { added, unmet }: Placement, step: number, ideal: (bolt: number, left: number | null, right: number | null) => number): number[] {
  if (unmet.length > 0 || added.length === 0) return added;
  const bolts = [...added];
  for (let sweep = 0; sweep < 10; sweep += 1) {
    let moved = false;
    for (let index = 0; index < bolts.length; index += 1) {
      const current = bolts[index]!;
      const others = [...demand.standing, ...bolts.filter((_, other) => other !== index)].sort((a, b) => a - b);
      const left = others.findLast((bolt) => bolt < current) ?? null;
      const right = others.find((bolt) => bolt > current) ?? null;
      const wanted = Math.round(ideal(current, left, right) / step) * step;
      const place = contains(demand.allowed, wanted) ? wanted : nearestTo(demand.allowed, wanted);
      if (place === null || place === current || Math.abs(place - wanted) >= Math.abs(current - wanted)) continue;
      if ((left !== null && place <= left) || (right !== null && place >= right)) continue;
      const trial = bolts.with(index, place);
      const crowds = trial.some((bolt, other) => other !== index && Math.abs(bolt - place) < demand.apart);
      if (crowds || !isMet(demand, trial)) continue;
      bolts[index] = place;
      moved = true;
    }
    if (!moved) break;
  }
  return bolts;
}
