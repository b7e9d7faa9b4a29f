"use client";

import { useSyncExternalStore } from "react";
import type { PlatesAnswer } from "@/calculators/plates";
import { Button } from "@/components/ui/button";
import { Verdict } from "@/components/ui/verdict";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { Planner } from "./planner";

/** Boards, pieces and added anchors in a line; what is proved of them below. */
export function PlatesVerdict({ answer, busy }: { answer: PlatesAnswer | null; busy: boolean }) {
  const t = useTranslate();
  if (answer === null) return <Verdict tone="idle" title={t(busy ? "plates.verdict.planning" : "plates.verdict.waiting")}>{t("plates.verdict.waitingBody")}</Verdict>;
  const { ok, totals, addedAnchors, walls } = answer;
  const added = addedAnchors.length;
  const title = walls.length === 0 ? t("plates.verdict.cut", { boards: totals.boards, pieces: totals.pieces }) : t("plates.verdict.plan", { boards: totals.boards, pieces: totals.pieces, added });
  const tone = !ok ? "out" : added > 0 ? "warn" : "good";
  return (
    <Verdict tone={tone} title={title}>
      {[ok ? "" : t("plates.verdict.findings", { count: answer.findings.length }), walls.length > 0 ? t(answer.anchorsProved ? "plates.verdict.anchorsProved" : "plates.verdict.anchorsFound") : "", t(answer.boardsProved ? "plates.verdict.boardsProved" : "plates.verdict.boardsFound", { share: percent(answer.gap) })].filter(Boolean).join(" ")}
    </Verdict>
  );
}

/** Never less than the gap: 0.4 percent is said as 0.4, 12.3 as 13. */
export const percent = (gap: number) => (gap < 0.1 ? Math.ceil(gap * 1000) / 10 : Math.ceil(gap * 100));

/** How far the search is, and a way to take the best so far. */
export function PlanProgress({ planner, stop }: { planner: Planner; stop: (() => void) | null }) {
  const t = useTranslate();
  // Listened to here alone: what moves many times a second must not draw the form again.
  const plan = useSyncExternalStore(planner.subscribe, planner.progress, planner.progress);
  return (
    <div className="plates-progress no-print">
      <label>
        {t(plan.stage === 1 ? "plates.progress.joints" : stop === null ? "plates.progress.boards" : "plates.progress.better")}
        <progress max={1} value={plan.share} />
      </label>
      {stop === null ? null : (
        <Button kind="ghost" small onClick={stop}>
          {t("plates.progress.stop")}
        </Button>
      )}
    </div>
  );
}
