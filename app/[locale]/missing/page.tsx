import { MissingNotice } from "@/components/site/missing-notice";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import { pageLocale, type LocaleProps } from "@/lib/client/i18n/page-locale";

export async function generateMetadata(props: LocaleProps) {
  const t = getTranslate(await pageLocale(props), ["common"]);
  return { title: `${t("common.missing.title")} · ${t("common.name")}`, robots: { index: false } };
}

/** What `next.config.mjs` serves for every address that is no page: prerendered in the reader's language; scripts/lib/csp.mjs gives it status 404. */
export default function MissingPage() {
  return <MissingNotice />;
}
