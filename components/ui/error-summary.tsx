"use client";

import { useEffect, useRef, type ReactNode } from "react";
import { useTranslate } from "@/lib/client/i18n/messages-context";

export interface FieldProblem {
  /** The id of the control, or none when the problem is the input's as a whole. */
  fieldId?: string;
  text: ReactNode;
}

/** All that needs another look, above the form. Shown once the answer was asked for; takes focus each time `asked` grows: count the times the form was sent. */
export function ErrorSummary({ problems, asked }: { problems: readonly FieldProblem[]; asked: number }) {
  const t = useTranslate();
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (asked > 0) box.current?.focus(); // only when asked: typing on must never lose its field
  }, [asked]);
  if (asked === 0 || problems.length === 0) return null;
  return (
    <div ref={box} className="error-summary" tabIndex={-1} role="alert" aria-labelledby="error-summary-title">
      <h2 id="error-summary-title">{t("common.errors.title", { count: problems.length })}</h2>
      <ul>
        {problems.map(({ fieldId, text }, index) => (
          <li key={index}>{fieldId === undefined ? <span>{text}</span> : <a href={`#${fieldId}`}>{text}</a>}</li>
        ))}
      </ul>
    </div>
  );
}
