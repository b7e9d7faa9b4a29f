"use client";

import { useId } from "react";
import type { LevelAnswer } from "@/calculators/level";
import { pixel } from "@/components/drawing/plan-geometry";
import { useTranslate } from "@/lib/client/i18n/messages-context";

const box = 390;
const margin = 26;
const top = 54;
const depth = 84;
const steps = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000] as const;
/** A fresh page shows a top that dips, without figures. */
const blank = [0, -3, -8, -4, -1].map((height, index) => ({ along: index, height }));

/** The concrete's top unrolled from reading to reading: the level line at the highest point, and the room a shim has to fill. Heights are drawn larger, and by how much is said. */
export function LevelDrawing({ answer }: { answer: LevelAnswer | null }) {
  const t = useTranslate();
  const id = useId();
  const points = answer === null ? blank : unrolled(answer);
  const length = Math.max(...points.map(({ along }) => along), 1e-9);
  const spread = Math.max(...points.map(({ height }) => -height), 0);
  const perInch = (box - 2 * margin) / length;
  // A round number of times larger, which the caption can state.
  const times = answer === null || spread === 0 ? 1 : (steps.findLast((step) => step * spread * perInch <= depth) ?? 1);
  const heightPerInch = spread === 0 ? 0 : answer === null ? depth / spread : Math.min(depth / spread, times * perInch);
  const placed = points.map(({ along, height }) => ({ x: pixel(margin + along * perInch), y: pixel(top - height * heightPerInch) }));
  const outline = placed.map(({ x, y }) => `${x} ${y}`).join("L");
  const bottom = top + depth + 34;
  const description = answer === null ? t("level.drawing.blank") : t("level.drawing.description", { points: points.length, spread: answer.spread.text });
  return (
    <figure>
      <svg viewBox={`0 0 ${box} ${bottom + 26}`} className="plan" role="img" aria-labelledby={`${id}-title ${id}-desc`}>
        <title id={`${id}-title`}>{t("level.drawing.title")}</title>
        <desc id={`${id}-desc`}>{description}</desc>
        <path d={`M${outline}V${bottom}H${placed[0]!.x}Z`} fill="var(--concrete)" stroke="none" />
        <path d={`M${outline}`} fill="none" stroke="var(--edge-strong)" strokeWidth="2.5" strokeLinejoin="round" />
        <path d={`M${margin - 10} ${top}H${box - margin + 10}`} fill="none" stroke="var(--chalk-line)" strokeWidth="2.6" strokeDasharray="8 4" />
        {answer === null ? null : placed.map(({ x, y }, index) => <Shim key={index} answer={answer} index={index} x={x} y={y} bottom={bottom} crowded={placed.length > 9} />)}
      </svg>
      <figcaption className="plan-caption">{answer === null || times === 1 ? t("level.drawing.line") : t("level.drawing.times", { times })}</figcaption>
    </figure>
  );
}

function Shim({ answer, index, x, y, bottom, crowded }: { answer: LevelAnswer; index: number; x: number; y: number; bottom: number; crowded: boolean }) {
  const { shim } = answer.points[index]!;
  const isLow = index === answer.low.index && answer.spread.in > 0;
  const anchor = x < 60 ? "start" : x > box - 60 ? "end" : "middle";
  const isTold = !crowded || isLow || index === answer.high.index;
  return (
    <g>
      {y - top > 3 ? <path d={`M${x} ${top}V${y}`} fill="none" stroke={isLow ? "var(--keel)" : "var(--steel)"} strokeWidth="2.2" /> : null}
      <circle cx={x} cy={y} r="4" fill={isLow ? "var(--keel)" : "var(--steel)"} />
      {isTold ? (
        <text x={anchor === "start" ? x - 16 : anchor === "end" ? x + 16 : x} y={isLow || index % 2 === 0 || answer.points.length < 6 ? top - 12 : top - 30} textAnchor={anchor} className={isLow ? "num small halo out" : "num small halo"}>
          {index === answer.high.index ? '0"' : shim.text}
        </text>
      ) : null}
      {crowded && index % 2 === 1 ? null : (
        <text x={x} y={bottom + 18} textAnchor="middle" className="num small">
          {index + 1}
        </text>
      )}
    </g>
  );
}

/** How far along each reading lies, by plan distance from the one before; where that cannot be told, one step. */
function unrolled({ points }: LevelAnswer): { along: number; height: number }[] {
  const steps = points.slice(1).map((point, index) => stepBetween(points[index]!, point));
  const known = steps.filter((step): step is number => step !== null && step > 0);
  const usual = known.length === 0 ? 96 : known.reduce((sum, step) => sum + step, 0) / known.length;
  let along = 0;
  return points.map(({ shim }, index) => {
    if (index > 0) along += steps[index - 1] ?? usual;
    return { along, height: -shim.in };
  });
}

function stepBetween(a: LevelAnswer["high"], b: LevelAnswer["high"]): number | null {
  if (a.x !== null && a.y !== null && b.x !== null && b.y !== null) return Math.hypot(a.x - b.x, a.y - b.y);
  return a.wall !== null && a.wall === b.wall && a.station !== null && b.station !== null ? Math.abs(a.station.in - b.station.in) : null;
}
