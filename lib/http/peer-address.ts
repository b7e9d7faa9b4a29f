import "server-only";
import { subscribe } from "node:diagnostics_channel";
import type { IncomingMessage } from "node:http";

export const peerHeader = "x-sillwright-peer";

let watching = false;

/**
 * A route handler is given headers and no connection. Next writes the connection's address into X-Forwarded-For only when the
 * client sent none, so that by itself it can be set to anything. This writes the true one into a header of ours, over
 * whatever the client sent under that name, before Next sees the request. `instrumentation.ts` calls it once.
 */
export function watchPeerAddresses(): void {
  if (watching) return;
  watching = true;
  subscribe("http.server.request.start", (message) => {
    const { request } = message as { request: IncomingMessage };
    request.headers[peerHeader] = request.socket.remoteAddress ?? "";
  });
}
