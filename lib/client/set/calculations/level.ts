import type { LevelAnswer } from "@/calculators/level";
import { keyFigure, type Adapter } from "./adapter";

export const level: Adapter<LevelAnswer> = {
  operation: () => "levels",
  key({ verdict, spread, closes }) {
    if (closes === false) return keyFigure("warn", "misses", { spread: spread.text });
    return keyFigure(verdict === "out" ? "out" : verdict === "unknown" ? "warn" : verdict === "within" ? "good" : "plain", verdict ?? "spread", { spread: spread.text });
  },
  gives: () => ({}),
  layers: () => ({}),
  readings: ({ shims }) => shims.map(({ index, shim }) => ({ key: "level.shim", params: { number: index + 1 }, text: shim.text })),
};
