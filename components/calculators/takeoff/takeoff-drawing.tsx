"use client";

import { useId } from "react";
import type { TakeoffAnswer } from "@/calculators/takeoff";
import { pixel } from "@/components/drawing/plan-geometry";
import { useTranslate } from "@/lib/client/i18n/messages-context";

const box = 390;
const left = 56;
const right = 86;
const rowHeight = 34;
const mostRows = 8;

/** The boards to order, longest on top, all to one scale. */
export function TakeoffDrawing({ answer }: { answer: TakeoffAnswer | null }) {
  const t = useTranslate();
  const id = useId();
  const boards = answer === null ? [192, 144, 96].map((length) => ({ length, text: "", quantity: null })) : answer.lines.filter(({ item }) => item === "board").map(({ size, quantity }) => ({ length: size!.in, text: size!.text, quantity }));
  const shown = boards.slice(0, mostRows);
  const perInch = (box - left - right) / Math.max(...shown.map(({ length }) => length), 1);
  return (
    <figure>
      <svg viewBox={`0 0 ${box} ${shown.length * rowHeight + 14}`} className="plan" role="img" aria-labelledby={`${id}-title ${id}-desc`}>
        <title id={`${id}-title`}>{t("takeoff.drawing.title")}</title>
        <desc id={`${id}-desc`}>{answer === null ? t("takeoff.drawing.blank") : t("takeoff.drawing.description", { boards: answer.totals.boards, kinds: boards.length })}</desc>
        {shown.map(({ length, text, quantity }, index) => (
          <g key={index} transform={`translate(0 ${index * rowHeight + 8})`}>
            {quantity === null ? null : (
              <text x={left - 10} y="19" textAnchor="end" className="num">
                {quantity}
              </text>
            )}
            <rect x={left} y="4" width={pixel(length * perInch)} height="20" fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
            <text x={pixel(left + length * perInch + 8)} y="19" className="num small">
              {text}
            </text>
          </g>
        ))}
      </svg>
      <figcaption className="plan-caption">{t("takeoff.drawing.scale")}</figcaption>
    </figure>
  );
}
