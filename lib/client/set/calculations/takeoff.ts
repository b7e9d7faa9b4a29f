import type { TakeoffAnswer } from "@/calculators/takeoff";
import { keyFigure, type Adapter } from "./adapter";

export const takeoff: Adapter<TakeoffAnswer> = {
  operation: () => "takeoffs",
  key: ({ lines, totals }) => keyFigure("good", "list", { lines: lines.length, boards: totals.boards }),
  gives: () => ({}),
  layers: () => ({}),
  readings: ({ lines }) => lines.map(({ item, size, quantity }) => ({ key: `takeoff.${item}`, params: { size: size?.text ?? "" }, text: `${quantity}` })),
};
