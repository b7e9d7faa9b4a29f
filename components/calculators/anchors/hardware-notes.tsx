"use client";

import type { CheckAnswer, LayoutAnswer } from "@/calculators/anchors";
import { KeyValues } from "@/components/ui/key-values";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { statusText } from "./status-text";

type RuleAnswer = Pick<CheckAnswer | LayoutAnswer, "hole" | "washer" | "notStated">;

/** Holes and plate washers for this bolt, with where they are from. */
export function HardwareNotes({ answer: { hole, washer } }: { answer: RuleAnswer }) {
  const t = useTranslate();
  return (
    <>
      <KeyValues
        items={[
          { label: t("anchors.results.hole"), value: t.rich("anchors.results.range", { from: <LengthText text={hole.least.text} />, to: <LengthText text={hole.most.text} /> }) },
          ...(washer === null ? [] : [{ label: t("anchors.results.washer"), value: <>{<LengthText text={washer.size.text} />}{washer.thickness === null ? null : <>, {t("anchors.results.thick", { inches: washer.thickness.in })}</>}</> }]),
          ...(washer === null || washer.slotWidth === null || washer.slotLength === null ? [] : [{ label: t("anchors.results.slot"), value: t.rich("anchors.results.by", { width: <LengthText text={washer.slotWidth.text} />, length: <LengthText text={washer.slotLength.text} /> }) }]),
        ]}
      />
      <p className="findings-note">
        {t.rich("anchors.results.holeNote", { clause: hole.clause ?? "", status: statusText(hole.status, t), navy: <LengthText text={hole.navy.text} /> })}
        {washer === null ? null : ` ${t("anchors.results.washerNote", { clause: washer.clause ?? "", status: statusText(washer.status, t) })}`}
      </p>
    </>
  );
}

/** What the rule leaves open, one line. */
export function NotStated({ answer }: { answer: RuleAnswer }) {
  const t = useTranslate();
  if (answer.notStated.length === 0) return null;
  return <li>{t("anchors.silent.notStated", { figures: answer.notStated.map((name) => t(`anchors.figure.${name}`).toLocaleLowerCase(t.locale)).join("; ") })}</li>;
}
