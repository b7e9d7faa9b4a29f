import path from "node:path";
import { pathToFileURL } from "node:url";
import { problems, type ProblemCode } from "@/api-spec";
import { documentedRoutes, type Documented } from "@/api-spec/documented";
import type { Endpoint } from "@/lib/http/endpoint";
import { addRoute, componentSchemas, type ComponentSchemas } from "./component-schemas";
import { exampleAnswer, exampleSummary } from "./examples";
import { generatedDocument, type GeneratedOperation } from "./generated-document";
import { goodHeaders, headers, problemResponse, responseName } from "./responses";

/**
 * The OpenAPI document: addresses and words from the comments of the route files by next-openapi-gen; schemas from zod itself,
 * since the generator's reading of them is not to be trusted; statuses from what each route says of itself; examples
 * from the worked examples, answered here and now.
 */
export async function buildDocument(root: string): Promise<object> {
  const generated = generatedDocument(root);
  const components = componentSchemas();
  const used = new Set<ProblemCode>();
  const paths: Record<string, object> = {};
  for (const [address, documented] of [...documentedRoutes].sort(([one], [other]) => one.localeCompare(other))) {
    const operation = generated.paths[address]?.[documented.method];
    if (operation === undefined) throw new Error(`No route file documents ${documented.method} ${address}: its comment needs @openapi`);
    const endpoint = await endpointOf(root, address, documented.method);
    endpoint.problems.forEach((code) => used.add(code));
    paths[address] = { [documented.method]: completed(address, operation, documented, endpoint, components) };
  }
  const undocumented = Object.keys(generated.paths).filter((address) => !documentedRoutes.has(address));
  if (undocumented.length > 0) throw new Error(`api-spec/documented.ts knows nothing of ${undocumented.join(", ")}`);
  return {
    openapi: "3.0.3",
    info: generated.info,
    servers: generated.servers,
    security: [],
    tags: tagsOf(generated.tags.map(({ name }) => name)),
    paths,
    components: {
      schemas: Object.fromEntries(Object.entries(components.schemas).sort(([one], [other]) => one.localeCompare(other))),
      responses: Object.fromEntries([...used].sort().map((code) => [responseName(code), problemResponse(code)])),
      headers,
    },
  };
}

async function endpointOf(root: string, address: string, method: string): Promise<Endpoint> {
  const file = path.join(root, "app", "api", address.replace(/\{(\w+)\}/g, "[$1]"), "route.ts");
  const route = (await import(pathToFileURL(file).href)) as Record<string, Endpoint>;
  return route[method.toUpperCase()]!;
}

function completed(address: string, { operationId, summary, description, tags, parameters }: GeneratedOperation, documented: Documented, endpoint: Endpoint, components: ComponentSchemas) {
  const { input, answer } = addRoute(components, documented);
  const [first] = documented.examples;
  const example = exampleAnswer(address, first?.input);
  return {
    operationId,
    summary,
    description,
    tags,
    ...(parameters.length > 0 && { parameters: parameters.map(({ name }) => ({ in: "path", name, required: true, description: "The id, as the answer to POST /v1/links gave it", schema: { type: "string", pattern: "^[0-9A-Za-z]{10}$" }, example: "4fQ9zKc2Ls" })) }),
    ...(input && {
      requestBody: {
        required: true,
        content: { "application/json": { schema: input, examples: Object.fromEntries(documented.examples.map(({ id, summary: words, input: value }) => [id, { summary: exampleSummary(address, id, words), value }])) } },
      },
    }),
    responses: Object.fromEntries([
      [String(endpoint.status), { description: endpoint.status === 201 ? "Made" : "The answer", headers: goodHeaders(endpoint.quota, endpoint.status), content: { "application/json": { schema: answer, ...(example !== undefined && { example }) } } }],
      ...endpoint.problems.map((code): [string, object] => [String(problems[code].status), { $ref: `#/components/responses/${responseName(code)}` }]),
    ]),
  };
}

const tagWords: Record<string, string> = {
  Calculators: "One calculation each. Lengths are text or numbers; answers hold each length exact, rounded as text, and in millimetres.",
  Batch: "Many calculations in one request.",
  Rules: "The bolt rules and where each figure is from.",
  Links: "Calculations under short addresses.",
  Health: "For whoever watches over the site.",
};

function tagsOf(names: string[]): { name: string; description: string }[] {
  const unknown = names.filter((name) => !(name in tagWords));
  if (unknown.length > 0) throw new Error(`No words for the tag ${unknown.join(", ")}`);
  return Object.entries(tagWords).filter(([name]) => names.includes(name)).map(([name, description]) => ({ name, description }));
}
