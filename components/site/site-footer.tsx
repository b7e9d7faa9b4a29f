import { localePath } from "@/lib/client/i18n/locales";
import type { Translate } from "@/lib/client/i18n/translate";
import { Mark } from "./wordmark";

const pages = ["privacy", "terms", "accessibility", "contact"] as const;

export function SiteFooter({ t }: { t: Translate }) {
  return (
    <footer className="site-footer">
      <div className="site-footer-body">
        <div className="site-footer-name">
          <Mark size={24} />
          <p>{t("common.footer.governs")}</p>
        </div>
        <nav aria-label={t("common.footer.label")}>
          <ul>
            {pages.map((page) => (
              <li key={page}>
                <a href={localePath(t.locale, `/${page}`)}>{t(`common.footer.${page}`)}</a>
              </li>
            ))}
          </ul>
        </nav>
      </div>
    </footer>
  );
}
