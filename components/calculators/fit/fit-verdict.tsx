"use client";

import type { FitAnswer } from "@/calculators/fit";
import { LengthText } from "@/components/ui/length-text";
import { Verdict } from "@/components/ui/verdict";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { spokenSide } from "../plan/plan-fields";

/** How near the plan comes to its wanted inset, where it is worst, and whether it stays on the concrete. */
export function FitVerdict({ answer }: { answer: FitAnswer | null }) {
  const t = useTranslate();
  if (answer === null) return <Verdict tone="idle" title={t("fit.verdict.waiting")}>{t("fit.verdict.waitingBody")}</Verdict>;
  const where = answer.worstAt.corner === null ? t("fit.verdict.alongSide", { side: spokenSide(answer.worstAt.side) }) : t("fit.verdict.atCorner", { side: spokenSide(answer.worstAt.side), corner: answer.worstAt.corner });
  if (!answer.fits) {
    return (
      <Verdict tone="out" title={t.rich("fit.verdict.overhangs", { overhang: <LengthText text={answer.overhang.text} /> })}>
        {answer.overhangNeeded === null ? t("fit.verdict.pastLimit") : t.rich("fit.verdict.needed", { needed: <LengthText text={answer.overhangNeeded.text} /> })}
      </Verdict>
    );
  }
  const exact = answer.worst.in < 1e-6;
  if (exact) return <Verdict tone="good" title={t(answer.mode === "follow" ? "fit.verdict.follows" : "fit.verdict.true")}>{t(answer.mode === "follow" ? "fit.verdict.followsBody" : "fit.verdict.trueBody")}</Verdict>;
  return (
    <Verdict tone="plain" title={t.rich("fit.verdict.worst", { worst: <LengthText text={answer.worst.text} /> })}>
      {where} {answer.mode === "size-held" || answer.mode === "size-free" ? t("fit.verdict.best") : null}
    </Verdict>
  );
}
