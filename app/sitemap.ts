import type { MetadataRoute } from "next";
import { calculators } from "@/calculators";
import { env } from "@/lib/env";
import { localePath, locales } from "@/lib/client/i18n/locales";

export const dynamic = "force-static";

const pages = ["/", "/set", "/calculators", ...calculators.map(({ name }) => `/calculators/${name}`), "/developers", "/privacy", "/terms", "/accessibility", "/contact"];

/** Every public page in every language, each naming the others. */
export default function sitemap(): MetadataRoute.Sitemap {
  const address = (path: string) => new URL(path, env.SITE_URL).href;
  return pages.flatMap((path) => {
    const languages = Object.fromEntries(locales.map((locale) => [locale, address(localePath(locale, path))]));
    return locales.map((locale) => ({ url: address(localePath(locale, path)), alternates: { languages: { ...languages, "x-default": languages.en! } } }));
  });
}
