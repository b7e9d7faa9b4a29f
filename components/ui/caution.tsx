"use client";

import type { Caution as CautionCode } from "@/calculators/schema";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** A calculator's cautions, from their codes. Needs the namespace `cautions`. */
export function Cautions({ codes }: { codes: readonly CautionCode[] }) {
  const t = useTranslate();
  return (
    <aside className="caution" aria-label={t("common.cautionsTitle")}>
      <ul className="caution-list">
        {codes.map((code) => (
          <li key={code}>{t(`cautions.${code}`)}</li>
        ))}
      </ul>
    </aside>
  );
}
