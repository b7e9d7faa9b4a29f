import { z } from "zod";
import { lengthAnswer } from "../schema";
import { blunders } from "./blunders/find-suspects";
import { cornerNames } from "./figure/corners";
import { readingNames } from "./input";
import { exceedings } from "./tolerance/allow";
import { presetIds } from "./tolerance/presets";

export const shapes = ["square", "racked", "tapered", "irregular"] as const;
export const verdicts = ["square", "within", "out", "contradictory"] as const;
export const proofs = ["rack-if-sides-match", "taper-unknown", "sides-agree", "sides-disagree", "corners-solved", "readings-close", "readings-disagree", "equal-diagonals-not-square", "scale-unchecked"] as const;

const cornerName = z.enum(cornerNames);
const readingName = z.enum(readingNames);

const cornerAnswer = z.strictObject({ x: z.number(), y: z.number(), angleDegrees: z.number() }).meta({ id: "SquarenessCorner", description: "Inches: A at the origin, B on x, C and D on y's side" });

const tapePart = z.strictObject({ length: z.number(), temperature: z.number(), pull: z.number(), sag: z.number(), total: z.number() }).meta({ id: "TapeCorrection", description: "Inches added to what the tape showed" });

const readingAnswer = z
  .strictObject({
    reading: lengthAnswer.nullable().meta({ description: "As the tape showed it, burn included; null for a size" }),
    correctionIn: tapePart.nullable().meta({ description: "null without `tape`, and for a size" }),
    measured: lengthAnswer.meta({ description: "Burn taken off, tape corrected" }),
    adjusted: lengthAnswer.nullable().meta({ description: "In the nearest figure that closes; null with two sides" }),
    residualIn: z.number().nullable().meta({ description: "Adjusted less measured; null with two sides" }),
  })
  .meta({ id: "SquarenessReading" });

const pullEnd = z
  .strictObject({
    corner: cornerName,
    toward: cornerName.nullable().meta({ description: "The corner that the mark stands toward; null at the corner itself" }),
    distance: lengthAnswer.nullable().meta({ description: "From the corner to the mark; null at the corner itself" }),
  })
  .meta({ id: "PullEnd", description: "One end of a pull" });

const allowed = { difference: lengthAnswer, taper: lengthAnswer };

export const squarenessAnswer = z
  .strictObject({
    shape: z.enum(shapes).meta({ description: "By one graduation of the precision; with two sides the taper is unknown and left out" }),
    verdict: z.enum(verdicts).nullable().meta({ description: "null when no tolerance was given and the readings can close" }),
    exceeds: z.array(z.enum(exceedings)).meta({ description: "In what the slab goes past the tolerance" }),
    allowed: z.strictObject(allowed).nullable().meta({ description: "What the tolerance allows on this slab; null without one" }),
    presets: z
      .array(z.strictObject({ id: z.enum(presetIds), ...allowed, status: z.enum(["read", "second-hand", "memory", "derived", "practice"]), source: z.string().nullable().meta({ description: "The work it is from; null for common practice" }) }))
      .meta({ description: "What each named tolerance allows on this slab" }),
    difference: lengthAnswer.meta({ description: "Of the diagonals, after burn and tape" }),
    longer: z.enum(["ac", "bd"]).nullable().meta({ description: "The longer diagonal; null when both measure the same" }),
    taper: z.strictObject({ length: lengthAnswer, width: lengthAnswer }).nullable().meta({ description: "How far AB and CD, BC and DA differ, adjusted; null with two sides" }),
    target: z
      .strictObject({
        diagonal: lengthAnswer.meta({ description: "Of both diagonals once CD is moved" }),
        reading: lengthAnswer.meta({ description: "The same as the tape will show it, burn included" }),
        readings: z.strictObject({ ac: lengthAnswer, bd: lengthAnswer }).meta({ description: "The same, where the two are burned differently" }),
      })
      .meta({ description: "What both diagonals must then read" }),
    rack: z.strictObject({
      distance: lengthAnswer.meta({ description: "How far the far side must slide along itself" }),
      side: z.literal("cd"),
      toward: z.enum(["C", "D"]).nullable().meta({ description: "D when AC is longer, C when BD is; null when neither" }),
    }),
    corners: z.strictObject({ A: cornerAnswer, B: cornerAnswer, C: cornerAnswer, D: cornerAnswer }),
    readings: z.strictObject({ ab: readingAnswer, bc: readingAnswer.nullable(), cd: readingAnswer.nullable(), da: readingAnswer, ac: readingAnswer, bd: readingAnswer }),
    closureIn: z.number().meta({ description: "How far the readings are from any figure: root of the summed squared residuals; with two sides the mean diagonal's departure from √(AB² + DA²)" }),
    closureLimitIn: z.number().meta({ description: "2.45 times the reading error" }),
    suspects: z
      .array(
        z.strictObject({
          reading: readingName,
          changeIn: z.number().meta({ description: "To be added to the reading; that alone closes the figure" }),
          likely: z.enum(blunders),
          shown: lengthAnswer.meta({ description: "What the reading would then have been, without its burn" }),
        }),
      )
      .meta({ description: "Every reading that one blunder explains, closest first" }),
    separatingPull: z
      .strictObject({
        kind: z.enum(["again", "new-side", "triangle", "mid"]),
        from: pullEnd,
        to: pullEnd,
        separatesAll: z.boolean(),
        expected: z.array(z.strictObject({ suspect: readingName, length: lengthAnswer, reading: lengthAnswer.meta({ description: "The same with the common burn" }) })).meta({ description: "What it shows if that reading is the wrong one" }),
      })
      .nullable()
      .meta({ description: "The shortest pull that tells the suspects apart; null when none is named" }),
    proves: z.array(z.enum(proofs)).meta({ description: "What these readings can and cannot prove" }),
  })
  .meta({ id: "SquarenessAnswer" });

export type SquarenessAnswer = z.output<typeof squarenessAnswer>;
