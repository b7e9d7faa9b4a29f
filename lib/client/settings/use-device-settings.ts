"use client";

import { useSyncExternalStore } from "react";
import { defaultSettings, precisionOf, readSettings, settingsKey, unitOf, type DeviceSettings } from "./device-settings";

const listeners = new Set<() => void>();
let text: string | null | undefined;
let current = defaultSettings;

function storedText(): string | null {
  try {
    return localStorage.getItem(settingsKey);
  } catch {
    return text ?? null; // storage is refused: the choice lasts as long as the page
  }
}

function snapshot(): DeviceSettings {
  const now = storedText();
  if (now !== text) {
    text = now;
    current = readSettings(now);
  }
  return current;
}

/** Shows the choice on the page: the same two attributes as the script in the head. */
function applySettings({ theme, units }: DeviceSettings): void {
  const root = document.documentElement;
  if (theme === "auto") root.removeAttribute("data-theme");
  else root.setAttribute("data-theme", theme);
  if (units === "mm") root.setAttribute("data-units", "mm");
  else root.removeAttribute("data-units");
}

/** The choice as it stands now, for effects: a hook's first client render still sees the defaults. */
export function deviceSettings(): DeviceSettings {
  return snapshot();
}

function changed(): void {
  applySettings(snapshot());
  for (const listener of listeners) listener();
}

function subscribe(listener: () => void): () => void {
  if (listeners.size === 0) window.addEventListener("storage", changed);
  listeners.add(listener);
  return () => {
    listeners.delete(listener);
    if (listeners.size === 0) window.removeEventListener("storage", changed);
  };
}

export function changeSettings(change: Partial<DeviceSettings>): void {
  const next = { ...snapshot(), ...change };
  const serialised = JSON.stringify(next);
  try {
    localStorage.setItem(settingsKey, serialised);
  } catch {
    text = serialised;
    current = next;
  }
  changed();
}

/**
 * The device's units, precision and theme, the same in every tab. The server and the first client render see the defaults,
 * so that hydration agrees; the stored choice follows in the same frame.
 */
export function useDeviceSettings() {
  const settings = useSyncExternalStore(subscribe, snapshot, () => defaultSettings);
  return { ...settings, unit: unitOf(settings.units), precision: precisionOf(settings), change: changeSettings };
}
