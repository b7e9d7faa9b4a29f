"use client";

import type { ReactNode } from "react";
import type { CheckAnswer, Finding } from "@/calculators/anchors";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { statusText } from "./status-text";

/** Every violation: what, how far from the limit, by which clause, and what helps. */
export function FindingList({ answer }: { answer: CheckAnswer }) {
  const t = useTranslate();
  if (answer.findings.length === 0) return null;
  return (
    <section aria-labelledby="findings-title">
      <h2 id="findings-title">{t("anchors.findings.title")}</h2>
      <ul className="findings">
        {answer.findings.map((finding, index) => (
          <li key={index} data-tone="out">
            <p>
              <b>{t(`anchors.code.${finding.code}`)}.</b> {t.rich(sentenceKey(finding), valuesOf(finding, answer))}
            </p>
            <p>{t(`anchors.remedy.${finding.remedy}`)}</p>
            <p className="findings-note">{[finding.clause, statusText(finding.status, t)].filter(Boolean).join(", ")}</p>
          </li>
        ))}
      </ul>
    </section>
  );
}

function sentenceKey({ code, next, bolt }: Finding): string {
  return `anchors.findings.${code === "spacing" && (next === null || bolt === null) ? "spacing-end" : code}`;
}

function valuesOf({ piece, bolt, next, limit, actual }: Finding, answer: CheckAnswer): Record<string, ReactNode> {
  const shown = (value: Finding["limit"]) => (value === null ? "" : typeof value === "number" ? value : <LengthText text={value.text} />);
  const station = bolt === null ? undefined : answer.bolts[bolt]?.station.text;
  return { piece: piece === null ? "" : piece + 1, bolt: bolt === null ? "" : bolt + 1, next: next === null ? "" : next + 1, station: station === undefined ? "" : <LengthText text={station} />, limit: shown(limit), actual: shown(actual) };
}
