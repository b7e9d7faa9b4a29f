"use client";

import { Fragment, useId, type ReactNode } from "react";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { pixel } from "./plan-geometry";
import { plateHeight, wallRows, type PlacedBolt, type WallBolt, type WallGap, type WallPiece } from "./wall-geometry";

export interface WallDrawingProps {
  /** Plate pieces in order along the wall. */
  pieces: readonly WallPiece[];
  bolts: readonly WallBolt[];
  /** As measured, in inches. */
  plateWidth: number;
  /** From the plate's outer edge out to the slab edge, in inches; negative when the plate overhangs. */
  inset?: number;
  /** The band in which a bolt's centre must stand. */
  middleThird?: boolean;
  /** Distances that break a rule, drawn under the plate from bolt to bolt with their words. */
  gaps?: readonly WallGap[];
  /** What the drawing shows, in one sentence. */
  description: string;
  title?: string;
  caption?: ReactNode;
}

const box = 390;
const labelRoom = 42;
const underRoom = 34;
const gapRoom = 26;

/** A wall's plates from above, outer edge down, each piece a row: timber, bolts, the middle third, and the slab edge beyond. */
export function WallDrawing({ pieces, bolts, plateWidth, inset, middleThird = false, gaps = [], description, title, caption }: WallDrawingProps) {
  const t = useTranslate();
  const id = useId();
  if (pieces.length === 0) return null;
  const { rows, perInch, acrossTimes, acrossPerInch } = wallRows({ pieces, bolts, plateWidth, box });
  const rowHeight = labelRoom + plateHeight + underRoom + (gaps.length > 0 ? gapRoom : 0);
  const edge = inset === undefined ? null : Math.max(-plateHeight / 2, Math.min(18, inset * acrossPerInch));
  return (
    <figure>
      <svg viewBox={`0 0 ${box} ${rows.length * rowHeight + 8}`} className="plan" role="img" aria-labelledby={`${id}-title ${id}-desc`}>
        <title id={`${id}-title`}>{title ?? t("common.drawing.wall")}</title>
        <desc id={`${id}-desc`}>{description}</desc>
        {rows.map(({ piece, left, width, bolts: placed }, index) => (
          <g key={index} transform={`translate(0 ${index * rowHeight + labelRoom})`}>
            {edge === null ? null : <line x1="0" x2={box} y1={plateHeight + edge} y2={plateHeight + edge} stroke="var(--edge-strong)" strokeWidth="2" />}
            <rect x={left} y="0" width={width} height={plateHeight} fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
            {middleThird ? (
              <path
                d={`M${left} ${plateHeight / 3}h${width}M${left} ${(2 * plateHeight) / 3}h${width}`}
                fill="none"
                stroke="var(--timber-edge)"
                strokeWidth="1.2"
                strokeDasharray="5 4"
              />
            ) : null}
            {placed.map((bolt, number) => (
              <Fragment key={number}>
                {bolt.label === undefined ? null : <BoltLabel bolt={bolt} />}
                <BoltMark bolt={bolt} />
                {bolt.number === undefined ? null : (
                  <text x={bolt.x} y={plateHeight + 28} textAnchor="middle" className={bolt.tone === "bad" ? "num small out" : "num small"}>
                    {bolt.number}
                  </text>
                )}
              </Fragment>
            ))}
            {gaps
              .filter(({ from }) => from >= piece.from && from < piece.to)
              .map((gap) => (
                <GapMark key={gap.from} gap={gap} left={left - piece.from * perInch} perInch={perInch} end={left + width} />
              ))}
            {piece.label === undefined ? null : (
              <text x="4" y={plateHeight + 28} className="small disp">
                {piece.label}
              </text>
            )}
          </g>
        ))}
      </svg>
      <figcaption className="plan-caption">{caption ?? t("common.drawing.across", { times: acrossTimes })}</figcaption>
    </figure>
  );
}

/** A dimension in keel red; one that runs on to the next piece ends with this one's row. */
function GapMark({ gap: { from, to, label }, left, perInch, end }: { gap: WallGap; left: number; perInch: number; end: number }) {
  const [x1, x2, y] = [pixel(left + from * perInch), pixel(Math.min(end, left + to * perInch)), plateHeight + 40];
  return (
    <g>
      <path d={`M${x1} ${y - 5}v10M${x1} ${y}H${x2}M${x2} ${y - 5}v10`} fill="none" stroke="var(--keel)" strokeWidth="2" />
      <text x={pixel((x1 + x2) / 2)} y={y + 18} textAnchor="middle" className="num small out">
        {label}
      </text>
    </g>
  );
}

function BoltLabel({ bolt }: { bolt: PlacedBolt }) {
  const y = bolt.line === 0 ? -8 : -24;
  return (
    <>
      {bolt.line === 1 ? <line x1={bolt.x} x2={bolt.x} y1="-20" y2="0" stroke="var(--edge)" strokeWidth="1" /> : null}
      <text x={bolt.labelX} y={y} textAnchor="middle" className={bolt.tone === "bad" ? "num small halo out" : "num small halo"}>
        {bolt.label}
      </text>
    </>
  );
}

/** Shape tells as much as colour: a filled round, a crossed ring, a ring with a plus, a square. */
export function BoltMark({ bolt: { x, y, tone = "good" } }: { bolt: Pick<PlacedBolt, "x" | "y" | "tone"> }) {
  switch (tone) {
    case "bad":
      return (
        <g stroke="var(--keel)" strokeWidth="2.4">
          <circle cx={x} cy={y} r="7.5" fill="var(--sheet)" />
          <path d={`M${x - 4} ${y - 4}l8 8m0-8l-8 8`} />
        </g>
      );
    case "added":
      return (
        <g stroke="var(--chalk)" strokeWidth="2.4">
          <circle cx={x} cy={y} r="7.5" fill="var(--sheet)" />
          <path d={`M${x - 4.5} ${y}h9m-4.5-4.5v9`} />
        </g>
      );
    case "engineered":
      return <rect x={x - 6.5} y={y - 6.5} width="13" height="13" fill="var(--steel)" stroke="var(--sheet)" strokeWidth="1.2" />;
    default:
      return <circle cx={x} cy={y} r="6" fill="var(--steel)" stroke="var(--sheet)" strokeWidth="1.2" />;
  }
}
