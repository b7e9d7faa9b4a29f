"use client";

import { Segmented } from "@/components/ui/segmented";
import type { LengthUnit } from "@/calculators/length";
import { useTranslate } from "@/lib/client/i18n/messages-context";

const names: Readonly<Record<string, string>> = { "0": "end", "1 in": "oneInch", "1 ft": "oneFoot", "100 mm": "hundred" };

/** Where the tape was held. A burn that came by an address and is none of these stands beside them. */
export function BurnChoice({ value, onChange, unit }: { value: string; onChange: (value: string) => void; unit: LengthUnit }) {
  const t = useTranslate();
  const known = unit === "mm" ? ["0", "100 mm"] : ["0", "1 in", "1 ft"];
  const current = value === "" ? "0" : (known.find((burn) => burn === value || burn === `${value} ${unit}`) ?? value);
  const options = known.includes(current) ? known : [...known, current];
  return (
    <div className="field">
      <Segmented
        name="burn"
        legend={t("inset.burn.legend")}
        hint={t("inset.burn.hint")}
        value={current}
        onChange={(burn) => onChange(burn === "0" ? "" : burn)}
        options={options.map((burn) => ({ value: burn, label: names[burn] === undefined ? burn : t(`inset.burn.${names[burn]}`) }))}
      />
    </div>
  );
}
