"use client";

import { useDeferredValue, useState, useSyncExternalStore, type ReactNode } from "react";
import type { platesAnswer, PlatesAnswer } from "@/calculators/plates";
import { calculatorAddress } from "@/lib/client/calculator/calculator-address";
import { useCalculator, type Initial } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { CalculatorWorkspace, type Carry } from "../calculator-workspace";
import { createPlanner } from "./planner";
import { PlatesDrawing } from "./plates-drawing";
import { defaults, isLengthField } from "./plates-fields";
import { PlatesInputs } from "./plates-inputs";
import { PlatesResults } from "./plates-results";
import { PlanProgress, PlatesVerdict } from "./plates-verdict";
import { takeoffFromPlates } from "./takeoff-fields";

/** Joints, boards and holes, worked out beside the page so that it never waits. */
export function PlatesCalculator({ header, initial }: { header: ReactNode; initial?: Initial<PlatesAnswer> }) {
  const t = useTranslate();
  const [planner] = useState(createPlanner);
  const plan = useSyncExternalStore(planner.subscribe, planner.get, planner.getInitial);
  const form = useCalculator<typeof platesAnswer>({ name: "plates", load: () => Promise.resolve(planner.loaded), isLength: isLengthField, defaults, prepare: plan.prepare, initial });
  // While the next plan is worked out the last one stays, unless what was typed cannot be planned.
  const shown = form.answer ?? (form.issues.length > 0 ? null : plan.last);
  // A plan of a whole house is much to draw: it is drawn when there is time, and a key pressed meanwhile comes first.
  const drawn = useDeferredValue(shown);
  return (
    <CalculatorWorkspace
      form={form}
      name="plates"
      operation="plates"
      header={header}
      drawing={<PlatesDrawing answer={drawn} />}
      fields={<PlatesInputs form={form} />}
      verdict={<PlatesVerdict answer={shown} busy={plan.busy} />}
      results={
        <>
          {plan.busy ? <PlanProgress planner={planner} stop={form.answer === null ? null : planner.stop} /> : null}
          {drawn === null ? null : <PlatesResults answer={drawn} />}
        </>
      }
      carries={form.answer === null ? [] : carriesOf(form.answer, t)}
    />
  );
}

function carriesOf(answer: PlatesAnswer, t: ReturnType<typeof useTranslate>): Carry[] {
  return [{ href: calculatorAddress(t.locale, "takeoff", takeoffFromPlates(answer)), label: t("plates.carry.takeoff") }];
}
