import { ProblemsPage } from "@/components/developers/problem-pages";
import { pageMetadata } from "@/components/site/page-metadata";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import { pageLocale, type LocaleProps } from "@/lib/client/i18n/page-locale";

export async function generateMetadata(props: LocaleProps) {
  const locale = await pageLocale(props);
  const t = getTranslate(locale, ["developers"]);
  return pageMetadata(locale, "/problems", t("developers.problem.index"), t("developers.problem.indexDescription"));
}

export default async function Page(props: LocaleProps) {
  return <ProblemsPage locale={await pageLocale(props)} />;
}
