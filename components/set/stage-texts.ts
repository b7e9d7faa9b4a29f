import "server-only";
import { calculators } from "@/calculators";
import { borrowedTexts } from "@/lib/client/i18n/borrowed-texts";
import type { Namespace } from "@/lib/client/i18n/catalogue";
import { loadMessages } from "@/lib/client/i18n/load-messages";
import type { Locale } from "@/lib/client/i18n/locales";
import { sheetKeys, sheetNamespaces } from "@/lib/client/sheet/sheet-texts";
import type { Messages } from "@/lib/client/i18n/translate";

/** What a calculator says in the browser: its own keys save those of its page, error sentences and its cautions. `reading` is the reading mode's, `sheet` the field sheet's. */
export function stageTexts(locale: Locale, name: string): Messages {
  if (name === "reading") return loadMessages(locale, ["set"], ["set.reading.", "set.readings."]);
  if (name === "sheet") return loadMessages(locale, sheetNamespaces, sheetKeys);
  const cautions = calculators.find((calculator) => calculator.name === name)?.cautions ?? [];
  const own = Object.entries(loadMessages(locale, [name as Namespace])).filter(([key]) => !key.startsWith(`${name}.page.`));
  const borrowed = borrowedTexts[name];
  return { ...(borrowed === undefined ? {} : loadMessages(locale, [borrowed.from], borrowed.under)), ...Object.fromEntries(own), ...loadMessages(locale, ["errors"]), ...loadMessages(locale, ["cautions"], cautions.map((code) => `cautions.${code}`)) };
}
