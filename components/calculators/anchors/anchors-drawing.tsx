"use client";

import type { CheckAnswer, LayoutAnswer } from "@/calculators/anchors";
import { BoltMark, WallDrawing } from "@/components/drawing/wall-drawing";
import type { BoltTone, WallBolt } from "@/components/drawing/wall-geometry";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { Mode } from "./anchors-fields";

/** A 2x6, when no plate was measured. */
const usualWidth = 5.5;
/** A fresh page shows the work on a piece of its own, without figures. */
const blank = { pieces: [{ from: 0, to: 192 }], bolts: [8, 66, 126, 184].map((station): WallBolt => ({ station })) };

/** The wall's pieces with their bolts, to scale, and what breaks the rule marked by shape and word. */
export function AnchorsDrawing({ mode, laid, checked }: { mode: Mode; laid: LayoutAnswer | null; checked: CheckAnswer | null }) {
  const t = useTranslate();
  if (mode === "check" && checked !== null) return <CheckedWall answer={checked} />;
  if (mode === "layout" && laid !== null) {
    const bolts = laid.pieces.flatMap(({ stations }) => stations.map((station): WallBolt => ({ station: station.in, label: station.text })));
    const pieces = laid.pieces.map(({ from, to }, index) => ({ from: from.in, to: to.in, label: labelOf(laid.pieces.length, index) }));
    return <WallDrawing pieces={pieces} bolts={bolts} plateWidth={usualWidth} middleThird description={t("anchors.drawing.layout", { bolts: laid.bolts, pieces: laid.pieces.length })} />;
  }
  return <WallDrawing pieces={blank.pieces} bolts={blank.bolts} plateWidth={usualWidth} middleThird description={t("anchors.drawing.blank")} />;
}

function CheckedWall({ answer }: { answer: CheckAnswer }) {
  const t = useTranslate();
  const plateWidth = answer.thirds === null ? usualWidth : answer.thirds.from.in * 3;
  const faulty = new Set(answer.findings.filter(({ code }) => code !== "spacing" && code !== "far-end").map(({ bolt }) => bolt));
  const standing = answer.bolts.map(({ station, offset, engineered }, index): WallBolt => {
    const tone: BoltTone = engineered ? "engineered" : faulty.has(index) ? "bad" : "good";
    return { station: station.in, label: station.text, number: index + 1, tone, ...(offset === null ? {} : { across: offset.in }) };
  });
  const added = answer.additions.map(({ station }): WallBolt => ({ station: station.in, label: station.text, tone: "added" }));
  const gaps = answer.findings.flatMap(({ code, bolt, next, actual }) => {
    if (code !== "spacing" || bolt === null || next === null || typeof actual !== "object" || actual === null) return [];
    return [{ from: answer.bolts[bolt]!.station.in, to: answer.bolts[next]!.station.in, label: actual.text }];
  });
  const tones = (["good", "bad", "added", "engineered"] as const).filter((tone) => [...standing, ...added].some((bolt) => bolt.tone === tone));
  return (
    <>
      <WallDrawing
        pieces={answer.pieces.map(({ from, to }, index) => ({ from: from.in, to: to.in, label: labelOf(answer.pieces.length, index) }))}
        bolts={[...standing, ...added]}
        plateWidth={plateWidth}
        inset={answer.converted[0]?.offsetBy.in}
        middleThird={answer.thirds !== null}
        gaps={gaps}
        description={t("anchors.drawing.check", { bolts: standing.length, findings: answer.findings.length, added: added.length })}
      />
      <ul className="bolt-legend">
        {tones.map((tone) => (
          <li key={tone}>
            <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true" focusable="false">
              <BoltMark bolt={{ x: 10, y: 10, tone }} />
            </svg>
            {t(`anchors.legend.${tone}`)}
          </li>
        ))}
      </ul>
    </>
  );
}

/** Pieces are numbered where there are several. */
function labelOf(count: number, index: number): string | undefined {
  return count > 1 ? String(index + 1) : undefined;
}
