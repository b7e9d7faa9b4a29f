import { defineOperation, type Calculator } from "../schema";
import { cornerAnswer } from "./answer";
import { cornerInput } from "./input";
import { setCorner } from "./set-corner";

export { cornerAnswer, type CornerAnswer } from "./answer";
export { cornerInput, type CornerInput } from "./input";
export { largestTriangle, type WholeTriangle } from "./largest-triangle";

export const cornerOperation = defineOperation({
  id: "corners",
  path: "corners",
  input: cornerInput,
  answer: cornerAnswer,
  calculate: setCorner,
  examples: [
    { id: "workshop", input: { legs: ["28 ft", "22 ft"], burn: "1 in" }, answer: { diagonal: { text: "35' 7 5/16\"" }, reading: { text: "35' 8 5/16\"" }, triangle: { counts: [28, 21, 35] } }, source: "product.md, set a corner; Pythagoras" },
    { id: "twelveSixteen", input: { legs: ["12 ft", "16 ft"] }, answer: { diagonal: { exact: "240", text: "20' 0\"" }, triangle: { counts: [12, 16, 20], primitive: [3, 4, 5] } }, source: "domain.md D02" },
    { id: "metric", input: { unit: "mm", precision: "1mm", legs: ["6000", "8000"] }, answer: { diagonal: { text: "10000 mm" }, triangle: { counts: [60, 80, 100], unit: "100 mm" } }, source: "domain.md D01, in metres" },
    { id: "plan", input: { legs: ["24 ft", "28 ft"] }, answer: { diagonal: { text: "36' 10 9/16\"" } }, source: "domain.md D24" },
  ],
});

export const corner: Calculator = {
  name: "corner",
  version: "1.0.0",
  stage: null,
  operations: [cornerOperation],
  sources: [
    { title: "CMHC, Canadian Wood-Frame House Construction", clause: "p. 30, triangles of 300, 400, 500 mm and their multiples", status: "read", address: "https://lehal.net/library" },
    { title: "US Army EN0069", clause: "squaring building lines by 3-4-5 and its multiples", status: "read", address: "https://armyengineer.tpub.com/en0069a/Squaring-Building-Lines-46.htm" },
    { title: "Carpenters' Guide", clause: "rule 1, 6-8-10", status: "read", address: "https://chestofbooks.com" },
    { title: "Tools of the Trade, A square deal", clause: "take the largest triangle that fits: small ones multiply errors", status: "read", address: "https://www.toolsofthetrade.net/windows/square-deal.aspx" },
  ],
  cautions: ["code-governs", "one-tape", "recheck-before-cutting"],
};
