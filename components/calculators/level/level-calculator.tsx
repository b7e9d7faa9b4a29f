"use client";

import type { ReactNode } from "react";
import type { levelAnswer, LevelAnswer } from "@/calculators/level";
import { useCalculator, type Initial } from "@/lib/client/calculator/use-calculator";
import { CalculatorWorkspace } from "../calculator-workspace";
import { LevelDrawing } from "./level-drawing";
import { isLengthField, prepareLevel } from "./level-fields";
import { LevelInputs } from "./level-inputs";
import { LevelResults, LevelVerdict } from "./level-results";

/** How level the concrete is, and what goes under the plate. */
export function LevelCalculator({ header, initial }: { header: ReactNode; initial?: Initial<LevelAnswer> }) {
  const form = useCalculator<typeof levelAnswer>({ name: "level", load: () => import("./core").then(({ loaded }) => loaded), isLength: isLengthField, prepare: prepareLevel, initial });
  const { answer } = form;
  return (
    <CalculatorWorkspace
      form={form}
      name="level"
      operation="levels"
      header={header}
      drawing={<LevelDrawing answer={answer} />}
      fields={<LevelInputs form={form} />}
      verdict={<LevelVerdict answer={answer} />}
      results={answer === null ? null : <LevelResults answer={answer} />}
    />
  );
}
