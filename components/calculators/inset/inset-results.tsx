"use client";

import type { InsetAnswer } from "@/calculators/inset";
import { KeyValues } from "@/components/ui/key-values";
import { LengthAnswer } from "@/components/ui/length-answer";
import { LengthText } from "@/components/ui/length-text";
import { Note } from "@/components/ui/note";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { SuspectTable } from "./suspect-list";

const corners = ["A", "B", "C", "D"] as const;

/** Lines, diagonals and drops, the offsets to mark at every corner, and what does not agree. */
export function InsetResults({ answer, burned }: { answer: InsetAnswer; burned: boolean }) {
  const t = useTranslate();
  const { lines, expected, drops, check } = answer;
  const measured = check?.drops ?? null;
  const alike = expected.ac.diagonal.text === expected.bd.diagonal.text && drops.ac.text === drops.bd.text;
  const diagonals = alike ? (["ac"] as const) : (["ac", "bd"] as const);
  const label = (key: string, name: "ac" | "bd") => t(`inset.results.${key}`, { diagonal: alike ? "both" : name });
  return (
    <>
      {answer.warnings.map(({ code, by }) => (
        <Note key={code} tone="warn" title={t(`inset.warning.${code}.title`)}>
          {t.rich(`inset.warning.${code}.body`, { by: <LengthText text={by.text} /> })}
        </Note>
      ))}
      <SuspectTable suspects={answer.suspects} />
      <div className="inset-columns">
        <KeyValues
          items={[
            { label: t("inset.results.along"), value: <LengthAnswer length={lines.ab} /> },
            { label: t("inset.results.across"), value: <LengthAnswer length={lines.bc} /> },
            ...diagonals.flatMap((name) => [
              { key: `${name}-diagonal`, label: label("diagonal", name), value: <LengthAnswer length={expected[name].diagonal} /> },
              ...(burned ? [{ key: `${name}-reading`, label: label("reading", name), value: <LengthAnswer length={expected[name].reading} /> }] : []),
              { key: `${name}-drop`, label: label("drop", name), value: <LengthAnswer length={drops[name]} /> },
            ]),
            ...(measured === null
              ? []
              : (["ac", "bd"] as const).map((name) => ({ key: `${name}-measured`, label: t("inset.results.measured", { diagonal: name }), value: <LengthAnswer length={measured[name].measured} /> }))),
          ]}
        />
        <Note title={t("inset.proves.title")}>{t(`inset.proves.${check === null ? "drop" : check.agrees ? "check" : "off"}`)}</Note>
      </div>
      <section aria-labelledby="offsets-title">
        <h2 id="offsets-title">{t("inset.offsets.title")}</h2>
        <p>{t("inset.offsets.intro")}</p>
        <div className="overflow-x-auto">
          <table className="data-table offsets-table">
            <thead>
              <tr>
                <th scope="col">{t("inset.offsets.corner")}</th>
                <th scope="col">{t("inset.offsets.from")}</th>
                <th scope="col" className="figure">
                  {t("inset.offsets.straight")}
                </th>
              </tr>
            </thead>
            <tbody>
              {corners.map((corner) => (
                <tr key={corner}>
                  <th scope="row">{corner}</th>
                  <td>
                    {Object.entries(answer.offsets[corner]).map(([side, offset]) => (
                      <span key={side} className="inset-offset">
                        {t(`inset.side.${side}`)} <LengthText text={offset.text} />
                      </span>
                    ))}
                  </td>
                  <td className="figure">
                    <LengthText text={answer.corners[corner].fromCorner.text} />
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      </section>
    </>
  );
}
