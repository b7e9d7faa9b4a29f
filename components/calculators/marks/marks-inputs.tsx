"use client";

import type { marksAnswer } from "@/calculators/marks";
import { LengthField } from "@/components/length-field/length-field";
import { CheckRow } from "@/components/ui/check-row";
import { Disclosure } from "@/components/ui/disclosure";
import { LengthText } from "@/components/ui/length-text";
import { Segmented } from "@/components/ui/segmented";
import type { useCalculator } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { metricModules, modules } from "./marks-fields";
import { StationRows } from "./station-rows";

export type MarksForm = ReturnType<typeof useCalculator<typeof marksAnswer>>;

/** What is typed: how long the wall is, the module, what lies on it, and the bolts in its plate. */
export function MarksInputs({ form }: { form: MarksForm }) {
  const t = useTranslate();
  const typed = form.value("spacing").trim();
  const offered: readonly string[] = form.unit === "mm" ? metricModules : modules;
  const chosen = offered.find((module) => module === typed || module === `${typed} ${form.unit}`) ?? "";
  const isLapped = form.value("lapped") === "true";
  const isTyped = (...names: string[]) => names.some((name) => form.value(name) !== "");
  const usual = form.unit === "mm" ? { thickness: "38 mm", washer: "35 mm" } : { thickness: '1 1/2"', washer: '1 3/8"' };
  return (
    <>
      <LengthField {...form.field("length")} label={t("marks.fields.length")} hint={t("marks.fields.lengthHint")} blade />
      <LengthField {...form.field("spacing")} label={t("marks.fields.spacing")} hint={t("marks.fields.spacingHint")} />
      <div className="plan-presets">
        <Segmented
          name="module"
          legend={t("marks.fields.module")}
          legendIs="hidden"
          value={typed === "" ? form.value("module") : chosen}
          onChange={(module) => form.change({ module: "", spacing: module })}
          options={offered.map((module) => ({ value: module, label: <LengthText text={module.replace(" in", '"').replace(" mm", "")} />, spoken: module }))}
        />
      </div>
      <LengthField {...form.field("thickness")} label={t("marks.fields.thickness")} hint={t("marks.fields.blank", { length: usual.thickness })} />
      <CheckRow name="lapped" checked={isLapped} onChange={(on) => form.set("lapped", on ? "true" : "")}>
        {t("marks.fields.lapped")}
      </CheckRow>
      {isLapped ? (
        <div className="field">
          <Segmented name="lap" legend={t("marks.fields.lap")} value={form.value("lap") || "before"} onChange={(lap) => form.set("lap", lap)} options={(["before", "after"] as const).map((value) => ({ value, label: t(`marks.fields.lap-${value}`) }))} />
        </div>
      ) : null}
      <StationRows form={form} list="bolts" />
      {isLapped ? <StationRows form={form} list="oppositeBolts" /> : null}
      <Disclosure summary={t("marks.more.title")} open={isTyped("first", "sheet", "washer", "diameter", "clearance")}>
        <LengthField {...form.field("first")} label={t("marks.more.first")} hint={t("marks.more.firstHint")} />
        <LengthField {...form.field("sheet")} label={t("marks.more.sheet")} hint={t("marks.more.sheetHint")} />
        <div className="plan-pair">
          <LengthField {...form.field("washer")} label={t("marks.more.washer")} hint={t("marks.fields.blank", { length: usual.washer })} />
          <LengthField {...form.field("clearance")} label={t("marks.more.clearance")} hint={t("marks.more.clearanceHint")} />
        </div>
      </Disclosure>
    </>
  );
}
