"use client";

import { memo } from "react";
import type { ConversionsAnswer } from "@/calculators/conversions";
import { LengthAnswer } from "@/components/ui/length-answer";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** The length in equal spaces: to scale on a line, and each mark from zero, since a chain of rounded spaces drifts. */
export const EqualSpaces = memo(function EqualSpaces({ spacing, total }: { spacing: NonNullable<ConversionsAnswer["spacing"]>; total: ConversionsAnswer["total"] }) {
  const t = useTranslate();
  const { count, each, marks } = spacing;
  const places = Array.from({ length: count + 1 }, (_, mark) => (mark / count) * 100);
  return (
    <section aria-labelledby="spaces-heading">
      <h2 id="spaces-heading" className="spaces-heading">
        {t.rich("conversions.spaces.title", { count, each: <LengthAnswer length={each} /> })}
      </h2>
      <svg className="spaces-line" role="img" aria-label={t("conversions.spaces.drawing", { count, total: total.text })}>
        <rect x="1" y="14" width="100%" height="20" fill="var(--timber)" stroke="var(--timber-edge)" />
        {places.map((x) => (
          <line key={x} x1={`${x}%`} x2={`${x}%`} y1="6" y2="42" stroke="var(--ink)" strokeWidth="2" />
        ))}
      </svg>
      <p className="field-hint">{t("conversions.spaces.fromZero")}</p>
      <ol className="spaces-marks">
        {marks.map((mark, index) => (
          <li key={index}>
            <span className="spaces-number">{index + 1}</span>
            <LengthText text={mark.text} />
          </li>
        ))}
      </ol>
    </section>
  );
});
