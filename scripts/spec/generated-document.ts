import { spawnSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";

export interface GeneratedOperation {
  operationId: string;
  summary: string;
  description: string;
  tags: string[];
  parameters: { in: string; name: string; required: boolean }[];
  requestBody?: { content: { "application/json": { schema: { $ref: string } } } };
  responses: Record<string, { content: { "application/json": { schema: { $ref: string } } } }>;
}

export interface GeneratedDocument {
  openapi: string;
  info: Record<string, unknown>;
  servers: { url: string }[];
  tags: { name: string }[];
  paths: Record<string, Record<string, GeneratedOperation>>;
}

/** What next-openapi-gen reads from the comments of the route files, as next.openapi.json tells it to. Its schemas are not used. */
export function generatedDocument(root: string): GeneratedDocument {
  const folder = mkdtempSync(path.join(os.tmpdir(), "sillwright-spec-"));
  try {
    const settings = JSON.parse(readFileSync(path.join(root, "next.openapi.json"), "utf8")) as object;
    const config = path.join(folder, "next.openapi.json");
    writeFileSync(config, JSON.stringify({ ...settings, outputDir: folder, outputFile: "generated.json" }));
    const generator = path.join(root, "node_modules", "next-openapi-gen", "bin", "cli.mjs");
    // In production it writes no notes of its own beside the sources.
    const { status, stdout, stderr } = spawnSync(process.execPath, [generator, "generate", "--config", config, "--fail-on", "error"], { cwd: root, encoding: "utf8", env: { ...process.env, NODE_ENV: "production" } });
    if (status !== 0) throw new Error(`next-openapi-gen failed:\n${stdout}${stderr}`);
    return JSON.parse(readFileSync(path.join(folder, "generated.json"), "utf8")) as GeneratedDocument;
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
