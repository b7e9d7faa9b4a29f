import { defineOperation, type Calculator } from "../schema";
import { squarenessAnswer } from "./answer";
import { checkSquare } from "./check-square";
import { squarenessInput } from "./input";

export { squarenessAnswer, type SquarenessAnswer } from "./answer";
export { squarenessInput, type ReadingName, type SquarenessInput } from "./input";
export { presetIds, presets, type PresetId } from "./tolerance/presets";

export const squarenessOperation = defineOperation({
  id: "squareness",
  path: "squareness",
  input: squarenessInput,
  answer: squarenessAnswer,
  calculate: checkSquare,
  examples: [
    {
      id: "racked",
      input: { length: "28' 0\"", width: "24' 0\"", diagonals: { ac: "444 5/16", bd: "442 13/16" }, burn: "1 in", tolerance: "triangle-12-16-20" },
      answer: { shape: "racked", verdict: "within", difference: { text: '1 1/2"' }, rack: { distance: { text: '1"', lean: "scant" }, toward: "D" } },
      source: "domain.md S07: 1.5 in on 24 by 28 ft is 0.988 in over 24 ft, inside the 1.9 in of section 2.2",
    },
    {
      id: "trapezoid",
      input: { sides: { ab: "336", bc: "288", cd: "336 1/4", da: "288" }, diagonals: { ac: "442 1/2", bd: "442 1/2" }, tolerance: "1/8" },
      answer: { shape: "tapered", verdict: "out", difference: { exact: "0" }, rack: { toward: null }, taper: { length: { text: '1/4"' } } },
      source: "domain.md Q06: equal diagonals, and yet no rectangle",
    },
    {
      id: "missedBurn",
      input: { sides: { ab: "481", bc: "361", cd: "481", da: "361" }, diagonals: { ac: "600", bd: "601" }, burn: "1 in", tolerance: "3/16" },
      answer: { verdict: "contradictory", separatingPull: { kind: "triangle" } },
      source: "domain.md Q07, a 3-4-5 of 40 by 30 ft, with AC read without its burn",
    },
    {
      id: "metric",
      input: { unit: "mm", precision: "1mm", length: "12000", width: "9000", diagonals: { ac: "15106", bd: "15094" }, burn: "100 mm", tolerance: "10 mm" },
      answer: { verdict: "out", difference: { text: "12 mm" }, rack: { distance: { text: "8 mm" }, toward: "D" } },
      source: "arithmetic: (15006² − 14994²) / (4·12000) = 7.5",
    },
  ],
});

export const squareness: Calculator = {
  name: "squareness",
  version: "1.0.0",
  stage: 1,
  operations: [squarenessOperation],
  sources: [
    { title: "Remodeling performance standard", clause: "foundation squareness: 12 by 16 ft triangle, 20 ft within 1/2 in", status: "second-hand", address: "https://faq.constructionplace.com/faq/observation-the-foundation-is-out-of-square" },
    { title: "Kent, Handbook of Construction Tolerances", clause: "squareness, 3/4 in per 100 ft of diagonal", status: "second-hand", address: "https://www.jlconline.com/how-to/foundations/q-a-foundation-and-framing-tolerances_o" },
    { title: "US Army EN0069", clause: "squaring building lines: hold one side, shift the far one", status: "read", address: "https://armyengineer.tpub.com/en0069a/Squaring-Building-Lines-46.htm" },
    { title: "NIST Handbook 44", clause: "s. 5.52, tolerance of steel tapes", status: "second-hand", address: "https://www.corada.com/documents/dimensional-tolerances-in-construction-and-for-surface-accessibility/Metal-measuring-tapes" },
    { title: "NAVEDTRA, Engineering Aid", clause: "steel tape, 0.0000065 per degree F", status: "read", address: "https://www.tpub.com/engbas/12-14.htm" },
    { title: "Tape corrections: length, temperature, pull, sag", clause: "vermessungsseiten.de, formulas", status: "read", address: "https://www.vermessungsseiten.de/englisch/vermtech/guide" },
  ],
  cautions: ["code-governs", "one-tape", "recheck-before-cutting"],
};
