"use client";

import type { ReactNode } from "react";
import type { fitAnswer, FitAnswer } from "@/calculators/fit";
import { calculatorAddress } from "@/lib/client/calculator/calculator-address";
import { useCalculator, type Initial } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { CalculatorWorkspace, type Carry } from "../calculator-workspace";
import { FitDrawing } from "./fit-drawing";
import { defaults, isLengthField, prepareFit } from "./fit-fields";
import { FitInputs } from "./fit-inputs";
import { FitResults } from "./fit-results";
import { FitVerdict } from "./fit-verdict";

/** The wanted plan on the slab as built, so that its worst departure from the wanted inset is least. */
export function FitCalculator({ header, initial }: { header: ReactNode; initial?: Initial<FitAnswer> }) {
  const t = useTranslate();
  const form = useCalculator<typeof fitAnswer>({ name: "fit", load: () => import("./core").then(({ loaded }) => loaded), isLength: isLengthField, defaults, prepare: prepareFit, initial });
  const { answer } = form;
  const burn = form.value("burn");
  return (
    <CalculatorWorkspace
      form={form}
      name="fit"
      operation="fits"
      header={header}
      drawing={<FitDrawing answer={answer} />}
      fields={<FitInputs form={form} answer={answer} />}
      verdict={<FitVerdict answer={answer} />}
      results={answer === null ? null : <FitResults answer={answer} burned={burn !== "" && burn !== "0"} choose={(mode) => form.set("mode", mode)} />}
      carries={answer === null ? [] : carriesOf(answer, burn, t)}
    />
  );
}

/** On to the recheck of a four-sided chalk, and to the bolts of the first wall. */
function carriesOf({ lines, bolts }: FitAnswer, burn: string, t: ReturnType<typeof useTranslate>): Carry[] {
  const text = (length: { exact: string | null; in: number }) => `${length.exact ?? Math.round(length.in * 1e6) / 1e6} in`;
  const names = Object.keys(lines);
  const own = bolts.filter(({ wall }) => wall === names[0]).map(({ station, offset }) => ({ station: text(station), offset: text(offset) }));
  const layout = own.length === 0 ? { mode: "layout", pieces: [text(lines[names[0]!]!)] } : { mode: "check", pieces: [{ to: text(lines[names[0]!]!) }], bolts: own };
  const recheck = names.length === 4 ? [{ href: calculatorAddress(t.locale, "squareness", { length: text(lines.ab!), width: text(lines.bc!), burn }), label: t("fit.carry.recheck") }] : [];
  return [...recheck, { href: calculatorAddress(t.locale, "anchors", layout), label: t(own.length === 0 ? "fit.carry.layout" : "fit.carry.check") }];
}
