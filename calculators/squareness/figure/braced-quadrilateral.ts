import type { ReadingName } from "../input";

/** The six lengths of a quadrilateral, in inches: adjusted figures are irrational, so doubles. */
export type Six = Readonly<Record<ReadingName, number>>;

/** How far six readings are from one flat figure, and how that depends on each. */
export interface Misclosure {
  /** BD as read less BD as the other five make it. */
  w: number;
  /** The same if the sides crossed, with D on B's side of AC. */
  crossed: number;
  gradient: Six;
}

/**
 * The one condition of a braced quadrilateral: B and D stand on the two sides of AC, so their distance follows from the
 * other five lengths.
 *
 * Source: the law of cosines at A, BD² = AB² + DA² − 2·AB·DA·cos(BAC + CAD), and its derivatives.
 * Null where five of the lengths make no two triangles.
 */
export function misclosureOf({ ab, bc, cd, da, ac, bd }: Six): Misclosure | null {
  const first = cornerOf(ab, ac, bc);
  const second = cornerOf(da, ac, cd);
  if (first === null || second === null) return null;
  const angle = first.angle + second.angle;
  const made = Math.sqrt(ab * ab + da * da - 2 * ab * da * Math.cos(angle));
  const crossed = Math.sqrt(Math.max(0, ab * ab + da * da - 2 * ab * da * Math.cos(first.angle - second.angle)));
  if (!(made > 0)) return null;
  const perAngle = (ab * da * Math.sin(angle)) / made;
  return {
    w: bd - made,
    crossed: bd - crossed,
    gradient: {
      ab: -((ab - da * Math.cos(angle)) / made + perAngle * first.perSide),
      bc: -perAngle * first.perOpposite,
      cd: -perAngle * second.perOpposite,
      da: -((da - ab * Math.cos(angle)) / made + perAngle * second.perSide),
      ac: -perAngle * (first.perCommon + second.perCommon),
      bd: 1,
    },
  };
}

/** The angle between `side` and `common` in a triangle, and what it gains per inch of each length; null when there is no triangle. */
function cornerOf(side: number, common: number, opposite: number) {
  const cosine = (side * side + common * common - opposite * opposite) / (2 * side * common);
  if (!(Math.abs(cosine) < 1)) return null;
  const sine = Math.sqrt(1 - cosine * cosine);
  return {
    angle: Math.acos(cosine),
    perSide: (cosine / side - 1 / common) / sine,
    perCommon: (cosine / common - 1 / side) / sine,
    perOpposite: opposite / (side * common * sine),
  };
}
