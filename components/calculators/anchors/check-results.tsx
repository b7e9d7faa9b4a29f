"use client";

import type { CheckAnswer } from "@/calculators/anchors";
import { KeyValues } from "@/components/ui/key-values";
import { LengthText } from "@/components/ui/length-text";
import { Note } from "@/components/ui/note";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { FindingList } from "./finding-list";
import { HardwareNotes, NotStated } from "./hardware-notes";

/** Findings with their remedies, anchors to add, and what was not judged. */
export function CheckResults({ answer }: { answer: CheckAnswer }) {
  const t = useTranslate();
  const numbers = (bolts: readonly number[]) => bolts.map((bolt) => bolt + 1).join(", ");
  return (
    <>
      <FindingList answer={answer} />
      {answer.unfixable.map(({ piece, code, least }) => (
        <Note key={piece} tone="out" title={t("anchors.unfixable.title", { piece: piece + 1 })}>
          {least === null ? t(`anchors.unfixable.${code}`) : t.rich(`anchors.unfixable.${code}`, { least: <LengthText text={least.text} /> })}
        </Note>
      ))}
      {answer.additions.length === 0 ? null : (
        <section aria-labelledby="additions-title">
          <h2 id="additions-title">{t("anchors.additions.title")}</h2>
          <p>{t("anchors.additions.intro")}</p>
          <div className="overflow-x-auto">
            <table className="data-table">
              <thead>
                <tr>
                  <th scope="col">{t("anchors.table.piece")}</th>
                  <th scope="col" className="figure">{t("anchors.table.station")}</th>
                  <th scope="col" className="figure">{t("anchors.table.hole")}</th>
                  {answer.additions[0]!.across === null ? null : <th scope="col" className="figure">{t("anchors.table.across")}</th>}
                </tr>
              </thead>
              <tbody>
                {answer.additions.map(({ piece, station, hole, across }) => (
                  <tr key={station.in}>
                    <td>{piece + 1}</td>
                    <td className="figure"><LengthText text={station.text} /></td>
                    <td className="figure"><LengthText text={hole.text} /></td>
                    {across === null ? null : <td className="figure"><LengthText text={across.text} /></td>}
                  </tr>
                ))}
              </tbody>
            </table>
          </div>
        </section>
      )}
      {answer.warnings.map(({ code, bolt, other, limit, actual, clause }, index) => (
        <Note key={index} tone="warn" title={t(`anchors.warning.${code}.title`)}>
          {t.rich(`anchors.warning.${code}.body`, { bolt: bolt === null ? "" : bolt + 1, other: other === null ? "" : other + 1, limit: limit === null ? "" : <LengthText text={limit.text} />, actual: actual === null ? "" : <LengthText text={actual.text} /> })}
          {clause === null ? null : <span className="findings-note"> {clause}</span>}
        </Note>
      ))}
      {answer.converted.length === 0 ? null : (
        <Note title={t("anchors.converted.title")}>{t.rich("anchors.converted.body", { count: answer.converted.length, station: <LengthText text={answer.converted[0]!.stationBy.text} />, offset: <LengthText text={answer.converted[0]!.offsetBy.text} /> })}</Note>
      )}
      {answer.exception === null ? null : <Note title={t("anchors.exception.title")}>{t("anchors.exception.body", { bolts: answer.exception.bolts, clause: answer.exception.clause ?? "" })}</Note>}
      {answer.engineered.length === 0 ? null : <Note title={t("anchors.engineered.title")}>{t("anchors.engineered.body", { bolts: numbers(answer.engineered), count: answer.engineered.length })}</Note>}
      <section aria-labelledby="silent-title">
        <h2 id="silent-title">{t("anchors.silent.title")}</h2>
        <ul className="silent">
          {answer.untested.map(({ code, bolts }) => (
            <li key={code}>{t(`anchors.untested.${code}`, { bolts: numbers(bolts), all: bolts.length === answer.bolts.length - answer.engineered.length ? "yes" : "no" })}</li>
          ))}
          <NotStated answer={answer} />
        </ul>
      </section>
      <KeyValues
        items={[
          ...(answer.thirds === null ? [] : [{ label: t("anchors.results.thirds"), value: t.rich("anchors.results.range", { from: <LengthText text={answer.thirds.from.text} />, to: <LengthText text={answer.thirds.to.text} /> }) }]),
          { label: t("anchors.results.projection"), value: <LengthText text={answer.projection.text} /> },
        ]}
      />
      <HardwareNotes answer={answer} />
    </>
  );
}
