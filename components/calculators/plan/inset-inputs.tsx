"use client";

import type { LengthFieldProps } from "@/components/length-field/length-field";
import { LengthField } from "@/components/length-field/length-field";
import { Disclosure } from "@/components/ui/disclosure";
import { LengthText } from "@/components/ui/length-text";
import { Segmented } from "@/components/ui/segmented";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { insetPresets, spokenSide } from "./plan-fields";

/** The part of a form that these pieces use; any calculator's has it. */
export interface PlanForm {
  field: (name: string) => Omit<LengthFieldProps, "label">;
  value: (name: string) => string;
  set: (name: string, text: string) => void;
  change: (fields: Readonly<Record<string, string>>) => void;
  errorAt: (name: string) => string | undefined;
  rows: (list: string) => number;
  removeRow: (list: string, row: number) => void;
  unit: LengthFieldProps["unit"];
}

/** The inset: one for every side, four labels that fill it, and sides of their own. `sides` are the plan's, such as ab. */
export function InsetInputs({ form, namespace, sides }: { form: PlanForm; namespace: string; sides: readonly string[] }) {
  const t = useTranslate();
  const typed = form.value("inset").trim();
  const chosen = insetPresets.find((preset) => preset === typed || preset === `${typed} in`) ?? "";
  return (
    <>
      <LengthField {...form.field("inset")} label={t(`${namespace}.inset.label`)} hint={t(`${namespace}.inset.hint`)} />
      <div className="plan-presets">
        <Segmented
          name="preset"
          legend={t(`${namespace}.inset.preset`)}
          legendIs="hidden"
          value={typed === "" ? form.value("preset") : chosen}
          onChange={(preset) => form.change({ preset: "", inset: preset })}
          options={insetPresets.map((preset) => ({ value: preset, label: <LengthText text={preset.replace(" in", '"')} />, spoken: preset }))}
        />
      </div>
      <Disclosure summary={t(`${namespace}.inset.each`)} open={sides.some((side) => form.value(`each.${side}`) !== "")}>
        <p>{t(`${namespace}.inset.eachHint`)}</p>
        {sides.map((side) => (
          <LengthField key={side} {...form.field(`each.${side}`)} error={form.errorAt(`inset.${side}`)} label={t(`${namespace}.inset.of`, { side: spokenSide(side) })} />
        ))}
      </Disclosure>
    </>
  );
}
