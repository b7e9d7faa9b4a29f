import { z } from "zod";
import { calculatorInput, lengthField, numberField, flagField } from "../schema";

const bolt = z.strictObject({
  station: lengthField({ sign: "any", description: "Along the wall from the end the marks run from", example: "8" }),
  diameter: lengthField({ description: "Its diameter where it differs", example: "1/2" }).optional(),
  washer: lengthField({ description: "Its washer where it differs, across", example: "3" }).optional(),
});

export const marksInput = calculatorInput({
  length: lengthField({ description: "Of the wall or rim, end to end", example: "28 ft" }),
  spacing: lengthField({ description: "On centre", example: "16" }),
  thickness: lengthField({ description: "Of a joist or stud, 1 1/2 in when left out", example: "1 1/2" }).optional(),
  first: lengthField({ sign: "not-negative", description: "Centre of the first one after the end; one spacing from the end when left out, so that sheets break on centre", example: "16" }).optional(),
  sheet: lengthField({ description: "Length of a sheet, 8 ft or 2400 mm by the spacing when left out", example: "8 ft" }).optional(),
  lapped: flagField({ description: "Joists lap over a girder: the opposite wall's marks shift by a thickness" }).optional(),
  lap: z.enum(["before", "after"]).default("before").meta({ description: "Which side of this wall's joists the opposite ones lie on, seen along the marks" }),
  bolts: z.array(bolt).max(200).default([]).meta({ description: "Bolts in this wall's plate" }),
  oppositeBolts: z.array(bolt).max(200).default([]).meta({ description: "Bolts in the opposite wall's plate, by the same end" }),
  diameter: lengthField({ description: "Of the bolts, 1/2 in when left out", example: "1/2" }).optional(),
  washer: lengthField({ description: "Width of the washers, 1 3/8 in when left out", example: "3" }).optional(),
  clearance: lengthField({ sign: "not-negative", description: "Room wanted between a joist and a washer, none when left out", example: "1/4" }).optional(),
  mostMarks: numberField({ minimum: 1, maximum: 1000, whole: true, description: "Refuse more marks than this, 1000 when left out", example: 1000 }).optional(),
});

export type MarksInput = z.output<typeof marksInput>;
