"use client";

import type { ReactNode } from "react";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { ErrorMark } from "./marks";

export interface FieldTexts {
  label: ReactNode;
  hint?: ReactNode;
  /** What is wrong and what to type; shown only once the form asks. */
  error?: ReactNode;
  /** The number of a diagonal, in the blue dot of the drawing. */
  dot?: number;
}

/** Label, hint and error round one control. Give the control `id`, and `aria-describedby={describedBy(id, …)}`. */
export function Field({ id, label, hint, error, dot, className = "", children }: FieldTexts & { id: string; className?: string; children: ReactNode }) {
  const t = useTranslate();
  const invalid = error !== undefined && error !== null;
  return (
    <div className={`field ${className}`} data-invalid={invalid || undefined}>
      <div className="field-head">
        <label htmlFor={id} className="field-label">
          {dot === undefined ? null : <span className="dot">{dot}</span>}
          {label}
        </label>
        {hint === undefined ? null : (
          <span id={`${id}-hint`} className="field-hint">
            {hint}
          </span>
        )}
      </div>
      {invalid ? (
        <p id={`${id}-error`} className="field-error">
          <ErrorMark />
          <span>
            <span className="sr-only">{t("common.field.errorPrefix")} </span>
            {error}
          </span>
        </p>
      ) : null}
      {children}
    </div>
  );
}

/** The ids a control is described by. */
export function describedBy(id: string, { hint, error }: Pick<FieldTexts, "hint" | "error">, ...more: (string | false)[]): string | undefined {
  const ids = [hint !== undefined && `${id}-hint`, error !== undefined && error !== null && `${id}-error`, ...more].filter(Boolean);
  return ids.length === 0 ? undefined : ids.join(" ");
}
