import { z } from "zod";
import { lengthField, numberField, flagField } from "../schema";

/**
 * A rule is data: every figure stands beside its clause, its source and how far that source was read. A figure its
 * source does not state is null, and is answered "not stated by this rule"; it is never borrowed from another rule.
 */
export const figureStatuses = ["read", "second-hand", "memory", "derived", "practice"] as const;
export type FigureStatus = (typeof figureStatuses)[number];

/** The ids of the published rules. */
export const ruleIds = ["us-irc", "us-irc-seismic", "us-irc-seismic-3-storey", "ibc", "ca-nbc", "ca-nbc-braced"] as const;
export type RuleId = (typeof ruleIds)[number];

/** Where a figure is from. A team's own rule may leave all three out. */
const provenance = {
  clause: z.string().max(160).nullable().default(null).meta({ description: "Where in the source the figure stands" }),
  source: z.string().max(240).nullable().default(null).meta({ description: "The text that was read" }),
  status: z.enum(figureStatuses).nullable().default(null).meta({ description: "How far the source was read" }),
};
const unstated = { clause: null, source: null, status: null };

/** The shape of a rule, with lengths and numbers as `pieces` reads them: requests accept text or numbers, answers hold text. */
function ruleShape<L extends z.ZodType, N extends z.ZodType, F extends z.ZodType>({ length, number, flag }: { length: (description: string, example: string) => L; number: (description: string, example: number) => N; flag: (description: string) => F }) {
  const figure = (description: string, example: string) => z.strictObject({ value: length(description, example).nullable(), ...provenance }).default({ value: null, ...unstated } as never);
  return {
    id: z.string().max(64).nullable().default(null),
    title: z.string().max(160).nullable().default(null).meta({ description: "The work's own name, never translated" }),
    diameter: figure("Least bolt diameter", "1/2 in"),
    spacing: figure("Greatest distance between bolts, centre to centre", "6 ft"),
    spacingOfThicker: z
      .strictObject({ diameter: length("Bolts of this diameter and more", "15.9 mm").nullable(), value: length("may stand this far apart", "2.4 m").nullable(), ...provenance })
      .default({ diameter: null, value: null, ...unstated } as never),
    endMinimum: z
      .strictObject({
        value: length("Least distance from a piece's end to a bolt", "4 in").nullable().default(null as never),
        diameters: number("The same as a number of bolt diameters", 7).nullable().default(null as never),
        ...provenance,
      })
      .default({ value: null, diameters: null, ...unstated } as never),
    endMaximum: figure("Greatest distance from a piece's end to its first bolt", "12 in"),
    foundationEndMaximum: figure("Greatest distance from the end of the foundation to the first bolt", "0.5 m"),
    boltsPerPiece: z.strictObject({ value: number("Fewest bolts in a piece", 2).nullable(), ...provenance }).default({ value: null, ...unstated } as never),
    embedment: figure("Least depth in the concrete", "7 in"),
    middleThird: z.strictObject({ value: flag("Bolts stand in the middle third of the plate's width").nullable(), ...provenance }).default({ value: null, ...unstated } as never),
    edgeCover: figure("Least concrete between the bolt's shank and the slab edge", "1 1/2 in"),
    washer: z
      .strictObject({
        size: length("Side of a square plate washer", "3 in").nullable(),
        thickness: length("Its thickness", "0.229 in").nullable(),
        slotLength: length("Longest slot", "1 3/4 in").nullable(),
        slotOver: length("Slot width over the bolt's diameter", "3/16 in").nullable(),
        ...provenance,
      })
      .default({ size: null, thickness: null, slotLength: null, slotOver: null, ...unstated } as never),
    shortWalls: z
      .array(z.strictObject({ upTo: length("A wall up to this long that joins offset braced panels", "24 in"), bolts: number("needs this many bolts", 1), ...provenance }))
      .max(4)
      .default([] as never)
      .meta({ description: "Exceptions for whole short walls that join offset braced panels; never for a short piece of a long wall" }),
  };
}

/** A rule in a request: lengths are text, or numbers in the request's unit. */
export const ruleInput = z
  .strictObject(
    ruleShape({
      length: (description, example) => lengthField({ description, example }),
      number: (description, example) => numberField({ minimum: 0, maximum: 100, description, example }),
      flag: (description) => flagField({ description }),
    }),
  )
  .meta({ id: "RuleInput", description: "A rule of one's own, shaped as GET /rules returns them" });

/** A rule in an answer: every length is text with its unit. */
export const ruleAnswer = z
  .strictObject(
    ruleShape({
      length: (description, example) => z.string().meta({ description, examples: [example] }),
      number: (description, example) => z.number().meta({ description, examples: [example] }),
      flag: (description) => z.boolean().meta({ description }),
    }),
  )
  .meta({ id: "Rule", description: "A set of limits for anchor bolts, each figure with its clause, source and status" });

export type RuleText = z.output<typeof ruleAnswer>;

/** What GET /rules answers. */
export const rulesAnswer = z.strictObject({ items: z.array(ruleAnswer) }).meta({ id: "Rules" });
