import { Suspense } from "react";
import { calculators } from "@/calculators";
import { SetPage } from "@/components/set/set-page";
import { pageMetadata } from "@/components/site/page-metadata";
import { getTranslate, loadMessages } from "@/lib/client/i18n/load-messages";
import { MessagesProvider } from "@/lib/client/i18n/messages-context";
import { localePath } from "@/lib/client/i18n/locales";
import { pageLocale, type LocaleProps } from "@/lib/client/i18n/page-locale";

export async function generateMetadata(props: LocaleProps) {
  const locale = await pageLocale(props);
  const t = getTranslate(locale, ["set"]);
  return pageMetadata(locale, "/set", t("set.page.title"), t("set.page.description"));
}

const sentToBrowser = ["loading", "list", "actions", "deletedBar", "bringBack", "missing", "keeping", "file", "stages", "about", "state", "stale", "undo", "plan", "key"].map((part) => `set.${part}`);

export default async function SetsPage(props: LocaleProps) {
  const locale = await pageLocale(props);
  const t = getTranslate(locale, ["common", "set"]);
  const versions = Object.fromEntries(calculators.flatMap(({ name, version, stage }) => (stage === null ? [] : [[name, version]])));
  const header = (
    <>
      <h1>{t("set.page.title")}</h1>
      <p className="lead">{t("set.page.intro")}</p>
    </>
  );
  return (
    <main id="main" tabIndex={-1}>
      <MessagesProvider locale={locale} messages={loadMessages(locale, ["set", "sheet"], [...sentToBrowser, "sheet.actions."])}>
        <Suspense
          fallback={
            <div className="set-start">
              {header}
              <noscript>
                <p>
                  {t("set.page.noScript")} <a href={localePath(locale, "/calculators")}>{t("common.nav.calculators")}</a>
                </p>
              </noscript>
            </div>
          }
        >
          <SetPage versions={versions} header={header} />
        </Suspense>
      </MessagesProvider>
    </main>
  );
}
