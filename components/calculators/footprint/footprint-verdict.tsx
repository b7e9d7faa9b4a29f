"use client";

import type { FootprintAnswer } from "@/calculators/footprint";
import { LengthText } from "@/components/ui/length-text";
import { Verdict } from "@/components/ui/verdict";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { areaText } from "./footprint-results";

/** Whether the plan closes, or its corners are fixed and agree; then its size. */
export function FootprintVerdict({ answer, metric }: { answer: FootprintAnswer | null; metric: boolean }) {
  const t = useTranslate();
  if (answer === null) return <Verdict tone="idle" title={t("footprint.verdict.waiting")}>{t("footprint.verdict.waitingBody")}</Verdict>;
  const { closure, adjustment, unfixed, fixWith, suspects } = answer;
  if (closure !== null) {
    if (closure.oneIn === null) return <Verdict tone="good" title={t("footprint.verdict.closes")}>{sizeOf(answer, metric, t)}</Verdict>;
    return (
      <Verdict tone="warn" title={t.rich("footprint.verdict.misses", { distance: <LengthText text={closure.distance.text} /> })}>
        {t("footprint.verdict.oneIn", { count: Math.round(closure.oneIn) })} {suspects.length > 0 ? t("footprint.verdict.oneRun") : null}
      </Verdict>
    );
  }
  if (unfixed.length > 0) {
    return (
      <Verdict tone="warn" title={t("footprint.verdict.loose", { corners: listed(unfixed.map(({ corner }) => corner)), count: unfixed.length })}>
        {t("footprint.verdict.pull", { pulls: listed(fixWith.map(({ from, to }) => `${from}-${to}`)) })}
      </Verdict>
    );
  }
  if (adjustment!.contradictory) return <Verdict tone="out" title={t("footprint.verdict.contradictory")}>{t("footprint.verdict.contradictoryBody")}</Verdict>;
  if (adjustment!.spare === 0) return <Verdict tone="warn" title={t("footprint.verdict.unchecked")}>{t("footprint.verdict.uncheckedBody")}</Verdict>;
  return <Verdict tone="good" title={t("footprint.verdict.fixed")}>{sizeOf(answer, metric, t)}</Verdict>;
}

export const listed = (names: readonly string[]) => names.join(", ");

function sizeOf(answer: FootprintAnswer, metric: boolean, t: ReturnType<typeof useTranslate>) {
  return t.rich("footprint.verdict.size", { area: areaText(answer, metric, t.locale, t), perimeter: <LengthText text={answer.perimeter!.text} /> });
}
