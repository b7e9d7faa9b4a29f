import { z } from "zod";
import { flagField, lengthField } from "../schema";
import { ruleField } from "../rules";

/** Joists or studs that a bolt must keep clear of, by the station of their centres. */
const membersField = z
  .strictObject({
    stations: z
      .array(lengthField({ sign: "any", description: "Station of a joist's or stud's centre", example: "16" }))
      .max(200)
      .optional(),
    spacing: lengthField({ description: "Or centres at every so much", example: "16" }).optional(),
    first: lengthField({ sign: "any", description: "beginning here; one spacing when left out", example: "16" }).optional(),
    thickness: lengthField({ description: "Thickness of one, 1 1/2 in when left out", example: "1 1/2" }).optional(),
    clearance: lengthField({ sign: "not-negative", description: "Room wanted between member and shank", example: "0" }).optional(),
  })
  .optional()
  .meta({ description: "Joists or studs to keep clear of" });

/** What layout and check both ask. */
export const sharedFields = {
  rule: ruleField,
  diameter: lengthField({ description: "Bolt diameter; the rule's least when left out", example: "1/2" }).optional(),
  endDistance: lengthField({ sign: "not-negative", description: "From a piece's end to its first bolt, 8 in when left out", example: "8 in" }).optional(),
  members: membersField,
  joinsOffsetPanels: flagField({ description: "The whole wall is short and joins offset braced wall panels: the rule's short-wall exceptions may apply" }).optional(),
  hole: lengthField({ description: "Size of the bit for the holes", example: "9/16" }).optional(),
  shearWall: flagField({ description: "An engineered shear wall: the washer's edge is held to the sheathed edge" }).optional(),
  washer: lengthField({ description: "Side of the plate washer used; the rule's when left out", example: "3 in" }).optional(),
};

const insetOf = (side: string) => lengthField({ sign: "any", description: `Inset of ${side}`, example: "7/16" });

export const layoutFields = {
  ...sharedFields,
  pieces: z
    .array(lengthField({ description: "Length of a plate piece, in the order they lie", example: "16 ft" }))
    .min(1)
    .max(60)
    .meta({ description: "The wall's pieces, end to end from its first corner" }),
  module: lengthField({ description: "Place bolts on multiples of this only", example: "16" }).optional(),
  moduleStart: lengthField({ sign: "any", description: "Station of one mark of the module, 0 when left out", example: "8" }).optional(),
};

const wallName = z.enum(["ab", "bc", "cd", "da"]);

export const checkFields = {
  ...sharedFields,
  pieces: z
    .array(z.strictObject({ from: lengthField({ sign: "any", description: "Station where the piece begins", example: "0" }), to: lengthField({ sign: "any", description: "Station where it ends", example: "16 ft" }) }))
    .min(1)
    .max(60),
  bolts: z
    .array(
      z.strictObject({
        station: lengthField({ sign: "any", description: "Along the wall from its first corner", example: "8" }),
        offset: lengthField({ sign: "any", description: "Square in from the chalk line, or from the slab edge", example: "2 1/4" }).optional(),
        from: z.enum(["chalk", "slab"]).default("chalk").meta({ description: "What station and offset were measured from" }),
        projection: lengthField({ description: "Standing above the concrete", example: "2 1/2" }).optional(),
        diameter: lengthField({ description: "Its diameter where it differs", example: "1/2" }).optional(),
        engineered: flagField({ description: "Hold-down, strap or other engineered anchor: never judged, moved or counted" }).optional(),
      }),
    )
    .max(200)
    .default([]),
  plateWidth: lengthField({ description: "Plate width as measured", example: "5 1/2" }).optional(),
  plateThickness: lengthField({ description: "Thickness of all plates the bolt goes through, 1 1/2 in when left out", example: "1 1/2" }).optional(),
  washerThickness: lengthField({ description: "The rule's plate washer, else 1/8 in, when left out", example: "1/8" }).optional(),
  wall: wallName.default("ab").meta({ description: "Which wall this is: says which insets hold at its first corner" }),
  inset: z
    .union([insetOf("every side"), z.strictObject({ ab: insetOf("AB"), bc: insetOf("BC"), cd: insetOf("CD"), da: insetOf("DA") })], { error: (issue) => (issue.input === undefined ? "required" : "expected-length") })
    .optional()
    .meta({ description: "From slab edge to chalk line: needed for bolts measured from the slab" }),
  clearOfBolts: lengthField({ sign: "not-negative", description: "Room kept between an added anchor and a bolt in the concrete, 3 in when left out", example: "3" }).optional(),
};
