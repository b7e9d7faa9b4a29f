"use client";

import type { CheckAnswer, LayoutAnswer } from "@/calculators/anchors";
import { LengthText } from "@/components/ui/length-text";
import { Verdict } from "@/components/ui/verdict";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** How many bolts, and how far apart. */
export function LayoutVerdict({ answer }: { answer: LayoutAnswer | null }) {
  const t = useTranslate();
  if (answer === null) return <Verdict tone="idle" title={t("anchors.verdict.waitingLayout")}>{t("anchors.verdict.waitingLayoutBody")}</Verdict>;
  const [only] = answer.pieces.length === 1 ? answer.pieces : [];
  const first = answer.pieces[0]!;
  return (
    <Verdict tone={answer.warnings.length > 0 ? "warn" : "plain"} title={t("anchors.verdict.bolts", { count: answer.bolts })}>
      {answer.bolts === 0
        ? t("anchors.verdict.noBolts")
        : only !== undefined && only.spacing !== null
          ? t.rich(only.even ? "anchors.verdict.even" : "anchors.verdict.uneven", { spacing: <LengthText text={only.spacing.text} />, end: <LengthText text={only.endDistance!.text} /> })
          : t.rich("anchors.verdict.first", { first: <LengthText text={first.stations[0]?.text ?? ""} />, pieces: answer.pieces.length })}
    </Verdict>
  );
}

/** Whether the bolts suit the plates; if not, how much there is to fix and what must be added. */
export function CheckVerdict({ answer }: { answer: CheckAnswer | null }) {
  const t = useTranslate();
  if (answer === null) return <Verdict tone="idle" title={t("anchors.verdict.waitingCheck")}>{t("anchors.verdict.waitingCheckBody")}</Verdict>;
  if (answer.ok) {
    const hasGap = answer.untested.length > 0 || answer.warnings.length > 0;
    return (
      <Verdict tone={answer.warnings.length > 0 ? "warn" : "good"} title={t("anchors.verdict.ok")}>
        {t(answer.warnings.length > 0 ? "anchors.verdict.okWarned" : hasGap ? "anchors.verdict.okUntested" : "anchors.verdict.okBody")}
      </Verdict>
    );
  }
  const count = answer.additions.length;
  return (
    <Verdict tone="out" title={t("anchors.verdict.fails", { count: answer.findings.length })}>
      {answer.unfixable.length > 0 ? t("anchors.verdict.unfixable", { count: answer.unfixable.length }) : null}{" "}
      {count > 0 ? t.rich("anchors.verdict.add", { count, first: <LengthText text={answer.additions[0]!.station.text} /> }) : answer.unfixable.length > 0 ? null : t("anchors.verdict.noAdd")}
    </Verdict>
  );
}
