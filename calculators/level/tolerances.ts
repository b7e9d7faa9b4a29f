import { Length } from "../length";
import type { Source } from "../schema";

/** Two points no further apart than `within` (null: anywhere) may differ by `difference`. */
export interface LevelLimit {
  difference: Length;
  within: Length | null;
}

export const presetIds = ["half-in-20-ft", "quarter-in-10-ft"] as const;
export type PresetId = (typeof presetIds)[number];

const inches = (value: number) => Length.from(value);
const feet = (value: number) => Length.from(value, "ft");

/** domain.md section 2.1: the remodelling performance standard, and Kent's handbook; both second-hand. */
export const presets: Readonly<Record<PresetId, { limits: readonly LevelLimit[]; source: Source }>> = {
  "half-in-20-ft": {
    limits: [{ difference: inches(0.5), within: feet(20) }],
    source: { title: "Residential construction performance guidelines", clause: "no point more than 1/2 in above or below any other within 20 ft", status: "second-hand", address: "https://faq.constructionplace.com/faq/observation-the-foundation-is-out-of-level" },
  },
  "quarter-in-10-ft": {
    limits: [{ difference: inches(0.25), within: feet(10) }, { difference: inches(0.5), within: null }],
    source: { title: "Kent, Handbook of Construction Tolerances", clause: "foundation level: 1/4 in in 10 ft, 1/2 in over the whole", status: "second-hand", address: "https://www.jlconline.com/how-to/foundations/q-a-foundation-and-framing-tolerances_o" },
  },
};
