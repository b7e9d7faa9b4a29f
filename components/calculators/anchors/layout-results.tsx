"use client";

import type { LayoutAnswer } from "@/calculators/anchors";
import { LengthAnswer } from "@/components/ui/length-answer";
import { LengthText } from "@/components/ui/length-text";
import { Note } from "@/components/ui/note";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { HardwareNotes, NotStated } from "./hardware-notes";

/** The stations of every piece, from the wall's corner and from the piece's own end. */
export function LayoutResults({ answer }: { answer: LayoutAnswer }) {
  const t = useTranslate();
  return (
    <>
      {answer.warnings.map(({ code, piece, limit, actual }, index) => (
        <Note key={index} tone="warn" title={t(`anchors.warning.${code}.title`)}>
          {t.rich(`anchors.warning.${code}.body`, { piece: piece === null ? "" : piece + 1, limit: <LengthText text={limit.text} />, actual: <LengthText text={actual.text} /> })}
        </Note>
      ))}
      {answer.exception === null ? null : <Note title={t("anchors.exception.title")}>{t("anchors.exception.body", { bolts: answer.exception.bolts, clause: answer.exception.clause ?? "" })}</Note>}
      {answer.pieces.map(({ length, count, spacing, even, stations, holes }, index) => (
        <section key={index} aria-labelledby={`piece-${index}`}>
          <h2 id={`piece-${index}`}>{t.rich("anchors.layout.piece", { number: index + 1, length: <LengthText text={length.text} /> })}</h2>
          <p>{spacing === null ? t("anchors.layout.count", { count }) : t.rich(even ? "anchors.layout.even" : "anchors.layout.uneven", { count, spacing: <LengthAnswer length={spacing} /> })}</p>
          {count === 0 ? null : (
            <div className="overflow-x-auto">
              <table className="data-table">
                <thead>
                  <tr>
                    <th scope="col">{t("anchors.table.bolt")}</th>
                    <th scope="col" className="figure">{t("anchors.table.station")}</th>
                    <th scope="col" className="figure">{t("anchors.table.hole")}</th>
                  </tr>
                </thead>
                <tbody>
                  {stations.map((station, bolt) => (
                    <tr key={station.in}>
                      <td>{bolt + 1}</td>
                      <td className="figure"><LengthAnswer length={station} /></td>
                      <td className="figure"><LengthAnswer length={holes[bolt]!} /></td>
                    </tr>
                  ))}
                </tbody>
              </table>
            </div>
          )}
        </section>
      ))}
      <ul className="silent">
        <NotStated answer={answer} />
      </ul>
      <HardwareNotes answer={answer} />
    </>
  );
}
