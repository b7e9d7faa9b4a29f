import { Length } from "../length";

export interface Members {
  stations?: readonly Length[] | undefined;
  spacing?: Length | undefined;
  first?: Length | undefined;
  thickness?: Length | undefined;
  clearance?: Length | undefined;
}

const defaultThickness = Length.from(1.5);
/** A wall of 10 000 ft at any sane spacing stays below; a spacing of nothing does not run away. */
const mostMembers = 5000;

/** Centres of the joists or studs on a wall from `start` to `end`. */
export function memberCentres(members: Members | undefined, start: Length, end: Length): Length[] {
  if (members === undefined) return [];
  const centres = [...(members.stations ?? [])];
  if (members.spacing !== undefined) {
    const { spacing, first = members.spacing } = members;
    for (let centre = first; centre.compare(end) <= 0 && centres.length < mostMembers; centre = centre.plus(spacing)) if (centre.compare(start) >= 0) centres.push(centre);
  }
  return centres.sort((a, b) => a.compare(b));
}

/** A bolt's centre must stand this far from a member's: half of each, and the room wanted. */
export function memberReach(members: Members | undefined, diameter: Length): Length {
  const thickness = members?.thickness ?? defaultThickness;
  return thickness.plus(diameter).over(2).plus(members?.clearance ?? Length.zero);
}
