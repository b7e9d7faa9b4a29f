import { calculators } from "@/calculators";
import type { Calculator, Operation } from "@/calculators/schema";
import { exampleAddress } from "@/components/calculators/calculator-page";
import { ButtonLink } from "@/components/ui/button";
import { KeyValues } from "@/components/ui/key-values";
import { LengthText } from "@/components/ui/length-text";
import { Note } from "@/components/ui/note";
import type { LinkAnswer } from "@/api-spec";
import type { Locale } from "@/lib/client/i18n/locales";
import type { Translate } from "@/lib/client/i18n/translate";
import { answerRows, inputRows, type SummaryRow } from "./summary-rows";

const valueOf = ({ text }: SummaryRow) => <LengthText text={text} />;
const listOf = (rows: readonly SummaryRow[]) => rows.map((row) => ({ key: row.path, label: row.label, value: valueOf(row) }));

/** A kept calculation: what was typed, what was answered, and what the calculator of today says where that is something else. */
export function KeptCalculation({ link, locale, t }: { link: LinkAnswer; locale: Locale; t: Translate }) {
  const { operation, current, version } = link;
  const calculator = calculators.find(({ name }) => name === link.calculator);
  const then = answerRows(operation, link.answer, t);
  const now = current.answer === null ? null : answerRows(operation, current.answer, t);
  const address = calculator === undefined ? undefined : openAddress(locale, calculator, operation, link.input);
  return (
    <>
      <CurrentNote link={link} shown={now === null || differ(then, now)} t={t} />
      {address === undefined ? null : <ButtonLink href={address}>{t("links.page.open")}</ButtonLink>}
      <div className="kept-grid">
        <section>
          <h2>{t("links.page.inputs")}</h2>
          <KeyValues items={listOf(inputRows(link.input, t))} />
        </section>
        <section>
          <h2>{t("links.page.answer")}</h2>
          {now !== null && differ(then, now) ? <BothAnswers then={then} now={now} versions={[version, current.version]} t={t} /> : <KeyValues items={listOf(then)} />}
        </section>
      </div>
      <p className="field-hint">{t("links.page.deleted", { date: new Date(link.deletedAfter) })}</p>
    </>
  );
}

function CurrentNote({ link: { version: then, current }, shown, t }: { link: LinkAnswer; shown: boolean; t: Translate }) {
  if (!current.newer && !current.differs) return null;
  const versions = { then, now: current.version };
  if (!current.differs) return <Note tone="plain" title={t("links.page.newer")}>{t("links.page.newerSame", versions)}</Note>;
  return (
    <Note tone="warn" title={t("links.page.newer")}>
      <p>{current.answer === null ? t("links.page.refused") : t(shown ? "links.page.newerDiffers" : "links.page.newerHidden", versions)}</p>
    </Note>
  );
}

function BothAnswers({ then, now, versions: [old, today], t }: { then: readonly SummaryRow[]; now: readonly SummaryRow[]; versions: readonly [string, string]; t: Translate }) {
  const paths = [...new Set([...then, ...now].map(({ path }) => path))];
  const cell = (rows: readonly SummaryRow[], path: string) => rows.find((row) => row.path === path);
  return (
    <div className="kept-table">
      <table className="data-table">
        <thead>
          <tr>
            <th scope="col">{t("links.page.what")}</th>
            <th scope="col">{t("links.page.then", { version: old })}</th>
            <th scope="col">{t("links.page.now", { version: today })}</th>
          </tr>
        </thead>
        <tbody>
          {paths.map((path) => {
            const [before, after] = [cell(then, path), cell(now, path)];
            return (
              <tr key={path}>
                <th scope="row">{(after ?? before)?.label}</th>
                <td className="figure">{before === undefined ? null : valueOf(before)}</td>
                <td className="figure">{after === undefined ? null : before?.text === after.text ? valueOf(after) : <b>{valueOf(after)}</b>}</td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}

const differ = (one: readonly SummaryRow[], other: readonly SummaryRow[]) => JSON.stringify(one) !== JSON.stringify(other);

function openAddress(locale: Locale, calculator: Calculator, path: string, input: object): string | undefined {
  const operation = calculator.operations.find((known: Operation) => known.path === path);
  return operation && exampleAddress(locale, calculator, operation, input);
}
