"use client";

import type { ReactNode } from "react";
import type { InsetAnswer } from "@/calculators/inset";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { Translate } from "@/lib/client/i18n/translate";

type Suspect = InsetAnswer["suspects"][number];

const opposite = { ab: "cd", bc: "da" } as const;

/** What fits, in one or two sentences: whole lines by opposite pairs, else the first mark or reading. The verdict has room for no more. */
export function Likely({ suspects }: { suspects: readonly Suspect[] }) {
  const t = useTranslate();
  const fitting = suspects.filter(({ fits }) => fits);
  const [first] = fitting;
  if (first === undefined) return t("inset.suspects.none");
  const whole = (side: string) => fitting.find(({ line, end }) => line === side && end === null);
  const pairs = (["ab", "bc"] as const).flatMap((side) => {
    const found = whole(side) ?? whole(opposite[side]);
    if (found === undefined) return [];
    return [{ side, sentence: t.rich(`inset.suspects.pair-${found.toward}`, { side: t(`inset.side.${side}`), other: t(`inset.side.${opposite[side]}`), off: <LengthText text={found.off.text} /> }) }];
  });
  if (pairs.length > 0 && first.end === null && first.reading === null) return pairs.map(({ side, sentence }, index) => <span key={side}>{index > 0 ? <> {t("inset.suspects.or")} </> : null}{sentence}</span>);
  return fitting.length === 1 ? sentenceOf(first, t) : t.rich("inset.suspects.likely", { first: sentenceOf(first, t), count: fitting.length - 1 });
}

/** Every line, how far it alone would have to be off; then the marks and readings that alone explain all. */
export function SuspectTable({ suspects }: { suspects: readonly Suspect[] }) {
  const t = useTranslate();
  if (suspects.length === 0) return null;
  return (
    <section aria-labelledby="suspects-title">
      <h2 id="suspects-title">{t("inset.suspects.title")}</h2>
      <p>{t("inset.suspects.intro")}</p>
      <ul className="findings">
        {suspects.map((suspect) => (
          <li key={`${suspect.line} ${suspect.end} ${suspect.reading}`} data-tone={suspect.fits ? "out" : "plain"}>
            <p>{sentenceOf(suspect, t)}</p>
            <p className="findings-note">
              {t(suspect.fits ? "inset.suspects.fits" : "inset.suspects.doesNotFit")} {suspect.likely === null ? null : t(`inset.suspects.${suspect.likely}`)}
            </p>
          </li>
        ))}
      </ul>
    </section>
  );
}

function sentenceOf({ line, end, reading, off, toward }: Suspect, t: Translate): ReactNode {
  const far = <LengthText text={off.text} />;
  if (reading !== null) return t.rich(`inset.suspects.reading-${toward}`, { reading: t(`inset.reading.${reading.replace(".", "-")}`), off: far });
  const side = t(`inset.side.${line}`);
  return end === null ? t.rich(`inset.suspects.line-${toward}`, { side, off: far }) : t.rich(`inset.suspects.mark-${toward}`, { side, end, off: far });
}
