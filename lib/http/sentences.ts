import "server-only";
import type { Issue } from "@/calculators/schema";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import type { Locale } from "@/lib/client/i18n/locales";
import type { Translate } from "@/lib/client/i18n/translate";

const translators = new Map<Locale, Translate>();

/** The sentences of the API, compiled once for each language from the same files as the pages' own. */
export function apiTranslate(locale: Locale): Translate {
  const known = translators.get(locale);
  if (known !== undefined) return known;
  const made = getTranslate(locale, ["errors", "developers"]);
  translators.set(locale, made);
  return made;
}

/** What to type instead of a faulty field. A code that has no sentence fails a test; in a running site it gets the general one. */
export function issueSentence(t: Translate, issue: Issue): string {
  const key = `errors.${issue.code}`;
  return t(t.has(key) ? key : "errors.not-valid", { example: "28' 7 1/2\"", ...issue.params });
}
