import type { MarksAnswer } from "@/calculators/marks";
import { keyFigure, type Adapter } from "./adapter";

/** Marks run along the first wall. */
export const marks: Adapter<MarksAnswer> = {
  operation: () => "marks",
  key: (answer) => keyFigure(answer.conflicts.length > 0 ? "warn" : "good", answer.conflicts.length > 0 ? "conflicts" : "marks", { marks: answer.marks.length, conflicts: answer.conflicts.length }),
  gives: () => ({}),
  layers: ({ joists }) => ({ joists: joists.map(({ centre }) => ({ wall: "ab", station: centre.in })) }),
  readings: (answer) => answer.marks.map(({ text }, index) => ({ key: "marks.mark", params: { number: index + 1 }, text })),
};
