"use client";

import { ButtonLink } from "@/components/ui/button";
import { localePath } from "@/lib/client/i18n/locales";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** A plate that stops short of its corner: nothing is here. */
function MissingDrawing() {
  return (
    <svg width="150" height="92" viewBox="0 0 150 92" aria-hidden="true" focusable="false">
      <rect x="8" y="34" width="84" height="24" fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
      <rect x="92" y="34" width="50" height="24" fill="none" stroke="var(--edge)" strokeWidth="2" strokeDasharray="5 4" />
      <circle cx="26" cy="46" r="5.5" fill="var(--steel)" />
      <circle cx="74" cy="46" r="5.5" fill="var(--steel)" />
      <path d="M111 40l12 12m0-12l-12 12" stroke="var(--keel)" strokeWidth="2.6" />
    </svg>
  );
}

/** The page for an address that has none. Next gives `not-found` no params, so the language comes from the layout's messages. */
export function MissingNotice() {
  const t = useTranslate();
  return (
    <main id="main" tabIndex={-1} className="page page-narrow prose">
      <MissingDrawing />
      <h1>{t("common.missing.title")}</h1>
      <p>{t("common.missing.text")}</p>
      <p className="hero-actions">
        <ButtonLink href={localePath(t.locale, "/calculators")}>{t("common.missing.calculators")}</ButtonLink>
        <ButtonLink kind="ghost" href={localePath(t.locale, "/")}>
          {t("common.missing.home")}
        </ButtonLink>
      </p>
    </main>
  );
}
