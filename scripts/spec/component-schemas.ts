import { isDeepStrictEqual } from "node:util";
import { z } from "zod";
import { documentedRoutes, type Documented } from "@/api-spec/documented";
import { problemAnswer } from "@/api-spec";

export type JsonSchema = { [key: string]: unknown; $ref?: string };

const own = (schema: z.ZodType, io: "input" | "output"): JsonSchema => {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { target: "openapi-3.0", io }) as JsonSchema;
  return fitting(rest) as JsonSchema;
};

/** zod's own schema as OpenAPI 3.0 wants it: references into the components, one example where it has several, null beside a type. */
function fitting(part: unknown): unknown {
  if (Array.isArray(part)) return part.map(fitting);
  if (part === null || typeof part !== "object") return part;
  return Object.fromEntries(
    Object.entries(nullBesideType(part as JsonSchema)).flatMap(([key, value]): [string, unknown][] => {
      if (key === "$ref") return [[key, String(value).replace("#/definitions/", "#/components/schemas/")]];
      if (key === "examples" && Array.isArray(value)) return [["example", value[0]]];
      return [[key, fitting(value)]];
    }),
  );
}

/** In 3.0 `nullable` means nothing without a `type` beside it, nor without null in an `enum`; zod writes it over unions and references as well. */
function nullBesideType(schema: JsonSchema): JsonSchema {
  if (schema.nullable !== true) return schema;
  if (schema.type !== undefined) return Array.isArray(schema.enum) && !schema.enum.includes(null) ? { ...schema, enum: [...schema.enum, null] } : schema;
  const { nullable: _, anyOf, allOf, ...rest } = schema as JsonSchema & { anyOf?: JsonSchema[]; allOf?: JsonSchema[] };
  const ways = anyOf ?? (allOf?.length === 1 ? allOf : [{ allOf }]);
  return { ...rest, anyOf: [...ways, { type: "object", nullable: true, enum: [null] }] };
}

/** The components, filled while the operations are described. */
export class ComponentSchemas {
  readonly schemas: Record<string, JsonSchema> = {};

  /** Adds a schema with all it refers to and answers the reference to it. */
  add(schema: z.ZodType, io: "input" | "output", name?: string): { $ref: string } {
    const { definitions = {}, ...root } = own(schema, io) as JsonSchema & { definitions?: Record<string, JsonSchema> };
    for (const [id, definition] of Object.entries(definitions)) this.put(id, definition);
    if (root.$ref !== undefined && Object.keys(root).length === 1) return { $ref: root.$ref };
    if (name === undefined) throw new Error(`A schema that is answered needs an id of its own: ${JSON.stringify(root).slice(0, 120)}`);
    this.put(name, root);
    return { $ref: `#/components/schemas/${name}` };
  }

  private put(name: string, schema: JsonSchema): void {
    const there = this.schemas[name];
    if (there !== undefined && !isDeepStrictEqual(there, schema)) throw new Error(`Two different schemas are called ${name}`);
    this.schemas[name] = schema;
  }
}

/** Every schema of the document, straight from zod. */
export function componentSchemas(): ComponentSchemas {
  const components = new ComponentSchemas();
  components.add(problemAnswer, "output");
  for (const route of documentedRoutes.values()) addRoute(components, route);
  return components;
}

export function addRoute(components: ComponentSchemas, { input, inputName, answer }: Documented): { input?: { $ref: string }; answer: { $ref: string } } {
  return { ...(input && { input: components.add(input, "input", inputName) }), answer: components.add(answer, "output") };
}
