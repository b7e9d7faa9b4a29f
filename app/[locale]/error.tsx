"use client";

import { useEffect } from "react";
import { Button, ButtonLink } from "@/components/ui/button";
import { localePath } from "@/lib/client/i18n/locales";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** A page that broke, inside the site's frame. The address still holds what was typed. */
export default function ErrorPage({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  const t = useTranslate();
  useEffect(() => console.error(error), [error]);
  return (
    <main id="main" tabIndex={-1} className="page page-narrow prose">
      <title>{`${t("failure.title")} · ${t("common.name")}`}</title>
      <h1>{t("failure.title")}</h1>
      <p>{t("failure.text")}</p>
      {error.digest === undefined ? null : <p className="field-hint num">{error.digest}</p>}
      <p className="hero-actions">
        <Button onClick={reset}>{t("failure.again")}</Button>
        <ButtonLink kind="ghost" href={localePath(t.locale, "/calculators")}>
          {t("common.missing.calculators")}
        </ButtonLink>
      </p>
    </main>
  );
}
