"use client";

import type { fitAnswer, FitAnswer } from "@/calculators/fit";
import { LengthField } from "@/components/length-field/length-field";
import { Disclosure } from "@/components/ui/disclosure";
import { Field } from "@/components/ui/field";
import { Segmented } from "@/components/ui/segmented";
import { Select } from "@/components/ui/select";
import { fieldId } from "@/lib/client/calculator/field-id";
import type { useCalculator } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { BurnChoice } from "../plan/burn-choice";
import { InsetInputs } from "../plan/inset-inputs";
import { spokenSide } from "../plan/plan-fields";
import { cornersIn, modes, planWayOf, planWays, slabWayOf, slabWays } from "./fit-fields";
import { BoltRows, EdgeRows } from "./place-rows";
import { SlabInputs } from "./slab-inputs";

export type FitForm = ReturnType<typeof useCalculator<typeof fitAnswer>>;

/** What is typed: the slab as built, the plan wanted on it, what is held, the inset, and places along the edges. */
export function FitInputs({ form, answer }: { form: FitForm; answer: FitAnswer | null }) {
  const t = useTranslate();
  const slabWay = slabWayOf(form.value, cornersIn(form.value));
  const planWay = planWayOf(form.value, slabWay);
  const mode = form.value("mode") || answer?.mode || (planWay === "none" ? "size-free" : "size-held");
  const sides = answer === null ? ["ab", "bc", "cd", "da"] : Object.keys(answer.lines);
  return (
    <>
      <div className="field">
        <Segmented name="slabBy" legend={t("fit.slab.legend")} value={slabWay} onChange={(way) => form.set("slabBy", way)} options={slabWays.map((value) => ({ value, label: t(`fit.slab.${value}`) }))} />
      </div>
      <SlabInputs form={form} way={slabWay} />
      <div className="field">
        <Segmented name="planBy" legend={t("fit.plan.legend")} value={planWay} onChange={(way) => form.set("planBy", way)} options={planWays.map((value) => ({ value, label: t(`fit.plan.${value}`) }))} />
      </div>
      {planWay === "size" ? (
        <>
          <LengthField {...form.field("size.length")} error={form.errorAt("size.length") ?? form.errorAt("size")} label={t("fit.plan.length")} hint={t("fit.plan.chalk")} />
          <LengthField {...form.field("size.width")} label={t("fit.plan.width")} hint={t("fit.plan.chalk")} />
        </>
      ) : null}
      {planWay === "walk" ? (
        <Field id={fieldId("walk")} label={t("fit.plan.walkLabel")} hint={t("fit.plan.walkHint")} error={form.errorAt("walk")}>
          <textarea id={fieldId("walk")} name="walk" className="control plan-text num" rows={5} spellCheck={false} aria-describedby={`${fieldId("walk")}-hint`} value={form.value("walk")} onChange={(event) => form.set("walk", event.target.value)} placeholder={t("fit.plan.walkExample")} />
        </Field>
      ) : null}
      <Select name="mode" label={t("fit.mode.legend")} options={modes.filter((value) => value !== "size-held" || planWay !== "none").map((value) => ({ value, label: t(`fit.mode.${value}`) }))} value={mode} onChange={(value) => form.set("mode", value)} error={form.errorAt("mode")} />
      {mode === "wall-held" ? <Select name="held" label={t("fit.mode.held")} options={sides.map((value) => ({ value, label: spokenSide(value) }))} value={form.value("held") || "ab"} onChange={(side) => form.set("held", side)} error={form.errorAt("held")} /> : null}
      <InsetInputs form={form} namespace="fit" sides={sides} />
      <LengthField {...form.field("overhang")} label={t("fit.overhang.label")} hint={t("fit.overhang.hint")} />
      <BurnChoice form={form} namespace="fit" />
      <Disclosure summary={t("fit.edges.title")} open={form.rows("edges") > 0}>
        <p>{t("fit.edges.hint")}</p>
        <EdgeRows form={form} sides={sides} />
      </Disclosure>
      <Disclosure summary={t("fit.bolts.title")} open={form.rows("bolts") > 0}>
        <p>{t("fit.bolts.hint")}</p>
        <BoltRows form={form} sides={sides} />
      </Disclosure>
    </>
  );
}
