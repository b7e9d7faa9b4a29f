"use client";

import { memo, type ReactNode } from "react";
import type { ConversionsAnswer, conversionsAnswer, StripOperation } from "@/calculators/conversions";
import { LengthField } from "@/components/length-field/length-field";
import { LengthAnswer } from "@/components/ui/length-answer";
import { LengthText } from "@/components/ui/length-text";
import { TextField } from "@/components/ui/text-field";
import { Verdict } from "@/components/ui/verdict";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useCalculator, type Initial } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { CalculatorWorkspace } from "../calculator-workspace";
import { EqualSpaces } from "./equal-spaces";
import { FormsTable } from "./forms-table";
import { NoScriptLines } from "./no-script-lines";
import { ResultBlade } from "./result-blade";
import { firstLines, isLengthField, opField, valueField, withoutBlankEnd } from "./strip-fields";
import { StripLine } from "./strip-line";

/** Next to the four operations of the API: halving is dividing by 2, and so common on the floor that it has its own button. */
const steps: readonly { key: string; op: StripOperation; text?: string }[] = [
  { key: "add", op: "add" },
  { key: "subtract", op: "subtract" },
  { key: "times", op: "times" },
  { key: "divide", op: "divide" },
  { key: "halve", op: "divide", text: "2" },
];

/** Fractions: one length in every form; with a second line it becomes a strip of tape arithmetic. */
export function ConversionsCalculator({ header, initial }: { header: ReactNode; initial?: Initial<ConversionsAnswer> }) {
  const t = useTranslate();
  const form = useCalculator<typeof conversionsAnswer>({
    name: "conversions",
    load: () => import("./core").then(({ loaded }) => loaded),
    isLength: isLengthField,
    prepare: withoutBlankEnd,
    initial,
  });
  const { answer, precision } = form;
  const rows = form.rows("strip");
  const metric = precision.endsWith("mm");

  const focus = (name: string) => requestAnimationFrame(() => document.getElementById(fieldId(name))?.focus());
  const addLine = ({ op, text = "" }: (typeof steps)[number]) => {
    const row = Math.max(1, rows);
    form.change(rows === 0 ? firstLines(form.value("value"), op, text) : { [opField(row)]: op, [valueField(row)]: text });
    focus(rows === 0 && form.value("value").trim() === "" ? valueField(0) : valueField(row));
  };
  const removeLine = (row: number) => {
    const rest = row === 0 ? 1 : 0;
    const alone = rows === 1 ? "" : rows === 2 && (form.value(opField(rest)) || "add") === "add" ? form.value(valueField(rest)) : null;
    form.removeRow("strip", row);
    if (alone !== null) {
      if (rows === 2) form.removeRow("strip", 0);
      form.set("value", alone);
    }
    focus(alone === null ? valueField(Math.max(0, row - 1)) : "value");
  };

  const fields = (
    <>
      {rows === 0 ? (
        <LengthField {...form.field("value")} label={t("conversions.fields.value")} hint={t("conversions.fields.valueHint")} blade />
      ) : (
        <ol className="strip" aria-label={t("conversions.strip.title")}>
          {Array.from({ length: rows }, (_, row) => (
            <StripLine key={row} form={form} row={row} total={answer?.strip?.[row]?.total} onRemove={() => removeLine(row)} />
          ))}
        </ol>
      )}
      <NoScriptLines from={Math.max(1, rows)} />
      <div className="strip-steps" role="group" aria-label={t("conversions.strip.next")}>
        <p className="field-label" aria-hidden="true">
          {t("conversions.strip.next")}
        </p>
        {steps.map((step) => (
          <button key={step.key} type="button" className="strip-step" onClick={() => addLine(step)}>
            {t(`conversions.step.${step.key}`)}
          </button>
        ))}
      </div>
      <TextField
        name="spaces"
        label={t("conversions.fields.spaces")}
        hint={t("conversions.fields.spacesHint")}
        inputMode="numeric"
        value={form.value("spaces")}
        onChange={(text) => form.set("spaces", text)}
        error={form.errorAt("spaces")}
      />
    </>
  );

  return (
    <CalculatorWorkspace
      form={form}
      name="conversions"
      operation="conversions"
      header={header}
      drawing={<ResultBlade answer={answer} precision={precision} single={rows === 0} />}
      fields={fields}
      verdict={answer === null ? <Verdict tone="idle" title={t("conversions.verdict.waiting")} /> : <TotalVerdict answer={answer} metric={metric} />}
      results={
        answer === null ? null : (
          <>
            <FormsTable answer={answer} metric={metric} />
            {answer.spacing === null ? null : <EqualSpaces spacing={answer.spacing} total={answer.total} />}
          </>
        )
      }
    />
  );
}

/**
 * Results are memos: a key press renders the page at once with the answer as it was, and again when the new one is worked out.
 * This one is the length in its everyday form, and the two forms most often asked for beside it.
 */
const TotalVerdict = memo(function TotalVerdict({ answer, metric }: { answer: ConversionsAnswer; metric: boolean }) {
  const t = useTranslate();
  const digits = ({ text }: { text: string }) => text.split(" ")[0] ?? "";
  return (
    <Verdict tone="plain" title={<LengthAnswer length={answer.total} />}>
      <p className="num">
        {t.rich(metric ? "conversions.verdict.metric" : "conversions.verdict.feet", {
          feetInches: <LengthText text={answer.feetInches.text} />,
          inches: <LengthText text={answer.inches.text} />,
          feet: digits(answer.decimalFeet),
          mm: digits(answer.millimetres),
          metres: digits(answer.metres),
        })}
      </p>
    </Verdict>
  );
});
