import type { Metadata } from "next";
import type { ReactNode } from "react";
import type { Calculator, Operation } from "@/calculators/schema";
import { Cautions } from "@/components/ui/caution";
import { Disclosure } from "@/components/ui/disclosure";
import { ShowMe } from "@/components/ui/show-me";
import { Sources } from "@/components/ui/sources";
import { calculatorAddress } from "@/lib/client/calculator/calculator-address";
import { borrowedTexts } from "@/lib/client/i18n/borrowed-texts";
import type { Namespace } from "@/lib/client/i18n/catalogue";
import { getTranslate, loadMessages } from "@/lib/client/i18n/load-messages";
import { localePath, locales, type Locale } from "@/lib/client/i18n/locales";
import { MessagesProvider } from "@/lib/client/i18n/messages-context";
import type { Translate } from "@/lib/client/i18n/translate";
import { CalculatorNav } from "./calculator-nav";

interface CalculatorPageProps {
  locale: Locale;
  calculator: Calculator;
  /** The drawing of "Show me". */
  showMeDrawing?: ReactNode;
  /** The client component in use; it is given title and first words. */
  children: (header: ReactNode) => ReactNode;
}

/**
 * The frame of a calculator's page. Its texts are under `<name>.page.*` and stay on the server: `title`, `intro`,
 * `description`, `method.1…`, `showMe.1…`, `examples.<id>`. All other keys of the namespace go to the browser.
 */
export function CalculatorPage({ locale, calculator, showMeDrawing, children }: CalculatorPageProps) {
  const { name } = calculator;
  const namespace = name as Namespace;
  const t = getTranslate(locale, ["common", "cautions", namespace]);
  const cautionKeys = calculator.cautions.map((code) => `cautions.${code}`);
  const messages = { ...clientMessages(locale, namespace), ...loadMessages(locale, ["errors"]), ...loadMessages(locale, ["links"], ["links.send"]), ...loadMessages(locale, ["cautions"], cautionKeys) };
  const header = (
    <>
      <h1>{t(`${name}.page.title`)}</h1>
      <p className="calculator-intro">{t(`${name}.page.intro`)}</p>
    </>
  );
  return (
    <MessagesProvider locale={locale} messages={messages}>
      <CalculatorNav current={name} t={t} />
      <main id="main" tabIndex={-1}>
        {children(header)}
        <div className="calculator-reading">
          <ShowMe title={t("common.actions.showMe")} drawing={showMeDrawing} steps={listOf(t, `${name}.page.showMe`)} />
          <Disclosure summary={t("common.actions.method")} id="method">
            {listOf(t, `${name}.page.method`).map((paragraph, index) => (
              <p key={index}>{paragraph}</p>
            ))}
          </Disclosure>
          <Disclosure summary={t("common.actions.example")} id="examples">
            <ul>
              {calculator.operations.flatMap((operation) =>
                operation.examples.map((example) => (
                  <li key={example.id}>
                    <a href={exampleAddress(locale, calculator, operation, example.input)}>{t(`${name}.page.examples.${example.id}`)}</a>
                  </li>
                )),
              )}
            </ul>
          </Disclosure>
          <Disclosure summary={t("common.actions.sources")} id="sources">
            <Sources sources={calculator.sources} t={t} />
            <p className="calculator-version">{t("common.version", { version: calculator.version })}</p>
          </Disclosure>
          <Cautions codes={calculator.cautions} />
        </div>
      </main>
    </MessagesProvider>
  );
}

/** A calculator with two operations tells them apart by the field `mode`: the last step of the operation's path. */
export function exampleAddress(locale: Locale, calculator: Calculator, operation: Operation, input: object): string {
  const mode = calculator.operations.length > 1 ? { mode: operation.path.split("/").at(-1) } : {};
  return calculatorAddress(locale, calculator.name, { ...mode, ...input });
}

/** Numbered messages, `key.1`, `key.2` …, as far as they go. */
function listOf(t: Translate, key: string): ReactNode[] {
  const found: ReactNode[] = [];
  for (let number = 1; t.has(`${key}.${number}`); number += 1) found.push(t.rich(`${key}.${number}`));
  return found;
}

function clientMessages(locale: Locale, namespace: Namespace) {
  const borrowed = borrowedTexts[namespace];
  const own = Object.entries(loadMessages(locale, [namespace])).filter(([key]) => !key.startsWith(`${namespace}.page.`));
  return { ...(borrowed === undefined ? {} : loadMessages(locale, [borrowed.from], borrowed.under)), ...Object.fromEntries(own) };
}

/** Title, description and the page's other language. */
export function calculatorMetadata(locale: Locale, name: string): Metadata {
  const t = getTranslate(locale, ["common", name as Namespace]);
  const path = `/calculators/${name}`;
  return {
    title: `${t(`${name}.page.title`)} · ${t("common.name")}`,
    description: t(`${name}.page.description`),
    alternates: { canonical: localePath(locale, path), languages: Object.fromEntries(locales.map((other) => [other, localePath(other, path)])) },
  };
}
