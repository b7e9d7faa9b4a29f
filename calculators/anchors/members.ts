import { Length } from "../length";
import { CalculationError } from "../schema";

export interface Members {
  stations?: readonly Length[] | undefined;
  spacing?: Length | undefined;
  first?: Length | undefined;
  thickness?: Length | undefined;
  clearance?: Length | undefined;
}

const defaultThickness = Length.from(1.5);
const mostMembers = 1000;

/**
 * Centres of the joists or studs on a wall from `start` to `end`, in order.
 *
 * @throws CalculationError `too-many` at `/members/spacing` past 1000 of them.
 */
export function memberCentres(members: Members | undefined, start: Length, end: Length): Length[] {
  if (members === undefined) return [];
  const centres = [...(members.stations ?? [])];
  if (members.spacing !== undefined) {
    const { spacing, first = members.spacing } = members;
    const skipped = Math.max(0, Number(start.minus(first).inches.div(spacing.inches).ceil().valueOf()));
    const count = Number(end.minus(first).inches.div(spacing.inches).floor().valueOf()) - skipped + 1;
    if (count > mostMembers) throw new CalculationError([{ pointer: "/members/spacing", code: "too-many", params: { maximum: mostMembers } }]);
    for (let index = 0; index < count; index += 1) centres.push(first.plus(spacing.times(skipped + index)));
  }
  return centres.sort((a, b) => a.compare(b));
}

/** A bolt's centre must stand this far from a member's: half of each, and the room wanted. */
export function memberReach(members: Members | undefined, diameter: Length): Length {
  const thickness = members?.thickness ?? defaultThickness;
  return thickness.plus(diameter).over(2).plus(members?.clearance ?? Length.zero);
}

/** The distance from a station to the nearest of the centres in order; null without any. */
export function nearestMember(centres: readonly Length[], station: Length): Length | null {
  let [low, high] = [0, centres.length];
  while (low < high) {
    const middle = (low + high) >> 1;
    if (centres[middle]!.compare(station) < 0) low = middle + 1;
    else high = middle;
  }
  const [before, after] = [centres[low - 1], centres[low]];
  const distances = [before, after].flatMap((centre) => (centre === undefined ? [] : [centre.minus(station).magnitude()]));
  return distances.reduce<Length | null>((least, distance) => (least === null || distance.compare(least) < 0 ? distance : least), null);
}
