import { z } from "zod";
import { lengthAnswer } from "../schema";
import { modes } from "./input";

const bySide = <T extends z.ZodType>(item: T, description: string) => z.record(z.string(), item).meta({ description });
const offsets = bySide(bySide(lengthAnswer, "By side: ab, da …"), "At each chalk corner, from the two slab edges, square to the edge; negative overhangs");
const where = z.strictObject({ side: z.string(), corner: z.string().nullable(), station: lengthAnswer }).meta({ description: "The side, and the corner or the place along the slab edge" });

const range = z.strictObject({
  least: lengthAnswer,
  most: lengthAnswer,
  leastAt: lengthAnswer.meta({ description: "Station along the slab edge" }),
  mostAt: lengthAnswer.meta({ description: "Station along the slab edge" }),
  stretches: z
    .array(z.strictObject({ from: lengthAnswer, to: lengthAnswer, stands: z.enum(["proud", "shy"]), most: lengthAnswer.meta({ description: "By how much at most, without sign" }) }))
    .meta({ description: "Where sheathing as thick as the wanted inset stands proud of the concrete (less inset) or shy of it (more), past half a graduation" }),
});

const alternative = z.strictObject({
  way: z.enum(["hold", "best", "follow"]),
  mode: z.enum(modes),
  worst: lengthAnswer,
  worstAt: where,
  overhang: lengthAnswer.meta({ description: "The most any chalk line hangs over; 0 when none does" }),
  fits: z.boolean().meta({ description: "Whether the overhang limit is kept" }),
  outOfSquareDegrees: z.number().meta({ description: "The most a chalk corner departs from the wanted angle" }),
  diagonalDifference: lengthAnswer.nullable().meta({ description: "|AC − BD| of a four-sided chalk less that of the wanted plan; null otherwise" }),
  offsets,
  lines: bySide(lengthAnswer, "Lengths of the chalk lines"),
});

export const fitAnswer = z
  .strictObject({
    mode: z.enum(modes),
    worst: lengthAnswer.meta({ description: "The worst departure from the wanted inset" }),
    worstAt: where,
    fits: z.boolean().meta({ description: "Whether the overhang limit is kept everywhere" }),
    overhang: lengthAnswer.meta({ description: "The most any chalk line hangs over; 0 when none does" }),
    overhangNeeded: lengthAnswer.nullable().meta({ description: "When it does not fit: the least overhang any place and turn would need" }),
    turnDegrees: z.number().meta({ description: "How far chalk AB is turned from slab edge AB, counter-clockwise" }),
    corners: z.record(z.string(), z.strictObject({ x: z.number(), y: z.number() })).meta({ description: "Chalk corners, inches in the slab's own axes" }),
    slab: z.record(z.string(), z.strictObject({ x: z.number(), y: z.number() })).meta({ description: "The slab's corners as used" }),
    offsets,
    ranges: bySide(range, "Along each wall, from slab edge to chalk line"),
    lines: bySide(lengthAnswer, "Lengths of the chalk lines"),
    checks: z
      .array(z.strictObject({ from: z.string(), to: z.string(), fixes: z.string(), length: lengthAnswer, reading: lengthAnswer.meta({ description: "Burn included" }) }))
      .meta({ description: "Diagonals of the chalk that prove it" }),
    bolts: z
      .array(z.strictObject({ wall: z.string(), station: lengthAnswer.meta({ description: "From the chalk corner, along the chalk line" }), offset: lengthAnswer.meta({ description: "From the chalk line, inward" }) }))
      .meta({ description: "What each bolt given becomes; ready for anchors/check with from chalk" }),
    optimal: z
      .strictObject({
        proved: z.boolean().meta({ description: "Whether the search came to its end" }),
        lowerBoundIn: z.number().meta({ description: "No place and turn of the plan has a worst departure below this, inches" }),
        gapIn: z.number(),
        active: z
          .array(z.strictObject({ side: z.string(), corner: z.string().nullable(), station: lengthAnswer, departureIn: z.number(), multiplier: z.number() }))
          .meta({ description: "The places that hold each other in balance, with their multipliers (together 1): no slide or turn betters one without worsening another" }),
      })
      .meta({ description: "The certificate" }),
    alternatives: z.array(alternative).length(3).meta({ description: "Hold a wall, best fit, follow the concrete" }),
  })
  .meta({ id: "FitAnswer" });

export type FitAnswer = z.output<typeof fitAnswer>;
