import "server-only";
import { Redis } from "@upstash/redis";
import { env } from "@/lib/env";

let client: Redis | undefined;

/** One client a process. It asks once: a request must not wait through retries for leave to calculate. */
export function storeClient(): Redis {
  return (client ??= makeStoreClient(env.UPSTASH_REDIS_REST_URL, env.UPSTASH_REDIS_REST_TOKEN));
}

export function makeStoreClient(url: string, token: string): Redis {
  return new Redis({
    url,
    token,
    responseEncoding: false,
    readYourWrites: false,
    enableTelemetry: false,
    retry: false,
    signal: () => AbortSignal.timeout(1_000), // the limiter has long gone on; this only frees the connection
  });
}
