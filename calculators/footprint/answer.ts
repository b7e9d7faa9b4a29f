import { z } from "zod";
import { lengthAnswer } from "../schema";

const nullableLength = lengthAnswer.nullable();
const pull = z.strictObject({ from: z.string(), to: z.string() });

export const footprintAnswer = z
  .strictObject({
    closure: z
      .strictObject({ east: lengthAnswer, north: lengthAnswer, distance: lengthAnswer, oneIn: z.number().nullable().meta({ description: "Length walked over the distance missed; null when it closes" }) })
      .nullable()
      .meta({ description: "Where a walk ends, from where it began; null for readings" }),
    areaSquareFeet: z.number().nullable(),
    areaSquareMetres: z.number().nullable(),
    perimeter: nullableLength,
    corners: z
      .array(
        z.strictObject({
          name: z.string(),
          x: z.number().nullable().meta({ description: "Inches east of A, or along AB with readings; null while not fixed" }),
          y: z.number().nullable().meta({ description: "Inches north of A, or square to AB with readings" }),
          inside: z.boolean().nullable().meta({ description: "Whether it is an inside corner" }),
          angleDegrees: z.number().nullable().meta({ description: "Angle inside the plan" }),
          chalk: z
            .strictObject({ x: z.number(), y: z.number(), fromCorner: lengthAnswer })
            .nullable()
            .meta({ description: "The chalk lines' corner, and its distance from this one; null without an inset" }),
        }),
      )
      .meta({ description: "Counter-clockwise from A" }),
    lines: z.array(
      z.strictObject({
        side: z.string(),
        toward: z.string().nullable().meta({ description: "Its direction; null with readings" }),
        length: lengthAnswer,
        inset: nullableLength,
        chalk: nullableLength.meta({ description: "Length of the chalk line" }),
        middle: z.strictObject({ station: lengthAnswer, x: z.number(), y: z.number() }).meta({ description: "The point half way along the straight edge, where a bowed form is read" }),
      }),
    ),
    checks: z
      .array(
        z.strictObject({
          from: z.string(),
          to: z.string(),
          fixes: z.string().meta({ description: "The corner it places, with the sides or checks to it from corners already placed" }),
          length: lengthAnswer,
          reading: lengthAnswer.meta({ description: "What the tape must read, burn included" }),
          chalk: z.strictObject({ length: lengthAnswer, reading: lengthAnswer }).nullable(),
        }),
      )
      .meta({ description: "The diagonals that with the sides prove every corner; both of a four-sided plan" }),
    bows: z
      .array(
        z.strictObject({
          side: z.string(),
          station: lengthAnswer,
          outward: lengthAnswer.meta({ description: "Negative where the edge stands inside the string" }),
          toChalk: nullableLength.meta({ description: "From the edge there to the chalk line" }),
        }),
      )
      .meta({ description: "Where an edge departs from the straight between its corners" }),
    suspects: z.array(z.strictObject({ run: z.number().int(), would: lengthAnswer })).meta({ description: "Of a walk that misses: each run that alone could be wrong, and what it would be" }),
    adjustment: z
      .strictObject({
        spare: z.number().int().meta({ description: "Readings beyond those needed; with none nothing is checked" }),
        closureIn: z.number().meta({ description: "Root of the sum of squared corrections" }),
        limitIn: z.number().meta({ description: "√m × the reading error" }),
        contradictory: z.boolean(),
        readings: z.array(z.strictObject({ from: z.string(), to: z.string(), measured: lengthAnswer, adjusted: nullableLength, residualIn: z.number().nullable() })),
        suspects: z
          .array(z.strictObject({ from: z.string(), to: z.string(), changeIn: z.number(), likely: z.enum(["burn", "foot"]).nullable() }))
          .meta({ description: "Readings that alone could be wrong, and the change that would close the figure" }),
        otherShapes: z.array(z.array(z.string())).meta({ description: "Other plans that these readings make as well: the inside corners of each" }),
      })
      .nullable()
      .meta({ description: "Least squares adjustment of readings; null for a walk" }),
    unfixed: z.array(z.strictObject({ corner: z.string(), pulls: z.array(pull) })).meta({ description: "Corners the readings do not fix, and the single pulls that would" }),
    fixWith: z.array(pull).meta({ description: "The fewest pulls that would fix everything" }),
    notes: z.array(
      z.strictObject({
        code: z.enum(["clockwise", "collinear", "start-on-side", "closing-leg-added", "balanced", "three-corners"]),
        run: z.number().int().nullable(),
        toward: z.string().nullable(),
        length: nullableLength,
      }),
    ),
  })
  .meta({ id: "FootprintAnswer" });

export type FootprintAnswer = z.output<typeof footprintAnswer>;
