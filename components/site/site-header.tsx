import { localePath } from "@/lib/client/i18n/locales";
import type { Translate } from "@/lib/client/i18n/translate";
import { LanguageSwitch } from "./language-switch";
import { Menu } from "./menu";
import { SiteLinks } from "./site-links";
import { ThemeSwitch } from "./theme-switch";
import { UnitSwitch } from "./unit-switch";
import { Mark } from "./wordmark";

/**
 * On a phone the name, the units and a menu; on a desk everything in one bar. The menu is a `<details>`, so it opens before
 * and without script; what is in it stands twice in the page, and each copy is hidden where the other shows.
 */
export function SiteHeader({ t }: { t: Translate }) {
  return (
    <header className="site-header">
      <a className="skip-link" href="#main">
        {t("common.skip")}
      </a>
      <div className="site-bar">
        <a className="site-name" href={localePath(t.locale, "/")} aria-label={t("common.nav.home")}>
          <Mark />
          <span>{t("common.name")}</span>
        </a>
        <div className="site-wide site-wide-links">
          <SiteLinks />
        </div>
        <div className="site-tools">
          <UnitSwitch />
          <div className="site-wide site-wide-tools">
            <LanguageSwitch />
            <Menu className="site-pop" summary={t("common.theme.label")}>
              <div className="site-pop-body">
                <ThemeSwitch name="theme-wide" />
              </div>
            </Menu>
          </div>
          <Menu
            className="site-menu"
            summary={
              <>
                <svg width="22" height="22" viewBox="0 0 22 22" aria-hidden="true" focusable="false">
                  <path d="M1 4h20M1 11h20M1 18h20" stroke="currentColor" strokeWidth="2.6" />
                </svg>
                <span className="sr-only">{t("common.nav.menu")}</span>
              </>
            }
          >
            <div className="site-menu-body">
              <SiteLinks />
              <div className="site-menu-row">
                <span aria-hidden="true">{t("common.language.label")}</span>
                <LanguageSwitch />
              </div>
              <div className="site-menu-row">
                <ThemeSwitch name="theme-narrow" />
              </div>
            </div>
          </Menu>
        </div>
      </div>
    </header>
  );
}
