"use client";

import { Segmented } from "@/components/ui/segmented";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { PlanForm } from "./inset-inputs";

/** Where the tape was held. A burn that came by an address and is none of these stands beside them. */
export function BurnChoice({ form, namespace }: { form: PlanForm; namespace: string }) {
  const t = useTranslate();
  const { unit } = form;
  const value = form.value("burn");
  const known = unit === "mm" ? ["0", "100 mm"] : ["0", "1 in", "1 ft"];
  const current = value === "" ? "0" : (known.find((burn) => burn === value || burn === `${value} ${unit}`) ?? value);
  const options = known.includes(current) ? known : [...known, current];
  return (
    <div className="field">
      <Segmented
        name="burn"
        legend={t(`${namespace}.burn.legend`)}
        hint={t(`${namespace}.burn.hint`)}
        value={current}
        onChange={(burn) => form.set("burn", burn === "0" ? "" : burn)}
        options={options.map((burn) => ({ value: burn, label: burn === "0" ? t(`${namespace}.burn.end`) : burn }))}
      />
    </div>
  );
}
