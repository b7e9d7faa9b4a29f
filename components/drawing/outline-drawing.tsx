"use client";

import { useId, type ReactNode } from "react";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { drawnFrom, letterPlace, outlineFrame, outward, timesBetween } from "./outline-geometry";
import { between, pathOf, pixel, type Point } from "./plan-geometry";
import { Chalk, Concrete, Pull } from "./plan-parts";

export interface OutlineDrawingProps {
  /** Corners counter-clockwise from A, in inches. */
  slab: readonly Point[];
  chalk?: readonly Point[] | null;
  /** Which of the two stands undistorted; the other's way from it is drawn larger. */
  truth?: "slab" | "chalk";
  names: readonly string[];
  /** A text beside each side; left out where it has no room. */
  sides: readonly string[];
  /** Pulls between corners, by number, on the slab or on the chalk. */
  pulls?: readonly { from: number; to: number }[];
  /** Sides to mark in red: the plate stands past the concrete, or a run that is in doubt. */
  marked?: readonly number[];
  description: string;
  title: string;
  /** After the scale. */
  caption?: ReactNode;
}

/** Any plan from above, to scale from the answer's own numbers. The gap between slab and chalk is drawn larger by a round number, stated below. */
export function OutlineDrawing({ slab, chalk = null, truth = "slab", names, sides, pulls = [], marked = [], description, title, caption }: OutlineDrawingProps) {
  const t = useTranslate();
  const id = useId();
  const base = truth === "chalk" && chalk !== null ? chalk : slab;
  const frame = outlineFrame(base);
  const other = chalk === null ? null : truth === "chalk" ? slab : chalk;
  const times = other === null ? 1 : timesBetween(other, base, frame.pixelsPerInch);
  const drawnBase = base.map(frame.place);
  const drawnOther = other === null ? null : drawnFrom(other, base, times).map(frame.place);
  const concrete = truth === "chalk" && drawnOther !== null ? drawnOther : drawnBase;
  const lines = chalk === null ? null : truth === "chalk" ? drawnBase : drawnOther;
  const pulled = lines ?? concrete;
  const around = (points: readonly Point[], index: number) => points[(index + points.length) % points.length]!;

  return (
    <figure>
      <svg viewBox={`0 0 ${frame.width} ${frame.height}`} className="plan" role="img" aria-labelledby={`${id}-title ${id}-desc`}>
        <title id={`${id}-title`}>{title}</title>
        <desc id={`${id}-desc`}>{description}</desc>
        <Concrete points={concrete} id={`${id}-concrete`} />
        {lines === null ? null : <Chalk points={lines} />}
        {marked.map((side) => (
          <polyline key={side} points={pathOf([around(pulled, side), around(pulled, side + 1)])} fill="none" stroke="var(--keel)" strokeWidth="3.4" strokeDasharray="10 6" />
        ))}
        {pulls.map(({ from, to }, index) => (
          <Pull key={`${from}-${to}`} from={pulled[from]!} to={pulled[to]!} number={index + 1} dashed={index % 2 === 1} />
        ))}
        {concrete.map((corner, index) => {
          const at = letterPlace(around(concrete, index - 1), corner, around(concrete, index + 1));
          return (
            <text key={names[index]} x={at.x} y={at.y} textAnchor="middle" className="disp halo">
              {names[index]}
            </text>
          );
        })}
        {concrete.map((corner, index) => (
          <SideText key={names[index]} from={corner} to={around(concrete, index + 1)} text={sides[index] ?? ""} inside={[index, index + 1].map((end) => isInside(around(concrete, end - 1), around(concrete, end), around(concrete, end + 1))) as [boolean, boolean]} />
        ))}
      </svg>
      <figcaption className="plan-caption">
        {times > 1 ? t("common.drawing.insetExaggerated", { times }) : t("common.drawing.toScale")}
        {caption === undefined ? null : <> {caption}</>}
      </figcaption>
    </figure>
  );
}

/** About how wide a figure of the small text is, in pixels. */
const figureWidth = 8.2;

/** On paper a counter-clockwise plan turns the other way: right turns are its inside corners. */
function isInside(before: Point, at: Point, after: Point): boolean {
  return (at.x - before.x) * (after.y - at.y) - (at.y - before.y) * (after.x - at.x) > 0;
}

/** A side's figure at its middle, moved a little off an inside corner, whose letter stands on the same side. */
function SideText({ from, to, text, inside }: { from: Point; to: Point; text: string; inside: readonly [boolean, boolean] }) {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const crowded = inside.filter(Boolean).length;
  if (text === "" || length < text.length * figureWidth + 22 + 8 * crowded) return null;
  const shift = (inside[0] ? 8 : 0) - (inside[1] ? 8 : 0);
  const middle = between(from, to, 0.5 + shift / length);
  const out = outward(from, to);
  const upright = Math.abs(to.y - from.y) > Math.abs(to.x - from.x);
  const off = 15;
  const at = { x: pixel(middle.x + out.x * off), y: pixel(middle.y + out.y * off) };
  if (!upright) {
    return (
      <text x={at.x} y={pixel(at.y + 5)} textAnchor="middle" className="num small halo">
        {text}
      </text>
    );
  }
  return (
    <text transform={`translate(${pixel(at.x + 5)} ${at.y}) rotate(-90)`} textAnchor="middle" className="num small halo">
      {text}
    </text>
  );
}
