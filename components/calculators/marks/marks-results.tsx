"use client";

import type { MarksAnswer } from "@/calculators/marks";
import { Disclosure } from "@/components/ui/disclosure";
import { KeyValues } from "@/components/ui/key-values";
import { LengthText } from "@/components/ui/length-text";
import { Note } from "@/components/ui/note";
import { Verdict } from "@/components/ui/verdict";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** How many marks, and whether anything stands in their way. */
export function MarksVerdict({ answer, bolts }: { answer: MarksAnswer | null; bolts: number }) {
  const t = useTranslate();
  if (answer === null) return <Verdict tone="idle" title={t("marks.verdict.waiting")}>{t("marks.verdict.waitingBody")}</Verdict>;
  const { marks, conflicts, lastBay } = answer;
  const body = marks.length === 0 ? t("marks.verdict.none") : t.rich("marks.verdict.body", { first: <LengthText text={marks[0]!.text} />, bay: <LengthText text={lastBay.text} /> });
  if (conflicts.length > 0) return <Verdict tone="out" title={t("marks.verdict.conflicts", { marks: marks.length, conflicts: new Set(conflicts.map(({ line, joist }) => line + joist)).size })}>{body}</Verdict>;
  return (
    <Verdict tone={bolts > 0 ? "good" : "plain"} title={t("marks.verdict.marks", { marks: marks.length })}>
      {body} {bolts > 0 ? t("marks.verdict.clear") : null}
    </Verdict>
  );
}

/** The marks in order, collisions, the last bay, where sheets break, and what stepping would have cost. */
export function MarksResults({ answer }: { answer: MarksAnswer }) {
  const t = useTranslate();
  const { stepping } = answer;
  return (
    <>
      <ConflictList answer={answer} />
      <MarkTable answer={answer} />
      <KeyValues
        items={[
          { label: t("marks.results.bays"), value: answer.bays },
          { label: t("marks.results.lastBay"), value: <LengthText text={answer.lastBay.text} /> },
          { label: t("marks.results.lastClear"), value: <LengthText text={answer.lastClear.text} /> },
        ]}
      />
      {answer.lastBayOver ? (
        <Note tone="warn" title={t("marks.over.title")}>
          {t("marks.over.body")}
        </Note>
      ) : null}
      {stepping === null ? null : (
        <Note title={t("marks.stepping.title")}>{t.rich("marks.stepping.body", { step: <LengthText text={stepping.step.text} />, last: <LengthText text={stepping.last.text} />, off: <LengthText text={stepping.off.text.replace("-", "")} /> })}</Note>
      )}
      <SheetNote answer={answer} />
    </>
  );
}

function MarkTable({ answer }: { answer: MarksAnswer }) {
  const t = useTranslate();
  const { joists, oppositeJoists } = answer;
  const hit = (line: string, joist: number) => answer.conflicts.some((conflict) => conflict.line === line && conflict.joist === joist);
  const rows = Math.max(joists.length, oppositeJoists?.length ?? 0);
  return (
    <section aria-labelledby="marks-title">
      <h2 id="marks-title">{t("marks.table.title")}</h2>
      <p>{t("marks.table.intro")}</p>
      <div className="overflow-x-auto">
        <table className="data-table">
          <thead>
            <tr>
              <th scope="col">{t("marks.table.number")}</th>
              <th scope="col" className="figure">{t(oppositeJoists === null ? "marks.table.mark" : "marks.table.here")}</th>
              {oppositeJoists === null ? null : <th scope="col" className="figure">{t("marks.table.opposite")}</th>}
              <th scope="col">{t("marks.table.kind")}</th>
            </tr>
          </thead>
          <tbody>
            {Array.from({ length: rows }, (_, index) => {
              // Both lines end flush: their last joists share the last row, whichever line has more before it.
              const placeIn = (count: number) => (index === rows - 1 ? count - 1 : index < count - 1 ? index : -1);
              const [at, across] = [placeIn(joists.length), placeIn(oppositeJoists?.length ?? 0)];
              const [here, there] = [joists[at], oppositeJoists?.[across]];
              const kind = here?.kind ?? there!.kind;
              const isHit = hit("here", at) || hit("opposite", across);
              return (
                <tr key={index}>
                  <th scope="row">{index === 0 || index === rows - 1 ? t("marks.table.end") : index}</th>
                  <td className="figure">{here === undefined ? null : <LengthText text={here.mark.text} />}</td>
                  {oppositeJoists === null ? null : <td className="figure">{there === undefined ? null : <LengthText text={there.mark.text} />}</td>}
                  <td>{isHit ? t("marks.table.hit") : kind === "layout" ? null : t(`marks.kind.${kind}`)}</td>
                </tr>
              );
            })}
          </tbody>
        </table>
      </div>
    </section>
  );
}

function ConflictList({ answer }: { answer: MarksAnswer }) {
  const t = useTranslate();
  if (answer.conflicts.length === 0) return null;
  return (
    <section aria-labelledby="conflicts-title">
      <h2 id="conflicts-title">{t("marks.conflicts.title")}</h2>
      <ul className="findings">
        {answer.conflicts.map(({ line, joist, bolt, hits, overlap, move, toward }, index) => {
          const joists = line === "here" ? answer.joists : answer.oppositeJoists!;
          const isEnd = joist === 0 || joist === joists.length - 1;
          const values = { joist, bolt: bolt + 1, mark: <LengthText text={joists[joist]!.mark.text} />, overlap: <LengthText text={overlap.text} />, move: <LengthText text={move.text} />, line: t(`marks.conflicts.${line}`) };
          return (
            <li key={index} data-tone={hits === "bolt" ? "out" : "warn"}>
              <p>{t.rich(`marks.conflicts.${hits}${isEnd ? "-end" : ""}`, values)}</p>
              <p>{isEnd ? t("marks.conflicts.notch") : t.rich(`marks.conflicts.${toward}`, values)}</p>
            </li>
          );
        })}
      </ul>
    </section>
  );
}

function SheetNote({ answer }: { answer: MarksAnswer }) {
  const t = useTranslate();
  const { sheetBreaks } = answer;
  if (sheetBreaks.length === 0) return null;
  const off = sheetBreaks.filter(({ onJoist }) => !onJoist);
  return (
    <Disclosure summary={t("marks.sheets.title")}>
      <p>{off.length === 0 ? t("marks.sheets.all", { count: sheetBreaks.length }) : t("marks.sheets.some", { count: off.length })}</p>
      <ul className="plain-list">
        {sheetBreaks.map(({ at, onJoist }, index) => (
          <li key={index}>
            <LengthText text={at.text} /> {t(onJoist ? "marks.sheets.on" : "marks.sheets.off")}
          </li>
        ))}
      </ul>
    </Disclosure>
  );
}
