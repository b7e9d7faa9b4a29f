import { defineOperation, type Calculator } from "../schema";
import { platesAnswer, type PlatesAnswer } from "./answer";
import { platesInput, type PlatesInput } from "./input";
import { planPlates, type PlanOptions } from "./plan-plates";
import { presentPlates } from "./present-plates";

export { platesAnswer, type PlatesAnswer } from "./answer";
export { platesInput, type PlatesInput } from "./input";
export type { PlanOptions } from "./plan-plates";

/** Seconds that the API gives a plan at most. */
const mostSecondsAsked = 1;

/**
 * Where the joints go, which board every piece is cut from, and every hole.
 *
 * Units: exact rational inches, as whole numbers of their common measure while planning. Stage 1 is exact: fewest added
 * anchors, then fewest pieces, over every position of every joint. Stage 2 is the best plan found in the time given;
 * `boardsProved`, `provedBound` and `gap` say what is proved of it. The same question has the same answer while the time suffices.
 * Source: the rule's figures (clause and status in the answer); n pieces fit a board when their sum + (n − 1)·kerf is no
 * more than its length − 2·trim; a hole stands across at the bolt's distance to the slab edge less the inset (domain.md N07,
 * correcting NAVEDTRA 14044 p. 1-2).
 *
 * @throws CalculationError as `planPlates` says.
 * @example 28 ft with bolts at 8, 72, 136, 200, 264 and 328 in takes one added anchor at its one joint, and a 16 ft and a 12 ft board, both whole.
 */
export function planSill(input: PlatesInput, options: PlanOptions = {}): PlatesAnswer {
  return presentPlates(planPlates(input, options));
}

/**
 * As `planSill`, within the time the API gives.
 *
 * Units: exact rational inches. Source: see `planSill`.
 *
 * @example Two 72 in pieces do not fit one 144 in board with a kerf of 1/8: they take two.
 */
export function cutPlates(input: PlatesInput): PlatesAnswer {
  return planSill(input, { mostSeconds: mostSecondsAsked });
}

export const platesOperation = defineOperation({
  id: "plates",
  path: "plates",
  input: platesInput,
  answer: platesAnswer,
  calculate: cutPlates,
  examples: [
    {
      id: "oneJoint",
      input: {
        walls: [{ name: "ab", length: "28 ft", bolts: [8, 72, 136, 200, 264, 328].map((station) => ({ station, offset: "2 3/4" })) }],
        stock: [{ length: "16 ft" }, { length: "12 ft" }],
        rule: "us-irc",
      },
      answer: { ok: true, anchorsProved: true, boardsProved: true, addedAnchors: [{ wall: "ab", piece: "AB1" }], joints: [{ at: { exact: "192" } }], boards: [{ uncut: true }, { uncut: true }], cost: 336 },
      source: "arithmetic on domain.md B01 and B03: bolts 64 in apart never stand 7 to 24 in apart astride a joint, so one is added; 16 ft and 12 ft are 28 ft",
    },
    {
      id: "kerf",
      input: { pieces: [{ length: "72", count: 2 }], stock: [{ length: "144" }], kerf: "1/8" },
      answer: { totals: { boards: 2, pieces: 2 }, boardsProved: true },
      source: "domain.md C06: 72 + 1/8 + 72 is 144 1/8",
    },
  ],
});

export const plates: Calculator = {
  name: "plates",
  version: "1.0.0",
  stage: 5,
  operations: [platesOperation],
  sources: [
    { title: "International Residential Code 2024", clause: "R403.1.6, two bolts in every piece, 7 diameters to 12 in from its ends", status: "read", address: "https://molina1998329.wixsite.com/369homeinspectionsll/new-foundation" },
    { title: "NDS, bolt holes", clause: "1/32 to 1/16 in over the bolt", status: "second-hand", address: "https://civilengineeringx.com/bdac/bolts" },
    { title: "NAVEDTRA 14044, Builder 3 & 2, Volume 2 (1994)", clause: "p. 1-2, squared ends, marking and boring; its hole distance corrected by the inset", status: "read", address: "https://constructionmanuals.tpub.com/14044/css/14044_14.htm" },
    { title: "Gilmore and Gomory, A linear programming approach to the cutting-stock problem (1961)", clause: "the bound by patterns", status: "memory" },
    { title: "OR-Library and BPPLIB", clause: "u120_00 and t60_00, known best values", status: "read", address: "https://github.com/mdelorme2/BPPLIB" },
  ],
  cautions: ["code-governs", "engineered-anchors", "recheck-before-cutting", "adhesive-anchors", "young-concrete", "treated-wood", "silica-dust"],
};
