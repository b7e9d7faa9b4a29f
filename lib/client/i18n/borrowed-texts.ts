import type { Namespace } from "./catalogue";

/** Texts of one calculator that another says too: namespace, and how their keys begin. */
export const borrowedTexts: Readonly<Record<string, { from: Namespace; under: readonly string[] }>> = {
  plates: { from: "anchors", under: ["anchors.rule.", "anchors.figure.", "anchors.unit.", "anchors.code.", "anchors.findings.", "anchors.remedy."] },
};
