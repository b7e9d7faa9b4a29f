"use client";

import { lazy, Suspense, use, useState, type ReactNode } from "react";
import { Button, ButtonLink } from "@/components/ui/button";
import { ErrorSummary } from "@/components/ui/error-summary";
import type { useCalculator } from "@/lib/client/calculator/use-calculator";
import { FormHomeContext } from "@/lib/client/calculator/form-home";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { readable } from "@/lib/client/set/readable";
import { PrecisionChoice } from "./precision-choice";

const SendToPhone = lazy(() => import("@/components/links/send-to-phone").then(({ SendToPhone: component }) => ({ default: component })));

const ReadingMode = lazy(() => import("@/components/set/reading-mode").then(({ ReadingMode: component }) => ({ default: component })));

type CalculatorForm = Pick<ReturnType<typeof useCalculator>, "formProps" | "problems" | "asked" | "unit" | "precision" | "reset" | "flush" | "input" | "answer">;

export interface Carry {
  /** Made by `calculatorAddress`. */
  href: string;
  label: ReactNode;
}

interface CalculatorWorkspaceProps {
  form: CalculatorForm;
  /** The calculator's folder, and the operation's path in the API. */
  name: string;
  operation: string;
  /** Title and first words, rendered by the server. */
  header: ReactNode;
  drawing: ReactNode;
  fields: ReactNode;
  /** A `<Verdict>`. */
  verdict: ReactNode;
  results: ReactNode;
  /** Where the answer goes next; shown once there is one. */
  carries?: readonly Carry[];
}

/** One calculator's page in use: on a phone drawing, fields, verdict, results below each other; on a desk the fields stand left. */
export function CalculatorWorkspace({ form, name, operation, header, drawing, fields, verdict, results, carries = [] }: CalculatorWorkspaceProps) {
  const t = useTranslate();
  const home = use(FormHomeContext);
  return (
    <div className="calculator">
      <div className="calculator-header">{header}</div>
      <div className="calculator-drawing">{drawing}</div>
      <form className="calculator-form" {...form.formProps}>
        <ErrorSummary problems={form.problems} asked={form.asked} />
        {fields}
        <div className="calculator-rounding">
          <noscript>
            <label className="field-label" htmlFor="unit-without-script">
              {t("common.units.bare")}
            </label>
            <select id="unit-without-script" name="unit" className="control" defaultValue={form.unit}>
              <option value="in">{t("common.units.in")}</option>
              <option value="ft">{t("common.units.ft")}</option>
              <option value="mm">{t("common.units.mm")}</option>
            </select>
          </noscript>
          <PrecisionChoice unit={form.unit} precision={form.precision} />
        </div>
        <div className="calculator-actions no-print">
          <Button type="submit">{t("common.actions.calculate")}</Button>
          <Button kind="ghost" onClick={form.reset}>
            {t("common.actions.reset")}
          </Button>
        </div>
      </form>
      {verdict}
      <div className="calculator-results">
        {results}
        {form.answer === null ? null : (
          <div className="calculator-next no-print">
            {home?.next ??
              carries.map(({ href, label }) => (
                <ButtonLink key={href} href={href}>
                  {label}
                </ButtonLink>
              ))}
            {readable.includes(name) ? <ReadBig name={name} answer={form.answer} /> : null}
            {home === null ? (
              <>
                <CopyLink flush={form.flush} />
                <PhoneLink name={name} operation={operation} input={form.input} />
              </>
            ) : null}
          </div>
        )}
      </div>
    </div>
  );
}

/** One reading a screen, for across the slab; fetched when asked for. */
function ReadBig({ name, answer }: { name: string; answer: unknown }) {
  const t = useTranslate();
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button kind="ghost" onClick={() => setOpen(true)}>
        {t("common.actions.readBig")}
      </Button>
      {open ? (
        <Suspense fallback={null}>
          <ReadingMode name={name} answer={answer} onClose={() => setOpen(false)} />
        </Suspense>
      ) : null}
    </>
  );
}

function CopyLink({ flush }: { flush: () => void }) {
  const t = useTranslate();
  const [copied, setCopied] = useState(false);
  const copy = async () => {
    flush();
    await navigator.clipboard.writeText(window.location.href).then(
      () => setCopied(true),
      () => setCopied(false),
    );
  };
  return (
    <Button kind="ghost" onClick={() => void copy()} onBlur={() => setCopied(false)}>
      <span aria-live="polite">{t(copied ? "common.actions.copied" : "common.actions.copy")}</span>
    </Button>
  );
}

function PhoneLink({ name, operation, input }: { name: string; operation: string; input: Record<string, unknown> }) {
  const t = useTranslate();
  const [open, setOpen] = useState(false);
  if (!open) {
    return (
      <Button kind="ghost" onClick={() => setOpen(true)}>
        {t("common.actions.sendToPhone")}
      </Button>
    );
  }
  return (
    <Suspense fallback={<p role="status">{t("common.actions.sendToPhone")}</p>}>
      <SendToPhone calculator={name} operation={operation} input={input} t={t} />
    </Suspense>
  );
}
