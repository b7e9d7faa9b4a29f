import { LegalPage, legalMetadata } from "@/components/site/legal-page";
import { pageLocale, type LocaleProps } from "@/lib/client/i18n/page-locale";

export async function generateMetadata(props: LocaleProps) {
  return legalMetadata(await pageLocale(props), "privacy");
}

export default async function PrivacyPage(props: LocaleProps) {
  return <LegalPage locale={await pageLocale(props)} page="privacy" />;
}
