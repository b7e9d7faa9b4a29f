import { bowAt, type SlabSide } from "./plan";

export interface InsetAlong {
  /** Breakpoints: between them the inset runs straight. */
  knots: { station: number; inset: number }[];
}

export interface Stretch {
  from: number;
  to: number;
  stands: "proud" | "shy";
  most: number;
}

/** The inset along one wall, from the foot of its first chalk corner to that of its second. */
export function insetAlong(side: SlabSide, first: { station: number; offset: number }, second: { station: number; offset: number }): InsetAlong["knots"] {
  const straight = (station: number) => first.offset + ((station - first.station) / (second.station - first.station)) * (second.offset - first.offset);
  const between = side.bows.map(({ station }) => station).filter((station) => station > first.station && station < second.station);
  const read = [...between].map((station) => ({ station, inset: straight(station) + bowAt(side, station) }));
  return [{ station: first.station, inset: first.offset }, ...read, { station: second.station, inset: second.offset }];
}

/** Where the inset departs from the wanted one by more than `tolerance`, as stretches of one kind each. */
export function stretchesOf(knots: InsetAlong["knots"], wanted: number, tolerance: number): Stretch[] {
  const found: Stretch[] = [];
  knots.slice(1).forEach((end, index) => {
    const start = knots[index]!;
    for (const stands of ["proud", "shy"] as const) {
      const sign = stands === "shy" ? 1 : -1;
      const [low, high] = [start, end].map(({ inset }) => sign * (inset - wanted)) as [number, number];
      if (Math.max(low, high) <= tolerance) continue;
      const at = (level: number) => start.station + ((level - low) / (high - low)) * (end.station - start.station);
      found.push({ from: low > tolerance ? start.station : at(tolerance), to: high > tolerance ? end.station : at(tolerance), stands, most: Math.max(low, high) });
    }
  });
  return found
    .sort((a, b) => a.from - b.from)
    .reduce<Stretch[]>((joined, stretch) => {
      const last = joined.at(-1);
      if (last === undefined || last.stands !== stretch.stands || stretch.from - last.to > 1e-9) return [...joined, stretch];
      return [...joined.slice(0, -1), { ...last, to: stretch.to, most: Math.max(last.most, stretch.most) }];
    }, []);
}
