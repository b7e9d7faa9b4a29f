import "server-only";
import http from "node:http";
import https from "node:https";
import { Redis, type Requester } from "@upstash/redis";
import { env } from "@/lib/env";

let client: Redis | undefined;

/** One client a process. */
export function storeClient(): Redis {
  return (client ??= makeStoreClient(env.UPSTASH_REDIS_REST_URL, env.UPSTASH_REDIS_REST_TOKEN));
}

/** The limiter has long gone on without an answer by then; this frees the connection. */
const longestWait = 1_000;

/**
 * Upstash's client over Node's own HTTP. Through fetch, which Next wraps, one question cost this process 2.2 ms of its time, more
 * than twice all the rest of a request. Asked once and plainly: no retry, no base64.
 */
export function makeStoreClient(url: string, token: string): Redis {
  const { protocol, hostname, port, pathname } = new URL(url);
  const { Agent, request } = protocol === "https:" ? https : http;
  const agent = new Agent({ keepAlive: true, maxSockets: 64, scheduling: "lifo" });
  const base = pathname.replace(/\/+$/, "");
  const common = { protocol, hostname: hostname.replace(/^\[|\]$/g, ""), port, method: "POST", agent };

  function ask(path: string, body: string): Promise<{ status: number; text: string }> {
    return new Promise((resolve, reject) => {
      const headers = { authorization: `Bearer ${token}`, "content-type": "application/json", "content-length": Buffer.byteLength(body) };
      const asked = request({ ...common, path, headers, timeout: longestWait }, (response) => {
        let text = "";
        response.setEncoding("utf8");
        response.on("data", (chunk: string) => (text += chunk));
        response.on("end", () => resolve({ status: response.statusCode ?? 0, text }));
        response.on("error", reject);
      });
      asked.on("timeout", () => asked.destroy(Object.assign(new Error("no answer from the store"), { code: "ETIMEDOUT" })));
      asked.on("error", reject);
      asked.end(body);
    });
  }

  const requester: Requester = {
    async request({ path = [], body }) {
      const { status, text } = await ask(`${base}/${path.join("/")}`, JSON.stringify(body));
      if (status === 200) return JSON.parse(text);
      throw new Error(messageOf(text) ?? `the store answered ${status}`);
    },
  };
  return new Redis(requester);
}

/** What the store says went wrong: the client tells by it that a script has to be sent whole. */
function messageOf(text: string): string | undefined {
  try {
    return (JSON.parse(text) as { error?: string }).error;
  } catch {
    return undefined;
  }
}
