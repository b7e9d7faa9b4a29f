import { DevelopersPage } from "@/components/developers/developers-page";
import { pageMetadata } from "@/components/site/page-metadata";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import { pageLocale, type LocaleProps } from "@/lib/client/i18n/page-locale";
import { env } from "@/lib/env";

export async function generateMetadata(props: LocaleProps) {
  const locale = await pageLocale(props);
  const t = getTranslate(locale, ["developers"]);
  return pageMetadata(locale, "/developers", t("developers.page.title"), t("developers.page.description"));
}

export default async function Page(props: LocaleProps) {
  return <DevelopersPage locale={await pageLocale(props)} site={env.SITE_URL} />;
}
