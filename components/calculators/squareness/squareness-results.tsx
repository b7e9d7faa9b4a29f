"use client";

import type { SquarenessAnswer } from "@/calculators/squareness";
import { KeyValues, type KeyValue } from "@/components/ui/key-values";
import { LengthAnswer } from "@/components/ui/length-answer";
import { Note } from "@/components/ui/note";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { ReadingTable } from "./reading-table";
import { SuspectList } from "./suspect-list";

const corners = ["A", "B", "C", "D"] as const;

/** The figures behind the verdict, what the readings prove, and who is suspected when they cannot all be right. */
export function SquarenessResults({ answer, burn, system, print }: { answer: SquarenessAnswer; burn: string; system: "imperial" | "metric"; print: (text: string) => string }) {
  const t = useTranslate();
  const { rack, target, taper, readings, difference, verdict } = answer;
  const degrees = (value: number) => t("squareness.results.degrees", { value: value.toFixed(2) });
  const shown = taper === null ? (["A", "B"] as const) : corners;
  // Figures of a slab that cannot be are not worth reading: only how far the readings miss each other.
  const slab: KeyValue[] = [
    { label: t("squareness.results.trueDiagonal"), value: <LengthAnswer length={target.diagonal} /> },
    ...(target.reading.text === target.diagonal.text
      ? []
      : [{ label: burn === "" ? t("squareness.results.tapeReads") : t("squareness.results.shouldRead", { burn }), value: <LengthAnswer length={{ ...target.reading, text: print(target.reading.text) }} /> }]),
    { label: t("squareness.results.rack", { width: readings.da.measured.text }), value: <LengthAnswer length={rack.distance} /> },
    ...(taper === null
      ? []
      : [
          { label: t("squareness.results.taperLength"), value: <LengthAnswer length={taper.length} /> },
          { label: t("squareness.results.taperWidth"), value: <LengthAnswer length={taper.width} /> },
        ]),
    ...shown.map((corner) => ({ key: corner, label: t("squareness.results.corner", { corner }), value: degrees(answer.corners[corner].angleDegrees) })),
  ];
  const small = (value: number) => t("squareness.results.small", { system, value: system === "metric" ? (value * 25.4).toFixed(1) : value.toFixed(2) });
  const items: KeyValue[] = [
    { label: t("squareness.results.difference"), value: <LengthAnswer length={difference} /> },
    ...(verdict === "contradictory" ? [] : slab),
    { label: t(taper === null ? "squareness.results.closureTwo" : "squareness.results.closure"), value: small(answer.closureIn) },
    { label: t("squareness.results.closureLimit"), value: small(answer.closureLimitIn) },
  ];
  return (
    <>
      <SuspectList answer={answer} print={print} />
      <div className="squareness-columns">
        <KeyValues items={items} />
        <Note title={t("squareness.proves.title")} tone={answer.proves.includes("equal-diagonals-not-square") ? "warn" : "plain"}>
          {answer.proves.map((code) => (
            <p key={code}>{t(`squareness.proves.${code}`)}</p>
          ))}
        </Note>
      </div>
      <ReadingTable answer={answer} system={system} />
    </>
  );
}
