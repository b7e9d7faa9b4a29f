"use client";

import type { SquarenessAnswer } from "@/calculators/squareness";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { readings as names } from "./squareness-fields";

/** Reading by reading: actual length, what the tape's own errors did to it, and what the adjustment makes of it. Left out where there is nothing to tell. */
export function ReadingTable({ answer, system }: { answer: SquarenessAnswer; system: "imperial" | "metric" }) {
  const t = useTranslate();
  const adjusted = answer.readings.ab.adjusted !== null;
  const taped = answer.readings.ac.correctionIn !== null;
  if (!adjusted && !taped) return null;
  const signed = (inches: number) => {
    const text = system === "metric" ? Math.abs(inches * 25.4).toFixed(1) : Math.abs(inches).toFixed(3);
    return Number(text) === 0 ? "0" : `${inches > 0 ? "+" : "-"}${text}`;
  };
  return (
    <section aria-labelledby="readings-title">
      <h2 id="readings-title">{t("squareness.table.title")}</h2>
      <p>{adjusted ? t("squareness.table.adjustedIntro") : t("squareness.table.tapeIntro")}</p>
      <div className="overflow-x-auto">
        <table className="data-table">
          <thead>
            <tr>
              <th scope="col">{t("squareness.table.reading")}</th>
              {taped ? (
                <th scope="col" className="figure">
                  {t("squareness.table.tape", { system })}
                </th>
              ) : null}
              <th scope="col" className="figure">
                {t("squareness.table.measured")}
              </th>
              {adjusted ? (
                <>
                  <th scope="col" className="figure">
                    {t("squareness.table.adjusted")}
                  </th>
                  <th scope="col" className="figure">
                    {t("squareness.table.change", { system })}
                  </th>
                </>
              ) : null}
            </tr>
          </thead>
          <tbody>
            {names.map((name) => {
              const row = answer.readings[name];
              if (row === null) return null;
              return (
                <tr key={name}>
                  <th scope="row">{t(`squareness.reading.${name}`)}</th>
                  {taped ? <td className="figure num">{row.correctionIn === null ? t("squareness.table.none") : signed(row.correctionIn.total)}</td> : null}
                  <td className="figure">
                    <LengthText text={row.measured.text} />
                  </td>
                  {adjusted ? (
                    <>
                      <td className="figure">{row.adjusted === null ? null : <LengthText text={row.adjusted.text} />}</td>
                      <td className="figure num">{row.residualIn === null ? null : signed(row.residualIn)}</td>
                    </>
                  ) : null}
                </tr>
              );
            })}
          </tbody>
        </table>
      </div>
    </section>
  );
}
