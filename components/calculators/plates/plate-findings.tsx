"use client";

import type { PlatesAnswer } from "@/calculators/plates";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { FindingItem } from "../anchors/finding-item";

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
          <FindingItem
            key={index}
            finding={finding}
            title={`${finding.wall.toUpperCase()}, ${t(`anchors.code.${finding.code}`)}`}
            piece={finding.piece ?? ""}
            station={stationOf(finding, answer)}
          />
        ))}
      </ul>
    </section>
  );
}

/** Where the finding's bolt stands on its wall, from the hole bored for it. */
function stationOf({ wall, bolt }: Finding, answer: PlatesAnswer): string | undefined {
  const holes = answer.pieces.filter((piece) => piece.wall === wall).flatMap((piece) => piece.holes);
  return holes.find((hole) => hole.bolt === bolt)?.station.text;
}
