"use client";

import type { SquarenessAnswer } from "@/calculators/squareness";
import { PlanDrawing } from "@/components/drawing/plan-drawing";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { isSkewed } from "./slab-words";

/** A fresh page shows the work on a slab of no size: the sides bear their names. */
const blank = { length: 336, width: 264 };

/** The slab as the readings make it, its departures drawn larger by a round number that the caption states, and which way C-D must go. */
export function SquarenessDrawing({ answer }: { answer: SquarenessAnswer | null }) {
  const t = useTranslate();
  if (answer === null) {
    return <PlanDrawing {...blank} sides={{ ab: t("squareness.drawing.length"), da: t("squareness.drawing.width") }} description={t("squareness.drawing.blank")} caption={t("squareness.drawing.blankCaption")} />;
  }
  const { readings, corners, rack, difference, verdict } = answer;
  const move = verdict !== "contradictory" && isSkewed(answer) && rack.toward !== null ? { toward: rack.toward, text: t("common.drawing.move", { side: t("squareness.reading.cd"), length: rack.distance.text }) } : undefined;
  const figures = { ab: readings.ab.measured.text, da: readings.da.measured.text, ac: readings.ac.measured.text, bd: readings.bd.measured.text, difference: difference.text };
  return (
    <PlanDrawing
      length={readings.ab.measured.in}
      width={readings.da.measured.in}
      corners={corners}
      sides={{ ab: figures.ab, da: figures.da, ...(readings.cd === null ? {} : { cd: readings.cd.measured.text }), ...(readings.bc === null ? {} : { bc: readings.bc.measured.text }) }}
      move={move}
      description={move === undefined ? t("squareness.drawing.description", figures) : t("squareness.drawing.moveDescription", { ...figures, distance: rack.distance.text, toward: rack.toward! })}
    />
  );
}
