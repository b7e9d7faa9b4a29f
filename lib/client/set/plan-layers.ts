import type { Layers, SillSet } from "./schema";
import { chosenFor, slotsOf, wallsOf, type Stage } from "./stages";

/** The whole plan as far as the stages have drawn it: each layer from the stage that owns it. */
export function planOf(set: SillSet, stages: readonly Stage[]): Layers & { walls: readonly string[] } {
  const layersOf = (id: string): Layers => set.calculations[id]?.result?.layers ?? {};
  const stage = (name: Stage["name"]) => stages.find((known) => known.name === name);
  const main = (name: Stage["name"]): Layers => {
    const found = stage(name);
    return found === undefined ? {} : layersOf(`${name}.${chosenFor(set, found)}`);
  };
  const bolts = stage("bolts");
  const [concrete, chalk, plates, marks] = [main("concrete"), main("chalk"), main("plates"), main("marks")];
  const plan = {
    slab: concrete.slab ?? chalk.slab,
    chalk: chalk.chalk ?? concrete.chalk,
    bolts: bolts === undefined ? undefined : slotsOf(set, bolts).flatMap(({ id }) => layersOf(id).bolts ?? []),
    pieces: plates.pieces,
    holes: plates.holes,
    joists: marks.joists,
  };
  const drawn: Layers = Object.fromEntries(Object.entries(plan).filter(([, layer]) => layer !== undefined && layer.length > 0));
  return { ...drawn, walls: wallsOf(set) };
}

export type Pair = readonly [number, number];

const steps = [1, 2, 5, 10, 20, 50, 100, 200];

/**
 * How the plan is drawn: the slab to scale in the box, the chalk's distance from it larger by a round number so that it
 * shows as some 14 px. Both polygons must have the same corners for that; else the chalk is drawn as it is.
 */
export function frameOf(slab: readonly Pair[], chalk: readonly Pair[] | undefined, box: number, margin: number, tallest: number) {
  const [xs, ys] = [slab.map(([x]) => x), slab.map(([, y]) => y)];
  const [left, bottom] = [Math.min(...xs), Math.min(...ys)];
  const [width, height] = [Math.max(...xs) - left, Math.max(...ys) - bottom];
  const scale = Math.min((box - 2 * margin) / Math.max(width, 1), tallest / Math.max(height, 1));
  const shift = (box - width * scale) / 2;
  const place = ([x, y]: Pair): Pair => [tenth(shift + (x - left) * scale), tenth(margin + (height - (y - bottom)) * scale)];
  const gaps = chalk !== undefined && chalk.length === slab.length ? chalk.map(([x, y], index) => Math.hypot(x - slab[index]![0], y - slab[index]![1]) * scale) : [];
  const greatest = Math.max(0, ...gaps);
  const times = greatest < 1e-6 ? 1 : ([...steps].reverse().find((step) => step * greatest <= 17) ?? 1);
  const drawnChalk = chalk?.map(([x, y], index): Pair => (gaps.length === 0 ? [x, y] : [slab[index]![0] + (x - slab[index]![0]) * times, slab[index]![1] + (y - slab[index]![1]) * times]));
  return { height: Math.round(height * scale + 2 * margin), scale, place, times, chalk: drawnChalk?.map(place), slab: slab.map(place) };
}

const tenth = (value: number) => Math.round(value * 10) / 10;

/**
 * A place along a wall of a drawn polygon: wall k runs from corner k to the next. `share` is how far along, 0 to 1; `inward`
 * pixels from the line, to the inside of a polygon that runs counter-clockwise on the ground.
 */
export function alongWall(corners: readonly Pair[], wall: number, share: number, inward: number): Pair {
  const [from, to] = [corners[wall % corners.length]!, corners[(wall + 1) % corners.length]!];
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
  const length = Math.hypot(dx, dy) || 1;
  return [tenth(from[0] + dx * share + (dy / length) * inward), tenth(from[1] + dy * share - (dx / length) * inward)];
}
