import { z } from "zod";

export const liveAnswer = z.strictObject({ live: z.literal(true) }).meta({ id: "Live" });

export const readyAnswer = z
  .strictObject({
    ready: z.literal(true),
    database: z.literal("up"),
    limiter: z.enum(["up", "reduced"]).meta({ description: "reduced while its store is away and a smaller limit in the process stands in" }),
  })
  .meta({ id: "Ready" });
