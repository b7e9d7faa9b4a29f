import { Suspense } from "react";
import { SheetPage } from "@/components/sheet/sheet-page";
import { pageMetadata } from "@/components/site/page-metadata";
import { getTranslate, loadMessages } from "@/lib/client/i18n/load-messages";
import { MessagesProvider } from "@/lib/client/i18n/messages-context";
import { pageLocale, type LocaleProps } from "@/lib/client/i18n/page-locale";
import { sheetKeys, sheetNamespaces } from "@/lib/client/sheet/sheet-texts";

export async function generateMetadata(props: LocaleProps) {
  const locale = await pageLocale(props);
  const t = getTranslate(locale, ["sheet"]);
  return { ...(await pageMetadata(locale, "/set/sheet", t("sheet.page.title"), t("sheet.page.description"))), robots: { index: false } };
}

export default async function FieldSheetPage(props: LocaleProps) {
  const locale = await pageLocale(props);
  const t = getTranslate(locale, ["sheet"]);
  const messages = loadMessages(locale, sheetNamespaces, sheetKeys);
  return (
    <main id="main" tabIndex={-1} className="sheet-main">
      <MessagesProvider locale={locale} messages={messages}>
        <Suspense
          fallback={
            <noscript>
              <p>{t("sheet.page.noScript")}</p>
            </noscript>
          }
        >
          <SheetPage messages={messages} />
        </Suspense>
      </MessagesProvider>
    </main>
  );
}
