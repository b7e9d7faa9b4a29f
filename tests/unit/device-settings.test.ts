import { describe, expect, test } from "vitest";
import { defaultSettings, precisionOf, readSettings, settingsKey, themes } from "@/lib/client/settings/device-settings";
import { settingsScript } from "@/lib/client/settings/settings-script";

describe("the device's settings", () => {
  test.each([null, "", "not json", "[]", "7", '{"theme":"neon","units":"cubits","inchPrecision":"1/3"}'])("fall back when %j is stored", (stored) => expect(readSettings(stored)).toEqual(defaultSettings));
  test("keep what is well formed", () => expect(readSettings('{"theme":"sun","units":"mm","metricPrecision":"0.5mm"}')).toEqual({ ...defaultSettings, theme: "sun", units: "mm", metricPrecision: "0.5mm" }));
  test("round to the precision of the units in use", () => expect([precisionOf(defaultSettings), precisionOf({ ...defaultSettings, units: "mm" })]).toEqual(["1/16", "1mm"]));
});

/** Runs the script of the head against a page that only remembers attributes. */
function attributesAfter(stored: string | null): Record<string, string> {
  const attributes: Record<string, string> = {};
  const page = { documentElement: { setAttribute: (name: string, value: string) => (attributes[name] = value) } };
  const storage = { getItem: (key: string) => (key === settingsKey ? stored : null) };
  new Function("document", "localStorage", settingsScript)(page, storage);
  return attributes;
}

describe("the script before paint", () => {
  test.each(themes)("shows the theme %s as the settings do", (theme) => expect(attributesAfter(JSON.stringify({ theme }))).toEqual(theme === "auto" ? {} : { "data-theme": theme }));
  test("shows millimeters", () => expect(attributesAfter('{"units":"mm"}')).toEqual({ "data-units": "mm" }));
  test.each([null, "not json", '{"theme":"neon"}', "null"])("does no harm when %j is stored", (stored) => expect(attributesAfter(stored)).toEqual({}));
});
