"use client";

import { memo } from "react";
import type { ConversionsAnswer } from "@/calculators/conversions";
import type { Precision } from "@/calculators/length";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { bladeWindow } from "./blade-window";

/** How much of the width a figure may take on a phone, in per cent: nearer than this, the mark would stand on it. */
const labelRoom = 17;

/** The tape where the answer stands: its graduation in red, and in blue where the true length falls when they differ. */
export const ResultBlade = memo(function ResultBlade({ answer, precision, single }: { answer: ConversionsAnswer | null; precision: Precision; single: boolean }) {
  const t = useTranslate();
  const metric = precision.endsWith("mm");
  const trueInches = answer?.total.in ?? null;
  const drawable = trueInches !== null && trueInches >= 0;
  const marked = answer === null ? 0 : metric ? trueInches! + answer.millimetres.errorIn : trueInches! + answer.feetInches.errorIn;
  const tape = bladeWindow(drawable ? marked : 0, precision);
  const exact = answer?.total.lean === "exact";
  const text = answer?.total.text ?? "";
  const mark = tape.at(marked);
  const description = !drawable
    ? t(trueInches === null ? "conversions.blade.blank" : "conversions.blade.negative")
    : t(exact ? "conversions.blade.exact" : "conversions.blade.leaning", { length: text });
  return (
    <figure className="result-blade" data-single={single || undefined}>
      <svg role="img" aria-label={description}>
        <rect x={`${tape.hook ?? 0}%`} y="34" width="100%" height="112" fill="var(--blade)" />
        <line x1={`${tape.hook ?? 0}%`} x2="100%" y1="34" y2="34" stroke="var(--edge-strong)" strokeWidth="1.5" />
        <line x1={`${tape.hook ?? 0}%`} x2="100%" y1="146" y2="146" stroke="var(--edge-strong)" strokeWidth="1.5" />
        {tape.hook === null ? null : (
          <svg x={`${tape.hook}%`} overflow="visible">
            <path d="M-7 26h7v130h-7z" fill="var(--steel)" />
          </svg>
        )}
        {tape.ticks.map(({ key, x, height }) => (
          <line key={key} x1={`${x}%`} x2={`${x}%`} y1="34" y2={34 + height} stroke="var(--ink)" strokeWidth={height > 70 ? 2.2 : 1.4} />
        ))}
        {tape.labels.map(({ key, x, count }) => {
          const aside = x > labelRoom && (x > 100 - labelRoom || (drawable && mark > x && mark < x + labelRoom));
          const place = { x: aside ? -7 : 7, textAnchor: aside ? "end" : "start" } as const;
          return (
            <svg key={key} x={`${x}%`} overflow="visible">
              <text {...place} y="112" className="blade-figure">
                {metric ? count * 10 : count}
              </text>
              {metric || count < 12 ? null : (
                <text {...place} y="133" className="blade-feet">
                  {`${Math.floor(count / 12)}' ${count % 12}"`}
                </text>
              )}
            </svg>
          );
        })}
        {drawable && answer !== null ? (
          <>
            {exact ? null : <line x1={`${tape.at(trueInches)}%`} x2={`${tape.at(trueInches)}%`} y1="34" y2="146" stroke="var(--chalk-line)" strokeWidth="2.5" strokeDasharray="7 4" />}
            <line x1={`${mark}%`} x2={`${mark}%`} y1="28" y2="152" stroke="var(--keel)" strokeWidth="3.5" />
            <svg x={`${mark}%`} overflow="visible">
              <path d="M0 152l-8 13h16z" fill="var(--keel)" />
              <text y="21" x={mark > 72 ? 8 : mark < 28 ? -8 : 0} textAnchor={mark > 72 ? "end" : mark < 28 ? "start" : "middle"} className="blade-reading">
                {text}
              </text>
            </svg>
          </>
        ) : null}
      </svg>
      <figcaption className="plan-caption">{description}</figcaption>
    </figure>
  );
});
