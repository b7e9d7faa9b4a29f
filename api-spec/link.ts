import { z } from "zod";
import { calculationRequest } from "./batch";

/** Bytes of the body that makes a link, at most. */
export const linkBodyLimit = 16 * 1024;

export const linkLanguages = ["en", "es"] as const;
export const linkIdPattern = /^[0-9A-Za-z]{10}$/;

export const linkInput = z
  .strictObject({
    ...calculationRequest,
    language: z.enum(linkLanguages).default("en").meta({ description: "Language of the page the link opens" }),
  })
  .meta({ id: "LinkInput" });

const id = z.string().regex(linkIdPattern).meta({ description: "Ten letters and digits, the last step of the address" });
const calculator = z.string().meta({ description: "Name of the calculator, as in the address of its page" });
const version = z.string().meta({ description: "Version of the calculator that answered when the link was made" });
const moment = (description: string) => z.iso.datetime().meta({ description });

export const madeLink = z
  .strictObject({
    id,
    url: z.string().meta({ description: "The address to send to a phone" }),
    calculator,
    operation: calculationRequest.operation,
    version,
    createdAt: moment("When it was made"),
    deletedAfter: moment("It is deleted a year after it was last opened: no earlier than this"),
  })
  .meta({ id: "MadeLink" });

const answer = z.record(z.string(), z.unknown());

export const linkAnswer = z
  .strictObject({
    ...madeLink.shape,
    input: calculationRequest.input,
    answer: answer.meta({ description: "As answered when the link was made" }),
    current: z
      .strictObject({
        version: z.string().meta({ description: "Version of the calculator today" }),
        newer: z.boolean().meta({ description: "Whether the calculator has changed since" }),
        differs: z.boolean().meta({ description: "Whether it answers the same input otherwise today" }),
        answer: answer.nullable().meta({ description: "Today's answer where it differs; null where it is the same, or where the input is refused today" }),
        errors: z.array(z.strictObject({ pointer: z.string(), code: z.string() })).meta({ description: "Why the input is refused today" }),
      })
      .meta({ description: "What the calculator of today makes of the same input" }),
  })
  .meta({ id: "LinkAnswer" });

export const linkParams = z.strictObject({ id }).meta({ id: "LinkParams" });

export type MadeLink = z.output<typeof madeLink>;
export type LinkAnswer = z.output<typeof linkAnswer>;
