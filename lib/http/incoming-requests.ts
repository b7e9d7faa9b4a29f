import "server-only";
import { subscribe } from "node:diagnostics_channel";
import type { IncomingMessage } from "node:http";

/** The other end of the connection, written by us over whatever a client sends under these names. */
export const peerHeader = "x-sillwright-peer";
/** The method as it came, where Next knows none of that name. */
export const methodHeader = "x-sillwright-method";

const methodsOfNext = new Set(["GET", "HEAD", "OPTIONS", "POST", "PUT", "DELETE", "PATCH"]);

let prepared = false;

/**
 * Sets right what a route handler cannot, before Next sees a request; `instrumentation.ts` calls it once.
 *
 * - A handler is given headers and no connection, and Next writes the connection's address into X-Forwarded-For only when the
 *   client sent none: by itself that header can be set to anything. So the true address goes into one of ours.
 * - Next answers 500 to TRACE and an empty 400 to PROPFIND and its like. Under /api they arrive as OPTIONS, which changes
 *   nothing anywhere, and are refused there as any method that an address does not serve.
 * - Next answers 500 to an address whose percent signs make no sense. Written out they make one that does not exist.
 */
export function prepareRequests(): void {
  if (prepared) return;
  prepared = true;
  subscribe("http.server.request.start", (message) => prepare((message as { request: IncomingMessage }).request));
}

export function prepare(request: IncomingMessage): void {
  const { headers } = request;
  headers[peerHeader] = request.socket.remoteAddress ?? "";
  delete headers[methodHeader];
  if (!methodsOfNext.has(request.method ?? "") && /^\/api(\/|$|\?)/.test(request.url ?? "")) {
    headers[methodHeader] = request.method;
    request.method = "OPTIONS";
  }
  if (request.url?.includes("%")) request.url = withPlainPercents(request.url);
}

function withPlainPercents(url: string): string {
  const [path = "", ...query] = url.split("?");
  try {
    decodeURIComponent(path);
    return url;
  } catch {
    return [path.replaceAll("%", "%25"), ...query].join("?");
  }
}
