"use client";

import type { ConversionsAnswer, StripOperation } from "@/calculators/conversions";
import { LengthField } from "@/components/length-field/length-field";
import { LengthText } from "@/components/ui/length-text";
import { TextField } from "@/components/ui/text-field";
import type { useCalculator } from "@/lib/client/calculator/use-calculator";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { opField, scales, stripOperationNames, valueField } from "./strip-fields";

export type StripForm = Pick<ReturnType<typeof useCalculator>, "field" | "value" | "set" | "errorAt">;

interface StripLineProps {
  form: StripForm;
  row: number;
  total: ConversionsAnswer["total"] | undefined;
  onRemove: () => void;
}

/** One line of the strip: what to do, with what, and the running total under the rule. */
export function StripLine({ form, row, total, onRemove }: StripLineProps) {
  const t = useTranslate();
  const op = form.value(opField(row)) || "add";
  const number = row + 1;
  const starts = row === 0 && op === "add";
  const field = form.field(valueField(row));
  const error = field.error ?? form.errorAt(opField(row));
  return (
    <li className="strip-line">
      <div className="strip-head">
        {starts ? (
          <>
            <input type="hidden" name={opField(row)} value="add" />
            <span className="field-label">{t("conversions.strip.start")}</span>
          </>
        ) : (
          <select
            id={fieldId(opField(row))}
            name={opField(row)}
            className="control strip-op"
            aria-label={t("conversions.strip.op", { number })}
            value={op}
            onChange={(event) => form.set(opField(row), event.target.value)}
          >
            {stripOperationNames.map((name: StripOperation) => (
              <option key={name} value={name}>
                {t(`conversions.op.${name}`)}
              </option>
            ))}
          </select>
        )}
        <button type="button" className="strip-remove" aria-label={t("conversions.strip.remove", { number })} onClick={onRemove}>
          <svg width="18" height="18" viewBox="0 0 18 18" aria-hidden="true" focusable="false">
            <path d="M3 3l12 12M15 3L3 15" stroke="currentColor" strokeWidth="2.4" fill="none" />
          </svg>
        </button>
      </div>
      {scales(op) ? (
        <TextField {...field} error={error} label={t("conversions.strip.factor", { number })} />
      ) : (
        <LengthField {...field} error={error} label={t("conversions.strip.length", { number })} />
      )}
      {row === 0 ? null : (
        <p className="strip-total">
          {total === undefined ? null : (
            <>
              <span className="strip-total-word">{t("conversions.strip.total")}</span> <LengthText text={total.text} />
            </>
          )}
        </p>
      )}
    </li>
  );
}
