import { z } from "zod";
import { choiceField, lengthField, numberField } from "../../schema";

export const tapeSystems = ["imperial", "metric"] as const;

/** A steel tape and how it was held. Each correction needs its own fields; what is left out is not corrected. */
export const tapeInput = z
  .strictObject({
    system: choiceField(tapeSystems, { description: "imperial: degrees F, lb, lb per 100 ft, sq in; metric: degrees C, kg, kg per 100 m, sq mm" }).default("imperial"),
    nominalLength: lengthField({ description: "What the tape's marks say of its whole length", example: "100 ft" }).optional(),
    trueLength: lengthField({ description: "What that length is when compared with a standard", example: "100.02 ft" }).optional(),
    temperature: numberField({ minimum: -60, maximum: 200, description: "Of the tape while it was read", example: 98 }).optional(),
    standardTemperature: numberField({ minimum: -60, maximum: 200, description: "At which its marks are true; 68 F, 20 C by default", example: 68 }).optional(),
    expansion: numberField({ minimum: 0, maximum: 0.0001, description: "Of the tape, per degree; steel, 0.00000645 per degree F, by default", example: 0.00000645 }).optional(),
    pull: numberField({ minimum: 0.1, maximum: 200, description: "Tension while it was read", example: 18 }).optional(),
    standardPull: numberField({ minimum: 0.1, maximum: 200, description: "Tension at which its marks are true", example: 12 }).optional(),
    section: numberField({ minimum: 0.0001, maximum: 100, description: "Area of the blade's cross-section", example: 0.015 }).optional(),
    weight: numberField({ minimum: 0.0001, maximum: 100, description: "Of 100 ft, or 100 m, of tape", example: 2.8 }).optional(),
    span: lengthField({ description: "Distance between supports where the tape hung free; a tape on the slab does not sag", example: "100 ft" }).optional(),
  })
  .superRefine((tape, context) => {
    const together = (names: readonly (keyof typeof tape)[], needed: readonly (keyof typeof tape)[] = names) => {
      if (names.every((name) => tape[name] === undefined)) return;
      for (const name of needed) if (tape[name] === undefined) context.issues.push({ code: "custom", input: undefined, path: [name], params: { code: "required" } });
    };
    together(["nominalLength", "trueLength"]);
    together(["standardPull", "section"], ["pull", "standardPull", "section"]);
    together(["weight", "span"], ["pull", "weight", "span"]);
    together(["standardTemperature", "expansion"], ["temperature"]);
  })
  .meta({ description: "Correction of a steel tape for its length, temperature, pull and sag; taken to every reading" });
