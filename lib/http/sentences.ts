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

/** What to type instead of a faulty field. Tests see to it that each code has its sentence and figures; whatever is amiss, a refusal stays one. */
export function issueSentence(t: Translate, issue: Issue): string {
  try {
    return t(`errors.${issue.code}`, { example: "28' 7 1/2\"", ...issue.params });
  } catch {
    return t("errors.not-valid");
  }
}
