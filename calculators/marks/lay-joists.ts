import { Length, printExact } from "../length";
import { CalculationError } from "../schema";

export interface Joist {
  kind: "first" | "layout" | "tight" | "last";
  /** Near edge. */
  mark: Length;
}

export interface JoistLine {
  length: Length;
  spacing: Length;
  thickness: Length;
  /** Centre of the first one after the end. */
  first: Length;
  most: number;
}

/**
 * The joists of one line: one flush with each end, the rest centred at `first` and every spacing on. Each mark is counted
 * from the end, so that nothing adds up. One that would overlap the last joist stands tight against it when the bay
 * would be too wide without it; else it is left out.
 *
 * @throws CalculationError `too-many-marks`, `shorter-than-joists`.
 */
export function layJoists({ length, spacing, thickness, first, most }: JoistLine): Joist[] {
  if (length.compare(thickness.times(2)) < 0) throw new CalculationError([{ pointer: "/length", code: "shorter-than-joists", params: { least: printExact(thickness.times(2)) } }]);
  if (length.minus(first).inches.div(spacing.inches).compare(most) > 0) throw new CalculationError([{ pointer: "/spacing", code: "too-many-marks", params: { maximum: most } }]);
  const half = thickness.over(2);
  const lastMark = length.minus(thickness);
  const layout: Joist[] = [];
  let index = 0;
  for (; ; index += 1) {
    const mark = first.plus(spacing.times(index)).minus(half);
    if (mark.plus(thickness).compare(lastMark) > 0) break;
    // Against the first joist there is no room for another.
    if (mark.compare(thickness) >= 0) layout.push({ kind: "layout", mark });
  }
  const reached = layout.at(-1)?.mark ?? Length.zero;
  const tight = lastMark.minus(thickness);
  const isTooWide = lastMark.minus(reached).compare(spacing) > 0;
  if (isTooWide && tight.compare(reached.plus(thickness)) >= 0) layout.push({ kind: "tight", mark: tight });
  return [{ kind: "first", mark: Length.zero }, ...layout, { kind: "last", mark: lastMark }];
}
