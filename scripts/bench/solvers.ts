import { operations } from "../../calculators";
import { planSill, platesInput } from "../../calculators/plates";
import { answerTo, type Operation } from "../../calculators/schema";
import { atMost, row } from "./table.mjs";

/** A draw that is the same in every run. */
let state = 20261201;
const draw = () => (state = (state * 1103515245 + 12345) % 2147483648) / 2147483648;
const eighths = (low: number, high: number) => Math.round((low + draw() * (high - low)) * 8) / 8;

const rounds = 7;

/** Milliseconds of the quickest run, the one least disturbed by what else the machine does; the first, which warms the engine up, is not counted. */
function timed(work: () => number | void): number {
  work();
  return Math.min(...Array.from({ length: rounds }, () => {
    const began = performance.now();
    return work() ?? performance.now() - began;
  }));
}

function answered(operation: string, input: unknown): void {
  const { answer, issues } = answerTo(operations.get(operation) as Operation, input);
  if (answer === null) throw new Error(`${operation}: ${JSON.stringify(issues)}`);
}

/** Stairs of 4, 6, 8 … corners, the slab's each up to 1/4 in off. */
function slab(corners: number) {
  const steps = (corners - 2) / 2;
  const [tread, rise] = [480 / steps, 360 / steps];
  const plan: [number, number][] = [[0, 0], [480, 0]];
  for (let step = 0; step < steps; step += 1) {
    plan.push([480 - step * tread, (step + 1) * rise]);
    if (step < steps - 1) plan.push([480 - (step + 1) * tread, (step + 1) * rise]);
  }
  plan.push([0, 360]);
  const places = plan.filter(([x, y], index) => index === 0 || x !== plan[index - 1]![0] || y !== plan[index - 1]![1]).slice(0, corners);
  const legs = places.map(([x, y], index) => {
    const [toX, toY] = places[(index + 1) % places.length]!;
    return toX === x ? `${toY > y ? "N" : "S"} ${Math.abs(toY - y)} in` : `${toX > x ? "E" : "W"} ${Math.abs(toX - x)} in`;
  });
  return { corners: Object.fromEntries(places.map(([x, y], index) => [String.fromCharCode(65 + index), { x: x + eighths(-0.25, 0.25), y: y + eighths(-0.25, 0.25) }])), walk: legs.join(", "), inset: "1/2", overhang: "2" };
}

/** A wall's bolts 30 to 40 in apart, where a joint finds few of use. */
const boltsOf = (count: number) => {
  let at = 6;
  return Array.from({ length: count }, () => ({ station: (at += eighths(30, 40)) - 30, offset: "2 3/4" }));
};

/** Stage 1 alone: from the question to the first word of the boards. */
function joints(count: number): number {
  const bolts = boltsOf(count);
  const input = platesInput.parse({ walls: [{ name: "ab", length: bolts.at(-1)!.station + 8, bolts }], stock: [{ length: "16 ft" }], shortest: "24 in", rule: "us-irc", timeLimit: 0.05 });
  const began = performance.now();
  let joined = 0;
  planSill(input, { onProgress: ({ stage }) => void (joined === 0 && stage === 2 && (joined = performance.now())) });
  return (joined || performance.now()) - began;
}

interface Against {
  solver: string;
  of: string;
  sizes: readonly number[];
  /** At most this power of the size: 1 is in step with it, 2 its square. */
  power: number;
  work: (size: number) => number | void;
}

/** Time at each size, and the power of the size that the last doublings grew by. */
function against({ solver, of, sizes, power, work }: Against) {
  const times = sizes.map((size) => timed(() => work(size)));
  const [first, last] = [Math.floor(sizes.length / 2) - 1, sizes.length - 1];
  const grew = Math.log(times[last]! / times[first]!) / Math.log(sizes[last]! / sizes[first]!);
  return [row(`${solver}, ${sizes.join(", ")} ${of}`, `${times.map((time) => time.toFixed(time < 10 ? 1 : 0)).join(", ")} ms`), atMost(`${solver}: grows with ${of} to the power`, grew, power)];
}

const wall = new Map<number, ReturnType<typeof boltsOf>>();
const fits = new Map<number, ReturnType<typeof slab>>();
const known = <Value>(map: Map<number, Value>, size: number, make: (size: number) => Value) => map.get(size) ?? map.set(size, make(size)).get(size)!;
const cuts = (count: number) => ({ pieces: Array.from({ length: count }, () => ({ length: eighths(30, 180), count: 1 })), stock: [{ length: "16 ft" }, { length: "12 ft" }, { length: "10 ft" }], kerf: "1/8" });
const cutLists = new Map<number, ReturnType<typeof cuts>>();

console.log(
  JSON.stringify([
    ...against({ solver: "best fit", of: "corners", sizes: [4, 6, 12, 24], power: 3, work: (size) => answered("fits", known(fits, size, slab)) }),
    ...against({ solver: "joints and anchors of a wall", of: "bolts", sizes: [18, 36, 72, 144], power: 2.5, work: joints }),
    ...against({ solver: "anchors to add", of: "bolts", sizes: [25, 50, 100, 200], power: 2, work: (size) => { const bolts = known(wall, size, boltsOf); answered("anchors/check", { pieces: [{ from: "0", to: bolts.at(-1)!.station + 40 }], bolts: bolts.filter((_, index) => index % 3 !== 1), plateWidth: "5 1/2", rule: "us-irc" }); } }),
    ...[50, 100, 200].map((size) => atMost(`boards for ${size} pieces alone: answered in`, timed(() => answered("plates", known(cutLists, size, cuts))), 1000, " ms", 0)),
  ]),
);
