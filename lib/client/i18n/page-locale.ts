import { notFound } from "next/navigation";
import { isLocale, type Locale } from "./locales";

/** What Next gives a page under `app/[locale]`. */
export interface LocaleProps {
  params: Promise<{ locale: string }>;
}

/** The page's language; an unknown one is a page that does not exist. */
export async function pageLocale({ params }: LocaleProps): Promise<Locale> {
  const { locale } = await params;
  if (!isLocale(locale)) notFound();
  return locale;
}
