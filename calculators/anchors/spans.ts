/** Stretches of a wall in whole ticks, closed at both ends, in order and apart from each other. A single mark is a stretch of no length. */
export type Span = readonly [low: number, high: number];

/** What is left of the stretches when everything nearer to `centre` than `half` is taken out; exactly `half` away stays. */
export function without(spans: readonly Span[], centre: number, half: number): Span[] {
  if (half <= 0) return [...spans];
  const [from, to] = [centre - half, centre + half];
  return spans.flatMap(([low, high]): Span[] => {
    if (high <= from || low >= to) return [[low, high]];
    const parts: Span[] = [];
    if (low <= from) parts.push([low, from]);
    if (high >= to) parts.push([to, high]);
    return parts;
  });
}

/** The last place at or before `at`, or null. */
export function lastUpTo(spans: readonly Span[], at: number): number | null {
  for (let index = spans.length - 1; index >= 0; index -= 1) {
    const [low, high] = spans[index]!;
    if (low <= at) return Math.min(high, at);
  }
  return null;
}

/** The place nearest to `at`, or null where there is none. */
export function nearestTo(spans: readonly Span[], at: number): number | null {
  let best: number | null = null;
  for (const [low, high] of spans) {
    const place = Math.min(Math.max(at, low), high);
    if (best === null || Math.abs(place - at) < Math.abs(best - at)) best = place;
  }
  return best;
}

export function contains(spans: readonly Span[], at: number): boolean {
  return spans.some(([low, high]) => low <= at && at <= high);
}

/** Those parts of the stretches that lie within `[from, to]`. */
export function within(spans: readonly Span[], from: number, to: number): Span[] {
  return spans.flatMap(([low, high]): Span[] => (high < from || low > to ? [] : [[Math.max(low, from), Math.min(high, to)]]));
}

/** The multiples of `step` from `start` that lie in the stretches, each a stretch of its own. */
export function marksWithin(spans: readonly Span[], start: number, step: number): Span[] {
  return spans.flatMap(([low, high]): Span[] => {
    const marks: Span[] = [];
    for (let mark = start + Math.ceil((low - start) / step) * step; mark <= high && marks.length < 2000; mark += step) marks.push([mark, mark]);
    return marks;
  });
}
