import { defineOperation, type Calculator } from "../schema";
import { fitAnswer } from "./answer";
import { fitInput } from "./input";
import { layPlan } from "./lay-plan";

export { fitAnswer, type FitAnswer } from "./answer";
export { fitInput, type FitInput } from "./input";

export const fitOperation = defineOperation({
  id: "fits",
  path: "fits",
  input: fitInput,
  answer: fitAnswer,
  calculate: layPlan,
  examples: [
    {
      id: "trueSlab",
      input: { corners: { A: { x: 0, y: 0 }, B: { x: 336, y: 0 }, C: { x: 336, y: 288 }, D: { x: 0, y: 288 } }, size: { length: "27' 11\"", width: "23' 11\"" }, inset: "1/2" },
      answer: { worst: { in: 0, exact: "0" }, fits: true, offsets: { A: { ab: { exact: "1/2" }, da: { exact: "1/2" } } } },
      source: "arithmetic: 336 − 2 × 1/2 = 335 and 288 − 1 = 287",
    },
    {
      id: "inchTooLong",
      input: { corners: { A: { x: 0, y: 0 }, B: { x: 337, y: 0 }, C: { x: 337, y: 288 }, D: { x: 0, y: 288 } }, size: { length: "27' 11\"", width: "23' 11\"" }, inset: "1/2" },
      answer: { worst: { in: 0.5, exact: "1/2" }, offsets: { A: { ab: { exact: "1/2" }, da: { exact: "1" } }, B: { bc: { exact: "1" } } } },
      source: "arithmetic: one inch too much, half of it at each end",
    },
    {
      id: "racked",
      input: { length: "28 ft", width: "24 ft", diagonals: { ac: "443 5/16", bd: "441 13/16" }, size: { length: "27' 10\"", width: "23' 10\"" }, inset: "1" },
      answer: { fits: true },
      source: "domain.md Q05's figure, kept inside the concrete",
    },
  ],
});

export const fit: Calculator = {
  name: "fit",
  version: "1.0.0",
  stage: 2,
  operations: [fitOperation],
  sources: [
    { title: "Minimax fit of a rigid plan: a linear program at each angle, branch and bound over the angle", clause: "worst departure within 1e-7 in of the least (sizes held), 1e-5 in (sizes free)", status: "derived" },
    { title: "JLC, fixing a faulty foundation", clause: "start from the longest straight wall, move the other lines", status: "read" },
    { title: "NAVEDTRA 14044, Builder 3 & 2, Volume 2 (1994)", clause: "p. 1-1, set-back by the sheathing's thickness", status: "read", address: "https://constructionmanuals.tpub.com/14044/css/" },
  ],
  cautions: ["code-governs", "one-tape", "recheck-before-cutting"],
};
