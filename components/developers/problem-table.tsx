import { problemCodes, problemPath, problems } from "@/api-spec";
import { localePath } from "@/lib/client/i18n/locales";
import type { Translate } from "@/lib/client/i18n/translate";

/** Every problem with its status, leading to its page. */
export function ProblemTable({ t }: { t: Translate }) {
  return (
    <div className="wide-table">
      <table className="data-table">
        <thead>
          <tr>
            <th scope="col">{t("developers.page.problems.code")}</th>
            <th scope="col">{t("developers.page.problems.status")}</th>
            <th scope="col">{t("developers.page.problems.meaning")}</th>
          </tr>
        </thead>
        <tbody>
          {problemCodes.map((code) => (
            <tr key={code}>
              <th scope="row">
                <a className="problem-link" href={localePath(t.locale, problemPath(code))}>
                  <code>{code}</code>
                </a>
              </th>
              <td className="figure">{problems[code].status}</td>
              <td>{t(`developers.problems.${code}.title`)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
