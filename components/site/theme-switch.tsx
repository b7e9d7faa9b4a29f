"use client";

import { Segmented } from "@/components/ui/segmented";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { themes } from "@/lib/client/settings/device-settings";
import { useDeviceSettings } from "@/lib/client/settings/use-device-settings";

/** As the device, light, dark, or for full sun. `name` keeps two copies on a page apart. */
export function ThemeSwitch({ name }: { name: string }) {
  const t = useTranslate();
  const { theme, change } = useDeviceSettings();
  return (
    <div className="theme-switch">
      <Segmented
        name={name}
        legend={t("common.theme.label")}
        value={theme}
        options={themes.map((choice) => ({ value: choice, label: t(`common.theme.${choice}`), spoken: t(`common.theme.${choice}Long`) }))}
        onChange={(value) => change({ theme: themes.find((choice) => choice === value) ?? "auto" })}
      />
    </div>
  );
}
