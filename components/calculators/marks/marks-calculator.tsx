"use client";

import type { ReactNode } from "react";
import type { marksAnswer, MarksAnswer } from "@/calculators/marks";
import { useCalculator, type Initial } from "@/lib/client/calculator/use-calculator";
import { CalculatorWorkspace } from "../calculator-workspace";
import { MarksDrawing } from "./marks-drawing";
import { defaults, isLengthField, prepareMarks } from "./marks-fields";
import { MarksInputs } from "./marks-inputs";
import { MarksResults, MarksVerdict } from "./marks-results";

/** Where the joists land, in running marks from one end, and what stands in their way. */
export function MarksCalculator({ header, initial }: { header: ReactNode; initial?: Initial<MarksAnswer> }) {
  const form = useCalculator<typeof marksAnswer>({ name: "marks", load: () => import("./core").then(({ loaded }) => loaded), isLength: isLengthField, defaults, prepare: prepareMarks, initial });
  const { answer } = form;
  const bolts = Array.isArray(form.input.bolts) ? form.input.bolts.length : 0;
  return (
    <CalculatorWorkspace
      form={form}
      name="marks"
      operation="marks"
      header={header}
      drawing={<MarksDrawing answer={answer} />}
      fields={<MarksInputs form={form} />}
      verdict={<MarksVerdict answer={answer} bolts={bolts} />}
      results={answer === null ? null : <MarksResults answer={answer} />}
    />
  );
}
