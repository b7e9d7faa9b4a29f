"use client";

import { useTranslate } from "@/lib/client/i18n/messages-context";
import { opField, stripOperationNames, valueField } from "./strip-fields";

const blankLines = 4;

/** Without script nothing can add a line, so a few blank ones are there; those left blank are passed over. */
export function NoScriptLines({ from }: { from: number }) {
  const t = useTranslate();
  return (
    <noscript>
      <fieldset>
        <legend className="field-label">{t("conversions.strip.title")}</legend>
        {Array.from({ length: blankLines }, (_, index) => from + index).map((row) => (
          <div key={row} className="strip-blank">
            <select name={opField(row)} className="control" aria-label={t("conversions.strip.op", { number: row + 1 })}>
              {stripOperationNames.map((name) => (
                <option key={name} value={name}>
                  {t(`conversions.op.${name}`)}
                </option>
              ))}
            </select>
            <input type="text" name={valueField(row)} className="control" aria-label={t("conversions.strip.length", { number: row + 1 })} />
          </div>
        ))}
      </fieldset>
    </noscript>
  );
}
