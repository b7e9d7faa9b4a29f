import { problems, type ProblemCode } from "@/api-spec";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import { localePath, type Locale } from "@/lib/client/i18n/locales";
import { ProblemTable } from "./problem-table";

/** The list of all problems. */
export function ProblemsPage({ locale }: { locale: Locale }) {
  const t = getTranslate(locale, ["developers"]);
  return (
    <main id="main" tabIndex={-1} className="page page-narrow prose">
      <h1>{t("developers.problem.index")}</h1>
      <p className="lead">{t("developers.problem.indexIntro")}</p>
      <ProblemTable t={t} />
      <p>
        <a href={localePath(locale, "/developers")}>{t("developers.problem.back")}</a>
      </p>
    </main>
  );
}

/** What the `type` of a problem leads to: why it came, and what to do. */
export function ProblemPage({ locale, code }: { locale: Locale; code: ProblemCode }) {
  const t = getTranslate(locale, ["developers"]);
  return (
    <main id="main" tabIndex={-1} className="page page-narrow prose">
      <h1>{t(`developers.problems.${code}.title`)}</h1>
      <p className="lead">
        <code>{code}</code> · {t("developers.problem.status", { status: problems[code].status })}
      </p>
      <section className="prose developers-section">
        <h2>{t("developers.problem.cause")}</h2>
        <p>{t(`developers.problems.${code}.cause`)}</p>
      </section>
      <section className="prose developers-section">
        <h2>{t("developers.problem.remedy")}</h2>
        <p>{t(`developers.problems.${code}.remedy`)}</p>
      </section>
      <p>
        <a href={localePath(locale, "/problems")}>{t("developers.problem.all")}</a>
      </p>
    </main>
  );
}
