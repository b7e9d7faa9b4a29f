import { LegalPage, legalMetadata } from "@/components/site/legal-page";
import { pageLocale, type LocaleProps } from "@/lib/client/i18n/page-locale";

export async function generateMetadata(props: LocaleProps) {
  return legalMetadata(await pageLocale(props), "terms");
}

export default async function TermsPage(props: LocaleProps) {
  return <LegalPage locale={await pageLocale(props)} page="terms" />;
}
