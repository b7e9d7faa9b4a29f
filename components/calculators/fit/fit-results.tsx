"use client";

import type { FitAnswer } from "@/calculators/fit";
import { Disclosure } from "@/components/ui/disclosure";
import { Note } from "@/components/ui/note";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { ActiveTable, BoltTable, CheckTable, OffsetTable, RangeTable } from "./fit-tables";
import { ThreeWays } from "./three-ways";

/** The three ways, then what to mark, how it lies along the walls, the pulls that prove it, the bolts, and the certificate. */
export function FitResults({ answer, burned, choose }: { answer: FitAnswer; burned: boolean; choose: (mode: string) => void }) {
  const t = useTranslate();
  const hasCertificate = (answer.mode === "size-held" || answer.mode === "size-free") && answer.optimal.active.length > 0;
  return (
    <>
      <ThreeWays answer={answer} choose={choose} />
      <OffsetTable answer={answer} />
      <RangeTable answer={answer} />
      <CheckTable answer={answer} burned={burned} />
      <BoltTable answer={answer} />
      <Note title={t("fit.proves.title")}>{t(answer.mode === "follow" ? "fit.proves.follow" : "fit.proves.fit")}</Note>
      {hasCertificate ? (
        <Disclosure summary={t("fit.optimal.summary")}>
          <ActiveTable answer={answer} />
        </Disclosure>
      ) : null}
    </>
  );
}
