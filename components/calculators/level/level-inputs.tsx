"use client";

import type { levelAnswer } from "@/calculators/level";
import { LengthField } from "@/components/length-field/length-field";
import { Disclosure } from "@/components/ui/disclosure";
import { Select } from "@/components/ui/select";
import type { useCalculator } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { toleranceOf, toleranceWays } from "./level-fields";
import { SetupRows } from "./reading-rows";

export type LevelForm = ReturnType<typeof useCalculator<typeof levelAnswer>>;

/** What is typed: backsight and readings, the plan's size, the tolerance, the benchmark. */
export function LevelInputs({ form }: { form: LevelForm }) {
  const t = useTranslate();
  const way = toleranceOf(form.value);
  const isTyped = (...names: string[]) => names.some((name) => form.value(name) !== "");
  return (
    <>
      <SetupRows form={form} />
      <Disclosure summary={t("level.plan.title")} open={isTyped("length", "width")}>
        <p>{t("level.plan.hint")}</p>
        <div className="plan-pair">
          <LengthField {...form.field("length")} label={t("level.plan.length")} />
          <LengthField {...form.field("width")} label={t("level.plan.width")} />
        </div>
      </Disclosure>
      <Select name="toleranceBy" label={t("level.tolerance.label")} hint={t("level.tolerance.hint")} value={way} onChange={(value) => form.change({ toleranceBy: value, tolerance: "" })} error={form.errorAt("tolerance")} options={toleranceWays.map((value) => ({ value, label: t(`level.tolerance.${value}`) }))} />
      {way === "own" ? (
        <div className="plan-pair">
          <LengthField {...form.field("own.difference")} error={form.errorAt("tolerance.0.difference")} label={t("level.tolerance.difference")} />
          <LengthField {...form.field("own.within")} error={form.errorAt("tolerance.0.within")} label={t("level.tolerance.within")} hint={t("level.tolerance.withinHint")} />
        </div>
      ) : null}
      <Disclosure summary={t("level.benchmark.title")} open={isTyped("benchmark.elevation", "benchmark.closing", "closingTolerance")}>
        <p>{t("level.benchmark.hint")}</p>
        <LengthField {...form.field("benchmark.elevation")} label={t("level.benchmark.elevation")} hint={t("level.benchmark.elevationHint")} />
        <LengthField {...form.field("benchmark.closing")} label={t("level.benchmark.closing")} hint={t("level.benchmark.closingHint")} />
        <LengthField {...form.field("closingTolerance")} label={t("level.benchmark.tolerance")} hint={t("level.benchmark.toleranceHint", { length: form.unit === "mm" ? "3 mm" : '1/8"' })} />
      </Disclosure>
    </>
  );
}
