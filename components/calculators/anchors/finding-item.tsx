"use client";

import type { ReactNode } from "react";
import type { Finding as AnchorFinding } from "@/calculators/anchors";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { statusText } from "./status-text";

/** What every judge of bolts tells of a finding; how it names piece and station is its own. */
type Finding = Pick<AnchorFinding, "code" | "bolt" | "next" | "limit" | "actual" | "remedy" | "clause" | "status">;

/** One finding: what is wrong, the remedy, and the clause with how far it was read. */
export function FindingItem({ finding, title, piece, station }: { finding: Finding; title: ReactNode; piece: ReactNode; station: string | undefined }) {
  const t = useTranslate();
  const { bolt, next, limit, actual } = finding;
  const values = {
    piece,
    bolt: bolt === null ? "" : bolt + 1,
    next: next === null ? "" : next + 1,
    station: station === undefined ? "" : <LengthText text={station} />,
    limit: shown(limit),
    actual: shown(actual),
  };
  return (
    <li data-tone="out">
      <p>
        <b>{title}.</b> {t.rich(sentenceKey(finding), values)}
      </p>
      <p>{t(`anchors.remedy.${finding.remedy}`)}</p>
      <p className="findings-note">{[finding.clause, statusText(finding.status, t)].filter(Boolean).join(", ")}</p>
    </li>
  );
}

function shown(value: Finding["limit"]): ReactNode {
  if (value === null) return "";
  return typeof value === "number" ? value : <LengthText text={value.text} />;
}

function sentenceKey({ code, next, bolt }: Finding): string {
  return `anchors.findings.${code === "spacing" && (next === null || bolt === null) ? "spacing-end" : code}`;
}
