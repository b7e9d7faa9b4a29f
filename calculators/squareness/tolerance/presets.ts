import { Length } from "../../length";
import type { SourceStatus } from "../../schema";

/** Named tolerances. None is a default: published figures differ by a factor of ten, and the drawings may ask for another. */
export const presetIds = ["triangle-12-16-20", "three-quarters-per-100-ft", "practice-1-8", "practice-3-16", "practice-1-4"] as const;
export type PresetId = (typeof presetIds)[number];

export interface Preset {
  /** corner: the hypotenuse of a 12 by 16 ft triangle at every corner; diagonal: each diagonal's share; difference: that length. */
  kind: { of: "corner"; plusOrMinusInches: number } | { of: "diagonal"; share: number } | { of: "difference"; most: Length };
  /** Most that opposite sides may differ. The two published ones are about angles and state none: ours, 1/4 in. */
  taper: Length;
  status: SourceStatus;
  /** The work it is from; null for practice, which has none. */
  source: string | null;
}

const quarter = Length.from(1 / 4);

export const presets: Readonly<Record<PresetId, Preset>> = {
  "triangle-12-16-20": {
    kind: { of: "corner", plusOrMinusInches: 0.5 },
    taper: quarter,
    status: "second-hand",
    source: "Remodeling performance standard",
  },
  "three-quarters-per-100-ft": {
    kind: { of: "diagonal", share: 0.75 / 1200 },
    taper: quarter,
    status: "second-hand",
    source: "Kent, Handbook of Construction Tolerances",
  },
  "practice-1-8": practice(1 / 8),
  "practice-3-16": practice(3 / 16),
  "practice-1-4": practice(1 / 4),
};

function practice(inches: number): Preset {
  const most = Length.from(inches);
  return { kind: { of: "difference", most }, taper: most, status: "practice", source: null };
}
