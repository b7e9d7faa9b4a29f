import { LegalPage, legalMetadata } from "@/components/site/legal-page";
import { pageLocale, type LocaleProps } from "@/lib/client/i18n/page-locale";

export async function generateMetadata(props: LocaleProps) {
  return legalMetadata(await pageLocale(props), "accessibility");
}

export default async function AccessibilityPage(props: LocaleProps) {
  return <LegalPage locale={await pageLocale(props)} page="accessibility" />;
}
