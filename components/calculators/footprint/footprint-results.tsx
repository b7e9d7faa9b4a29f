"use client";

import type { FootprintAnswer } from "@/calculators/footprint";
import { KeyValues } from "@/components/ui/key-values";
import { LengthAnswer } from "@/components/ui/length-answer";
import { LengthText } from "@/components/ui/length-text";
import { Note } from "@/components/ui/note";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { Translate } from "@/lib/client/i18n/translate";
import { BowTable, CheckTable, CornerTable, LineTable } from "./footprint-tables";
import { ReadingsTable } from "./readings-table";

/** Area in the device's unit, with the separators of the language; es-US, never bare es. */
export function areaText({ areaSquareFeet, areaSquareMetres }: FootprintAnswer, metric: boolean, locale: string, t: Pick<Translate, "rich"> & ((key: string, values?: Record<string, string>) => string)): string {
  const format = (value: number, digits: number) => new Intl.NumberFormat(locale === "es" ? "es-US" : "en-US", { maximumFractionDigits: digits }).format(value);
  return metric ? t("footprint.results.squareMetres", { value: format(areaSquareMetres ?? 0, 2) }) : t("footprint.results.squareFeet", { value: format(areaSquareFeet ?? 0, 1) });
}

/** Figures, what was noticed, and the tables of sides, corners and checks. */
export function FootprintResults({ answer, metric, burned }: { answer: FootprintAnswer; metric: boolean; burned: boolean }) {
  const t = useTranslate();
  const { closure, adjustment } = answer;
  const figures = [
    ...(answer.areaSquareFeet === null ? [] : [{ label: t("footprint.results.area"), value: areaText(answer, metric, t.locale, t) }]),
    ...(answer.perimeter === null ? [] : [{ label: t("footprint.results.perimeter"), value: <LengthAnswer length={answer.perimeter} /> }]),
    ...(closure === null || closure.oneIn === null
      ? []
      : [
          { label: t("footprint.results.east"), value: <LengthAnswer length={closure.east} /> },
          { label: t("footprint.results.north"), value: <LengthAnswer length={closure.north} /> },
        ]),
    ...(adjustment === null ? [] : [{ label: t("footprint.results.spare"), value: String(adjustment.spare) }]),
  ];
  return (
    <>
      <Notes answer={answer} />
      <div className="plan-columns">
        <KeyValues items={figures} />
        {answer.lines.length === 0 ? null : <Note title={t("footprint.proves.title")}>{t(`footprint.proves.${adjustment === null ? "walk" : adjustment.spare === 0 ? "bare" : "braced"}`)}</Note>}
      </div>
      <CheckTable answer={answer} burned={burned} />
      <LineTable answer={answer} />
      <CornerTable answer={answer} />
      <BowTable answer={answer} />
      <ReadingsTable answer={answer} />
    </>
  );
}

/** Each thing that was not quite as it should be, by name. */
function Notes({ answer }: { answer: FootprintAnswer }) {
  const t = useTranslate();
  const { notes, suspects, unfixed, adjustment } = answer;
  if (notes.length + suspects.length + unfixed.length + (adjustment?.suspects.length ?? 0) + (adjustment?.otherShapes.length ?? 0) === 0) return null;
  return (
    <ul className="plan-notes">
      {notes.map(({ code, run, toward, length }) => (
        <li key={code + run} data-tone={code === "balanced" ? "warn" : undefined}>
          {t.rich(`footprint.note.${code}`, { run: run ?? 0, toward: toward ?? "", length: <LengthText text={length?.text ?? ""} /> })}
        </li>
      ))}
      {suspects.map(({ run, would }) => (
        <li key={`run-${run}`} data-tone="warn">
          {t.rich("footprint.suspect.run", { run, would: <LengthText text={would.text} /> })}
        </li>
      ))}
      {unfixed.map(({ corner, pulls }) => (
        <li key={corner} data-tone="warn">
          {pulls.length === 0 ? t("footprint.unfixed.more", { corner }) : t("footprint.unfixed.one", { corner, pulls: pulls.map(({ from, to }) => `${from}-${to}`).join(", ") })}
        </li>
      ))}
      {adjustment?.suspects.map(({ from, to, changeIn, likely }) => (
        <li key={from + to} data-tone="out">
          {t(changeIn > 0 ? "footprint.suspect.more" : "footprint.suspect.less", { pull: `${from}-${to}`, by: Math.abs(changeIn).toFixed(2) })} {likely === null ? null : t(`footprint.suspect.${likely}`)}
        </li>
      ))}
      {adjustment?.otherShapes.map((inside) => (
        <li key={inside.join("")} data-tone="warn">
          {t("footprint.otherShape", { count: inside.length, corners: inside.join(", ") })}
        </li>
      ))}
    </ul>
  );
}
