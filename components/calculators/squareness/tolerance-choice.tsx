"use client";

import type { SquarenessAnswer } from "@/calculators/squareness";
import { LengthField } from "@/components/length-field/length-field";
import { Select } from "@/components/ui/select";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { other } from "../burn-field";
import { toleranceChosen, tolerancePresets } from "./squareness-fields";
import type { SquarenessForm } from "./squareness-inputs";

/** The limit to judge by; beside each named one, what it allows on this very slab, and where it is from. */
export function ToleranceChoice({ form, answer }: { form: SquarenessForm; answer: SquarenessAnswer | null }) {
  const t = useTranslate();
  const { choice, text } = toleranceChosen(form.value);
  const presetOf = (id: string) => answer?.presets.find((preset) => preset.id === id);
  const label = (id: (typeof tolerancePresets)[number]) => {
    const name = t(`squareness.tolerance.${id}`);
    const allowed = presetOf(id);
    return allowed === undefined || id.startsWith("practice") ? name : t("squareness.tolerance.here", { name, difference: allowed.difference.text });
  };
  const chosen = presetOf(choice);
  return (
    <div className="with-other">
      <Select
        name="tolerance"
        label={t("squareness.tolerance.label")}
        hint={t("squareness.tolerance.hint")}
        options={[{ value: "", label: t("squareness.tolerance.none") }, ...tolerancePresets.map((id) => ({ value: id, label: label(id) })), { value: other, label: t("squareness.tolerance.other") }]}
        value={choice}
        onChange={(tolerance) => form.change({ tolerance })}
        error={choice === other ? undefined : form.errorAt("tolerance")}
      />
      {chosen === undefined ? null : (
        <p className="field-hint squareness-allows">
          {t(chosen.source === null ? "squareness.tolerance.allows" : "squareness.tolerance.allowsFrom", {
            difference: chosen.difference.text,
            taper: (answer?.allowed?.taper ?? chosen.taper).text,
            status: t(`common.sourceStatus.${chosen.status}`),
            source: chosen.source ?? "",
          })}
        </p>
      )}
      <div className="if-other">
        <LengthField
          {...form.field("toleranceOther")}
          id={choice === other ? fieldId("tolerance") + "-other" : undefined}
          value={choice === other ? text : ""}
          onChange={(typed) => form.change({ tolerance: other, toleranceOther: typed })}
          error={choice === other ? form.errorAt("tolerance") : undefined}
          label={t("squareness.tolerance.otherLabel")}
          hint={t("squareness.tolerance.otherHint")}
        />
      </div>
    </div>
  );
}
