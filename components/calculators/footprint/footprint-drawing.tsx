"use client";

import type { FootprintAnswer } from "@/calculators/footprint";
import { OutlineDrawing } from "@/components/drawing/outline-drawing";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** A fresh page shows the work on an L of its own, without figures. */
const blank = [[0, 0], [480, 0], [480, 240], [288, 240], [288, 384], [0, 384]].map(([x, y]) => ({ x: x!, y: y! }));
const letters = "ABCDEFGHIJKLMNOPQRSTUVWXYZ".split("");
/** Numbers on more pulls than this would cover the plan; the table has them all. */
const mostPulls = 6;

/** The plan from above, with its chalk lines and the pulls that prove it. Corners not fixed yet cannot be drawn. */
export function FootprintDrawing({ answer }: { answer: FootprintAnswer | null }) {
  const t = useTranslate();
  const placed = answer?.corners.flatMap(({ x, y }) => (x === null || y === null ? [] : [{ x, y }])) ?? [];
  const isWhole = answer !== null && placed.length === answer.corners.length;
  if (!isWhole) return <OutlineDrawing slab={blank} names={letters.slice(0, blank.length)} sides={[]} title={t("footprint.drawing.title")} description={t("footprint.drawing.blank")} caption={answer === null ? undefined : t("footprint.drawing.loose")} />;
  const { corners, lines, checks } = answer;
  const chalk = corners.flatMap((corner) => (corner.chalk === null ? [] : [corner.chalk]));
  const number = (name: string) => letters.indexOf(name);
  return (
    <OutlineDrawing
      slab={placed}
      chalk={chalk.length === corners.length ? chalk : null}
      names={corners.map(({ name }) => name)}
      sides={lines.map(({ length }) => length.text)}
      pulls={checks.slice(0, mostPulls).map(({ from, to }) => ({ from: number(from), to: number(to) }))}
      title={t("footprint.drawing.title")}
      description={t("footprint.drawing.description", { count: corners.length, sides: lines.map(({ side, length }) => `${side.toUpperCase()} ${length.text}`).join(", ") })}
      caption={t("footprint.drawing.figures")}
    />
  );
}
