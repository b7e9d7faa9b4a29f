"use client";

import { usePathname } from "next/navigation";
import { localePath, pathWithoutLocale } from "@/lib/client/i18n/locales";
import { useTranslate } from "@/lib/client/i18n/messages-context";

const links = [
  { path: "/calculators", label: "common.nav.calculators" },
  { path: "/set", label: "common.nav.sets" },
  { path: "/developers", label: "common.nav.api" },
] as const;

/** The main places; the one we are in is underlined. */
export function SiteLinks() {
  const t = useTranslate();
  const here = pathWithoutLocale(usePathname());
  return (
    <nav className="site-nav" aria-label={t("common.nav.label")}>
      {links.map(({ path, label }) => (
        <a key={path} href={localePath(t.locale, path)} aria-current={here === path ? "page" : here.startsWith(`${path}/`) ? "true" : undefined}>
          <span>{t(label)}</span>
        </a>
      ))}
    </nav>
  );
}
