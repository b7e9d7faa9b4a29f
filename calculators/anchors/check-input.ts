import { z } from "zod";
import { calculatorInput, lengthAnswer } from "../schema";
import { checkFields } from "./fields";
import { provenanceAnswer, sharedAnswer } from "./shared-answer";

export const checkInput = calculatorInput(checkFields);
export type CheckInput = z.output<typeof checkInput>;

export const findingCodes = ["too-few", "near-end", "far-end", "spacing", "middle-third", "slab-edge", "under-joist", "too-short", "diameter", "off-piece"] as const;
export type FindingCode = (typeof findingCodes)[number];
export const remedies = ["add-anchor", "move-joint", "longer-piece", "ask-engineer", "move-joist", "extend-bolt", "thicker-anchor", "no-plate-here"] as const;
export type Remedy = (typeof remedies)[number];

/** Tests that could not be made, since what they need was not given. */
export const untestedCodes = ["middle-third", "slab-edge", "under-joist", "too-short"] as const;

export const checkAnswer = z
  .strictObject({
    ok: z.boolean(),
    pieces: z.array(z.strictObject({ from: lengthAnswer, to: lengthAnswer, length: lengthAnswer, bolts: z.number().meta({ description: "Bolts that count on it" }) })),
    bolts: z.array(z.strictObject({ station: lengthAnswer, offset: lengthAnswer.nullable(), engineered: z.boolean() })).meta({ description: "As they stand from the chalk" }),
    findings: z.array(
      z.strictObject({
        code: z.enum(findingCodes),
        piece: z.number().nullable().meta({ description: "Its place in the request, from 0" }),
        bolt: z.number().nullable().meta({ description: "Its place in the request, from 0" }),
        next: z.number().nullable().meta({ description: "The other bolt of a spacing" }),
        ...provenanceAnswer,
        limit: z.union([lengthAnswer, z.number()]).nullable().meta({ description: "What the rule asks; a number of bolts for too-few" }),
        actual: z.union([lengthAnswer, z.number()]).nullable(),
        remedy: z.enum(remedies),
      }),
    ),
    additions: z.array(
      z.strictObject({
        piece: z.number(),
        station: lengthAnswer.meta({ description: "From the wall's first corner" }),
        hole: lengthAnswer.meta({ description: "From the piece's own first end" }),
        across: lengthAnswer.nullable().meta({ description: "From the plate's outer edge: its middle" }),
      }),
    ).meta({ description: "The fewest added anchors that satisfy the rule, and where. Post-installed: their approval and the engineer govern" }),
    unfixable: z.array(z.strictObject({ piece: z.number(), code: z.enum(["piece-too-short", "no-room"]), least: lengthAnswer.nullable() })).meta({ description: "Pieces that no added anchor can put right" }),
    converted: z.array(z.strictObject({ bolt: z.number(), station: lengthAnswer, offset: lengthAnswer.nullable(), stationBy: lengthAnswer, offsetBy: lengthAnswer })).meta({ description: "Bolts measured from the slab, as they stand from the chalk" }),
    untested: z.array(z.strictObject({ code: z.enum(untestedCodes), bolts: z.array(z.number()) })).meta({ description: "Tests that lack a figure" }),
    engineered: z.array(z.number()).meta({ description: "Bolts left out of every test" }),
    thirds: z.strictObject({ from: lengthAnswer, to: lengthAnswer }).nullable().meta({ description: "The plate's middle third, from its outer edge" }),
    projection: lengthAnswer.meta({ description: "What a bolt must stand above the concrete: plate, washer and nut" }),
    ...sharedAnswer,
    warnings: z.array(
      z.strictObject({
        code: z.enum(["shank-leaves-third", "washer-edge", "duplicate-bolt", "hole-too-big", "hole-too-small"]),
        bolt: z.number().nullable(),
        other: z.number().nullable(),
        ...provenanceAnswer,
        limit: lengthAnswer.nullable(),
        actual: lengthAnswer.nullable(),
      }),
    ),
  })
  .meta({ id: "AnchorCheck" });

export type CheckAnswer = z.output<typeof checkAnswer>;
export type Finding = CheckAnswer["findings"][number];
