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
  const bolts = answer === null ? [] : answer.bolts.filter(({ line }) => line === "here").map(({ station, washer }) => ({ at: station.in, radius: washer.in / 2 }));
  const rows = rowsOf(length, joists);
  const perInch = (box - 2 * margin) / Math.max(...rows.map(({ from, to }) => to - from), 1);
  const description = answer === null ? t("marks.drawing.blank") : t("marks.drawing.description", { marks: answer.marks.length, conflicts: answer.conflicts.length });
  return (
    <figure>
      <svg viewBox={`0 0 ${box} ${rows.length * rowHeight + 6}`} className="plan" role="img" aria-labelledby={`${id}-title ${id}-desc`}>
        <title id={`${id}-title`}>{t("marks.drawing.title")}</title>
        <desc id={`${id}-desc`}>{description}</desc>
        {rows.map(({ from, to }, row) => (
          <g key={row} transform={`translate(${margin} ${row * rowHeight + 36})`}>
            <rect x="0" y="0" width={pixel((to - from) * perInch)} height={plate} fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
            {bolts.filter(({ at }) => at >= from && at < to).map(({ at, radius }, index) => (
              <circle key={index} cx={pixel((at - from) * perInch)} cy={plate / 2} r={pixel(Math.max(3, radius * perInch))} fill="var(--steel)" />
            ))}
            {joists.map(({ mark, kind, hit }, index) =>
              mark < from - 1e-6 || mark >= to - 1e-6 ? null : (
                <JoistMark key={index} x={pixel((mark - from) * perInch)} width={pixel(Math.max(4, thickness * perInch))} isEnd={kind === "first" || kind === "last"} hit={hit} number={answer === null || kind === "first" || kind === "last" ? null : index} />
              ),
            )}
          </g>
        ))}
      </svg>
      <figcaption className="plan-caption">{t(rows.length === 1 ? "marks.drawing.scale" : "marks.drawing.rows")}</figcaption>
    </figure>
  );
}

/** Rows of equal length that break between two joists, never in one. */
function rowsOf(length: number, joists: readonly Joist[]): { from: number; to: number }[] {
  const count = Math.min(8, Math.max(1, Math.ceil(length / mostPerRow)));
  const step = joists.length > 3 ? joists[2]!.mark - joists[1]!.mark : length;
  const perRow = Math.max(step, Math.ceil(length / count / step) * step);
  const rows: { from: number; to: number }[] = [];
  for (let from = 0; from < length - 1e-6; from = rows.at(-1)!.to) {
    const to = (rows.length + 1) * perRow + step / 2;
    rows.push({ from, to: to > length - step ? length : to });
  }
  return rows;
}

/** A line square across the plate and an X where the joist goes. */
function JoistMark({ x, width, isEnd, hit, number }: { x: number; width: number; isEnd: boolean; hit: boolean; number: number | null }) {
  const colour = hit ? "var(--keel)" : "var(--ink)";
  return (
    <g>
      {isEnd ? <rect x={x} y="0" width={width} height={plate} fill="var(--timber-edge)" opacity="0.55" /> : null}
      <path d={`M${x} -6V${plate}`} stroke={colour} strokeWidth="2.2" />
      {isEnd ? null : <path d={`M${x + 2} ${plate / 2 - 5}l9 10m0-10l-9 10`} stroke={colour} strokeWidth="1.8" />}
      {number === null ? null : (
        <text x={x + 4} y="-10" textAnchor="middle" className={hit ? "num small out" : "num small"}>
          {number}
        </text>
      )}
    </g>
  );
}
