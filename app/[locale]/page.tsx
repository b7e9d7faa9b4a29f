import { CalculatorTiles } from "@/components/site/calculator-tiles";
import { apiAnswer, apiRequest } from "@/components/site/home-example";
import { HeroPlan } from "@/components/site/hero-plan";
import { pageMetadata } from "@/components/site/page-metadata";
import { ButtonLink } from "@/components/ui/button";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import { localePath } from "@/lib/client/i18n/locales";
import { pageLocale, type LocaleProps } from "@/lib/client/i18n/page-locale";

export async function generateMetadata(props: LocaleProps) {
  const locale = await pageLocale(props);
  const t = getTranslate(locale, ["home"]);
  return pageMetadata(locale, "/", t("home.meta.title"), t("home.meta.description"));
}

const reasons = ["exact", "burn", "prove", "sun", "local"] as const;

export default async function HomePage(props: LocaleProps) {
  const locale = await pageLocale(props);
  const t = getTranslate(locale, ["common", "home"]);
  return (
    <main id="main" tabIndex={-1}>
      <section className="hero">
        <div>
          <h1>
            {t("home.hero.first")} <br />
            {t("home.hero.second")}
          </h1>
          <p className="hero-text">{t("home.hero.text")}</p>
          <div className="hero-actions">
            <ButtonLink href={localePath(locale, "/set")}>{t("home.hero.start")}</ButtonLink>
            <ButtonLink kind="ghost" href={localePath(locale, "/calculators/squareness")}>
              {t("home.hero.check")}
            </ButtonLink>
          </div>
        </div>
        <HeroPlan description={t("home.hero.drawing")} />
      </section>
      <section className="home-tiles" aria-labelledby="tiles-title">
        <h2 id="tiles-title" className="sr-only">
          {t("home.tiles.title")}
        </h2>
        <CalculatorTiles t={t} heading="h3" />
      </section>
      <section className="band">
        <div className="band-columns">
          <div>
            <h2>{t("home.why.title")}</h2>
            <ul className="band-list">
              {reasons.map((reason) => (
                <li key={reason}>{t(`home.why.${reason}`)}</li>
              ))}
            </ul>
          </div>
          <div>
            <h2>{t("home.api.title")}</h2>
            <p>{t("home.api.text")}</p>
            <pre className="code">
              <code>{apiRequest}</code>
            </pre>
            <pre className="code code-answer">
              <code>{apiAnswer}</code>
            </pre>
            <p>
              <a className="inline-target" href={localePath(locale, "/developers")}>
                {t("home.api.link")}
              </a>
            </p>
          </div>
        </div>
      </section>
    </main>
  );
}
