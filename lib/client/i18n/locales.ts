/** The languages of the pages. The first has addresses without a prefix. */
export const locales = ["en", "es"] as const;
export type Locale = (typeof locales)[number];
export const defaultLocale: Locale = "en";

/** What formatters are given. Bare `es` would swap the decimal point for a comma, and a wrong separator is a wrong cut. */
export const formatterTags = { en: "en-US", es: "es-US" } as const satisfies Record<Locale, string>;

export function isLocale(text: string): text is Locale {
  return (locales as readonly string[]).includes(text);
}

/** The public address of a page: `/calculators/inset` in English, `/es/calculators/inset` in Spanish. `path` begins with `/`; a query or fragment may follow. */
export function localePath(locale: Locale, path: string): string {
  if (locale === defaultLocale) return path;
  return path === "/" ? `/${locale}` : path.startsWith("/?") || path.startsWith("/#") ? `/${locale}${path.slice(1)}` : `/${locale}${path}`;
}

/** The path without its language, whether public (`/es/x`, `/x`) or internal (`/en/x`): what server and browser agree on. */
export function pathWithoutLocale(path: string): string {
  const [, first = ""] = path.split("/", 2);
  if (!isLocale(first)) return path;
  return path.slice(first.length + 1) || "/";
}
