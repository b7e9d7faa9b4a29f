"use client";

import type { footprintAnswer, FootprintAnswer } from "@/calculators/footprint";
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
import { RowList } from "../plan/row-list";
import { pullsFor, wayOf, ways } from "./footprint-fields";
import { fieldsOf, PullRows } from "./pull-rows";
import { RunRows } from "./run-rows";
import { TapPad } from "./tap-pad";

export type FootprintForm = ReturnType<typeof useCalculator<typeof footprintAnswer>>;

/** What is typed: the plan in one of three ways, the inset, bowed edges. */
export function FootprintInputs({ form, answer }: { form: FootprintForm; answer: FootprintAnswer | null }) {
  const t = useTranslate();
  const way = wayOf(form.value, form.rows);
  const choose = (next: string) => form.change({ by: next, ...(next === "readings" && form.rows("readings") === 0 ? fieldsOf(pullsFor(4, []), 0) : {}) });
  const sides = answer?.lines.map(({ side }) => side) ?? ["ab", "bc", "cd", "da"];
  return (
    <>
      <div className="field">
        <Segmented name="by" legend={t("footprint.by.legend")} value={way} onChange={choose} options={ways.map((value) => ({ value, label: t(`footprint.by.${value}`) }))} />
      </div>
      {way === "runs" ? (
        <>
          <TapPad form={form} />
          <RunRows form={form} />
        </>
      ) : null}
      {way === "walk" ? (
        <Field id={fieldId("walk")} label={t("footprint.walk.label")} hint={t("footprint.walk.hint")} error={form.errorAt("walk")}>
          <textarea id={fieldId("walk")} name="walk" className="control plan-text num" rows={6} spellCheck={false} aria-describedby={`${fieldId("walk")}-hint`} value={form.value("walk")} onChange={(event) => form.set("walk", event.target.value)} placeholder={t("footprint.walk.example")} />
        </Field>
      ) : (
        <noscript>
          <label className="field-label" htmlFor="walk-without-script">
            {t("footprint.walk.label")}
          </label>
          <textarea id="walk-without-script" name="walk" className="control plan-text" rows={4} />
        </noscript>
      )}
      {way === "readings" ? <PullRows form={form} answer={answer} /> : null}
      <BurnChoice form={form} namespace="footprint" />
      <InsetInputs form={form} namespace="footprint" sides={sides} />
      <Disclosure summary={t("footprint.bows.title")} open={form.rows("bows") > 0}>
        <p>{t("footprint.bows.hint")}</p>
        <BowRows form={form} sides={sides} />
      </Disclosure>
    </>
  );
}

function BowRows({ form, sides }: { form: FootprintForm; sides: readonly string[] }) {
  const t = useTranslate();
  return (
    <RowList form={form} list="bows" title={t("footprint.bows.list")} rows={form.rows("bows")} most={60} first="outward" add={t("footprint.bows.add")} remove={(row) => t("footprint.bows.remove", { number: row + 1 })} fresh={(row) => ({ [`bows.${row}.side`]: sides[row % sides.length]! })}>
      {(row) => (
        <>
          <Select name={`bows.${row}.side`} label={t("footprint.bows.side", { number: row + 1 })} options={sides.map((value) => ({ value, label: spokenSide(value) }))} value={form.value(`bows.${row}.side`)} onChange={(side) => form.set(`bows.${row}.side`, side)} error={form.errorAt(`bows.${row}.side`)} />
          <LengthField {...form.field(`bows.${row}.outward`)} label={t("footprint.bows.outward", { number: row + 1 })} hint={t("footprint.bows.outwardHint")} />
          <LengthField {...form.field(`bows.${row}.station`)} label={t("footprint.bows.station", { number: row + 1 })} hint={t("footprint.bows.stationHint")} />
        </>
      )}
    </RowList>
  );
}
