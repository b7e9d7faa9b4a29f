"use client";

import { useId } from "react";
import type { PlatesAnswer } from "@/calculators/plates";
import { BoltMark } from "@/components/drawing/wall-drawing";
import { pixel } from "@/components/drawing/plan-geometry";
import { useTranslate } from "@/lib/client/i18n/messages-context";

const box = 390;
const left = 46;
const right = 10;
const plate = 22;
const rowHeight = 66;
const mostRows = 12;

interface Bar {
  name: string;
  length: number;
  pieces: { from: number; to: number; label: string }[];
  bolts: { at: number; tone: "good" | "added" | "engineered" }[];
}

const blankBars: Bar[] = [
  { name: "A-B", length: 336, pieces: [{ from: 0, to: 192, label: "" }, { from: 192, to: 336, label: "" }], bolts: [8, 72, 136, 184, 200, 264, 328].map((at) => ({ at, tone: at === 184 ? "added" : "good" })) },
];

/** Every wall as a bar to one scale: pieces from joint to joint, bolts as poured, anchors to add. For a cut list, the boards. */
export function PlatesDrawing({ answer }: { answer: PlatesAnswer | null }) {
  const t = useTranslate();
  const id = useId();
  const bars = answer === null ? blankBars : answer.walls.length === 0 ? boardBars(answer) : wallBars(answer);
  const shown = bars.slice(0, mostRows);
  const perInch = (box - left - right) / Math.max(...shown.map(({ length }) => length), 1);
  const description = answer === null ? t("plates.drawing.blank") : t("plates.drawing.description", { pieces: answer.totals.pieces, boards: answer.totals.boards, added: answer.addedAnchors.length });
  return (
    <figure>
      <svg viewBox={`0 0 ${box} ${shown.length * rowHeight + 4}`} className="plan" role="img" aria-labelledby={`${id}-title ${id}-desc`}>
        <title id={`${id}-title`}>{t("plates.drawing.title")}</title>
        <desc id={`${id}-desc`}>{description}</desc>
        {shown.map((bar, index) => (
          <BarRow key={index} bar={bar} perInch={perInch} y={index * rowHeight} />
        ))}
      </svg>
      <figcaption className="plan-caption">{t(bars.length > mostRows ? "plates.drawing.more" : "plates.drawing.scale", { count: bars.length - mostRows })}</figcaption>
    </figure>
  );
}

function BarRow({ bar, perInch, y }: { bar: Bar; perInch: number; y: number }) {
  const x = (inches: number) => pixel(left + inches * perInch);
  return (
    <g transform={`translate(0 ${y + 18})`}>
      <text x="2" y={plate / 2 + 6} className="disp small">
        {bar.name}
      </text>
      {bar.pieces.map(({ from, to, label }) => (
        <g key={from}>
          <rect x={x(from)} y="0" width={pixel((to - from) * perInch)} height={plate} fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
          {(to - from) * perInch < 26 ? null : (
            <text x={pixel(x(from) + ((to - from) * perInch) / 2)} y={plate + 18} textAnchor="middle" className="num small">
              {label}
            </text>
          )}
        </g>
      ))}
      {bar.bolts.map(({ at, tone }, index) => (
        <g key={index} transform={`translate(${x(at)} ${plate / 2}) scale(.7)`}>
          <BoltMark bolt={{ x: 0, y: 0, tone }} />
        </g>
      ))}
    </g>
  );
}

function wallBars(answer: PlatesAnswer): Bar[] {
  return answer.walls.map(({ name, from, to, pieces }) => {
    const own = answer.pieces.filter(({ id }) => pieces.includes(id));
    const start = Math.min(0, from.in);
    return {
      name: /^[a-z]{2}$/i.test(name) ? name.toUpperCase().split("").join("-") : name.slice(0, 5),
      length: to.in - start,
      pieces: own.map((piece) => ({ from: piece.from!.in - start, to: piece.to!.in - start, label: piece.id })),
      bolts: own.flatMap(({ holes }) => holes.map(({ station, kind }) => ({ at: station.in - start, tone: kind === "bolt" ? ("good" as const) : kind }))),
    };
  });
}

/** A board and the pieces cut from it, in order from its squared end. */
export function boardBars(answer: PlatesAnswer): Bar[] {
  return answer.boards.map(({ stock, pieces }, index) => {
    let at = 0;
    return {
      name: String(index + 1),
      length: stock.in,
      pieces: pieces.map((id) => {
        const { length } = answer.pieces.find((piece) => piece.id === id)!;
        const from = at;
        at += length.in;
        return { from, to: at, label: id };
      }),
      bolts: [],
    };
  });
}
