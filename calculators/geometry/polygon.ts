import { cross, direction, distance, minus, turn, type Point } from "./point";

/** The item at an index counted round and round. */
export function around<Item>(items: readonly Item[], index: number): Item {
  return items[((index % items.length) + items.length) % items.length]!;
}

/** In square inches; positive when the corners run counter-clockwise. The products are taken from the first corner, so that far origins lose no digits. */
export function signedArea(corners: readonly Point[]): number {
  const [first, ...rest] = corners;
  if (first === undefined) return 0;
  return rest.reduce((sum, corner, index) => sum + (index === 0 ? 0 : cross(minus(rest[index - 1]!, first), minus(corner, first))), 0) / 2;
}

export function perimeter(corners: readonly Point[]): number {
  return corners.reduce((sum, corner, index) => sum + distance(corner, around(corners, index + 1)), 0);
}

/** The angle inside the plan at each corner of a counter-clockwise polygon, in degrees: more than 180 at an inside corner. */
export function insideAngles(corners: readonly Point[]): number[] {
  return corners.map((corner, index) => {
    const arriving = direction(around(corners, index - 1), corner);
    const leaving = direction(corner, around(corners, index + 1));
    return 180 - (turn(arriving, leaving) * 180) / Math.PI;
  });
}

/** The first two sides that meet anywhere but at a shared corner, by the number of their first corner; null when the outline is simple. */
export function crossingSides(corners: readonly Point[]): [number, number] | null {
  for (let first = 0; first < corners.length; first += 1) {
    for (let second = first + 2; second < corners.length; second += 1) {
      if (first === 0 && second === corners.length - 1) continue;
      if (segmentsMeet(corners[first]!, around(corners, first + 1), corners[second]!, around(corners, second + 1))) return [first, second];
    }
  }
  return null;
}

/** Whether two segments have a point in common; ends count. */
export function segmentsMeet(a: Point, b: Point, c: Point, d: Point): boolean {
  const side = (p: Point, q: Point, r: Point) => {
    const value = cross(minus(q, p), minus(r, p));
    return Math.abs(value) <= 1e-9 * distance(p, q) ? 0 : Math.sign(value);
  };
  const [abc, abd, cda, cdb] = [side(a, b, c), side(a, b, d), side(c, d, a), side(c, d, b)];
  if (abc * abd < 0 && cda * cdb < 0) return true;
  const within = (p: Point, q: Point, r: Point) => r.x >= Math.min(p.x, q.x) - 1e-9 && r.x <= Math.max(p.x, q.x) + 1e-9 && r.y >= Math.min(p.y, q.y) - 1e-9 && r.y <= Math.max(p.y, q.y) + 1e-9;
  return (abc === 0 && within(a, b, c)) || (abd === 0 && within(a, b, d)) || (cda === 0 && within(c, d, a)) || (cdb === 0 && within(c, d, b));
}

/** Whether a point lies inside the outline (not on it). */
export function holds(corners: readonly Point[], point: Point): boolean {
  let inside = false;
  corners.forEach((a, index) => {
    const b = around(corners, index + 1);
    if (a.y > point.y !== b.y > point.y && point.x < a.x + ((point.y - a.y) / (b.y - a.y)) * (b.x - a.x)) inside = !inside;
  });
  return inside;
}
