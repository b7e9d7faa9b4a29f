import { z } from "zod";
import { setFormat, setVersion } from "./new-set";

/**
 * A set as it lies on the device and in an exported file. Documented in README.md ("The set file"). Objects are loose: what
 * a later edition adds is kept when an older one reads and writes the file again.
 */
const texts = z.record(z.string().max(120), z.string().max(20_000));
const point = z.tuple([z.number(), z.number()]);
const wallPlace = z.looseObject({ wall: z.string(), station: z.number(), offset: z.number().nullable(), tone: z.enum(["good", "bad", "added", "engineered"]) });

/** What a stage adds to the plan, in inches. Walls are named by their corners in small letters, stations run from the wall's first corner. */
const layers = z.looseObject({
  slab: z.array(point).max(60).optional(),
  chalk: z.array(point).max(60).optional(),
  bolts: z.array(wallPlace).max(2_000).optional(),
  pieces: z.array(z.looseObject({ wall: z.string(), from: z.number(), to: z.number() })).max(400).optional(),
  holes: z.array(z.looseObject({ wall: z.string(), station: z.number(), across: z.number().nullable() })).max(2_000).optional(),
  joists: z.array(z.looseObject({ wall: z.string(), station: z.number() })).max(2_000).optional(),
});

/** The answer's figure for the rail, by a code whose sentence is in the messages. */
const keyFigure = z.looseObject({ tone: z.enum(["good", "out", "warn", "plain"]), code: z.string().max(60), params: z.record(z.string(), z.union([z.string(), z.number()])) });

const result = z.looseObject({
  operation: z.string().max(60).meta({ description: "Path under /api/v1" }),
  core: z.string().max(40).meta({ description: "Version of the calculator that answered" }),
  input: z.record(z.string(), z.unknown()).meta({ description: "What it was asked, as the API takes it" }),
  of: z.string().max(40).meta({ description: "Hash of the fields it was worked out from" }),
  key: keyFigure,
  gives: texts.meta({ description: "What later stages take from it, exact" }),
  layers,
});

const calculation = z.looseObject({
  fields: texts.meta({ description: "As typed: dotted names of the form" }),
  unit: z.enum(["in", "ft", "mm", "cm", "m"]).meta({ description: "What a bare number means" }),
  precision: z.enum(["1/2", "1/4", "1/8", "1/16", "1/32", "1/64", "1mm", "0.5mm"]),
  taken: texts.meta({ description: "What was carried in from earlier stages, as it was then: the stage is stale once they say otherwise" }),
  result: result.nullable(),
});

export const sillSet = z.looseObject({
  format: z.literal(setFormat),
  version: z.literal(setVersion),
  id: z.string().min(1).max(60),
  name: z.string().max(200),
  created: z.string().max(40),
  changed: z.string().max(40),
  deleted: z.string().max(40).nullable(),
  choices: z.record(z.string().max(40), z.string().max(40)).meta({ description: "The calculator chosen for a stage that offers several" }),
  calculations: z.record(z.string().max(80), calculation).meta({ description: "By stage, calculator and, for bolts, wall: chalk.inset, bolts.anchors.ab" }),
});

export type SillSet = z.infer<typeof sillSet>;
export type Calculation = z.infer<typeof calculation>;
export type Result = z.infer<typeof result>;
export type Layers = z.infer<typeof layers>;
export type KeyFigure = z.infer<typeof keyFigure>;
export type Texts = Readonly<Record<string, string>>;
