"use client";

import { useId } from "react";
import type { CornerAnswer } from "@/calculators/corner";
import { Concrete, CornerLetter, Dimension } from "@/components/drawing/plan-parts";
import { frameFor, pathOf, type Point } from "@/components/drawing/plan-geometry";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** A fresh page shows the work on legs of no size. */
const blank = { first: 336, second: 264 };

/** The corner from above, to scale: both legs, the pull between their ends, and the whole-number triangle inside with its marks. */
export function CornerDrawing({ answer }: { answer: CornerAnswer | null }) {
  const t = useTranslate();
  const id = useId();
  const { first, second } = answer === null ? blank : { first: answer.legs.first.in, second: answer.legs.second.in };
  const frame = frameFor(first, second);
  const at = (x: number, y: number): Point => frame.place({ x, y });
  const [A, B, D] = [at(0, 0), at(first, 0), at(0, second)];
  const triangle = answer?.triangle ?? null;
  const marks = triangle === null ? null : { a: at(triangle.a.in, 0), b: at(0, triangle.b.in) };
  const middle = at(first / 2, second / 2);
  const full = answer === null ? null : { a: answer.legs.first.text, b: answer.legs.second.text, diagonal: answer.diagonal.text };
  return (
    <figure>
      <svg viewBox={`0 0 ${frame.width} ${frame.height}`} className="plan" role="img" aria-labelledby={`${id}-title ${id}-desc`}>
        <title id={`${id}-title`}>{t("corner.drawing.title")}</title>
        <desc id={`${id}-desc`}>
          {full === null ? t("corner.drawing.blank") : triangle === null ? t("corner.drawing.description", full) : t("corner.drawing.triangleDescription", { ...full, triangle: triangle.counts.join("-"), unit: triangle.unit })}
        </desc>
        <Concrete points={[A, B, at(first, second), D]} id={`${id}-concrete`} edge={false} />
        <path d={`M${D.x} ${D.y}L${A.x} ${A.y}L${B.x} ${B.y}`} fill="none" stroke="var(--edge-strong)" strokeWidth="2.6" />
        <path d={`M${A.x} ${A.y - 16}h16v16`} fill="none" stroke="var(--edge-strong)" strokeWidth="1.6" />
        <line x1={B.x} y1={B.y} x2={D.x} y2={D.y} stroke="var(--chalk-line)" strokeWidth="2.2" strokeDasharray={marks === null ? undefined : "9 5"} />
        {marks === null || triangle === null ? null : (
          <>
            <polygon points={pathOf([A, marks.a, marks.b])} fill="var(--chalk)" fillOpacity="0.1" stroke="var(--chalk-line)" strokeWidth="2.6" />
            <path d={`M${marks.a.x} ${marks.a.y - 8}v16M${marks.b.x - 8} ${marks.b.y}h16`} stroke="var(--keel)" strokeWidth="3" />
            <text x={(A.x + marks.a.x) / 2} y={A.y - 9} textAnchor="middle" className="num halo">
              {triangle.counts[0]}
            </text>
            <text x={A.x + 9} y={(A.y + marks.b.y) / 2 + 6} className="num halo">
              {triangle.counts[1]}
            </text>
            <text x={(marks.a.x + marks.b.x) / 2 - 12} y={(marks.a.y + marks.b.y) / 2 + 18} textAnchor="end" className="num halo">
              {triangle.counts[2]}
            </text>
          </>
        )}
        <CornerLetter name="A" at={A} toward={middle} />
        <CornerLetter name="B" at={B} toward={middle} />
        <CornerLetter name="D" at={D} toward={middle} />
        <Dimension from={A} to={B} text={full?.a ?? t("corner.drawing.first")} />
        <Dimension from={A} to={D} text={full?.b ?? t("corner.drawing.second")} />
      </svg>
      <figcaption className="plan-caption">{triangle === null ? t("common.drawing.toScale") : t("corner.drawing.caption", { unit: triangle.unit })}</figcaption>
    </figure>
  );
}
