import type { Metadata } from "next";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import { localePath, type Locale } from "@/lib/client/i18n/locales";
import { pageMetadata } from "./page-metadata";

export type LegalPageName = "privacy" | "terms" | "accessibility" | "contact";

/** The day the texts last changed. */
const changed = new Date("2026-12-01T00:00:00Z");

const mailTo = (address: string) => `mailto:${address}@sillwright.example`;

/** A page of plain text: sections `legal.<page>.1…`, each with a title and numbered paragraphs. */
export function LegalPage({ locale, page }: { locale: Locale; page: LegalPageName }) {
  const t = getTranslate(locale, ["legal"]);
  const numbered = (start: string, end = "") => {
    const keys: string[] = [];
    for (let number = 1; t.has(`${start}.${number}${end}`); number += 1) keys.push(`${start}.${number}`);
    return keys;
  };
  const links = {
    contact: (chunks: React.ReactNode) => <a href={localePath(locale, "/contact")}>{chunks}</a>,
    mail: (chunks: React.ReactNode) => (
      <a className="inline-target" href={mailTo("crew")}>
        {chunks}
      </a>
    ),
    security: (chunks: React.ReactNode) => <a href={mailTo("security")}>{chunks}</a>,
  };
  return (
    <main id="main" tabIndex={-1} className="page page-narrow prose">
      <h1>{t(`legal.${page}.title`)}</h1>
      <p className="lead">{t(`legal.${page}.intro`)}</p>
      {numbered(`legal.${page}`, ".title").map((section) => (
        <section key={section} className="prose legal-section">
          <h2>{t(`${section}.title`)}</h2>
          {numbered(section).map((paragraph) => (
            <p key={paragraph}>{t.rich(paragraph, links)}</p>
          ))}
        </section>
      ))}
      <p className="field-hint">{t("legal.updated", { date: changed })}</p>
    </main>
  );
}

export function legalMetadata(locale: Locale, page: LegalPageName): Metadata {
  const t = getTranslate(locale, ["legal"]);
  return pageMetadata(locale, `/${page}`, t(`legal.${page}.title`), t(`legal.${page}.description`));
}
