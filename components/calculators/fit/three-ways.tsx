"use client";

import type { FitAnswer } from "@/calculators/fit";
import { Button } from "@/components/ui/button";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** Hold a wall, best fit, follow the concrete: what each costs, and a tap to take it. */
export function ThreeWays({ answer, choose }: { answer: FitAnswer; choose: (mode: string) => void }) {
  const t = useTranslate();
  return (
    <section aria-labelledby="ways-title">
      <h2 id="ways-title">{t("fit.ways.title")}</h2>
      <div className="ways">
        {answer.alternatives.map((way) => {
          const chosen = way.mode === answer.mode;
          return (
            <div key={way.way} className="way" data-chosen={chosen}>
              <p className="way-title">{t(`fit.ways.${way.way}`)}</p>
              <p className="way-figure num">
                <LengthText text={way.worst.text} />
              </p>
              <p>{t("fit.ways.off")}</p>
              <p>{way.overhang.in > 1e-6 ? t.rich("fit.ways.overhang", { overhang: <LengthText text={way.overhang.text} /> }) : t("fit.ways.inside")}</p>
              <p>
                {way.outOfSquareDegrees < 0.005
                  ? t("fit.ways.square")
                  : way.diagonalDifference === null
                    ? t("fit.ways.out", { degrees: way.outOfSquareDegrees.toFixed(2) })
                    : t.rich("fit.ways.diagonals", { difference: <LengthText text={way.diagonalDifference.text} /> })}
              </p>
              {chosen ? (
                <p className="field-hint">{t("fit.ways.chosen")}</p>
              ) : (
                <Button kind="ghost" small className="no-print" onClick={() => choose(way.mode)}>
                  {t("fit.ways.take", { way: t(`fit.ways.${way.way}`) })}
                </Button>
              )}
            </div>
          );
        })}
      </div>
    </section>
  );
}
