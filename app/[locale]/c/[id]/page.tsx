import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { cache } from "react";
import { KeptCalculation } from "@/components/links/kept-calculation";
import type { LinkAnswer } from "@/api-spec";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import { isLocale, type Locale } from "@/lib/client/i18n/locales";
import { Problem } from "@/lib/http/problem";
import { presentLink } from "@/lib/presenters/link";
import { openLink } from "@/lib/services/links/open-link";

export const dynamic = "force-dynamic";
export const dynamicParams = true;

interface PageProps {
  params: Promise<{ locale: string; id: string }>;
}

/** Read once for title and page. `away` while the database is. */
const kept = cache(async (id: string): Promise<LinkAnswer | "away" | null> => {
  try {
    const opened = await openLink(id);
    return opened && presentLink(opened);
  } catch (error) {
    if (error instanceof Problem && error.code === "not-ready") return "away";
    throw error;
  }
});

const translateFor = (locale: Locale) => getTranslate(locale, ["common", "links", "anchors"]);

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  const { locale, id } = await params;
  if (!isLocale(locale)) notFound();
  const t = translateFor(locale);
  const link = await kept(id);
  const title = link === null || link === "away" ? t("common.name") : `${t("links.page.title", { calculator: t(`common.calculators.${link.calculator}`) })} · ${t("common.name")}`;
  // Whoever has the address can read the readings: no search engine, and no site linked from here, is to have it.
  return { title, description: t("links.page.description"), robots: { index: false, follow: false }, referrer: "no-referrer" };
}

/** A calculation under its short address. */
export default async function KeptPage({ params }: PageProps) {
  const { locale, id } = await params;
  if (!isLocale(locale)) notFound();
  const t = translateFor(locale);
  const link = await kept(id);
  if (link === null) notFound();
  return (
    <main id="main" tabIndex={-1} className="page page-narrow prose">
      {link === "away" ? (
        <>
          <h1>{t("links.page.away")}</h1>
          <p>{t("links.page.awayText")}</p>
        </>
      ) : (
        <>
          <h1>{t(`common.calculators.${link.calculator}`)}</h1>
          <p className="lead">{t("links.page.made", { date: new Date(link.createdAt), version: link.version })}</p>
          <KeptCalculation link={link} locale={locale} t={t} />
        </>
      )}
    </main>
  );
}
