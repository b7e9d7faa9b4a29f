"use client";

import type { ReactNode } from "react";
import type { takeoffAnswer, TakeoffAnswer } from "@/calculators/takeoff";
import { useCalculator, type Initial } from "@/lib/client/calculator/use-calculator";
import { CalculatorWorkspace } from "../calculator-workspace";
import { TakeoffDrawing } from "./takeoff-drawing";
import { isLengthField, prepareTakeoff } from "./takeoff-fields";
import { TakeoffInputs } from "./takeoff-inputs";
import { TakeoffResults, TakeoffVerdict } from "./takeoff-results";

/** What must be on the truck: a list for the supplier. */
export function TakeoffCalculator({ header, initial }: { header: ReactNode; initial?: Initial<TakeoffAnswer> }) {
  const form = useCalculator<typeof takeoffAnswer>({ name: "takeoff", load: () => import("./core").then(({ loaded }) => loaded), isLength: isLengthField, prepare: prepareTakeoff, initial });
  const { answer } = form;
  return (
    <CalculatorWorkspace
      form={form}
      name="takeoff"
      operation="takeoffs"
      header={header}
      drawing={<TakeoffDrawing answer={answer} />}
      fields={<TakeoffInputs form={form} />}
      verdict={<TakeoffVerdict answer={answer} />}
      results={answer === null ? null : <TakeoffResults answer={answer} isMetric={form.unit === "mm"} />}
    />
  );
}
