"use client";

import { LengthField } from "@/components/length-field/length-field";
import { LengthText } from "@/components/ui/length-text";
import { Segmented } from "@/components/ui/segmented";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { AnchorsForm } from "./anchors-calculator";
import type { Mode } from "./anchors-fields";

/** Dry dressed widths (PS 20); a wet plate is wider and is measured. */
const widths = [
  { value: "3 1/2 in", label: "2x4" },
  { value: "5 1/2 in", label: "2x6" },
  { value: "7 1/4 in", label: "2x8" },
] as const;
const diameters = ["1/2 in", "5/8 in", "3/4 in"] as const;

/** Bolt, plate and end distance. */
export function PlateInputs({ form, mode }: { form: AnchorsForm; mode: Mode }) {
  const t = useTranslate();
  const matching = (options: readonly string[], typed: string) => options.find((option) => option === typed || option === `${typed} in`) ?? "";
  const diameter = form.value("diameter");
  const known = diameter === "" || matching(diameters, diameter) !== "";
  const options = known ? diameters : [...diameters, diameter];
  return (
    <>
      {mode === "check" ? (
        <>
          <LengthField {...form.field("plateWidth")} onChange={(text) => form.change({ plateWidth: text, widthPreset: "" })} label={t("anchors.plate.width")} hint={t("anchors.plate.widthHint")} />
          <Segmented
            name="widthPreset"
            legend={t("anchors.plate.preset")}
            legendIs="hidden"
            value={matching(widths.map(({ value }) => value), form.value("plateWidth"))}
            onChange={(value) => form.change({ plateWidth: value, widthPreset: "" })}
            options={widths.map(({ value, label }) => ({ value, label, spoken: `${label}, ${value}` }))}
          />
        </>
      ) : null}
      <div className="field rows-gap">
        <Segmented
          name="diameter"
          legend={t("anchors.plate.diameter")}
          value={diameter === "" ? diameters[0] : known ? matching(diameters, diameter) : diameter}
          onChange={(value) => form.set("diameter", value)}
          options={options.map((value) => ({ value, label: <LengthText text={value.replace(" in", '"')} />, spoken: value }))}
        />
        {form.errorAt("diameter") === undefined ? null : <p className="field-error">{form.errorAt("diameter")}</p>}
      </div>
      {mode === "layout" ? <LengthField {...form.field("endDistance")} label={t("anchors.plate.endDistance")} hint={t("anchors.plate.endDistanceHint", { length: form.unit === "mm" ? "203 mm" : '8"' })} /> : null}
    </>
  );
}
