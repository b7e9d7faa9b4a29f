"use client";

import type { ReactNode } from "react";
import type { CornerAnswer, cornerAnswer } from "@/calculators/corner";
import { LengthField } from "@/components/length-field/length-field";
import { calculatorAddress } from "@/lib/client/calculator/calculator-address";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useCalculator, type Initial } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { countsInches, inInches } from "@/components/length-field/tape-style";
import { BurnChoice } from "../burn-choice";
import { burnChosen, burnName, withBurn } from "../burn-field";
import { CalculatorWorkspace } from "../calculator-workspace";
import { CornerDrawing } from "./corner-drawing";
import { blankLegs, isLengthField } from "./corner-fields";
import { CornerResults, CornerVerdict } from "./corner-results";

/** Set a corner: what to read between the ends of two legs, and the largest whole-number triangle inside them. */
export function CornerCalculator({ header, initial }: { header: ReactNode; initial?: Initial<CornerAnswer> }) {
  const t = useTranslate();
  const form = useCalculator<typeof cornerAnswer>({ name: "corner", load: () => import("./core").then(({ loaded }) => loaded), isLength: isLengthField, prepare: withBurn, initial });
  const blank = blankLegs(form.value);
  const answer = blank.length === 0 ? form.answer : null;
  const burn = burnChosen(form.value, form.unit).text;
  const held = burnName(burn, t, "corner");
  const print = countsInches(form.value("legs.0")) ? inInches : (text: string) => text;
  const missing = form.asked === 0 ? [] : blank;
  const errorAt = (name: string) => (missing.includes(name) ? t("errors.required") : form.errorAt(name));
  const problems = missing.length === 0 ? form.problems : [...missing.map((name) => ({ fieldId: fieldId(name), text: t("errors.required") })), ...form.problems.filter(({ fieldId: id }) => id !== undefined && id !== fieldId("legs"))];
  return (
    <CalculatorWorkspace
      form={{ ...form, problems, answer }}
      name="corner"
      operation="corners"
      header={header}
      drawing={<CornerDrawing answer={answer} />}
      fields={
        <>
          <LengthField {...form.field("legs.0")} error={errorAt("legs.0")} label={t("corner.fields.first")} hint={t("corner.fields.firstHint")} />
          <LengthField {...form.field("legs.1")} error={errorAt("legs.1")} label={t("corner.fields.second")} hint={t("corner.fields.secondHint")} />
          <BurnChoice form={form} namespace="corner" />
        </>
      }
      verdict={<CornerVerdict answer={answer} burn={held} print={print} />}
      results={answer === null ? null : <CornerResults answer={answer} burn={held} system={form.precision.endsWith("mm") ? "metric" : "imperial"} print={print} />}
      carries={answer === null ? [] : [{ href: calculatorAddress(t.locale, "squareness", { length: `${answer.legs.first.exact} in`, width: `${answer.legs.second.exact} in`, burn }), label: t("corner.carry.check") }]}
    />
  );
}
