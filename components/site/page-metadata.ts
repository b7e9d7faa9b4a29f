import type { Metadata } from "next";
import { localePath, locales, type Locale } from "@/lib/client/i18n/locales";

/** Title, description, and where the page stands in each language. `path` is without language. */
export function pageMetadata(locale: Locale, path: string, title: string, description: string): Metadata {
  const languages = Object.fromEntries(locales.map((other) => [other, localePath(other, path)]));
  return {
    title: path === "/" ? title : `${title} · Sillwright`,
    description,
    alternates: { canonical: localePath(locale, path), languages: { ...languages, "x-default": localePath("en", path) } },
    openGraph: { title, description, url: localePath(locale, path), siteName: "Sillwright", locale: locale === "es" ? "es_US" : "en_US", type: "website" },
  };
}
