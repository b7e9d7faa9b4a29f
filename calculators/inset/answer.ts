import { z } from "zod";
import { lengthAnswer } from "../schema";
import { sides } from "./input";

const perDiagonal = <T extends z.ZodType>(item: T) => z.strictObject({ ac: item, bd: item });
const cornerName = z.enum(["A", "B", "C", "D"]);
const point = z.strictObject({ x: z.number(), y: z.number() });
const cornerAnswer = z.strictObject({
  slab: point.meta({ description: "Inches from A, x along AB" }),
  chalk: point,
  angleDegrees: z.number().meta({ description: "Angle of the slab's corner" }),
  fromCorner: lengthAnswer.meta({ description: "From the slab's corner straight to the chalk's" }),
});

export const insetSuspect = z.strictObject({
  line: z.enum(sides).nullable().meta({ description: "The chalk line that alone would have to be off, or whose one mark would" }),
  end: cornerName.nullable().meta({ description: "The corner of the one mark; null for the whole line" }),
  reading: z.string().nullable().meta({ description: "The field of a reading that alone would have to be wrong", examples: ["chalkDiagonals.ac"] }),
  off: lengthAnswer.meta({ description: "How far, without sign" }),
  toward: z.enum(["in", "out", "more", "less"]).meta({ description: "in: the line stands too far in; out: too far out; more, less: what the reading should have been" }),
  fits: z.boolean().meta({ description: "Whether this alone explains every reading" }),
  likely: z.enum(["burn", "foot"]).nullable().meta({ description: "A reading off by about the burn, or by a foot" }),
});

export const insetAnswer = z
  .strictObject({
    lines: z.strictObject({ ab: lengthAnswer, bc: lengthAnswer, cd: lengthAnswer, da: lengthAnswer }).meta({ description: "Lengths of the chalk lines, exact; on a racked slab they differ by less than lineBound" }),
    lineBound: z.number().meta({ description: "The most, in inches, that a racked slab's lines differ from lines: (inset + inset)(1/sin A − 1)" }),
    diagonal: lengthAnswer.meta({ description: "Diagonal of a true rectangle of these lines" }),
    reading: lengthAnswer.meta({ description: "The same as the tape must read, burn included" }),
    slabDiagonal: lengthAnswer.meta({ description: "Diagonal of a true rectangle of the slab's size" }),
    drop: lengthAnswer.meta({ description: "How much shorter the chalk's diagonal is than the slab's, both true" }),
    drops: perDiagonal(lengthAnswer).meta({ description: "The same for each diagonal of this slab, racked as its diagonals say" }),
    expected: perDiagonal(z.strictObject({ diagonal: lengthAnswer, reading: lengthAnswer })).meta({ description: "What each chalk diagonal should be with every line at its inset" }),
    offsets: z.strictObject({
      A: z.strictObject({ ab: lengthAnswer, da: lengthAnswer }),
      B: z.strictObject({ ab: lengthAnswer, bc: lengthAnswer }),
      C: z.strictObject({ bc: lengthAnswer, cd: lengthAnswer }),
      D: z.strictObject({ cd: lengthAnswer, da: lengthAnswer }),
    }),
    corners: z.strictObject({ A: cornerAnswer, B: cornerAnswer, C: cornerAnswer, D: cornerAnswer }),
    check: z
      .strictObject({
        agrees: z.boolean(),
        closureIn: z.number().meta({ description: "√Σ(r²/k) over the misclosures r of k readings each" }),
        limitIn: z.number().meta({ description: "2.45 × the reading error" }),
        drops: perDiagonal(z.strictObject({ measured: lengthAnswer, difference: lengthAnswer })).nullable().meta({ description: "Measured drops, and how much they exceed the expected" }),
      })
      .nullable()
      .meta({ description: "null until something was read on the chalk" }),
    suspects: z.array(insetSuspect).meta({ description: "For each line how far it alone would have to be off; then single marks and readings that alone explain all. Empty while the readings agree" }),
    ask: z.enum(["slab-diagonals", "chalk-lines", "offsets"]).nullable().meta({ description: "What to read next to part the suspects that fit" }),
    warnings: z.array(z.strictObject({ code: z.enum(["slab-contradictory", "slab-racked", "overhang"]), by: lengthAnswer })),
  })
  .meta({ id: "InsetAnswer" });

export type InsetAnswer = z.output<typeof insetAnswer>;
