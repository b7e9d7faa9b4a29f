"use client";

import type { ReactNode } from "react";
import type { FootprintAnswer } from "@/calculators/footprint";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { spokenSide } from "../plan/plan-fields";

interface Part {
  answer: FootprintAnswer;
}

/** The pulls that prove the plan, on the slab and on the chalk. */
export function CheckTable({ answer, burned }: Part & { burned: boolean }) {
  const t = useTranslate();
  const { checks } = answer;
  if (checks.length === 0) return null;
  const hasChalk = checks.some(({ chalk }) => chalk !== null);
  const figure = (length: { text: string }, reading: { text: string }) => <LengthText text={(burned ? reading : length).text} />;
  return (
    <Section id="checks" figures={[2, 4]} title={t("footprint.checks.title")} intro={t(burned ? "footprint.checks.introBurned" : "footprint.checks.intro")} head={[t("footprint.checks.pull"), t("footprint.checks.fixes"), t("footprint.checks.slab"), ...(hasChalk ? [t("footprint.checks.chalk")] : [])]}>
      {checks.map(({ from, to, fixes, length, reading, chalk }) => (
        <tr key={from + to}>
          <th scope="row">
            {from}-{to}
          </th>
          <td>{fixes}</td>
          <td className="figure">{figure(length, reading)}</td>
          {chalk === null ? null : <td className="figure">{figure(chalk.length, chalk.reading)}</td>}
        </tr>
      ))}
    </Section>
  );
}

export function LineTable({ answer }: Part) {
  const t = useTranslate();
  const { lines } = answer;
  if (lines.length === 0) return null;
  const hasToward = lines.some(({ toward }) => toward !== null);
  const hasChalk = lines.some(({ chalk }) => chalk !== null);
  return (
    <Section id="lines" figures={[hasToward ? 2 : 1, 5]} title={t("footprint.lines.title")} intro={t("footprint.lines.intro")} head={[t("footprint.lines.side"), ...(hasToward ? [t("footprint.lines.toward")] : []), t("footprint.lines.slab"), ...(hasChalk ? [t("footprint.lines.chalk")] : []), t("footprint.lines.middle")]}>
      {lines.map(({ side, toward, length, chalk, middle }) => (
        <tr key={side}>
          <th scope="row">{spokenSide(side)}</th>
          {hasToward ? <td>{towardText(toward ?? "", t.locale)}</td> : null}
          <td className="figure">
            <LengthText text={length.text} />
          </td>
          {chalk === null ? null : (
            <td className="figure">
              <LengthText text={chalk.text} />
            </td>
          )}
          <td className="figure">
            <LengthText text={middle.station.text} />
          </td>
        </tr>
      ))}
    </Section>
  );
}

/** West is oeste: O on a Spanish plan. */
export const towardText = (toward: string, locale: string) => (locale === "es" ? toward.replace("W", "O") : toward);

export function CornerTable({ answer }: Part) {
  const t = useTranslate();
  const corners = answer.corners.filter(({ x }) => x !== null);
  if (corners.length === 0) return null;
  const hasChalk = corners.some(({ chalk }) => chalk !== null);
  return (
    <Section id="corners" figures={[2, 4]} title={t("footprint.corners.title")} intro={t(hasChalk ? "footprint.corners.intro" : "footprint.corners.introBare")} head={[t("footprint.corners.corner"), t("footprint.corners.kind"), t("footprint.corners.angle"), ...(hasChalk ? [t("footprint.corners.fromCorner")] : [])]}>
      {corners.map(({ name, inside, angleDegrees, chalk }) => (
        <tr key={name}>
          <th scope="row">{name}</th>
          <td>{inside === null ? t("footprint.corners.unknown") : t(inside ? "footprint.corners.inside" : "footprint.corners.outside")}</td>
          <td className="figure">{angleDegrees === null ? "" : `${angleDegrees.toFixed(2)}°`}</td>
          {chalk === null ? null : (
            <td className="figure">
              <LengthText text={chalk.fromCorner.text} />
            </td>
          )}
        </tr>
      ))}
    </Section>
  );
}

export function BowTable({ answer }: Part) {
  const t = useTranslate();
  if (answer.bows.length === 0) return null;
  return (
    <Section id="bows-found" figures={[1, 4]} title={t("footprint.bowed.title")} intro={t("footprint.bowed.intro")} head={[t("footprint.bowed.side"), t("footprint.bowed.station"), t("footprint.bowed.outward"), t("footprint.bowed.toChalk")]}>
      {answer.bows.map(({ side, station, outward, toChalk }, index) => (
        <tr key={index}>
          <th scope="row">{spokenSide(side)}</th>
          <td className="figure">
            <LengthText text={station.text} />
          </td>
          <td className="figure">
            <LengthText text={outward.text} />
          </td>
          <td className="figure">{toChalk === null ? "" : <LengthText text={toChalk.text} />}</td>
        </tr>
      ))}
    </Section>
  );
}

/** A titled table whose first column names the row; `figures` says which columns hold figures, up to but not with the second number. */
export function Section({ id, title, intro, head, figures, children }: { id: string; title: string; intro: string; head: readonly string[]; figures: readonly [from: number, to: number]; children: ReactNode }) {
  return (
    <section aria-labelledby={`${id}-title`}>
      <h2 id={`${id}-title`}>{title}</h2>
      <p>{intro}</p>
      <div className="overflow-x-auto">
        <table className="data-table plan-table">
          <thead>
            <tr>
              {head.map((text, index) => (
                <th key={text} scope="col" className={index >= figures[0] && index < figures[1] ? "figure" : undefined}>
                  {text}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>{children}</tbody>
        </table>
      </div>
    </section>
  );
}
