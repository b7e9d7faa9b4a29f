"use client";

import type { FootprintAnswer } from "@/calculators/footprint";
import { Disclosure } from "@/components/ui/disclosure";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { Section } from "./footprint-tables";

/** Each pull as read and as adjusted. */
export function ReadingsTable({ answer }: { answer: FootprintAnswer }) {
  const t = useTranslate();
  const { adjustment } = answer;
  if (adjustment === null) return null;
  return (
    <Disclosure summary={t("footprint.adjusted.summary")}>
      <Section id="adjusted" figures={[1, 4]} title={t("footprint.adjusted.title")} intro={t("footprint.adjusted.intro", { closure: adjustment.closureIn.toFixed(3), limit: adjustment.limitIn.toFixed(3) })} head={[t("footprint.adjusted.pull"), t("footprint.adjusted.measured"), t("footprint.adjusted.adjusted"), t("footprint.adjusted.change")]}>
        {adjustment.readings.map(({ from, to, measured, adjusted, residualIn }, index) => (
          <tr key={index}>
            <th scope="row">
              {from}-{to}
            </th>
            <td className="figure">
              <LengthText text={measured.text} />
            </td>
            <td className="figure">{adjusted === null ? "" : <LengthText text={adjusted.text} />}</td>
            <td className="figure">{residualIn === null ? "" : t("footprint.adjusted.inches", { value: residualIn.toFixed(3) })}</td>
          </tr>
        ))}
      </Section>
    </Disclosure>
  );
}
