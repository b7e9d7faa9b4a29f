import { defineOperation, type Calculator } from "../schema";
import { insetAnswer } from "./answer";
import { layChalkLines } from "./chalk-lines";
import { insetInput } from "./input";

export { insetAnswer, type InsetAnswer } from "./answer";
export { cornerDistance } from "./chalk-geometry";
export { insetInput, sides, type InsetInput, type Side } from "./input";

export const insetOperation = defineOperation({
  id: "insets",
  path: "insets",
  input: insetInput,
  answer: insetAnswer,
  calculate: layChalkLines,
  examples: [
    { id: "halfInch", input: { length: "28 ft", width: "40 ft", inset: "1/2" }, answer: { lines: { ab: { text: "27' 11\"" }, bc: { text: "39' 11\"" } }, diagonal: { text: "48' 8 1/2\"" } }, source: "domain.md N01" },
    { id: "sevenSixteenths", input: { length: "28 ft", width: "40 ft", inset: "7/16" }, answer: { lines: { ab: { text: "27' 11 1/8\"" }, bc: { text: "39' 11 1/8\"" } }, diagonal: { text: "48' 8 11/16\"" } }, source: "domain.md N02" },
    {
      id: "wrongMark",
      input: { length: "28 ft", width: "24 ft", inset: "1/2", burn: "1", slabDiagonals: { ac: "443 9/16", bd: "443 9/16" }, chalkDiagonals: { ac: "441 1/2", bd: "441 1/2" } },
      answer: { check: { agrees: false }, ask: "chalk-lines" },
      source: "arithmetic: with A-B 1 in too far in the chalk is 335 by 286, its diagonal 440.476 in, read 441 1/2",
    },
  ],
});

export const inset: Calculator = {
  name: "inset",
  version: "1.0.0",
  stage: 2,
  operations: [insetOperation],
  sources: [
    { title: "NAVEDTRA 14044, Builder 3 & 2, Volume 2 (1994)", clause: "p. 1-1, set-back by the sheathing's thickness", status: "read", address: "https://constructionmanuals.tpub.com/14044/css/" },
    { title: "APA, Performance Category (PS 1, PS 2)", clause: "thickness of 7/16, 15/32, 1/2 and 19/32 panels", status: "read", address: "https://www.apawood-europe.org/products-trademarks/plywood/trademarks/performance-category" },
    { title: "Modern Carpentry (2016)", clause: "p. 243, further back for brick veneer", status: "read", address: "https://www.g-wonlinetextbooks.com/modern-carpentry-2016/265" },
    { title: "JLC, mudsill layout for a complex foundation", clause: "parallels first, diagonals last", status: "read", address: "https://www.jlconline.com/photos/mudsill-layout-for-a-complex-foundation" },
  ],
  cautions: ["code-governs", "one-tape", "recheck-before-cutting"],
};
