"use client";

import { memo } from "react";
import type { ConversionsAnswer } from "@/calculators/conversions";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";

const forms = ["feetInches", "inches", "decimalFeet", "decimalInches", "millimetres", "centimetres", "metres"] as const;
const metricFirst = ["millimetres", "metres", "centimetres", "feetInches", "inches", "decimalFeet", "decimalInches"] as const;

/** Errors are shown to 0.0001 in or 0.001 mm; below half of that, no place would tell. */
const places = { in: 4, mm: 3 } as const;

/** Every form of the length, and by how much what is shown is more or less than the true length. */
export const FormsTable = memo(function FormsTable({ answer, metric }: { answer: ConversionsAnswer; metric: boolean }) {
  const t = useTranslate();
  const shown = (form: (typeof forms)[number]) => {
    const { text } = answer[form];
    const [, digits, unit] = /^(-?[\d.]+) (ft|in|mm|cm|m)$/.exec(text) ?? [];
    return digits === undefined || unit === undefined ? <LengthText text={text} /> : t(`conversions.unit.${unit}`, { figure: digits });
  };
  const error = (errorIn: number) => {
    if (errorIn === 0) return t("common.lean.exact");
    const unit = metric ? "mm" : "in";
    const size = Math.abs(errorIn) * (metric ? 25.4 : 1);
    const least = 10 ** -places[unit];
    const figure = size < least / 2 ? `<${least}` : `${errorIn > 0 ? "+" : "-"}${size.toFixed(places[unit])}`;
    return t(`conversions.unit.${unit}`, { figure });
  };
  return (
    <table className="data-table forms-table">
      <caption className="sr-only">{t("conversions.forms.caption")}</caption>
      <thead>
        <tr>
          <th scope="col">{t("conversions.forms.form")}</th>
          <th scope="col" className="figure">
            {t("conversions.forms.figure")}
          </th>
          <th scope="col" className="figure">
            {t("conversions.forms.error")}
          </th>
        </tr>
      </thead>
      <tbody>
        {(metric ? metricFirst : forms).map((form) => (
          <tr key={form}>
            <th scope="row">{t(`conversions.forms.${form}`)}</th>
            <td className="figure num">{shown(form)}</td>
            <td className="figure num forms-error">{error(answer[form].errorIn)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
});
