import { defineOperation, type Calculator } from "../schema";
import { levelAnswer } from "./answer";
import { findLevel } from "./find-level";
import { levelInput } from "./input";
import { presets } from "./tolerances";

export { levelAnswer, type LevelAnswer } from "./answer";
export { levelInput, type LevelInput } from "./input";
export { presetIds, type PresetId } from "./tolerances";

export const levelOperation = defineOperation({
  id: "levels",
  path: "levels",
  input: levelInput,
  answer: levelAnswer,
  calculate: findLevel,
  examples: [
    {
      id: "oneSetup",
      input: { unit: "ft", setups: [{ backsight: "8.42", readings: [{ rod: "1.20" }] }], benchmark: { elevation: "820.00" } },
      answer: { instruments: [{ height: { exact: "248526/25" } }], points: [{ elevation: { exact: "248166/25" } }], arithmeticCheck: { ok: true } },
      source: "domain.md E01: 820.00 + 8.42 = 828.42 ft; less 1.20 is 827.22 ft (here in inches)",
    },
    {
      id: "fourCorners",
      input: {
        length: "28 ft",
        width: "24 ft",
        setups: [
          {
            backsight: "48",
            readings: [
              { wall: "ab", station: "0", rod: "48" },
              { wall: "bc", station: "0", rod: "48 3/16" },
              { wall: "cd", station: "0", rod: "48 1/2" },
              { wall: "da", station: "0", rod: "48 1/4" },
            ],
          },
        ],
        tolerance: "half-in-20-ft",
      },
      answer: { spread: { exact: "1/2" }, shims: [{ shim: { exact: "0" } }, { shim: { exact: "3/16" } }, { shim: { exact: "1/2" } }, { shim: { exact: "1/4" } }], verdict: "within" },
      source: "domain.md E06",
    },
  ],
});

export const level: Calculator = {
  name: "level",
  version: "1.0.0",
  stage: 1,
  operations: [levelOperation],
  sources: [
    ...Object.values(presets).map(({ source }) => source),
    { title: "NAVEDTRA 14071, Engineering Aid", clause: "level computations, page check", status: "read", address: "https://engineeringtraining.tpub.com/14071/css/Level-Computations-127.htm" },
    { title: "NAVEDTRA 14044, Builder 3 & 2, Volume 2 (1994)", clause: "p. 1-3: low spots shimmed with wood wedges; grout or mortar is better", status: "read", address: "https://constructionmanuals.tpub.com/14044/css/14044_15.htm" },
    { title: "Ontario O. Reg. 332/12", clause: "9.23.7.2: a full bed of mortar, or directly on a level top", status: "read", address: "https://oncodes.ca/framing/levelling-of-sill-plates" },
  ],
  cautions: ["code-governs", "recheck-before-cutting"],
};
