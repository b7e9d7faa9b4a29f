/** A point of the ground plan in inches: A is the origin, x runs along AB, y toward D. */
export interface Point {
  x: number;
  y: number;
}

export interface Corners {
  A: Point;
  B: Point;
  C: Point;
  D: Point;
}

export type Corner = keyof Corners;
export const cornerNames = ["A", "B", "C", "D"] as const satisfies readonly Corner[];

/** The rectangle the corners depart from: as long as AB, as wide as DA. */
export function rectangleOf(length: number, width: number): Corners {
  return { A: { x: 0, y: 0 }, B: { x: length, y: 0 }, C: { x: length, y: width }, D: { x: 0, y: width } };
}

/** An inset shows as this many pixels or a little less, measured across the corner. */
export const insetPixels = 17;

/** Departures drawn smaller than this many pixels cannot be seen. */
const visiblePixels = 22;
const steps = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000];

/**
 * How many times larger than true to draw the departures from the rectangle, so that the greatest shows as some 22 px and
 * none hides the shape: a round number the caption can state. 1 when there is nothing to see.
 */
export function exaggeration(corners: Corners, rectangle: Corners, pixelsPerInch: number, visible = visiblePixels): number {
  const greatest = Math.max(...cornerNames.map((name) => Math.hypot(corners[name].x - rectangle[name].x, corners[name].y - rectangle[name].y)));
  const pixels = greatest * pixelsPerInch;
  if (pixels < 1e-6) return 1;
  const wanted = visible / pixels;
  return [...steps].reverse().find((step) => step <= wanted * 1.15) ?? 1;
}

/** The corners with their departures from `base` drawn so many times larger, from where `base` itself is drawn. */
export function exaggerated(corners: Corners, base: Corners, times: number, drawnBase: Corners = base): Corners {
  const move = (name: Corner): Point => ({
    x: drawnBase[name].x + (corners[name].x - base[name].x) * times,
    y: drawnBase[name].y + (corners[name].y - base[name].y) * times,
  });
  return { A: move("A"), B: move("B"), C: move("C"), D: move("D") };
}

/** Inches to the drawing's pixels: y turned over, since paper counts downward. */
export interface Frame {
  width: number;
  height: number;
  pixelsPerInch: number;
  place: (point: Point) => Point;
}

/** Fits a length by width plan into a box with margins for dimensions and letters. Tall plans are held to a height a phone can show. */
export function frameFor(length: number, width: number, box = 390, margin = { left: 56, right: 46, top: 58, bottom: 58 }, tallest = 330): Frame {
  const room = box - margin.left - margin.right;
  const pixelsPerInch = Math.min(room / length, tallest / width);
  const drawnWidth = length * pixelsPerInch;
  const drawnHeight = width * pixelsPerInch;
  const left = margin.left + (room - drawnWidth) / 2;
  return {
    width: box,
    height: Math.round(drawnHeight + margin.top + margin.bottom),
    pixelsPerInch,
    place: ({ x, y }) => ({ x: pixel(left + x * pixelsPerInch), y: pixel(margin.top + drawnHeight - y * pixelsPerInch) }),
  };
}

/** A tenth of a pixel is enough, and keeps the page small. */
export function pixel(value: number): number {
  return Math.round(value * 10) / 10;
}

export function between(from: Point, to: Point, part: number): Point {
  return { x: pixel(from.x + (to.x - from.x) * part), y: pixel(from.y + (to.y - from.y) * part) };
}

export function pathOf(points: readonly Point[]): string {
  return points.map(({ x, y }) => `${x},${y}`).join(" ");
}
