import { z } from "zod";
import { perSide } from "../geometry/per-side";
import { calculatorInput, lengthField } from "../schema";

export const modes = ["size-held", "size-free", "wall-held", "follow"] as const;
export type Mode = (typeof modes)[number];

const place = (axis: string) => lengthField({ sign: "any", description: `${axis} of the slab's corner`, example: "336 1/4" });
const side = (name: string) => lengthField({ description: `Side ${name} as read, burn included`, example: "28'" });
const burnOf = (name: string) => lengthField({ sign: "not-negative", description: `Where the tape was held for ${name}`, example: "1" });
const sideWord = z.string({ error: (issue) => (issue.input === undefined ? "required" : "side-unknown") }).meta({ description: "A side, such as ab", examples: ["ab"] });

export const fitInput = calculatorInput({
  corners: z
    .record(z.string(), z.strictObject({ x: place("x"), y: place("y") }))
    .optional()
    .meta({ description: "The slab's corners as built, A, B, C … counter-clockwise; A to Z", examples: [{ A: { x: 0, y: 0 }, B: { x: 336, y: 0 }, C: { x: "336 1/4", y: 288 }, D: { x: 0, y: 288 } }] }),
  length: lengthField({ description: "Instead of corners: size of the slab's AB and CD, never burned", example: "28 ft" }).optional(),
  width: lengthField({ description: "Size of the slab's BC and DA, never burned", example: "24 ft" }).optional(),
  sides: z
    .strictObject({ ab: side("AB"), bc: side("BC").optional(), cd: side("CD").optional(), da: side("DA") })
    .optional()
    .meta({ description: "Instead of length and width: two sides (ab, da) or four as read" }),
  diagonals: z.strictObject({ ac: side("AC"), bd: side("BD") }).optional().meta({ description: "The slab's diagonals as read" }),
  burn: lengthField({ sign: "not-negative", description: "Where the tape was held: taken off sides and diagonals, added to the readings of checks", example: "1" }).optional(),
  burns: z
    .strictObject({ ab: burnOf("AB").optional(), bc: burnOf("BC").optional(), cd: burnOf("CD").optional(), da: burnOf("DA").optional(), ac: burnOf("AC").optional(), bd: burnOf("BD").optional() })
    .optional()
    .meta({ description: "Another burn for one reading" }),
  size: z
    .strictObject({ length: lengthField({ description: "Wanted AB and CD, chalk to chalk", example: "27' 11\"" }), width: lengthField({ description: "Wanted BC and DA, chalk to chalk", example: "23' 11\"" }) })
    .optional()
    .meta({ description: "The wanted rectangle" }),
  walk: z.string().optional().meta({ description: "The wanted plan of chalk lines, walked round from A", examples: ["E 39' 11\", N 19' 11\", W 16 ft, N 12 ft, W 23' 11\", S 31' 11\""] }),
  mode: z
    .enum(modes, { error: (issue) => (issue.input === undefined ? "required" : undefined) })
    .optional()
    .meta({ description: "size-held moves the plan as one rigid piece; size-free keeps its angles alone; wall-held keeps one chalk line along its slab edge; follow runs parallel to every edge. size-held unless no size is given" }),
  held: sideWord.optional().meta({ description: "The wall that wall-held keeps; ab unless given" }),
  inset: perSide({ sign: "any", description: "Wanted distance from slab edge to chalk line; negative overhangs", example: "7/16" }),
  overhang: lengthField({ sign: "not-negative", description: "The most a chalk line may hang over the edge; 0 unless given", example: "1/4" }).optional(),
  edges: z
    .array(
      z.strictObject({
        wall: sideWord,
        station: lengthField({ sign: "not-negative", description: "Distance along the slab edge from its first corner", example: "14 ft" }),
        offset: lengthField({ sign: "any", description: "How far the edge stands outside a string from corner to corner; negative inside it", example: "3/8" }),
      }),
    )
    .max(60)
    .optional()
    .meta({ description: "Places read along bowed edges" }),
  bolts: z
    .array(
      z.strictObject({
        wall: sideWord,
        station: lengthField({ sign: "any", description: "Distance along the slab edge from its first corner", example: "2 ft" }),
        offset: lengthField({ sign: "any", description: "From the slab edge to the bolt's centre", example: "2 3/4" }),
      }),
    )
    .max(200)
    .optional()
    .meta({ description: "Bolts as poured, from the slab's corners and edges" }),
});

export type FitInput = z.output<typeof fitInput>;
