import { z } from "zod";
import { lengthAnswer } from "../schema";

export const items = ["board", "sill-sealer", "anchor-bolt", "threaded-rod", "nut", "washer", "plate-washer", "adhesive", "preservative"] as const;
export const itemUnits = ["board", "roll", "piece", "cartridge", "can"] as const;
export const noteCodes = ["treated", "width-of-plate", "galvanized", "galvanized-small", "plate-washer-size", "rod-length", "approval-governs", "cut-ends-and-holes"] as const;

const amount = z.strictObject({ value: z.number(), unit: z.enum(["ml", "ft2", "ft"]), metric: z.number(), metricUnit: z.enum(["ml", "m2", "m"]) });

export const takeoffAnswer = z
  .strictObject({
    lines: z.array(
      z.strictObject({
        item: z.enum(items),
        size: lengthAnswer.nullable().meta({ description: "A board's length, a roll's, a rod's, or a bolt's diameter" }),
        quantity: z.number().meta({ description: "To order, waste in" }),
        unit: z.enum(itemUnits),
        needed: z.number().meta({ description: "In that unit, without waste; not whole where it is cut or poured" }),
        amount: amount.nullable().meta({ description: "What is used of it: length, area or volume" }),
        note: z.enum(noteCodes).nullable(),
      }),
    ),
    totals: z.strictObject({
      boards: z.number(),
      boardLength: lengthAnswer,
      boardFeet: z.number().meta({ description: "Nominal board feet of two-by stock of this width" }),
      pounds: z.number().meta({ description: "About, wet treated lumber at 49 lb a cubic foot" }),
      kilograms: z.number(),
      heaviestPounds: z.number().meta({ description: "The longest board: what two carry" }),
      heaviestKilograms: z.number(),
    }),
    waste: z.number(),
    assumed: z.array(z.enum(["plate-length-from-boards", "anchor-depth", "anchor-hole", "coverage", "density"])).meta({ description: "Figures of ours, not asked for" }),
  })
  .meta({ id: "Takeoff" });

export type TakeoffAnswer = z.output<typeof takeoffAnswer>;
export type TakeoffLine = TakeoffAnswer["lines"][number];
