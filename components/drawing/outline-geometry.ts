import { frameFor, insetPixels, pixel, type Frame, type Point } from "./plan-geometry";

const steps = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000];

/** Fits any outline into the drawing's box: inches in, pixels out. */
export function outlineFrame(points: readonly Point[]): Frame {
  const [left, right] = [Math.min(...points.map(({ x }) => x)), Math.max(...points.map(({ x }) => x))];
  const [low, high] = [Math.min(...points.map(({ y }) => y)), Math.max(...points.map(({ y }) => y))];
  const frame = frameFor(Math.max(right - left, 1), Math.max(high - low, 1), 390, { left: 52, right: 52, top: 46, bottom: 46 });
  return { ...frame, place: ({ x, y }) => frame.place({ x: x - left, y: y - low }) };
}

/** By what round number to draw the way between two outlines larger, so that the greatest shows as some 17 px. */
export function timesBetween(outline: readonly Point[], base: readonly Point[], pixelsPerInch: number): number {
  const greatest = Math.max(0, ...outline.map(({ x, y }, index) => Math.hypot(x - base[index]!.x, y - base[index]!.y)));
  if (greatest * pixelsPerInch < 1e-6) return 1;
  const wanted = insetPixels / (greatest * pixelsPerInch);
  return [...steps].reverse().find((step) => step <= wanted * 1.15) ?? 1;
}

export function drawnFrom(outline: readonly Point[], base: readonly Point[], times: number): Point[] {
  return outline.map(({ x, y }, index) => ({ x: base[index]!.x + (x - base[index]!.x) * times, y: base[index]!.y + (y - base[index]!.y) * times }));
}

/** On paper y counts downward, so out of a counter-clockwise plan is to the right of each side as drawn. */
export function outward(from: Point, to: Point): Point {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  return { x: -(to.y - from.y) / length, y: (to.x - from.x) / length };
}

/** Where a corner's letter stands: off the corner, away from the plan. */
export function letterPlace(before: Point, at: Point, after: Point, off = 17): Point {
  const [first, second] = [outward(before, at), outward(at, after)];
  const sum = { x: first.x + second.x, y: first.y + second.y };
  const length = Math.hypot(sum.x, sum.y) || 1;
  return { x: pixel(at.x + (sum.x / length) * off), y: pixel(at.y + (sum.y / length) * off + 6) };
}
