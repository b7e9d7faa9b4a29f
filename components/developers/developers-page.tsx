import { getTranslate } from "@/lib/client/i18n/load-messages";
import type { Locale } from "@/lib/client/i18n/locales";
import { ApiReference } from "./api-reference";
import { CodeBlock } from "./code-block";
import { codeExamples } from "./code-examples";
import { ProblemTable } from "./problem-table";

/** How to call the API, and its reference. `site` is the address people reach us at. */
export function DevelopersPage({ locale, site }: { locale: Locale; site: string }) {
  const t = getTranslate(locale, ["developers"]);
  const words = { copy: t("developers.page.copy"), copied: t("developers.page.copied"), notCopied: t("developers.page.notCopied") };
  const paragraphs = (section: string) =>
    ["1", "2", "3"].filter((number) => t.has(`developers.page.${section}.${number}`)).map((number) => <p key={number}>{t(`developers.page.${section}.${number}`, { text: "28' 7 1/2\"" })}</p>);
  return (
    <main id="main" tabIndex={-1} className="page">
      <div className="prose page-narrow">
        <h1>{t("developers.page.title")}</h1>
        <p className="lead">{t("developers.page.intro")}</p>
        {codeExamples(site).map(({ id, code }) => (
          <section key={id} className="prose developers-section">
            <h2>{t(`developers.page.${id}.title`)}</h2>
            <p>{t(`developers.page.${id}.text`)}</p>
            <CodeBlock id={`example-${id}`} code={code} label={t(`developers.page.${id}.title`)} words={words} />
          </section>
        ))}
        {["lengths", "limits", "promise"].map((section) => (
          <section key={section} className="prose developers-section" id={section}>
            <h2>{t(`developers.page.${section}.title`)}</h2>
            {paragraphs(section)}
          </section>
        ))}
        <section className="prose developers-section" id="problems">
          <h2>{t("developers.page.problems.title")}</h2>
          <p>{t("developers.page.problems.text")}</p>
          <ProblemTable t={t} />
        </section>
        <section className="prose developers-section" id="reference">
          <h2>{t("developers.page.reference.title")}</h2>
          <p>{t.rich("developers.page.reference.text", { link: <a href="/api/v1/openapi.json">/api/v1/openapi.json</a> })}</p>
        </section>
      </div>
      <ApiReference loading={t("developers.page.reference.loading")} />
    </main>
  );
}
