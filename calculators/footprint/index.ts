import { defineOperation, type Calculator } from "../schema";
import { footprintAnswer } from "./answer";
import { findFootprint } from "./find-footprint";
import { footprintInput } from "./input";

export { footprintAnswer, type FootprintAnswer } from "./answer";
export { footprintInput, type FootprintInput } from "./input";

export const footprintOperation = defineOperation({
  id: "footprints",
  path: "footprints",
  input: footprintInput,
  answer: footprintAnswer,
  calculate: findFootprint,
  examples: [
    {
      id: "lPlan",
      input: { walk: "E 40 ft, N 20 ft, W 16 ft, N 12 ft, W 24 ft, S 32 ft", inset: "1/2" },
      answer: { closure: { distance: { in: 0 }, oneIn: null }, areaSquareFeet: 1088, perimeter: { text: "144' 0\"" } },
      source: "domain.md V05",
    },
    {
      id: "oneInchOff",
      input: { walk: "E 40 ft, N 20 ft, W 15' 11\", N 12 ft, W 24 ft, S 32 ft" },
      answer: { closure: { east: { in: 1 }, north: { in: 0 }, oneIn: 1727 } },
      source: "domain.md V06",
    },
    {
      id: "braced",
      input: {
        readings: [
          { from: "A", to: "B", reading: "336" },
          { from: "B", to: "C", reading: "288" },
          { from: "C", to: "D", reading: "336" },
          { from: "D", to: "A", reading: "288" },
          { from: "A", to: "C", reading: "443.3125" },
          { from: "B", to: "D", reading: "441.8125" },
        ],
        inset: "1/2",
      },
      answer: { adjustment: { spare: 1, contradictory: false }, unfixed: [] },
      source: "domain.md Q05",
    },
  ],
});

export const footprint: Calculator = {
  name: "footprint",
  version: "1.0.0",
  stage: 1,
  operations: [footprintOperation],
  sources: [
    { title: "Mahun, Open Access Surveying Library", clause: "COGO chapter H, area by coordinates", status: "read", address: "https://jerrymahun.com/index.php/home/open-access/12-iv-cogo/30-cogo-chap-h" },
    { title: "Mahun, Open Access Surveying Library", clause: "chapter D, closure of a traverse", status: "read" },
    { title: "Least squares by variation of coordinates, equal weights", clause: "closure limit √m × the reading error", status: "derived" },
  ],
  cautions: ["code-governs", "one-tape", "recheck-before-cutting"],
};
