/** Invented plans for property tests, by a fixed sequence, so that a failure can be had again. */
export interface Spot {
  x: number;
  y: number;
}

export function sequence(seed: number): () => number {
  let state = seed % 2147483647 || 1;
  return () => (state = (state * 48271) % 2147483647) / 2147483647;
}

const between = (random: () => number, low: number, high: number) => low + random() * (high - low);

/** Counter-clockwise, along the axes, inches in sixteenths: a strip plan whose top and bottom step up and down, so it has inside corners. */
export function rectilinear(random: () => number): Spot[] {
  const strips = 1 + Math.floor(random() * 4);
  const step = () => Math.round(between(random, 60, 200) * 16) / 16;
  const rise = () => Math.round(between(random, 20, 90) * 16) / 16;
  let x = 0;
  const edges = Array.from({ length: strips }, (_, index) => {
    const left = x;
    x += step();
    return { left, right: x, low: index % 2 === 0 ? 0 : -rise(), high: 150 + rise() * (index % 2 === 0 ? 1 : 2) };
  });
  const low = edges.flatMap(({ left, right, low: y }) => [{ x: left, y }, { x: right, y }]);
  const high = [...edges].reverse().flatMap(({ left, right, high: y }) => [{ x: right, y }, { x: left, y }]);
  return withoutRepeats([...low, ...high]);
}

/** Counter-clockwise, at random angles round a circle. */
export function convex(random: () => number): Spot[] {
  const count = 3 + Math.floor(random() * 6);
  const radius = between(random, 120, 400);
  const angles = Array.from({ length: count }, (_, index) => (2 * Math.PI * (index + between(random, 0.1, 0.9))) / count);
  return angles.map((angle) => ({ x: radius * Math.cos(angle), y: radius * Math.sin(angle) }));
}

/** A rectangle or an L, as wanted, in inches. */
export function houseShape(random: () => number): Spot[] {
  const long = Math.round(between(random, 200, 600));
  const wide = Math.round(between(random, 180, 420));
  if (random() < 0.5) return [{ x: 0, y: 0 }, { x: long, y: 0 }, { x: long, y: wide }, { x: 0, y: wide }];
  const notchX = Math.round(long * between(random, 0.35, 0.65));
  const notchY = Math.round(wide * between(random, 0.35, 0.65));
  return [{ x: 0, y: 0 }, { x: long, y: 0 }, { x: long, y: notchY }, { x: notchX, y: notchY }, { x: notchX, y: wide }, { x: 0, y: wide }];
}

export const shaken = (plan: readonly Spot[], random: () => number, most: number): Spot[] => plan.map(({ x, y }) => ({ x: x + between(random, -most, most), y: y + between(random, -most, most) }));

function withoutRepeats(corners: Spot[]): Spot[] {
  const distinct = corners.filter((corner, index) => {
    const last = corners[(index - 1 + corners.length) % corners.length]!;
    return corner.x !== last.x || corner.y !== last.y;
  });
  return distinct.filter((corner, index) => {
    const [last, next] = [distinct[(index - 1 + distinct.length) % distinct.length]!, distinct[(index + 1) % distinct.length]!];
    return (corner.x - last.x) * (next.y - corner.y) !== (corner.y - last.y) * (next.x - corner.x);
  });
}
