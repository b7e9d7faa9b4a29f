import type { SillSet } from "./schema";

/** The stages of product.md in order. `main` is a choice of one; `beside` is done as well. A stage shows once one of its calculators has a page. */
const plan = [
  { name: "concrete", main: ["squareness", "footprint"], beside: ["level"] },
  { name: "chalk", main: ["inset", "fit"], beside: [] },
  { name: "recheck", main: ["squareness", "footprint"], beside: [] },
  { name: "bolts", main: ["anchors"], beside: [] },
  { name: "plates", main: ["plates"], beside: [] },
  { name: "takeoff", main: ["takeoff"], beside: [] },
  { name: "marks", main: ["marks"], beside: [] },
] as const;

export type StageName = (typeof plan)[number]["name"];

export interface Stage {
  name: StageName;
  main: readonly string[];
  beside: readonly string[];
}

/** A place in a set for one calculation: `id` is its key in `calculations`. */
export interface Slot {
  id: string;
  stage: StageName;
  calculator: string;
  /** Bolts are read wall by wall. */
  wall?: string;
}

export function stagesWith(available: readonly string[]): Stage[] {
  const known = (names: readonly string[]) => names.filter((name) => available.includes(name));
  return plan.map(({ name, main, beside }) => ({ name, main: known(main), beside: known(beside) })).filter(({ main }) => main.length > 0);
}

/** The calculator in use for a stage: the one chosen, else the first; chalk lines of other than four walls are rechecked as a footprint. */
export function chosenFor(set: SillSet, { name, main }: Stage): string {
  const chosen = set.choices[name];
  if (chosen !== undefined && main.includes(chosen)) return chosen;
  return name === "recheck" && main.includes("footprint") && wallsOf(set).length !== 4 ? "footprint" : main[0]!;
}

const rectangleWalls = ["ab", "bc", "cd", "da"];

/** The walls that the chalk lines make, in order; before there are any, a rectangle's. */
export function wallsOf(set: SillSet): readonly string[] {
  const chalk = set.choices.chalk === "fit" ? "chalk.fit" : "chalk.inset";
  const gives = set.calculations[chalk]?.result?.gives ?? {};
  const walls = Object.keys(gives).flatMap((key) => (key.startsWith("line.") ? [key.slice("line.".length)] : []));
  return walls.length === 0 ? rectangleWalls : walls;
}

/** Every calculation a stage asks for now: the chosen one (for each wall where bolts are read), then those beside it. */
export function slotsOf(set: SillSet, stage: Stage): Slot[] {
  const calculator = chosenFor(set, stage);
  const main = stage.name === "bolts" ? wallsOf(set).map((wall) => ({ id: `bolts.${calculator}.${wall}`, stage: stage.name, calculator, wall })) : [{ id: `${stage.name}.${calculator}`, stage: stage.name, calculator }];
  return [...main, ...stage.beside.map((beside) => ({ id: `${stage.name}.${beside}`, stage: stage.name, calculator: beside }))];
}
