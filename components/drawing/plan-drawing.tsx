"use client";

import { useId, type ReactNode } from "react";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { Chalk, Concrete, CornerLetter, Dimension, MoveArrow, Pull } from "./plan-parts";
import { cornerNames, exaggerated, exaggeration, frameFor, insetPixels, pathOf, rectangleOf, type Corners, type Point } from "./plan-geometry";

export interface PlanDrawingProps {
  /** The sides, in inches: the drawing is to their scale. */
  length: number;
  width: number;
  /** As the readings make them, in inches; without them the plan is the rectangle. */
  corners?: Corners;
  /** Texts along AB and DA (and along CD and BC when all four were pulled). */
  sides: { ab: string; da: string; cd?: string; bc?: string };
  /** Both pulls, numbered 1 (A to C) and 2 (B to D). */
  diagonals?: boolean;
  /** Chalk corners in inches. The inset has a larger scale of its own, stated too, so that the gap to the slab edge shows. */
  chalk?: Corners;
  /** Which way side CD must go; nothing when it stands right. */
  move?: { toward: "C" | "D"; text: string };
  /** Says in one sentence what is drawn, figures included. */
  description: string;
  title?: string;
  /** Replaces the caption that states the scale. */
  caption?: ReactNode;
}

/**
 * The slab from above, to scale from the same numbers as the answer. Departures from the rectangle are too small to see, so
 * they are drawn larger by a round number that is computed from them and stated under the drawing.
 */
export function PlanDrawing({ length, width, corners, sides, diagonals = true, chalk, move, description, title, caption }: PlanDrawingProps) {
  const t = useTranslate();
  const id = useId();
  const rectangle = rectangleOf(length, width);
  const frame = frameFor(length, width);
  const times = corners === undefined ? 1 : exaggeration(corners, rectangle, frame.pixelsPerInch);
  const drawn = corners === undefined ? rectangle : exaggerated(corners, rectangle, times);
  const slab = corners ?? rectangle;
  const chalkTimes = chalk === undefined ? 1 : exaggeration(chalk, slab, frame.pixelsPerInch, insetPixels);
  const at = place(drawn, frame.place);
  const truth = place(rectangle, frame.place);
  const middle: Point = { x: (at.A.x + at.C.x) / 2, y: (at.A.y + at.C.y) / 2 };
  const isRacked = cornerNames.some((name) => Math.hypot(at[name].x - truth[name].x, at[name].y - truth[name].y) > 1.5);
  const arrow = move === undefined ? null : arrowOf(move.toward, at);

  return (
    <figure>
      <svg viewBox={`0 0 ${frame.width} ${frame.height}`} className="plan" role="img" aria-labelledby={`${id}-title ${id}-desc`}>
        <title id={`${id}-title`}>{title ?? t("common.drawing.slab")}</title>
        <desc id={`${id}-desc`}>{description}</desc>
        <Concrete points={ring(at)} id={`${id}-concrete`} />
        {isRacked ? <polygon points={pathOf(ring(truth))} fill="none" stroke="var(--edge-strong)" strokeDasharray="2 5" strokeWidth="1.4" /> : null}
        {chalk === undefined ? null : <Chalk points={ring(place(exaggerated(chalk, slab, chalkTimes, drawn), frame.place))} />}
        {diagonals ? (
          <>
            <Pull from={at.A} to={at.C} number={1} />
            <Pull from={at.B} to={at.D} number={2} dashed />
          </>
        ) : null}
        {cornerNames.map((name) => (
          <CornerLetter key={name} name={name} at={at[name]} toward={middle} />
        ))}
        <Dimension from={at.A} to={at.B} text={sides.ab} />
        <Dimension from={{ x: Math.min(at.A.x, at.D.x), y: at.A.y }} to={{ x: Math.min(at.A.x, at.D.x), y: at.D.y }} text={sides.da} />
        {sides.cd === undefined || move !== undefined ? null : <Dimension from={at.D} to={at.C} text={sides.cd} off={-18} />}
        {sides.bc === undefined ? null : <Dimension from={at.B} to={at.C} text={sides.bc} off={-18} />}
        {arrow === null || move === undefined ? null : <MoveArrow {...arrow} text={move.text} />}
      </svg>
      <figcaption className="plan-caption">
        {caption ?? (
          <>
            {times === 1 && chalkTimes === 1 ? t("common.drawing.toScale") : null}
            {times > 1 ? t("common.drawing.exaggerated", { times }) : null} {chalkTimes > 1 ? t("common.drawing.insetExaggerated", { times: chalkTimes }) : null}
          </>
        )}
      </figcaption>
    </figure>
  );
}

function place(corners: Corners, by: (point: Point) => Point): Corners {
  return { A: by(corners.A), B: by(corners.B), C: by(corners.C), D: by(corners.D) };
}

function ring({ A, B, C, D }: Corners): Point[] {
  return [A, B, C, D];
}

/** Above side CD, beginning inside and pointing at the corner it must go toward. */
function arrowOf(toward: "C" | "D", at: Corners): { from: Point; to: Point } {
  const y = Math.min(at.C.y, at.D.y) - 14;
  return toward === "D" ? { from: { x: at.D.x + 46, y }, to: { x: at.D.x + 10, y } } : { from: { x: at.C.x - 46, y }, to: { x: at.C.x - 10, y } };
}
