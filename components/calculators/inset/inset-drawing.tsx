"use client";

import { useId } from "react";
import type { InsetAnswer } from "@/calculators/inset";
import { Chalk, Concrete, CornerLetter, Dimension, Pull } from "@/components/drawing/plan-parts";
import { between, cornerNames, exaggerated, exaggeration, frameFor, insetPixels, rectangleOf, type Corner, type Corners, type Point } from "@/components/drawing/plan-geometry";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { sides, type Side } from "./inset-fields";

const ends = { ab: ["A", "B"], bc: ["B", "C"], cd: ["C", "D"], da: ["D", "A"] } as const satisfies Record<Side, readonly [Corner, Corner]>;
/** A fresh page shows the work on a slab of its own, without figures. */
const blank = { corners: rectangleOf(336, 264), chalk: insetRectangle(336, 264, 0.5) };

/** The slab and its chalk lines from above, to scale; rack and inset drawn larger by round numbers that the caption states. A line that may be off is dashed red and named. */
export function InsetDrawing({ answer, pulled }: { answer: InsetAnswer | null; pulled: boolean }) {
  const t = useTranslate();
  const id = useId();
  const slab = answer === null ? blank.corners : cornersOf(answer, "slab");
  const chalk = answer === null ? blank.chalk : cornersOf(answer, "chalk");
  const [length, width] = [slab.B.x, Math.hypot(slab.D.x, slab.D.y)];
  const truth = rectangleOf(length, width);
  const frame = frameFor(length, width);
  const times = exaggeration(slab, truth, frame.pixelsPerInch);
  const drawn = exaggerated(slab, truth, times);
  const chalkTimes = exaggeration(chalk, slab, frame.pixelsPerInch, insetPixels);
  const at = placed(drawn, frame.place);
  const lines = placed(exaggerated(chalk, slab, chalkTimes, drawn), frame.place);
  const middle: Point = { x: (at.A.x + at.C.x) / 2, y: (at.A.y + at.C.y) / 2 };
  const suspected = sides.filter((side) => answer?.suspects.some(({ line, fits }) => fits && line === side));

  return (
    <figure>
      <svg viewBox={`0 0 ${frame.width} ${frame.height}`} className="plan" role="img" aria-labelledby={`${id}-title ${id}-desc`}>
        <title id={`${id}-title`}>{t("inset.drawing.title")}</title>
        <desc id={`${id}-desc`}>{answer === null ? t("inset.drawing.blank") : t("inset.drawing.description", { ab: answer.lines.ab.text, bc: answer.lines.bc.text, ac: answer.expected.ac.diagonal.text, bd: answer.expected.bd.diagonal.text })}</desc>
        <Concrete points={ring(at)} id={`${id}-concrete`} />
        <Chalk points={ring(lines)} />
        {pulled ? (
          <>
            <Pull from={lines.A} to={lines.C} number={1} />
            <Pull from={lines.B} to={lines.D} number={2} dashed />
          </>
        ) : null}
        {suspected.map((side) => (
          <SuspectLine key={side} from={lines[ends[side][0]]} to={lines[ends[side][1]]} toward={middle} text={t("inset.drawing.off")} />
        ))}
        {cornerNames.map((name) => (
          <CornerLetter key={name} name={name} at={at[name]} toward={middle} />
        ))}
        {answer === null ? null : (
          <>
            <Dimension from={at.A} to={at.B} text={answer.lines.ab.text} />
            <Dimension from={{ x: Math.min(at.A.x, at.D.x), y: at.A.y }} to={{ x: Math.min(at.A.x, at.D.x), y: at.D.y }} text={answer.lines.da.text} />
          </>
        )}
      </svg>
      <figcaption className="plan-caption">
        {times > 1 ? t("common.drawing.exaggerated", { times }) : null} {chalkTimes > 1 ? t("common.drawing.insetExaggerated", { times: chalkTimes }) : t("common.drawing.toScale")}
        {answer === null ? null : ` ${t("inset.drawing.figures")}`}
      </figcaption>
    </figure>
  );
}

function SuspectLine({ from, to, toward, text }: { from: Point; to: Point; toward: Point; text: string }) {
  const at = between(between(from, to, 0.5), toward, 0.16);
  return (
    <g>
      <line x1={from.x} y1={from.y} x2={to.x} y2={to.y} stroke="var(--keel)" strokeWidth="3.4" strokeDasharray="10 6" />
      <text x={at.x} y={at.y + 5} textAnchor="middle" className="num small halo out">
        {text}
      </text>
    </g>
  );
}

function cornersOf({ corners }: InsetAnswer, of: "slab" | "chalk"): Corners {
  return { A: corners.A[of], B: corners.B[of], C: corners.C[of], D: corners.D[of] };
}

function placed(corners: Corners, by: (point: Point) => Point): Corners {
  return { A: by(corners.A), B: by(corners.B), C: by(corners.C), D: by(corners.D) };
}

function ring({ A, B, C, D }: Corners): Point[] {
  return [A, B, C, D];
}

function insetRectangle(length: number, width: number, by: number): Corners {
  return { A: { x: by, y: by }, B: { x: length - by, y: by }, C: { x: length - by, y: width - by }, D: { x: by, y: width - by } };
}
