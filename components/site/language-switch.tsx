"use client";

import { usePathname } from "next/navigation";
import type { SyntheticEvent } from "react";
import { localePath, locales, pathWithoutLocale, type Locale } from "@/lib/client/i18n/locales";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** The same page in the other language, with everything that was typed: the address's query goes along at the last moment. */
export function LanguageSwitch() {
  const t = useTranslate();
  const path = pathWithoutLocale(usePathname());

  const takeQueryAlong = (locale: Locale) => (event: SyntheticEvent<HTMLAnchorElement>) => {
    event.currentTarget.href = localePath(locale, path) + window.location.search + window.location.hash;
  };

  return (
    <div className="seg" role="group" aria-label={t("common.language.label")}>
      {locales.map((locale) => (
        <a
          key={locale}
          className="seg-item"
          href={localePath(locale, path)}
          hrefLang={locale}
          lang={locale}
          aria-current={locale === t.locale ? "true" : undefined}
          aria-label={t(`common.language.${locale}`)}
          onPointerDown={takeQueryAlong(locale)}
          onFocus={takeQueryAlong(locale)}
          onClick={takeQueryAlong(locale)}
        >
          {locale.toUpperCase()}
        </a>
      ))}
    </div>
  );
}
