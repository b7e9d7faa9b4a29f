"use client";

import type { ReactNode } from "react";
import type { SquarenessAnswer, squarenessAnswer } from "@/calculators/squareness";
import { countsInches, inInches } from "@/components/length-field/tape-style";
import { calculatorAddress } from "@/lib/client/calculator/calculator-address";
import { useCalculator, type Initial } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { burnChosen, burnName, other } from "../burn-field";
import { CalculatorWorkspace, type Carry } from "../calculator-workspace";
import { isLengthField, prepareSquareness, pullsFourSides, toleranceChosen } from "./squareness-fields";
import { SquarenessDrawing } from "./squareness-drawing";
import { SquarenessInputs, type SquarenessForm } from "./squareness-inputs";
import { SquarenessResults } from "./squareness-results";
import { SquarenessVerdict } from "./squareness-verdict";
import { isTapered } from "./slab-words";


/** Is the slab square, how far is it racked, which side to move, and what must the tape then read. */
export function SquarenessCalculator({ header, initial }: { header: ReactNode; initial?: Initial<SquarenessAnswer> }) {
  const t = useTranslate();
  const form = useCalculator<typeof squarenessAnswer>({ name: "squareness", load: () => import("./core").then(({ loaded }) => loaded), isLength: isLengthField, prepare: prepareSquareness, initial });
  const { answer } = form;
  const print = countsInches(form.value("diagonals.ac")) ? inInches : (text: string) => text;
  return (
    <CalculatorWorkspace
      form={form}
      name="squareness"
      operation="squareness"
      header={header}
      drawing={<SquarenessDrawing answer={answer} />}
      fields={<SquarenessInputs form={form} answer={answer} />}
      verdict={<SquarenessVerdict answer={answer} print={print} />}
      results={answer === null ? null : <SquarenessResults answer={answer} burn={burnName(burnChosen(form.value, form.unit).text, t, "squareness")} system={form.precision.endsWith("mm") ? "metric" : "imperial"} print={print} />}
      carries={answer === null ? [] : carriesOf(answer, form, t)}
    />
  );
}

/** On to the chalk lines with the slab and its diagonals; and the same page again, once the side is moved. Nothing to carry while the readings contradict each other. */
function carriesOf(answer: SquarenessAnswer, form: SquarenessForm, t: ReturnType<typeof useTranslate>): Carry[] {
  const { readings, taper, verdict } = answer;
  if (verdict === "contradictory") return [];
  const exact = (length: { exact: string | null; in: number }) => `${length.exact ?? length.in} in`;
  const shorter = (one: SquarenessAnswer["readings"]["ab"], opposite: SquarenessAnswer["readings"]["bc"]) => exact(opposite === null || one.measured.in <= opposite.measured.in ? one.measured : opposite.measured);
  const burn = burnChosen(form.value, form.unit).text;
  const diagonals = { ac: form.value("diagonals.ac"), bd: form.value("diagonals.bd") };
  const { choice, text } = toleranceChosen(form.value);
  const sides = pullsFourSides(form.value) ? { pulled: "four", sides: { ab: form.value("sides.ab"), bc: form.value("sides.bc"), cd: form.value("sides.cd"), da: form.value("sides.da") } } : { length: form.value("length"), width: form.value("width") };
  return [
    {
      href: calculatorAddress(t.locale, "inset", { length: shorter(readings.ab, readings.cd), width: shorter(readings.da, readings.bc), burn, ...(isTapered(answer) ? {} : { slabDiagonals: diagonals }), ...unitOf(form) }),
      label: taper === null || !isTapered(answer) ? t("squareness.carry.chalk") : t("squareness.carry.chalkShorter"),
    },
    { href: calculatorAddress(t.locale, "squareness", { ...sides, burn, tolerance: choice === other ? text : choice, ...unitOf(form) }), label: t("squareness.carry.recheck") },
  ];
}

/** A bare number keeps its meaning on the next page. */
function unitOf({ unit }: SquarenessForm): { unit?: string } {
  return unit === "in" ? {} : { unit };
}
