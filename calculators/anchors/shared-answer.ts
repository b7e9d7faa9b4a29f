import { z } from "zod";
import type { Precision, Length } from "../length";
import { figureNames, figureStatuses, notStatedBy, ruleAnswer, type Rule } from "../rules";
import { lengthAnswer, measure } from "../schema";
import { bitAnswer, holeRange, holeSource } from "./hardware";
import type { Limits } from "./limits";

export const provenanceAnswer = {
  clause: z.string().nullable(),
  source: z.string().nullable(),
  status: z.enum(figureStatuses).nullable(),
};

/** What layout and check both answer about the rule. */
export const sharedAnswer = {
  rule: z.strictObject({ id: ruleAnswer.shape.id.unwrap(), title: ruleAnswer.shape.title.unwrap() }),
  limits: z.strictObject({
    diameter: lengthAnswer,
    spacing: lengthAnswer.nullable(),
    endMinimum: lengthAnswer.nullable(),
    endMaximum: lengthAnswer.nullable(),
    wallEndMaximum: lengthAnswer.nullable(),
    boltsPerPiece: z.number().nullable(),
  }),
  notStated: z.array(z.enum(figureNames)).meta({ description: "Figures this rule does not state: nothing is judged by them" }),
  exception: z.strictObject({ bolts: z.number(), upTo: lengthAnswer, ...provenanceAnswer }).nullable().meta({ description: "The short-wall exception that holds here" }),
  hole: z.strictObject({ least: lengthAnswer, most: lengthAnswer, navy: lengthAnswer, ...provenanceAnswer }).meta({ description: "Holes for this bolt; navy: the 1/4 in over of an older builder course" }),
  washer: z
    .strictObject({ size: lengthAnswer, thickness: lengthAnswer.nullable(), slotLength: lengthAnswer.nullable(), slotWidth: lengthAnswer.nullable(), ...provenanceAnswer })
    .nullable()
    .meta({ description: "Plate washers, where the rule states them" }),
};

export function answerAboutRule(rule: Rule, limits: Limits, exception: Rule["shortWalls"][number] | null, precision: Precision) {
  const show = (value: Length) => measure(value, precision);
  const orNull = (value: Length | null) => (value === null ? null : show(value));
  const { washer } = rule;
  const { least, most, navy } = holeRange(limits.diameter);
  return {
    rule: { id: rule.id, title: rule.title },
    limits: {
      diameter: show(limits.diameter),
      spacing: orNull(limits.spacing),
      endMinimum: orNull(limits.endMinimum),
      endMaximum: orNull(limits.endMaximum),
      wallEndMaximum: orNull(limits.wallEndMaximum),
      boltsPerPiece: limits.boltsPerPiece,
    },
    notStated: notStatedBy(rule),
    exception: exception === null ? null : { bolts: exception.bolts, upTo: show(exception.upTo), clause: exception.clause, source: exception.source, status: exception.status },
    hole: { least: bitAnswer(least, precision), most: bitAnswer(most, precision), navy: bitAnswer(navy, precision), ...holeSource },
    washer:
      washer.size === null
        ? null
        : {
            size: show(washer.size),
            thickness: orNull(washer.thickness),
            slotLength: orNull(washer.slotLength),
            slotWidth: washer.slotOver === null ? null : bitAnswer(limits.diameter.plus(washer.slotOver), precision),
            clause: washer.clause,
            source: washer.source,
            status: washer.status,
          },
  };
}
