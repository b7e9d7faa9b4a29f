"use client";

import { Segmented } from "@/components/ui/segmented";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { unitSystems } from "@/lib/client/settings/device-settings";
import { useDeviceSettings } from "@/lib/client/settings/use-device-settings";

/** Feet and inches or millimetres, for every field of this device. The look follows `html[data-units]`, which is there before paint. */
export function UnitSwitch() {
  const t = useTranslate();
  const { units, change } = useDeviceSettings();
  return (
    <div className="unit-switch">
      <Segmented
        name="units-of-device"
        legend={t("common.units.label")}
        legendIs="hidden"
        value={units}
        options={[
          { value: "ft-in", label: t("common.units.ftIn"), spoken: t("common.units.ftInLong") },
          { value: "mm", label: t("common.units.mm"), spoken: t("common.units.mmLong") },
        ]}
        onChange={(value) => change({ units: unitSystems.find((system) => system === value) ?? "ft-in" })}
      />
    </div>
  );
}
