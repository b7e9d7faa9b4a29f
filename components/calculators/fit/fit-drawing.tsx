"use client";

import type { FitAnswer } from "@/calculators/fit";
import { OutlineDrawing } from "@/components/drawing/outline-drawing";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** A fresh page shows a slab that is out and a true plan on it, without figures. */
const blankSlab = [[0, 3], [338, -1], [335, 266], [2, 263]].map(([x, y]) => ({ x: x!, y: y! }));
const blankChalk = [[3, 3], [333, 3], [333, 261], [3, 261]].map(([x, y]) => ({ x: x!, y: y! }));

/** The chalk as laid, true to scale, and the concrete round it with its departures drawn larger. Sides that hang over are dashed red. */
export function FitDrawing({ answer }: { answer: FitAnswer | null }) {
  const t = useTranslate();
  if (answer === null) return <OutlineDrawing slab={blankSlab} chalk={blankChalk} truth="chalk" names={["A", "B", "C", "D"]} sides={[]} title={t("fit.drawing.title")} description={t("fit.drawing.blank")} />;
  const names = Object.keys(answer.corners);
  const sides = Object.keys(answer.lines);
  const ranges = sides.map((side) => answer.ranges[side]!);
  const texts = ranges.map(({ least, most }) => (least.text === most.text ? least.text : t("fit.drawing.range", { least: least.text, most: most.text })));
  return (
    <OutlineDrawing
      slab={Object.values(answer.slab)}
      chalk={Object.values(answer.corners)}
      truth="chalk"
      names={names}
      sides={texts}
      marked={ranges.flatMap(({ least }, index) => (least.in < -1e-6 ? [index] : []))}
      title={t("fit.drawing.title")}
      description={t("fit.drawing.description", { worst: answer.worst.text, ranges: sides.map((side, index) => `${side.toUpperCase()} ${texts[index]}`).join(", ") })}
      caption={t("fit.drawing.figures")}
    />
  );
}
