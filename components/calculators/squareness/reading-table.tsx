"use client";

import type { SquarenessAnswer } from "@/calculators/squareness";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { readings as names } from "./squareness-fields";

/** Reading by reading: actual length, what the tape's own errors did to it, and what the adjustment makes of it. Left out where there is nothing to tell. */
export function ReadingTable({ answer }: { answer: SquarenessAnswer }) {
  const t = useTranslate();
  const adjusted = answer.readings.ab.adjusted !== null;
  const taped = answer.readings.ac.correctionIn !== null;
  if (!adjusted && !taped) return null;
  const inches = (value: number) => (Math.abs(value) < 0.0005 ? "0" : `${value > 0 ? "+" : "-"}${Math.abs(value).toFixed(3)}`);
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
                  {t("squareness.table.tape")}
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
                    {t("squareness.table.change")}
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
                  {taped ? <td className="figure num">{row.correctionIn === null ? t("squareness.table.none") : inches(row.correctionIn.total)}</td> : null}
                  <td className="figure">
                    <LengthText text={row.measured.text} />
                  </td>
                  {adjusted ? (
                    <>
                      <td className="figure">{row.adjusted === null ? null : <LengthText text={row.adjusted.text} />}</td>
                      <td className="figure num">{row.residualIn === null ? null : inches(row.residualIn)}</td>
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
