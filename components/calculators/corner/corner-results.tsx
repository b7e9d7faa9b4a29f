"use client";

import type { CornerAnswer } from "@/calculators/corner";
import { KeyValues } from "@/components/ui/key-values";
import { LengthAnswer } from "@/components/ui/length-answer";
import { LengthText } from "@/components/ui/length-text";
import { Note } from "@/components/ui/note";
import { Verdict } from "@/components/ui/verdict";
import { useTranslate } from "@/lib/client/i18n/messages-context";

interface Shown {
  answer: CornerAnswer;
  burn: string;
  /** Shows readings as the person typed theirs. */
  print: (text: string) => string;
}

/** What the tape must read between the legs' ends, and the whole-number triangle that squares the same corner. */
export function CornerVerdict({ answer, burn, print }: Omit<Shown, "answer"> & { answer: CornerAnswer | null }) {
  const t = useTranslate();
  if (answer === null) return <Verdict tone="idle" title={t("corner.verdict.waiting")}>{t("corner.verdict.waitingBody")}</Verdict>;
  const { triangle, reading } = answer;
  return (
    <Verdict tone="plain" title={t.rich("corner.verdict.reading", { reading: <LengthText text={print(reading.text)} /> })}>
      {burn === "" ? null : t("corner.verdict.burned", { burn })}{" "}
      {triangle === null
        ? t("corner.verdict.noTriangle")
        : t.rich("corner.verdict.triangle", { triangle: <b>{triangle.counts.join("-")}</b>, unit: triangle.unit, a: <LengthText text={triangle.a.text} />, b: <LengthText text={triangle.b.text} />, reading: <b><LengthText text={triangle.reading.text} /></b> })}
    </Verdict>
  );
}

export function CornerResults({ answer, burn, system, print }: Shown & { system: "imperial" | "metric" }) {
  const t = useTranslate();
  const { diagonal, reading, triangle } = answer;
  const small = (value: number) => t("corner.results.small", { system, value: system === "metric" ? (value * 25.4).toFixed(1) : value.toFixed(2) });
  return (
    <div className="squareness-columns">
      <KeyValues
        items={[
          { label: t("corner.results.diagonal"), value: <LengthAnswer length={diagonal} /> },
          ...(burn === "" ? [] : [{ label: t("corner.results.reading", { burn }), value: <LengthAnswer length={{ ...reading, text: print(reading.text) }} /> }]),
          ...(triangle === null
            ? []
            : [
                { label: t("corner.results.a"), value: <LengthAnswer length={triangle.a} /> },
                { label: t("corner.results.b"), value: <LengthAnswer length={triangle.b} /> },
                { label: t("corner.results.c"), value: <LengthAnswer length={triangle.c} /> },
                ...(burn === "" ? [] : [{ label: t("corner.results.cReading", { burn }), value: <LengthAnswer length={triangle.reading} /> }]),
                { label: t("corner.results.multiple"), value: t("corner.results.times", { triple: triangle.primitive.join("-"), times: triangle.times }) },
              ]),
          { label: t("corner.results.swing"), value: small(answer.swingIn) },
          ...(triangle === null ? [] : [{ label: t("corner.results.triangleSwing"), value: small(triangle.swingIn) }]),
        ]}
      />
      <Note title={t("corner.proves.title")}>
        <p>{t("corner.proves.body")}</p>
        <p>{t("corner.proves.largest")}</p>
      </Note>
    </div>
  );
}
