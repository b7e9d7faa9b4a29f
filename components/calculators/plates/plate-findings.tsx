"use client";

import type { ReactNode } from "react";
import type { PlatesAnswer } from "@/calculators/plates";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { statusText } from "../anchors/status-text";

type Finding = PlatesAnswer["findings"][number];

/** What no joint and no anchor mends, in the words of the bolts' page, with its wall. */
export function PlateFindings({ answer }: { answer: PlatesAnswer }) {
  const t = useTranslate();
  if (answer.findings.length === 0) return null;
  return (
    <section aria-labelledby="findings-title">
      <h2 id="findings-title">{t("plates.findings.title")}</h2>
      <ul className="findings">
        {answer.findings.map((finding, index) => (
          <li key={index} data-tone="out">
            <p>
              <b>
                {finding.wall.toUpperCase()}, {t(`anchors.code.${finding.code}`)}.
              </b>{" "}
              {t.rich(sentenceKey(finding), valuesOf(finding, answer))}
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

function valuesOf({ wall, piece, bolt, next, limit, actual }: Finding, answer: PlatesAnswer): Record<string, ReactNode> {
  const shown = (value: Finding["limit"]) => (value === null ? "" : typeof value === "number" ? value : <LengthText text={value.text} />);
  const hole = answer.pieces.filter((candidate) => candidate.wall === wall).flatMap(({ holes }) => holes).find((candidate) => candidate.bolt === bolt);
  return { piece: piece ?? "", bolt: bolt === null ? "" : bolt + 1, next: next === null ? "" : next + 1, station: hole === undefined ? "" : <LengthText text={hole.station.text} />, limit: shown(limit), actual: shown(actual) };
}
