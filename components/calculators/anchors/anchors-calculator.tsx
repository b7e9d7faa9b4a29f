"use client";

import type { ReactNode } from "react";
import type { CheckAnswer, checkAnswer, LayoutAnswer, layoutAnswer } from "@/calculators/anchors";
import { Segmented } from "@/components/ui/segmented";
import { calculatorAddress } from "@/lib/client/calculator/calculator-address";
import { useCalculator, type Initial } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { CalculatorWorkspace, type Carry } from "../calculator-workspace";
import { AnchorsDrawing } from "./anchors-drawing";
import { isLengthField, modeOf, prepareAnchors, type Mode } from "./anchors-fields";
import { BoltRows } from "./bolt-rows";
import { CheckResults } from "./check-results";
import { LayoutResults } from "./layout-results";
import { MoreInputs } from "./more-inputs";
import { PieceRows } from "./piece-rows";
import { PlateInputs } from "./plate-inputs";
import { RuleChoice } from "./rule-choice";
import { CheckVerdict, LayoutVerdict } from "./verdicts";

export type AnchorsForm = ReturnType<typeof useCalculator<typeof layoutAnswer | typeof checkAnswer>>;

/** Bolts: a new layout, or those in the concrete judged against a rule. */
export function AnchorsCalculator({ header, initial }: { header: ReactNode; initial?: Initial<LayoutAnswer | CheckAnswer> }) {
  const t = useTranslate();
  const form = useCalculator<typeof layoutAnswer | typeof checkAnswer>({ name: "anchors", load: () => import("./core").then(({ loaded }) => loaded), isLength: isLengthField, prepare: prepareAnchors, initial });
  const mode = modeOf({ mode: form.value("mode"), pieces: form.value("pieces.0.to") === "" ? [] : [{}] });
  const checked = form.answer !== null && "ok" in form.answer ? form.answer : null;
  const laid = form.answer !== null && !("ok" in form.answer) ? form.answer : null;
  const answer = mode === "check" ? checked : laid;

  const fields = (
    <>
      <div className="field">
        <Segmented
          name="mode"
          legend={t("anchors.mode.legend")}
          legendIs="hidden"
          value={mode}
          onChange={(next) => switchMode(form, next as Mode)}
          options={(["layout", "check"] as const).map((value) => ({ value, label: t(`anchors.mode.${value}`) }))}
        />
      </div>
      <PieceRows form={form} mode={mode} />
      {mode === "check" ? <BoltRows form={form} /> : null}
      <PlateInputs form={form} mode={mode} />
      <RuleChoice form={form} />
      <MoreInputs form={form} mode={mode} />
    </>
  );
  return (
    <CalculatorWorkspace
      form={{ ...form, answer }}
      name="anchors"
      operation={`anchors/${mode}`}
      header={header}
      drawing={<AnchorsDrawing mode={mode} laid={laid} checked={checked} />}
      fields={fields}
      verdict={mode === "check" ? <CheckVerdict answer={checked} /> : <LayoutVerdict answer={laid} />}
      results={mode === "check" ? checked === null ? null : <CheckResults answer={checked} /> : laid === null ? null : <LayoutResults answer={laid} />}
      carries={mode === "layout" && laid !== null ? carriesOf(laid, form, t) : []}
    />
  );
}

/** The other mode, with the wall's pieces as far as they are known. */
function switchMode(form: AnchorsForm, mode: Mode): void {
  const { answer } = form;
  const pieces =
    answer === null
      ? []
      : mode === "check"
        ? answer.pieces.map(({ to }, index): [string, string] => [`pieces.${index}.to`, exactText(to)])
        : answer.pieces.map(({ length }, index): [string, string] => [`pieces.${index}`, exactText(length)]);
  for (let row = form.rows("pieces") - 1; row >= 0; row -= 1) form.removeRow("pieces", row);
  form.change({ mode, ...Object.fromEntries(pieces) });
}

const exactText = ({ exact, in: inches }: { exact: string | null; in: number }) => `${exact ?? inches} in`;

/** After the pour, the same wall is checked: its bolts where the layout wanted them. */
function carriesOf(laid: LayoutAnswer, form: AnchorsForm, t: ReturnType<typeof useTranslate>): Carry[] {
  const bolts = laid.pieces.flatMap(({ stations }) => stations.map((station) => ({ station: exactText(station) })));
  const own = Object.fromEntries(Object.entries(form.fields).filter(([name]) => /^(own|rule)\./.test(name)));
  const shared = { rule: form.value("rule"), diameter: form.value("diameter"), ...own };
  return [{ href: calculatorAddress(t.locale, "anchors", { mode: "check", ...shared, pieces: laid.pieces.map(({ from, to }) => ({ from: exactText(from), to: exactText(to) })), bolts }), label: t("anchors.carry.check") }];
}
