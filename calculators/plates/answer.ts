import { z } from "zod";
import { findingCodes, remedies } from "../anchors";
import { provenanceAnswer, sharedAnswer } from "../anchors/shared-answer";
import { lengthAnswer } from "../schema";

const span = z.strictObject({ from: lengthAnswer, to: lengthAnswer });
const name = z.string();

const hole = z.strictObject({
  station: lengthAnswer.meta({ description: "Along the wall from its first corner" }),
  running: lengthAnswer.meta({ description: "From the piece's own end nearer the wall's first corner" }),
  across: lengthAnswer.nullable().meta({ description: "From the plate's outer edge; null where the bolt's offset was not given" }),
  kind: z.enum(["bolt", "engineered", "added"]),
  bolt: z.number().nullable().meta({ description: "The bolt's place in the wall's list, from 0; null for an added anchor" }),
});

const piece = z.strictObject({
  id: name.meta({ examples: ["AB2"] }),
  wall: name.nullable(),
  from: lengthAnswer.nullable().meta({ description: "Station of its end nearer the wall's first corner" }),
  to: lengthAnswer.nullable(),
  length: lengthAnswer,
  holes: z.array(hole),
  window: span.nullable().meta({ description: "Where the joint at its far end may stand with no further anchor; null when there is no joint" }),
  board: z.number().meta({ description: "Its board's place in boards, from 0" }),
});

export const platesAnswer = z
  .strictObject({
    ok: z.boolean().meta({ description: "Every piece keeps the rule, with the added anchors in" }),
    addedAnchors: z
      .array(z.strictObject({ wall: name, piece: name, station: lengthAnswer, running: lengthAnswer, across: lengthAnswer.nullable(), window: span.meta({ description: "How far it may go either way" }) }))
      .meta({ description: "Anchors to drill in: post-installed, so their approval, edge distance, the concrete's age and the engineer govern" }),
    pieces: z.array(piece),
    joints: z.array(z.strictObject({ wall: name, at: lengthAnswer, window: span, before: name, after: name })),
    boards: z.array(
      z.strictObject({
        stock: lengthAnswer.meta({ description: "The board's length as it lies there" }),
        stockIndex: z.number().meta({ description: "Its place in the request's stock, from 0" }),
        pieces: z.array(name),
        offcut: lengthAnswer.meta({ description: "What is left when the last piece is cut off" }),
        uncut: z.boolean().meta({ description: "One piece as long as the board: no cut at all" }),
      }),
    ),
    cost: z.number(),
    bound: z.number().meta({ description: "The material bound: what boards enough for the whole length cost at least, however it is cut" }),
    provedBound: z.number().meta({ description: "No plan costs less than this; at least bound" }),
    gap: z.number().meta({ description: "How much of the cost a better plan could save at most, 0 to 1; 0 when none can" }),
    anchorsProved: z.boolean().meta({ description: "No joints cost fewer added anchors, nor as few with fewer pieces" }),
    boardsProved: z.boolean().meta({ description: "No boards are cheaper, nor as cheap and fewer, wherever the joints stand in their windows" }),
    ended: z.enum(["proved", "looked", "time"]).meta({ description: "Why the search ended: proved best, looked far enough, or out of time" }),
    totals: z.strictObject({ boards: z.number(), pieces: z.number(), pieceLength: lengthAnswer, boardLength: lengthAnswer, kerfs: lengthAnswer, wasteShare: z.number().meta({ description: "Of the boards' length, not in a piece; 0 to 1" }) }),
    walls: z.array(
      z.strictObject({ name, from: lengthAnswer.meta({ description: "Station where its plate begins: a plate's width in where another wall runs through" }), to: lengthAnswer, pieces: z.array(name), added: z.number(), boltsLeftOut: z.array(z.strictObject({ bolt: z.number(), reason: z.enum(["engineered", "duplicate", "in-opening", "unsound"]) })) }),
    ),
    findings: z
      .array(
        z.strictObject({
          wall: name,
          code: z.enum(findingCodes),
          piece: name.nullable(),
          bolt: z.number().nullable(),
          next: z.number().nullable(),
          ...provenanceAnswer,
          limit: z.union([lengthAnswer, z.number()]).nullable(),
          actual: z.union([lengthAnswer, z.number()]).nullable(),
          remedy: z.enum(remedies),
        }),
      )
      .meta({ description: "What no joint and no added anchor puts right: bolts too near a wall's end, off the middle third, too thin" }),
    astride: z.strictObject({ least: lengthAnswer, most: lengthAnswer }).nullable().meta({ description: "How far apart two bolts on either side of a joint stand under this rule" }),
    notes: z.array(z.strictObject({ code: z.enum(["joints-cost-anchors", "no-bolts-given", "corners-not-given", "shorter-pieces-for-stock"]), wall: name.nullable() })),
    bit: z.strictObject({ size: lengthAnswer, warning: z.enum(["hole-too-big", "hole-too-small"]).nullable() }),
    ...sharedAnswer,
  })
  .meta({ id: "Plates" });

export type PlatesAnswer = z.output<typeof platesAnswer>;
