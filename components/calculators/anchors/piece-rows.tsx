"use client";

import { LengthField } from "@/components/length-field/length-field";
import { Button } from "@/components/ui/button";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { AnchorsForm } from "./anchors-calculator";
import type { Mode } from "./anchors-fields";

const blankRows = 3;

/** The wall's pieces: lengths for a new layout, where each ends for a check. The first row is always there. */
export function PieceRows({ form, mode }: { form: AnchorsForm; mode: Mode }) {
  const t = useTranslate();
  const rows = Math.max(1, form.rows("pieces"));
  const nameOf = (row: number) => (mode === "layout" ? `pieces.${row}` : `pieces.${row}.to`);
  const add = () => {
    form.set(nameOf(rows), "");
    requestAnimationFrame(() => document.getElementById(fieldId(nameOf(rows)))?.focus());
  };
  return (
    <fieldset className="rows">
      <legend className="rows-title">{t(`anchors.pieces.${mode}`)}</legend>
      {Array.from({ length: rows }, (_, row) => (
        <div key={row} className="rows-item">
          <div className={mode === "check" ? "rows-pair" : undefined}>
            {mode === "check" ? (
              <LengthField {...form.field(`pieces.${row}.from`)} label={t("anchors.pieces.from", { number: row + 1 })} hint={row === 0 ? t("anchors.pieces.fromFirst") : t("anchors.pieces.fromNext")} />
            ) : null}
            <LengthField
              {...form.field(nameOf(row))}
              error={form.errorAt(nameOf(row)) ?? (row === 0 ? form.errorAt("pieces") : undefined)}
              label={t(mode === "layout" ? "anchors.pieces.length" : "anchors.pieces.to", { number: row + 1 })}
              hint={mode === "check" ? t("anchors.pieces.toHint") : undefined}
            />
          </div>
          {rows > 1 ? (
            <Button kind="ghost" small className="no-print" onClick={() => form.removeRow("pieces", row)}>
              {t("anchors.pieces.remove", { number: row + 1 })}
            </Button>
          ) : null}
        </div>
      ))}
      <noscript>
        {Array.from({ length: blankRows }, (_, index) => rows + index).map((row) => (
          <label key={row} className="rows-blank">
            {t(mode === "layout" ? "anchors.pieces.length" : "anchors.pieces.to", { number: row + 1 })}
            <input type="text" name={nameOf(row)} className="control" />
          </label>
        ))}
      </noscript>
      <Button kind="ghost" small className="rows-add no-print" onClick={add}>
        {t("anchors.pieces.add")}
      </Button>
    </fieldset>
  );
}
