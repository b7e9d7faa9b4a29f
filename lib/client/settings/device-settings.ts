import type { LengthUnit, Precision } from "@/calculators/length";

/** What this device's owner chose; kept on the device and never sent. */
export interface DeviceSettings {
  theme: (typeof themes)[number];
  units: (typeof unitSystems)[number];
  inchPrecision: InchPrecision;
  metricPrecision: MetricPrecision;
}

export type MetricPrecision = Extract<Precision, `${string}mm`>;
export type InchPrecision = Exclude<Precision, MetricPrecision>;

export const themes = ["auto", "light", "dark", "sun"] as const;
export const unitSystems = ["ft-in", "mm"] as const;
export const inchPrecisions = ["1/2", "1/4", "1/8", "1/16", "1/32", "1/64"] as const satisfies readonly InchPrecision[];
export const metricPrecisions = ["1mm", "0.5mm"] as const satisfies readonly MetricPrecision[];

export const defaultSettings: DeviceSettings = { theme: "auto", units: "ft-in", inchPrecision: "1/16", metricPrecision: "1mm" };

export const settingsKey = "sillwright.settings";

/** Keeps what is well formed of a stored text; anything else falls back, so that an old or spoiled store does no harm. */
export function readSettings(stored: string | null): DeviceSettings {
  let found: Partial<Record<keyof DeviceSettings, unknown>> = {};
  try {
    const parsed: unknown = JSON.parse(stored ?? "null");
    if (typeof parsed === "object" && parsed !== null) found = parsed;
  } catch {
    // a spoiled store reads as none
  }
  const oneOf = <Choice extends string>(choices: readonly Choice[], value: unknown, fallback: Choice): Choice => choices.find((choice) => choice === value) ?? fallback;
  return {
    theme: oneOf(themes, found.theme, defaultSettings.theme),
    units: oneOf(unitSystems, found.units, defaultSettings.units),
    inchPrecision: oneOf(inchPrecisions, found.inchPrecision, defaultSettings.inchPrecision),
    metricPrecision: oneOf(metricPrecisions, found.metricPrecision, defaultSettings.metricPrecision),
  };
}

/** What a bare number means under a choice of units. */
export function unitOf(units: DeviceSettings["units"]): Extract<LengthUnit, "in" | "mm"> {
  return units === "mm" ? "mm" : "in";
}

export function precisionOf(settings: DeviceSettings): Precision {
  return settings.units === "mm" ? settings.metricPrecision : settings.inchPrecision;
}
