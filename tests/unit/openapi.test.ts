import { execFile } from "node:child_process";
import { readFileSync } from "node:fs";
import { promisify } from "node:util";
import { createConfig, lintFromString } from "@redocly/openapi-core";
import { describe, expect, test } from "vitest";
import { z } from "zod";
import { problemAnswer } from "@/api-spec";
import { documentedRoutes } from "@/api-spec/documented";
import document from "@/api-spec/openapi.json";
import { operations } from "@/calculators";
import { documented, moduleOf, routeFiles } from "@/tests/setup/api-routes";
import { validatorOf } from "@/tests/setup/openapi-validator";

type Operation = { operationId: string; summary: string; description: string; requestBody?: { content: Record<string, { schema: { $ref: string }; examples: Record<string, { summary: string; value: unknown }> }> }; responses: Record<string, { content?: Record<string, { schema: { $ref: string }; example?: unknown }> }> };
const paths = document.paths as unknown as Record<string, Record<string, Operation>>;
const all = Object.entries(paths).flatMap(([address, methods]) => Object.entries(methods).map(([method, operation]) => ({ address, method, operation })));
const schemas = document.components.schemas as Record<string, unknown>;

describe("the OpenAPI document", () => {
  test("is what the sources say now", { timeout: 60_000 }, async () => {
    const { stdout } = await promisify(execFile)(process.execPath, ["--conditions=react-server", "--import", "tsx", "scripts/spec/generate.mjs", "--check"]);
    expect(stdout).toContain("as the sources say");
  });

  test("describes every route of the API and no other, each operation of the registry among them", () => {
    const routes = documented.map((address) => address.replace("/api", "").replace(/\[(\w+)\]/g, "{$1}"));
    expect(Object.keys(paths).sort()).toEqual(routes.sort());
    expect([...operations.keys()].filter((path) => paths[`/v1/${path}`]?.post === undefined)).toEqual([]);
    expect([...operations.values()].map(({ id }) => id).sort()).toEqual(all.filter(({ operation }) => operation.operationId in Object.fromEntries([...operations.values()].map(({ id }) => [id, 1]))).map(({ operation }) => operation.operationId).sort());
  });

  test("names in each route's comment the very schemas that the route reads and answers with", async () => {
    for (const { path, input, answer } of operations.values()) {
      const source = readFileSync(routeFiles.get(`/api/v1/${path}`)!, "utf8");
      const folder = /from "@\/(calculators\/[a-z]+)"/.exec(source)![1]!;
      const exported = (await import(/* @vite-ignore */ `../../${folder}/index.ts`)) as Record<string, unknown>;
      expect(exported[/@body (\w+)/.exec(source)![1]!], path).toBe(input);
      expect(exported[/@response (\w+)/.exec(source)![1]!], path).toBe(answer);
    }
  });

  test("has zod's own schema for everything that is sent and answered", () => {
    for (const [address, { method, input, answer }] of documentedRoutes) {
      const operation = paths[address]![method]!;
      const good = Object.entries(operation.responses).find(([status]) => status.startsWith("2"))![1];
      expect(resolved(good.content!["application/json"]!.schema), address).toEqual(fromZod(answer, "output"));
      if (input) expect(resolved(operation.requestBody!.content["application/json"]!.schema), address).toEqual(fromZod(input, "input"));
    }
    expect(resolved({ $ref: "#/components/schemas/Problem" })).toEqual(fromZod(problemAnswer, "output"));
  });

  test("refers to nothing that is not there, and holds nothing that nobody refers to", () => {
    const text = JSON.stringify(document);
    const references = new Set([...text.matchAll(/"\$ref":"#\/components\/(\w+\/[\w-]+)"/g)].map(([, reference]) => reference!));
    const there = Object.entries(document.components).flatMap(([kind, members]) => Object.keys(members).map((name) => `${kind}/${name}`));
    expect([...references].sort()).toEqual(there.sort());
    expect(text).not.toMatch(/#\/definitions|\$defs|"examples":\[/);
  });

  test("passes Redocly's recommended rules", async () => {
    const config = await createConfig({ extends: ["recommended"], rules: { "info-license": "off", "no-server-example.com": "off", "operation-4xx-response": "off" } });
    const found = await lintFromString({ source: JSON.stringify(document), absoluteRef: "openapi.json", config });
    expect(found.map(({ ruleId, severity, message, location }) => [ruleId, severity, message, location[0]?.pointer])).toEqual([]);
  });

  test("has for each request examples that its schema allows, and for each answer too", () => {
    for (const { address, operation } of all) {
      for (const [type, { schema, examples }] of Object.entries(operation.requestBody?.content ?? {})) {
        expect([type, Object.keys(examples).length > 0]).toEqual(["application/json", true]);
        for (const [id, { value, summary }] of Object.entries(examples)) {
          expect(validatorOf(schema.$ref)(value), `${address} ${id}`).toEqual([]);
          expect(summary).toMatch(/\S/);
        }
      }
      for (const response of Object.values(operation.responses)) {
        for (const { schema, example } of Object.values(response.content ?? {})) if (example !== undefined) expect(validatorOf(schema.$ref)(example), address).toEqual([]);
      }
    }
    for (const [name, response] of Object.entries(document.components.responses)) expect(validatorOf("#/components/schemas/Problem")(response.content["application/problem+json"].example), name).toEqual([]);
  });

  test("tells of each route every status that the route says it may answer", async () => {
    for (const address of documented) {
      const route = await moduleOf(address);
      const method = route.POST?.problems ? "post" : "get";
      const { problems, status } = route[method.toUpperCase()]!;
      const { problems: table } = await import("@/api-spec");
      const said = Object.keys(paths[address.replace("/api", "").replace(/\[(\w+)\]/g, "{$1}")]![method]!.responses).map(Number);
      expect(said.sort(), address).toEqual([status!, ...problems!.map((code) => table[code].status)].sort());
    }
  });

  test("refuses in its schemas what the routes refuse: a field nobody knows", () => {
    for (const [address, { input, inputName, examples }] of documentedRoutes) {
      if (!input) continue;
      expect(validatorOf(`#/components/schemas/${inputName}`)({ ...examples[0]!.input, nope: 1 }).join(), address).toContain("additional properties");
    }
  });
});

/** A component with every reference replaced by what it refers to. */
function resolved(part: unknown): unknown {
  if (Array.isArray(part)) return part.map(resolved);
  if (part === null || typeof part !== "object") return part;
  const { $ref } = part as { $ref?: string };
  if ($ref !== undefined) return resolved(schemas[$ref.replace("#/components/schemas/", "")]);
  return Object.fromEntries(Object.entries(part).map(([key, value]) => [key, resolved(value)]));
}

/** The same from zod, without any of the document's own making. */
function fromZod(schema: z.ZodType, io: "input" | "output"): unknown {
  const { definitions = {}, $schema: _, ...root } = z.toJSONSchema(schema, { target: "openapi-3.0", io }) as Record<string, unknown> & { definitions?: Record<string, unknown> };
  const inline = (part: unknown): unknown => {
    if (Array.isArray(part)) return part.map(inline);
    if (part === null || typeof part !== "object") return part;
    const { $ref } = part as { $ref?: string };
    if ($ref !== undefined) return inline(definitions[$ref.replace("#/definitions/", "")]);
    const { nullable, type, anyOf, allOf, ...rest } = part as Record<string, unknown[]>;
    if (nullable && !type) return inline({ ...rest, anyOf: [...(anyOf ?? allOf ?? []), { type: "object", nullable: true, enum: [null] }] }); // OpenAPI 3.0.3, proposal "Clarify Nullable": it needs a type beside it,
    if (nullable && rest.enum && !rest.enum.includes(null)) return inline({ ...part, enum: [...rest.enum, null] }); // and null among the words
    return Object.fromEntries(Object.entries(part).map(([key, value]) => (key === "examples" ? ["example", (value as unknown[])[0]] : [key, inline(value)])));
  };
  return inline(root);
}
