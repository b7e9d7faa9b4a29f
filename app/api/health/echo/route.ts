import { env } from "@/lib/env";
import { unknownAddress } from "@/lib/http/unknown-address";

/** The least a route of this server can do with a body: `npm run bench` measures the API against it. Only with BENCH=1. */
export async function POST(request: Request): Promise<Response> {
  if (env.BENCH === undefined) return unknownAddress(request);
  return Response.json(await request.json());
}

export { unknownAddress as DELETE, unknownAddress as GET, unknownAddress as HEAD, unknownAddress as OPTIONS, unknownAddress as PATCH, unknownAddress as PUT } from "@/lib/http/unknown-address";
