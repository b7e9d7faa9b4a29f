import type { Metadata } from "next";
import { ButtonLink } from "@/components/ui/button";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import { localePath } from "@/lib/client/i18n/locales";
import { pageLocale, type LocaleProps } from "@/lib/client/i18n/page-locale";

export async function generateMetadata(props: LocaleProps): Promise<Metadata> {
  const t = getTranslate(await pageLocale(props), ["set", "common"]);
  return { title: `${t("set.offline.title")} · ${t("common.name")}`, description: t("set.offline.description"), robots: { index: false } };
}

/** What the service worker answers with when a page needs signal and there is none. */
export default async function OfflinePage(props: LocaleProps) {
  const locale = await pageLocale(props);
  const t = getTranslate(locale, ["set"]);
  return (
    <main id="main" tabIndex={-1} className="set-start">
      <h1>{t("set.offline.title")}</h1>
      <p className="lead">{t("set.offline.text")}</p>
      <p className="set-buttons">
        <ButtonLink href={localePath(locale, "/set")}>{t("set.offline.sets")}</ButtonLink>
        <ButtonLink kind="ghost" href={localePath(locale, "/calculators")}>
          {t("set.offline.calculators")}
        </ButtonLink>
      </p>
    </main>
  );
}
