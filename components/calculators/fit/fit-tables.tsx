"use client";

import type { FitAnswer } from "@/calculators/fit";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { Section } from "../footprint/footprint-tables";
import { spokenSide } from "../plan/plan-fields";

interface Part {
  answer: FitAnswer;
}

/** What to mark at each corner. */
export function OffsetTable({ answer }: Part) {
  const t = useTranslate();
  return (
    <Section id="offsets" figures={[9, 9]} title={t("fit.offsets.title")} intro={t("fit.offsets.intro")} head={[t("fit.offsets.corner"), t("fit.offsets.from")]}>
      {Object.entries(answer.offsets).map(([corner, offsets]) => (
        <tr key={corner}>
          <th scope="row">{corner}</th>
          <td>
            {Object.entries(offsets).map(([side, offset]) => (
              <span key={side} className="inset-offset">
                {spokenSide(side)} <LengthText text={offset.text} />
              </span>
            ))}
          </td>
        </tr>
      ))}
    </Section>
  );
}

/** Along each wall: line, least and most inset; then where sheathing stands proud or shy. */
export function RangeTable({ answer }: Part) {
  const t = useTranslate();
  const ranges = Object.entries(answer.ranges);
  const stretches = ranges.flatMap(([side, range]) => range.stretches.map((stretch) => ({ side, ...stretch })));
  return (
    <>
      <Section id="ranges" figures={[1, 4]} title={t("fit.ranges.title")} intro={t("fit.ranges.intro")} head={[t("fit.ranges.wall"), t("fit.ranges.line"), t("fit.ranges.least"), t("fit.ranges.most")]}>
        {ranges.map(([side, { least, most }]) => (
          <tr key={side}>
            <th scope="row">{spokenSide(side)}</th>
            <td className="figure">
              <LengthText text={answer.lines[side]!.text} />
            </td>
            <td className="figure">
              <LengthText text={least.text} />
            </td>
            <td className="figure">
              <LengthText text={most.text} />
            </td>
          </tr>
        ))}
      </Section>
      <section aria-labelledby="sheathing-title">
        <h2 id="sheathing-title">{t("fit.sheathing.title")}</h2>
        <p>{t(stretches.length === 0 ? "fit.sheathing.flush" : "fit.sheathing.intro")}</p>
        <ul className="plan-stretches">
          {stretches.map(({ side, from, to, stands, most }, index) => (
            <li key={index}>{t.rich(`fit.sheathing.${stands}`, { side: spokenSide(side), from: <LengthText text={from.text} />, to: <LengthText text={to.text} />, by: <LengthText text={most.text} /> })}</li>
          ))}
        </ul>
      </section>
    </>
  );
}

export function CheckTable({ answer, burned }: Part & { burned: boolean }) {
  const t = useTranslate();
  return (
    <Section id="checks" figures={[1, 2]} title={t("fit.checks.title")} intro={t(burned ? "fit.checks.introBurned" : "fit.checks.intro")} head={[t("fit.checks.pull"), t("fit.checks.chalk")]}>
      {answer.checks.map(({ from, to, length, reading }) => (
        <tr key={from + to}>
          <th scope="row">
            {from}-{to}
          </th>
          <td className="figure">
            <LengthText text={(burned ? reading : length).text} />
          </td>
        </tr>
      ))}
    </Section>
  );
}

export function BoltTable({ answer }: Part) {
  const t = useTranslate();
  if (answer.bolts.length === 0) return null;
  return (
    <Section id="bolts-found" figures={[2, 4]} title={t("fit.boltsFound.title")} intro={t("fit.boltsFound.intro")} head={[t("fit.boltsFound.bolt"), t("fit.boltsFound.wall"), t("fit.boltsFound.station"), t("fit.boltsFound.offset")]}>
      {answer.bolts.map(({ wall, station, offset }, index) => (
        <tr key={index}>
          <th scope="row">{index + 1}</th>
          <td>{spokenSide(wall)}</td>
          <td className="figure">
            <LengthText text={station.text} />
          </td>
          <td className="figure">
            <LengthText text={offset.text} />
          </td>
        </tr>
      ))}
    </Section>
  );
}

/** The certificate: the places that hold each other in balance. */
export function ActiveTable({ answer }: Part) {
  const t = useTranslate();
  const { active, lowerBoundIn, gapIn } = answer.optimal;
  if (active.length === 0) return null;
  return (
    <Section id="active" figures={[1, 3]} title={t("fit.optimal.title")} intro={t("fit.optimal.intro", { bound: lowerBoundIn.toFixed(5), gap: gapIn < 1e-9 ? "0" : gapIn.toExponential(1) })} head={[t("fit.optimal.place"), t("fit.optimal.departure"), t("fit.optimal.weight")]}>
      {active.map(({ side, corner, station, departureIn, multiplier }, index) => (
        <tr key={index}>
          <th scope="row">{corner === null ? t.rich("fit.optimal.along", { side: spokenSide(side), station: <LengthText text={station.text} /> }) : t("fit.optimal.at", { side: spokenSide(side), corner })}</th>
          <td className="figure">{t("fit.optimal.inches", { value: departureIn.toFixed(5) })}</td>
          <td className="figure">{multiplier.toFixed(3)}</td>
        </tr>
      ))}
    </Section>
  );
}
