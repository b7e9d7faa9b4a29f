"use client";

import { useId } from "react";
import type { MarksAnswer } from "@/calculators/marks";
import { pixel } from "@/components/drawing/plan-geometry";
import { useTranslate } from "@/lib/client/i18n/messages-context";

const box = 390;
const margin = 14;
const plate = 34;
const rowHeight = 84;
/** A row holds so much at most; a long wall goes on below. */
const mostPerRow = 144;
const blankMarks = [0, 15.25, 31.25, 47.25, 63.25, 79.25, 94.5];

interface Joist {
  mark: number;
  kind: string;
  hit: boolean;
}

/** The plate in rows to one scale: each joist's line and X on the side it goes, what is hit in red. */
export function MarksDrawing({ answer }: { answer: MarksAnswer | null }) {
  const t = useTranslate();
  const id = useId();
  const joists: Joist[] = answer === null ? blankMarks.map((mark) => ({ mark, kind: "layout", hit: false })) : answer.joists.map(({ mark, kind }, index) => ({ mark: mark.in, kind, hit: answer.conflicts.some(({ line, joist }) => line === "here" && joist === index) }));
  const length = answer === null ? 96 : answer.joists.at(-1)!.far.in;
  const thickness = answer === null ? 1.5 : answer.joists[0]!.far.in;
  const rows = Math.min(8, Math.max(1, Math.ceil(length / mostPerRow)));
  const perRow = Math.max(length / rows, 1);
  const perInch = (box - 2 * margin) / perRow;
  const description = answer === null ? t("marks.drawing.blank") : t("marks.drawing.description", { marks: answer.marks.length, conflicts: answer.conflicts.length });
  return (
    <figure>
      <svg viewBox={`0 0 ${box} ${rows * rowHeight + 6}`} className="plan" role="img" aria-labelledby={`${id}-title ${id}-desc`}>
        <title id={`${id}-title`}>{t("marks.drawing.title")}</title>
        <desc id={`${id}-desc`}>{description}</desc>
        {Array.from({ length: rows }, (_, row) => {
          const start = row * perRow;
          const width = pixel((Math.min(length, start + perRow) - start) * perInch);
          const here = joists.map((joist, index) => ({ ...joist, index })).filter(({ mark }) => mark >= start - 1e-6 && mark < start + perRow - 1e-6);
          return (
            <g key={row} transform={`translate(${margin} ${row * rowHeight + 36})`}>
              <rect x="0" y="0" width={width} height={plate} fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
              {here.map(({ mark, kind, hit, index }) => (
                <JoistMark key={index} x={pixel((mark - start) * perInch)} width={pixel(Math.max(4, thickness * perInch))} isEnd={kind === "first" || kind === "last"} hit={hit} number={answer === null || kind === "first" || kind === "last" ? null : index} />
              ))}
            </g>
          );
        })}
      </svg>
      <figcaption className="plan-caption">{t(rows === 1 ? "marks.drawing.scale" : "marks.drawing.rows")}</figcaption>
    </figure>
  );
}

/** A line square across the plate and an X where the joist goes. */
function JoistMark({ x, width, isEnd, hit, number }: { x: number; width: number; isEnd: boolean; hit: boolean; number: number | null }) {
  const colour = hit ? "var(--keel)" : "var(--ink)";
  return (
    <g>
      {isEnd ? <rect x={x} y="0" width={width} height={plate} fill="var(--timber-edge)" opacity="0.55" /> : null}
      <path d={`M${x} -6V${plate}`} stroke={colour} strokeWidth="2.2" />
      <path d={`M${x + 2} ${plate / 2 - 5}l9 10m0-10l-9 10`} stroke={colour} strokeWidth="1.8" />
      {number === null ? null : (
        <text x={x + 4} y="-10" textAnchor="middle" className={hit ? "num small out" : "num small"}>
          {number}
        </text>
      )}
    </g>
  );
}
