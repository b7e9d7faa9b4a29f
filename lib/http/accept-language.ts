import "server-only";
import { defaultLocale, isLocale, type Locale } from "@/lib/client/i18n/locales";

const seen = new Map<string, Locale>();
const mostSeen = 500;

/** The best of our languages for an Accept-Language header; English when it names none of them. */
export function acceptedLocale(header: string | null): Locale {
  if (header === null) return defaultLocale;
  const known = seen.get(header);
  if (known !== undefined) return known;
  const chosen = choose(header);
  if (seen.size < mostSeen && header.length <= 200) seen.set(header, chosen);
  return chosen;
}

function choose(header: string): Locale {
  let best: { locale: Locale; quality: number } = { locale: defaultLocale, quality: 0 };
  for (const part of header.slice(0, 1000).split(",")) {
    const [tag = "", ...parameters] = part.trim().toLowerCase().split(/\s*;\s*/);
    const given = parameters.find((parameter) => parameter.startsWith("q="));
    const quality = given === undefined ? 1 : Number(given.slice(2));
    const language = tag === "*" ? defaultLocale : (tag.split("-", 1)[0] ?? "");
    if (isLocale(language) && quality > best.quality && quality <= 1) best = { locale: language, quality };
  }
  return best.locale;
}
