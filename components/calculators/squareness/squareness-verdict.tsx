"use client";

import type { ReactNode } from "react";
import type { SquarenessAnswer } from "@/calculators/squareness";
import { LengthText } from "@/components/ui/length-text";
import { Verdict, type VerdictTone } from "@/components/ui/verdict";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { Translate } from "@/lib/client/i18n/translate";
import { suspectsSentence } from "./suspect-list";
import { greatestTaper, isSkewed, isTapered } from "./slab-words";

/** Square or not, by how much; then which side to move, how far, and what both diagonals must read. `print` shows readings as the person typed theirs. */
export function SquarenessVerdict({ answer, print }: { answer: SquarenessAnswer | null; print: (text: string) => string }) {
  const t = useTranslate();
  if (answer === null) return <Verdict tone="idle" title={t("squareness.verdict.waiting")}>{t("squareness.verdict.waitingBody")}</Verdict>;
  if (answer.verdict === "contradictory") {
    return (
      <Verdict tone="warn" title={t("common.verdict.contradictory")}>
        {suspectsSentence(answer, t)}
      </Verdict>
    );
  }
  return (
    <Verdict tone={toneOf(answer)} title={titleOf(answer, t)}>
      {limitSentence(answer, t)} {whatToDo(answer, print, t)}
    </Verdict>
  );
}

function toneOf({ verdict }: SquarenessAnswer): VerdictTone {
  if (verdict === null) return "plain";
  return verdict === "out" ? "out" : "good";
}

const length = (text: string) => <LengthText text={text} />;

function titleOf(answer: SquarenessAnswer, t: Translate): ReactNode {
  const { verdict, difference } = answer;
  const apart = { difference: length(difference.text) };
  if (verdict === "square") return t("common.verdict.square");
  if (verdict === "within") return t.rich("squareness.verdict.within", apart);
  if (isSkewed(answer)) return t.rich(verdict === "out" ? "squareness.verdict.out" : "squareness.verdict.racked", apart);
  if (isTapered(answer)) return t.rich("squareness.verdict.tapered", { taper: length(greatestTaper(answer)!.text) });
  return t.rich(answer.taper === null ? "squareness.verdict.agree" : "squareness.verdict.allAgree", apart);
}

/** Over or inside the limit, with its figure on this slab. */
function limitSentence({ verdict, allowed, exceeds }: SquarenessAnswer, t: Translate): ReactNode {
  if (allowed === null || verdict === "square") return null;
  const values = { limit: length(allowed.difference.text), taper: length(allowed.taper.text) };
  if (verdict === "within") return t.rich("squareness.verdict.insideLimit", values);
  const onlyTaper = exceeds.every((code) => code.endsWith("taper"));
  return t.rich(onlyTaper ? "squareness.verdict.overTaper" : "squareness.verdict.overLimit", values);
}

function whatToDo(answer: SquarenessAnswer, print: (text: string) => string, t: Translate): ReactNode {
  const { rack, target, shape } = answer;
  const alike = target.readings.ac.text === target.readings.bd.text;
  const reading = <b>{length(print(target.reading.text))}</b>;
  const readings = alike ? { reading } : { ac: <b>{length(print(target.readings.ac.text))}</b>, bd: <b>{length(print(target.readings.bd.text))}</b> };
  const both = t.rich(alike ? "squareness.verdict.bothRead" : "squareness.verdict.eachReads", readings);
  if (isSkewed(answer) && rack.toward !== null) {
    const move = t.rich("squareness.verdict.move", { distance: <b>{length(rack.distance.text)}</b>, toward: rack.toward });
    return (
      <>
        {move} {both} {shape === "irregular" ? t("squareness.verdict.thenTapered") : null}
      </>
    );
  }
  if (isTapered(answer)) return t("squareness.verdict.taperedBody");
  return answer.verdict === null ? t("squareness.verdict.chooseLimit") : answer.taper === null ? t("squareness.verdict.ifSidesMatch") : null;
}
