"use client";

import type { ReactNode } from "react";
import type { InsetAnswer, insetAnswer } from "@/calculators/inset";
import { calculatorAddress } from "@/lib/client/calculator/calculator-address";
import { useCalculator, type Initial } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { CalculatorWorkspace, type Carry } from "../calculator-workspace";
import { InsetDrawing } from "./inset-drawing";
import { isLengthField, prepareInset, presets } from "./inset-fields";
import { InsetInputs } from "./inset-inputs";
import { InsetResults } from "./inset-results";
import { InsetVerdict } from "./inset-verdict";

const defaults = { inset: presets[0] };

/** Chalk lines: where they go, what the tape must read over them, and which of them is off. */
export function InsetCalculator({ header, initial }: { header: ReactNode; initial?: Initial<InsetAnswer> }) {
  const t = useTranslate();
  const form = useCalculator<typeof insetAnswer>({ name: "inset", load: () => import("./core").then(({ loaded }) => loaded), isLength: isLengthField, defaults, prepare: prepareInset, initial });
  const { answer } = form;
  const burn = form.value("burn");
  const pulled = form.value("slabDiagonals.ac") !== "" || form.value("chalkDiagonals.ac") !== "";
  return (
    <CalculatorWorkspace
      form={form}
      name="inset"
      operation="insets"
      header={header}
      drawing={<InsetDrawing answer={answer} pulled={pulled} />}
      fields={<InsetInputs form={form} answer={answer} />}
      verdict={<InsetVerdict answer={answer} />}
      results={answer === null ? null : <InsetResults answer={answer} burned={burn !== "" && burn !== "0"} />}
      carries={answer === null ? [] : carriesOf(answer, form.value, t)}
    />
  );
}

/** On to the recheck with the chalk's own sizes and readings, and to the bolts of the first wall. */
function carriesOf({ lines }: InsetAnswer, value: (name: string) => string, t: ReturnType<typeof useTranslate>): Carry[] {
  const exact = (length: { exact: string | null; in: number }) => `${length.exact ?? length.in} in`;
  const diagonals = { ac: value("chalkDiagonals.ac"), bd: value("chalkDiagonals.bd") };
  return [
    { href: calculatorAddress(t.locale, "squareness", { length: exact(lines.ab), width: exact(lines.bc), burn: value("burn"), diagonals }), label: t("inset.carry.recheck") },
    { href: calculatorAddress(t.locale, "anchors", { mode: "layout", pieces: [exact(lines.ab)] }), label: t("inset.carry.bolts") },
  ];
}
