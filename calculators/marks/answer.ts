import { z } from "zod";
import { lengthAnswer } from "../schema";

const conflict = z.strictObject({
  line: z.enum(["here", "opposite"]),
  joist: z.number().meta({ description: "Its place in joists (or oppositeJoists), from 0" }),
  bolt: z.number().meta({ description: "Its place in the request, from 0" }),
  hits: z.enum(["bolt", "washer"]).meta({ description: "bolt: the shank stands under the joist; washer: only its washer or nut does" }),
  overlap: lengthAnswer.meta({ description: "How far the joist lies over it" }),
  move: lengthAnswer.meta({ description: "The least the joist must move to clear bolt, washer and the clearance asked" }),
  toward: z.enum(["start", "end"]),
});

const joist = z.strictObject({
  kind: z.enum(["first", "layout", "tight", "last"]).meta({ description: "tight: its place would overlap the last, so it stands against it" }),
  mark: lengthAnswer.meta({ description: "Near edge, from the end the marks run from; the X goes beyond the line" }),
  centre: lengthAnswer,
  far: lengthAnswer.meta({ description: "Far edge" }),
});

export const marksAnswer = z
  .strictObject({
    marks: z.array(lengthAnswer).meta({ description: "Running marks from one end, near edges, each rounded from zero" }),
    lastBay: lengthAnswer.meta({ description: "From the centre of the last mark to the far end, measured as the first bay is" }),
    lastClear: lengthAnswer.meta({ description: "Clear space in that bay" }),
    lastBayOver: z.boolean().meta({ description: "The last two stand further apart on centre than the spacing" }),
    conflicts: z.array(conflict),
    bolts: z.array(z.strictObject({ line: z.enum(["here", "opposite"]), station: lengthAnswer, washer: lengthAnswer })).meta({ description: "The bolts as asked, with the washer each was taken to have" }),
    joists: z.array(joist).meta({ description: "All of them, with those at both ends" }),
    opposite: z.array(lengthAnswer).nullable().meta({ description: "Marks on the opposite wall when joists lap" }),
    oppositeJoists: z.array(joist).nullable(),
    bays: z.number(),
    sheetBreaks: z.array(z.strictObject({ at: lengthAnswer, onJoist: z.boolean().meta({ description: "Its edge falls on a joist's centre" }) })),
    stepping: z
      .strictObject({ step: lengthAnswer, last: lengthAnswer, off: lengthAnswer })
      .nullable()
      .meta({ description: "What the last mark would come to by adding up the rounded spacing; null when that is exact" }),
  })
  .meta({ id: "Marks" });

export type MarksAnswer = z.output<typeof marksAnswer>;
