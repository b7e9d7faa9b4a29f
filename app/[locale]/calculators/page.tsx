import { CalculatorTiles } from "@/components/site/calculator-tiles";
import { pageMetadata } from "@/components/site/page-metadata";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import { pageLocale, type LocaleProps } from "@/lib/client/i18n/page-locale";

export async function generateMetadata(props: LocaleProps) {
  const locale = await pageLocale(props);
  const t = getTranslate(locale, ["home"]);
  return pageMetadata(locale, "/calculators", t("home.index.title"), t("home.index.metaDescription"));
}

export default async function CalculatorsPage(props: LocaleProps) {
  const t = getTranslate(await pageLocale(props), ["common", "home"]);
  return (
    <main id="main" tabIndex={-1} className="page">
      <h1>{t("home.index.title")}</h1>
      <p className="lead">{t("home.index.text")}</p>
      <CalculatorTiles t={t} heading="h2" />
    </main>
  );
}
