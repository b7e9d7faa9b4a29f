"use client";

import { Select } from "@/components/ui/select";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { changeSettings } from "@/lib/client/settings/use-device-settings";
import { inchPrecisions, metricPrecisions } from "@/lib/client/settings/device-settings";
import type { LengthUnit, Precision } from "@/calculators/length";

/** What answers are rounded to; kept on the device. Without script it is sent with the form. */
export function PrecisionChoice({ unit, precision }: { unit: LengthUnit; precision: Precision }) {
  const t = useTranslate();
  const metric = unit !== "in" && unit !== "ft";
  const options = metric
    ? metricPrecisions.map((value) => ({ value, label: t("common.precision.mm", { size: value.replace("mm", "") }) }))
    : inchPrecisions.map((value) => ({ value, label: t("common.precision.inches", { size: value }) }));
  return (
    <Select
      name="precision"
      label={t("common.precision.label")}
      options={options}
      value={precision}
      onChange={(value) => changeSettings(metric ? { metricPrecision: value as (typeof metricPrecisions)[number] } : { inchPrecision: value as (typeof inchPrecisions)[number] })}
    />
  );
}
