"use client";

import type { InsetAnswer } from "@/calculators/inset";
import { LengthText } from "@/components/ui/length-text";
import { Verdict } from "@/components/ui/verdict";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { Likely } from "./suspect-list";

/** The lines to snap and what the tape must read; once the chalk was pulled, whether it agrees. */
export function InsetVerdict({ answer }: { answer: InsetAnswer | null }) {
  const t = useTranslate();
  if (answer === null) return <Verdict tone="idle" title={t("inset.verdict.waiting")}>{t("inset.verdict.waitingBody")}</Verdict>;
  const { check, lines, expected, drops } = answer;
  if (check === null) {
    const alike = expected.ac.reading.text === expected.bd.reading.text;
    return (
      <Verdict tone="plain" title={t.rich("inset.verdict.lines", { along: <LengthText text={lines.ab.text} />, across: <LengthText text={lines.bc.text} /> })}>
        {alike
          ? t.rich("inset.verdict.reads", { reading: <LengthText text={expected.ac.reading.text} /> })
          : t.rich("inset.verdict.readsApart", { ac: <LengthText text={expected.ac.reading.text} />, bd: <LengthText text={expected.bd.reading.text} /> })}
      </Verdict>
    );
  }
  const measured = check.drops;
  const figures =
    measured === null
      ? null
      : t.rich("inset.verdict.drops", {
          ac: <LengthText text={measured.ac.measured.text} />,
          bd: <LengthText text={measured.bd.measured.text} />,
          wantedAc: <LengthText text={drops.ac.text} />,
          wantedBd: <LengthText text={drops.bd.text} />,
        });
  if (check.agrees) {
    return (
      <Verdict tone="good" title={t("inset.verdict.agrees")}>
        {figures ?? t("inset.verdict.agreesBody")}
      </Verdict>
    );
  }
  return (
    <Verdict tone="out" title={t("inset.verdict.off")}>
      <p>
        <Likely suspects={answer.suspects} /> {answer.ask === null ? null : t(`inset.ask.${answer.ask}`)}
      </p>
    </Verdict>
  );
}
