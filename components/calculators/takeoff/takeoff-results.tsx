"use client";

import type { TakeoffAnswer } from "@/calculators/takeoff";
import { toCsv } from "@/calculators/takeoff/to-csv";
import { Button, ButtonLink } from "@/components/ui/button";
import { KeyValues } from "@/components/ui/key-values";
import { LengthText } from "@/components/ui/length-text";
import { Note } from "@/components/ui/note";
import { Verdict } from "@/components/ui/verdict";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { lineTexts, listAsRows, listAsText } from "./list-texts";

export function TakeoffVerdict({ answer }: { answer: TakeoffAnswer | null }) {
  const t = useTranslate();
  if (answer === null) return <Verdict tone="idle" title={t("takeoff.verdict.waiting")}>{t("takeoff.verdict.waitingBody")}</Verdict>;
  const { boards, boardLength } = answer.totals;
  return (
    <Verdict tone="plain" title={t("takeoff.verdict.boards", { boards })}>
      {t.rich("takeoff.verdict.body", { length: <LengthText text={boardLength.text} />, lines: answer.lines.length, waste: answer.waste })}
    </Verdict>
  );
}

/** The list, how it leaves the page, weights, and what was assumed. */
export function TakeoffResults({ answer, isMetric }: { answer: TakeoffAnswer; isMetric: boolean }) {
  const t = useTranslate();
  const { totals, assumed } = answer;
  const weight = (pounds: number, kilograms: number) => (isMetric ? t("takeoff.totals.kilograms", { value: Math.round(kilograms) }) : t("takeoff.totals.pounds", { value: Math.round(pounds) }));
  return (
    <>
      <ListTable answer={answer} isMetric={isMetric} />
      <ListActions answer={answer} isMetric={isMetric} />
      <KeyValues
        items={[
          { label: t("takeoff.totals.length"), value: <LengthText text={totals.boardLength.text} /> },
          ...(isMetric ? [] : [{ label: t("takeoff.totals.boardFeet"), value: t("takeoff.totals.number", { value: Math.round(totals.boardFeet) }) }]),
          { label: t("takeoff.totals.weight"), value: weight(totals.pounds, totals.kilograms) },
          { label: t("takeoff.totals.heaviest"), value: weight(totals.heaviestPounds, totals.heaviestKilograms) },
        ]}
      />
      {totals.heaviestPounds > 35 ? <Note tone="warn" title={t("takeoff.lift.title")}>{t("takeoff.lift.body")}</Note> : null}
      <Note title={t("takeoff.assumed.title")}>
        <ul className="plain-list">
          {assumed.map((code) => (
            <li key={code}>{t(`takeoff.assumed.${code}`)}</li>
          ))}
        </ul>
      </Note>
    </>
  );
}

function ListTable({ answer, isMetric }: { answer: TakeoffAnswer; isMetric: boolean }) {
  const t = useTranslate();
  return (
    <section aria-labelledby="list-title">
      <h2 id="list-title">{t("takeoff.table.title")}</h2>
      <div className="overflow-x-auto">
        <table className="data-table takeoff-list">
          <thead>
            <tr>
              <th scope="col" className="figure">{t("takeoff.table.quantity")}</th>
              <th scope="col">{t("takeoff.table.item")}</th>
              <th scope="col">{t("takeoff.table.note")}</th>
            </tr>
          </thead>
          <tbody>
            {answer.lines.map((line, index) => {
              const texts = lineTexts(line, isMetric, t);
              return (
                <tr key={index}>
                  <td className="figure">
                    <b className="num">{texts.quantity}</b> <span>{texts.unit}</span>
                  </td>
                  <th scope="row">
                    {texts.item}
                    {texts.size === "" ? null : (
                      <>
                        {" "}
                        <LengthText text={texts.size} />
                      </>
                    )}
                  </th>
                  <td>{[texts.note, texts.used === "" ? "" : t("takeoff.table.usedIs", { amount: texts.used })].filter(Boolean).join(" ")}</td>
                </tr>
              );
            })}
          </tbody>
        </table>
      </div>
    </section>
  );
}

/** Down as a spreadsheet, off to print, or into a letter to the supplier. */
function ListActions({ answer, isMetric }: { answer: TakeoffAnswer; isMetric: boolean }) {
  const t = useTranslate();
  const download = () => {
    // The mark tells a spreadsheet that the text is UTF-8.
    const address = URL.createObjectURL(new Blob(["\ufeff", toCsv(listAsRows(answer, isMetric, t))], { type: "text/csv;charset=utf-8" }));
    const link = document.createElement("a");
    link.href = address;
    link.download = t("takeoff.actions.fileName");
    link.click();
    URL.revokeObjectURL(address);
  };
  const letter = `mailto:?subject=${encodeURIComponent(t("takeoff.actions.subject"))}&body=${encodeURIComponent(listAsText(answer, isMetric, t))}`;
  return (
    <div className="takeoff-actions no-print">
      <Button kind="ghost" onClick={download}>
        {t("takeoff.actions.csv")}
      </Button>
      <Button kind="ghost" onClick={() => window.print()}>
        {t("takeoff.actions.print")}
      </Button>
      <ButtonLink href={letter}>{t("takeoff.actions.mail")}</ButtonLink>
    </div>
  );
}
