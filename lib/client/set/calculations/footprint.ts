import type { FootprintAnswer } from "@/calculators/footprint";
import { exactText, inchText, keyFigure, typed, type Adapter } from "./adapter";

type Placed = FootprintAnswer["corners"][number] & { x: number; y: number };

/** The corners, once every one of them is fixed. */
const placed = ({ corners }: FootprintAnswer): Placed[] => (corners.every(({ x, y }) => x !== null && y !== null) ? (corners as Placed[]) : []);

export const footprint: Adapter<FootprintAnswer> = {
  operation: () => "footprints",
  key(answer) {
    const { unfixed, closure, adjustment, corners, perimeter } = answer;
    if (adjustment?.contradictory === true) return keyFigure("warn", "contradictory");
    if (unfixed.length > 0) return keyFigure("warn", "unfixed", { count: unfixed.length });
    if (closure !== null && closure.oneIn !== null) return keyFigure("warn", "misses", { distance: closure.distance.text });
    return keyFigure("good", "closed", { corners: corners.length, perimeter: perimeter?.text ?? "" });
  },
  gives: (answer, asked) => ({
    ...typed(asked, { burn: "burn" }),
    ...Object.fromEntries(placed(answer).flatMap(({ name, x, y }) => [[`corners.${name}.x`, inchText(x)], [`corners.${name}.y`, inchText(y)]])),
    ...Object.fromEntries(answer.lines.flatMap(({ side, length, chalk }) => [[`side.${side}`, exactText(length)], ...(chalk === null ? [] : [[`wanted.${side}`, exactText(chalk)]])])),
    walk: answer.lines.every(({ toward, chalk }) => toward !== null && chalk !== null) ? answer.lines.map(({ toward, chalk }) => `${toward} ${exactText(chalk!)}`).join(", ") : "",
    ...(answer.lines.length === 4 ? { length: exactText(answer.lines[0]!.length), width: exactText(answer.lines[3]!.length) } : {}),
  }),
  layers(answer) {
    const corners = placed(answer);
    const chalk = corners.flatMap(({ chalk: at }) => (at === null ? [] : [[at.x, at.y] as [number, number]]));
    return { slab: corners.map(({ x, y }) => [x, y]), ...(chalk.length > 2 && chalk.length === corners.length ? { chalk } : {}) };
  },
  readings: ({ checks }) => checks.map(({ from, to, reading }) => ({ key: "footprint.check", params: { pull: `${from}${to}` }, text: reading.text })),
};
