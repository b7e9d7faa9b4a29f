"use client";

import { LengthField, type LengthFieldProps } from "@/components/length-field/length-field";
import { Segmented } from "@/components/ui/segmented";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { burnChosen, burnName, burns, other } from "./burn-field";

interface BurnChoiceProps {
  form: {
    unit: string;
    value: (name: string) => string;
    change: (fields: Record<string, string>) => void;
    errorAt: (name: string) => string | undefined;
    field: (name: string) => Pick<LengthFieldProps, "name" | "value" | "onChange" | "unit" | "precision">;
  };
  /** The messages under `<namespace>.burn`. */
  namespace: "squareness" | "corner";
}

/** Where the tape was held. The field for another mark is there for whoever chose it, with script or without. */
export function BurnChoice({ form, namespace }: BurnChoiceProps) {
  const t = useTranslate();
  const { choice, text } = burnChosen(form.value, form.unit);
  const label = (value: string) => (value === "0" ? t(`${namespace}.burn.end`) : value === other ? t(`${namespace}.burn.other`) : burnName(value, t, namespace));
  return (
    <div className="field with-other">
      <Segmented
        name="burn"
        legend={t(`${namespace}.burn.legend`)}
        hint={t(`${namespace}.burn.hint`)}
        value={choice}
        onChange={(burn) => form.change({ burn: burn === "0" ? "" : burn })}
        options={[...burns, other].map((value) => ({ value, label: label(value) }))}
      />
      <div className="if-other">
        <LengthField
          {...form.field("burnOther")}
          id={fieldId("burn")}
          value={choice === other ? text : ""}
          onChange={(typed) => form.change({ burn: other, burnOther: typed })}
          error={form.errorAt("burn")}
          label={t(`${namespace}.burn.otherLabel`)}
          hint={t(`${namespace}.burn.otherHint`)}
        />
      </div>
    </div>
  );
}
