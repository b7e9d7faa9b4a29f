"use client";

import type { ReactNode } from "react";
import type { SquarenessAnswer } from "@/calculators/squareness";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { Translate } from "@/lib/client/i18n/translate";

type PullEnd = NonNullable<SquarenessAnswer["separatingPull"]>["from"];

/** One or two sentences for the verdict: which readings one blunder would explain, and what to pull. */
export function suspectsSentence({ suspects, separatingPull, taper }: SquarenessAnswer, t: Translate): ReactNode {
  const [first] = suspects;
  if (first === undefined) return t(taper === null ? "squareness.suspects.nobodyTwo" : "squareness.suspects.nobodyFour");
  const names = [...new Set(suspects.map(({ reading }) => t(`squareness.reading.${reading}`)))];
  const alike = suspects.every(({ likely }) => likely === first.likely);
  return (
    <>
      {t(alike ? `squareness.suspects.short.${first.likely}` : "squareness.suspects.short.several", { readings: listed(names, t) })} {separatingPull === null ? null : pullSentence(separatingPull, t)}
    </>
  );
}

/** Every reading that one blunder explains, and the shortest pull that tells them apart, with what each would make it read. */
export function SuspectList({ answer, print }: { answer: SquarenessAnswer; print: (text: string) => string }) {
  const t = useTranslate();
  const { suspects, separatingPull, verdict } = answer;
  if (suspects.length === 0) return null;
  return (
    <section aria-labelledby="suspects-title">
      <h2 id="suspects-title">{t("squareness.suspects.title")}</h2>
      <p>{t(verdict === "contradictory" ? "squareness.suspects.intro" : "squareness.suspects.introQuiet")}</p>
      <ul className="findings">
        {suspects.map(({ reading, changeIn, likely, shown }) => (
          <li key={reading} data-tone="out">
            <p>
              <b>{t(`squareness.reading.${reading}`)}</b>: {t(`squareness.suspects.likely.${likely}`)}
            </p>
            <p className="findings-note">{t.rich(changeIn > 0 ? "squareness.suspects.longer" : "squareness.suspects.shorter", { actual: <LengthText text={shown.text} /> })}</p>
          </li>
        ))}
      </ul>
      {separatingPull === null ? null : (
        <>
          <h3 className="squareness-pull">{t("squareness.pull.title")}</h3>
          <p>
            {pullSentence(separatingPull, t)} {separatingPull.kind === "triangle" ? t("squareness.pull.triangle") : null} {suspects.length > 1 && !separatingPull.separatesAll ? t("squareness.pull.notAll") : null}
          </p>
          <table className="data-table">
            <thead>
              <tr>
                <th scope="col">{t("squareness.pull.ifWrong")}</th>
                <th scope="col" className="figure">
                  {t("squareness.pull.tapeShows")}
                </th>
              </tr>
            </thead>
            <tbody>
              {separatingPull.expected.map(({ suspect, reading }) => (
                <tr key={suspect}>
                  <td>{t(`squareness.reading.${suspect}`)}</td>
                  <td className="figure">
                    <LengthText text={print(reading.text)} />
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </>
      )}
    </section>
  );
}

function pullSentence({ kind, from, to }: NonNullable<SquarenessAnswer["separatingPull"]>, t: Translate): ReactNode {
  const far = ({ distance }: PullEnd) => <LengthText text={distance?.text ?? ""} />;
  const [first, second] = from.toward === null ? [to, from] : [from, to];
  if (first.toward === null) return t(kind === "again" ? "squareness.pull.again" : "squareness.pull.side", { from: from.corner, to: to.corner });
  const mark = { distance: far(first), corner: first.corner, toward: first.toward };
  return second.toward === null
    ? t.rich("squareness.pull.toMark", { ...mark, from: second.corner })
    : t.rich("squareness.pull.marks", { ...mark, otherDistance: far(second), otherCorner: second.corner, otherToward: second.toward });
}

/** A-C; A-C or B-D; A-B, C-D or A-C. */
function listed(names: readonly string[], t: Translate): string {
  if (names.length === 1) return names[0]!;
  return t("squareness.suspects.or", { most: names.slice(0, -1).join(", "), last: names.at(-1)! });
}
