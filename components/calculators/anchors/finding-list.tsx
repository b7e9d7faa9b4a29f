"use client";

import type { CheckAnswer } from "@/calculators/anchors";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { FindingItem } from "./finding-item";

/** Every violation: what, how far from the limit, by which clause, and what helps. */
export function FindingList({ answer }: { answer: CheckAnswer }) {
  const t = useTranslate();
  if (answer.findings.length === 0) return null;
  return (
    <section aria-labelledby="findings-title">
      <h2 id="findings-title">{t("anchors.findings.title")}</h2>
      <ul className="findings">
        {answer.findings.map((finding, index) => (
          <FindingItem
            key={index}
            finding={finding}
            title={t(`anchors.code.${finding.code}`)}
            piece={finding.piece === null ? "" : finding.piece + 1}
            station={finding.bolt === null ? undefined : answer.bolts[finding.bolt]?.station.text}
          />
        ))}
      </ul>
    </section>
  );
}
