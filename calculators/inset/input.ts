import { z } from "zod";
import { calculatorInput, lengthField, orRequired } from "../schema";

export const sides = ["ab", "bc", "cd", "da"] as const;
export type Side = (typeof sides)[number];
export type Diagonal = "ac" | "bd";

const insetOf = (side: string) => lengthField({ sign: "any", description: `Inset of ${side}, from slab edge to chalk line; negative overhangs`, example: "7/16" });
const veneerOf = (side: string) => lengthField({ sign: "not-negative", description: `Veneer setback of ${side}, added to its inset`, example: "4 1/2" });
const reading = (description: string, example: string) => lengthField({ description, example });
const burn = (description: string) => lengthField({ sign: "not-negative", description, example: "1" });

export const insetInput = calculatorInput({
  length: lengthField({ description: "Slab edges AB and CD", example: "28 ft" }),
  width: lengthField({ description: "Slab edges BC and DA", example: "40 ft" }),
  inset: z
    .union([insetOf("every side"), z.strictObject({ ab: insetOf("AB"), bc: insetOf("BC"), cd: insetOf("CD"), da: insetOf("DA") })], orRequired("expected-length"))
    .meta({ description: "From slab edge to chalk line, square to the edge: one for all sides, or one each" }),
  veneer: z
    .union([veneerOf("every side"), z.strictObject({ ab: veneerOf("AB").optional(), bc: veneerOf("BC").optional(), cd: veneerOf("CD").optional(), da: veneerOf("DA").optional() })], orRequired("expected-length"))
    .optional()
    .meta({ description: "Setback for masonry veneer, added to the inset: one for all sides, or for some" }),
  burn: burn("Where the tape was held: taken off every reading").optional(),
  burns: z.strictObject({ ac: burn("Burn of AC").optional(), bd: burn("Burn of BD").optional() }).optional().meta({ description: "Another burn for one diagonal, on the slab and on the chalk" }),
  chalkBurns: z
    .strictObject({ ac: burn("Burn of AC").optional(), bd: burn("Burn of BD").optional(), ab: burn("Burn of AB").optional(), bc: burn("Burn of BC").optional(), cd: burn("Burn of CD").optional(), da: burn("Burn of DA").optional() })
    .optional()
    .meta({ description: "Another burn for one reading on the chalk" }),
  slabDiagonals: z
    .strictObject({ ac: reading("Diagonal AC of the slab, as read", "48' 9 15/16\""), bd: reading("Diagonal BD of the slab, as read", "48' 9 15/16\"") })
    .optional()
    .meta({ description: "Diagonals of the concrete as read, burn included" }),
  chalkDiagonals: z
    .strictObject({ ac: reading("Diagonal AC of the chalk, as read", "48' 8 5/8\""), bd: reading("Diagonal BD of the chalk, as read", "48' 8 5/8\"") })
    .optional()
    .meta({ description: "Diagonals of the chalk lines as read, burn included" }),
  chalkLines: z
    .strictObject({
      ab: reading("Chalk line AB, as read", "27' 11 1/8\"").optional(),
      bc: reading("Chalk line BC, as read", "39' 11 1/8\"").optional(),
      cd: reading("Chalk line CD, as read", "27' 11 1/8\"").optional(),
      da: reading("Chalk line DA, as read", "39' 11 1/8\"").optional(),
    })
    .optional()
    .meta({ description: "Lengths of the chalk lines as read, burn included: they tell which line is off" }),
  readingError: lengthField({ description: "How far a reading may be off", example: "1/8" }).optional(),
});

export type InsetInput = z.output<typeof insetInput>;
