import highsLoader from "highs";
import type { Spot } from "./random-plans";

/**
 * An independent judge of the fit at one angle: HiGHS on the corners themselves, written out from product.md's words (offset at a
 * chalk corner = its distance from the slab edge's line, square to it), not from our reduced unknowns.
 */
export interface Judged {
  slab: readonly Spot[];
  /** Chalk corners as wanted, anywhere; with free sizes only their directions count. */
  plan: readonly Spot[];
  insets: readonly number[];
  sizesFree: boolean;
  overhang: number | null;
}

const solver = await highsLoader();

/** The least worst departure at one turn of chalk AB from slab edge AB (radians); null when the overhang limit cannot be kept. */
export function leastWorst({ slab, plan, insets, sizesFree, overhang }: Judged, turn: number): number | null {
  const count = slab.length;
  const heading = (from: Spot, to: Spot) => Math.atan2(to.y - from.y, to.x - from.x);
  const spin = heading(slab[0]!, slab[1]!) - heading(plan[0]!, plan[1]!) + turn;
  const [cos, sin] = [Math.cos(spin), Math.sin(spin)];
  const turned = plan.map(({ x, y }) => ({ x: cos * x - sin * y, y: sin * x + cos * y }));
  // The last side of a rigid plan follows from the others: said again it could contradict them by rounding.
  // Corners are x0, y0, x1 … ; for numbers' sake counted from the slab's own corners.
  const rows: string[] = [];
  const term = (value: number, name: string) => `${value < 0 ? "-" : "+"} ${Math.abs(value).toFixed(17)} ${name}`;
  const equal = (parts: string[], right: number) => rows.push(`${parts.join(" ")} = ${right.toFixed(17)}`);
  for (let side = 0; side < count; side += 1) {
    const next = (side + 1) % count;
    const step = { x: turned[next]!.x - turned[side]!.x, y: turned[next]!.y - turned[side]!.y };
    const own = { x: slab[next]!.x - slab[side]!.x, y: slab[next]!.y - slab[side]!.y };
    const length = Math.hypot(step.x, step.y);
    if (!sizesFree && next !== 0) {
      equal([term(1, `x${next}`), term(-1, `x${side}`)], step.x - own.x);
      equal([term(1, `y${next}`), term(-1, `y${side}`)], step.y - own.y);
    } else if (sizesFree) {
      const [ux, uy] = [step.x / length, step.y / length];
      equal([term(ux, `y${next}`), term(-ux, `y${side}`), term(-uy, `x${next}`), term(uy, `x${side}`)], uy * own.x - ux * own.y);
    }
    const edge = Math.hypot(own.x, own.y);
    const inward = { x: -own.y / edge, y: own.x / edge };
    for (const corner of [side, next]) {
      // The slab's corners lie on the edge's line, so a chalk corner's offset is its displacement's part square to it.
      const offset = [term(inward.x, `x${corner}`), term(inward.y, `y${corner}`)].join(" ");
      rows.push(`${offset} - z <= ${insets[side]!.toFixed(17)}`, `${offset} + z >= ${insets[side]!.toFixed(17)}`);
      if (overhang !== null) rows.push(`${offset} >= ${(-overhang).toFixed(17)}`);
    }
  }
  const names = slab.flatMap((_, corner) => [`x${corner}`, `y${corner}`]);
  const problem = `Minimize\n obj: z\nSubject To\n${rows.map((row, index) => ` c${index}: ${row}`).join("\n")}\nBounds\n${names.map((name) => ` ${name} free`).join("\n")}\n z >= 0\nEnd\n`;
  const solved = solver.solve(problem, { primal_feasibility_tolerance: 1e-10, dual_feasibility_tolerance: 1e-10, presolve: "off" });
  return solved.Status === "Optimal" ? solved.ObjectiveValue : null;
}
