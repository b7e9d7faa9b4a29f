import { readdirSync } from "node:fs";
import path from "node:path";
import type { ProblemCode } from "@/api-spec";

type Handler = (request: Request, context: { params: Promise<unknown> }) => Response | Promise<Response>;

/** What a route file exports; `POST` or `GET` made by `endpoint` tell about themselves. */
export type RouteModule = Partial<Record<string, Handler & { open?: boolean; status?: number; problems?: readonly ProblemCode[]; quota?: string }>>;

const folder = "app/api";

/** Every route file of the API, by its address: `/api/v1/links/[id]`. */
export const routeFiles: ReadonlyMap<string, string> = new Map(
  readdirSync(folder, { recursive: true, encoding: "utf8" })
    .filter((file) => file.endsWith("route.ts"))
    .map((file): [string, string] => [`/api/${path.dirname(file)}`, path.resolve(folder, file)])
    .sort(([one], [other]) => one.localeCompare(other)),
);

/** Those that are documented: all but the one the bench measures against, the document itself, and the one for unknown addresses. */
export const documented = [...routeFiles.keys()].filter((address) => !address.includes("[[") && !/\/(echo|openapi\.json)$/.test(address));

export const moduleOf = async (address: string) => (await import(/* @vite-ignore */ routeFiles.get(address)!)) as RouteModule;

let next = Math.floor(Math.random() * 60_000) * 256;

/** An address that nobody has asked from yet, in any file of a test run: a bucket of its own. */
export const stranger = () => `10.${(next >> 16) & 255}.${(next >> 8) & 255}.${next++ & 255}`;

interface Call {
  body?: BodyInit | object;
  headers?: Record<string, string>;
  params?: Record<string, string>;
  /** Whose bucket pays. */
  from?: string;
}

/** Asks a route's handler as Next would, from an address of its own unless one is given. */
export async function call(address: string, method: string, { body, headers = {}, params = {}, from = stranger() }: Call = {}): Promise<Response> {
  const route = await moduleOf(address);
  const handler = route[method];
  if (handler === undefined) throw new Error(`${method} ${address} is not exported`);
  const isRaw = body === undefined || typeof body === "string" || body instanceof ReadableStream || body instanceof Uint8Array;
  const request = new Request(`http://localhost${address}`, {
    method,
    headers: { "content-type": "application/json", "x-sillwright-peer": from, ...headers },
    body: isRaw ? (body as BodyInit | undefined) : JSON.stringify(body),
    ...(body instanceof ReadableStream && { duplex: "half" }),
  } as RequestInit);
  return handler(request, { params: Promise.resolve(params) });
}
