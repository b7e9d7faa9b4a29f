import { calculators } from "@/calculators";
import { localePath } from "@/lib/client/i18n/locales";
import type { Translate } from "@/lib/client/i18n/translate";

/** The calculators side by side, in the order of the job; the one in hand is marked. */
export function CalculatorNav({ current, t }: { current: string; t: Translate }) {
  return (
    <nav className="calculator-nav no-print" aria-label={t("common.calculators.label")}>
      <ul>
        {calculators.map(({ name }) => (
          <li key={name}>
            <a href={localePath(t.locale, `/calculators/${name}`)} aria-current={name === current ? "page" : undefined}>
              {t(`common.calculators.${name}`)}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}
