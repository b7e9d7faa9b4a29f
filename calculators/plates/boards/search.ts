import { weightOf, type BoardPlan, type BoardProblem, type GoOn } from "./board-problem";
import { exhaust } from "./exhaust";
import { greedyPack, recut } from "./greedy-pack";
import { improve } from "./improve";
import { Packing, type SlidingJoint } from "./packing";
import { drawFrom } from "./repair";
import { startingJoints, type StartingJoints } from "./starting-joints";

interface AttemptOptions {
  /** Nothing weighs less: the attempt ends there. */
  floor: number;
  rounds: number;
  goOn: GoOn;
  seed: number;
}

/** A search of every sharing-out ends after so many steps, over all ways of jointing. */
const mostSteps = 1_500_000;

/** The best plan so far, and the ways to look for a better one. */
export class Search {
  best: BoardPlan | null = null;
  weight = Infinity;
  /** The sizes of the best plan's pieces. */
  sizes: readonly number[] = [];
  private readonly options: StartingJoints[][];
  private readonly firstPiece: number[] = [];

  constructor(
    private readonly problem: BoardProblem,
    private readonly weights: readonly number[],
  ) {
    let next = 0;
    for (const stretch of problem.stretches) {
      this.firstPiece.push(next);
      next += (stretch.ways[0]?.length ?? 0) + 1;
    }
    this.options = problem.stretches.map((stretch) => startingJoints(stretch, problem.kinds, problem.kerf));
  }

  cost(): number {
    return this.best === null ? Infinity : this.best.boards.reduce((sum, board) => sum + this.problem.kinds[board.kind]!.cost, 0);
  }

  /** Whole boards first, as they come. */
  attemptFirst(options: AttemptOptions): void {
    const chosen = this.chosen(() => 0);
    if (chosen !== null) this.attempt(chosen, options, undefined);
  }

  /** Other joints, drawn; then each stretch's joints changed where that alone saves something; then pieces exchanged. */
  attemptOther(options: AttemptOptions): void {
    const draw = drawFrom(options.seed * 977);
    const chosen = this.chosen((count) => Math.floor(count * draw() ** 2));
    if (chosen !== null) this.attempt(this.descend(chosen, draw, options.goOn), options, draw);
  }

  private chosen(pick: (count: number) => number): StartingJoints[] | null {
    if (this.options.some((options) => options.length === 0)) return null;
    return this.options.map((options) => options[Math.min(options.length - 1, pick(options.length))]!);
  }

  private attempt(chosen: readonly StartingJoints[], { floor, rounds, goOn, seed }: AttemptOptions, shuffle: (() => number) | undefined): void {
    const { sizes, joints } = this.laid(chosen);
    const first = greedyPack(sizes, this.problem.kinds, this.weights, { shuffle });
    if (first === null) return;
    const boards = recut(first, sizes, this.problem.kinds, this.weights);
    const start = new Packing(this.problem.kinds, sizes, joints, boards);
    this.keep(start, chosen);
    this.keep(improve(start, { weight: this.weights, floor, draw: drawFrom(seed), goOn, rounds }), chosen);
  }

  /** One stretch after another takes the joints with which a quick plan of all weighs least. */
  private descend(start: StartingJoints[], draw: () => number, goOn: GoOn): StartingJoints[] {
    const chosen = [...start];
    let weight = this.quickWeight(chosen);
    for (let index = 0; index < chosen.length; index += 1) {
      for (let trial = 0; trial < 4 && goOn(); trial += 1) {
        const options = this.options[index]!;
        const before = chosen[index]!;
        chosen[index] = options[Math.floor(draw() * options.length)]!;
        const now = chosen[index] === before ? weight : this.quickWeight(chosen);
        if (now <= weight) weight = now;
        else chosen[index] = before;
      }
    }
    return chosen;
  }

  private quickWeight(chosen: readonly StartingJoints[]): number {
    const { sizes } = this.laid(chosen);
    const boards = greedyPack(sizes, this.problem.kinds, this.weights, { nodes: 60 });
    return boards === null ? Infinity : weightOf(recut(boards, sizes, this.problem.kinds, this.weights), this.weights);
  }

  /** Every plan of a few pieces; true when all were looked at. */
  everyPlan(floor: number, goOn: GoOn): boolean {
    const { stretches, kinds } = this.problem;
    let all = stretches.every((stretch) => stretch.complete);
    let left = mostSteps;
    const combine = (index: number, chosen: StartingJoints[]): void => {
      if (!goOn() || left <= 0) all = false;
      if (!all || this.weight <= floor) return;
      if (index === stretches.length) {
        const { sizes, joints, least } = this.laid(chosen);
        const found = exhaust({ kinds, weight: this.weights, least, sizes, joints, beat: this.weight, floor, goOn, steps: left });
        if (found.packing !== null) this.keep(found.packing, chosen);
        if (!found.proved) all = false;
        left -= found.steps;
        return;
      }
      const seen = new Set<number>();
      for (const option of this.options[index]!) {
        if (seen.has(option.way)) continue;
        seen.add(option.way);
        combine(index + 1, [...chosen, option]);
      }
    };
    combine(0, []);
    return all;
  }

  private keep(packing: Packing, chosen: readonly StartingJoints[]): void {
    const boards = packing.boards();
    const weight = weightOf(boards, this.weights);
    if (!packing.isSound() || weight >= this.weight) return;
    this.weight = weight;
    this.sizes = [...packing.sizes];
    let joint = 0;
    const joints = chosen.map((option) => option.joints.map(() => packing.joints[joint++]!.at));
    this.best = { ways: chosen.map((option) => option.way), joints, boards };
  }

  /** The pieces as the chosen joints make them, how the joints may slide, and how small each piece can become. */
  private laid(chosen: readonly StartingJoints[]): { sizes: number[]; joints: SlidingJoint[]; least: number[] } {
    const { stretches, kerf } = this.problem;
    const sizes: number[] = [];
    const joints: SlidingJoint[] = [];
    const least: number[] = [];
    stretches.forEach((stretch, index) => {
      const { way, joints: at } = chosen[index]!;
      const windows = stretch.ways[way]!;
      const ends = [stretch.from, ...at, stretch.to];
      ends.slice(1).forEach((end, place) => {
        sizes.push(end - ends[place]! + kerf);
        const low = place === windows.length ? stretch.to : windows[place]![0];
        const high = place === 0 ? stretch.from : windows[place - 1]![1];
        least.push(Math.max(0, low - high) + kerf);
        const left = this.firstPiece[index]! + place;
        if (place < windows.length) joints.push({ left, right: left + 1, low: windows[place]![0], high: windows[place]![1], at: end });
      });
    });
    return { sizes, joints, least };
  }
}
