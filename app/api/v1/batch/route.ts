import { batchEnvelope } from "@/api-spec";
import { endpoint } from "@/lib/http/endpoint";
import { otherMethods } from "@/lib/http/other-methods";
import { runBatch } from "@/lib/services/run-batch";

/**
 * Many calculations at once
 * @description Up to 100 calculations in one request, 60 without a key. Each is answered or refused on its own, and each counts as one.
 * @body batchInput
 * @response batchAnswer
 * @operationId batch
 * @tag Batch
 * @openapi
 */
export const POST = endpoint({
  access: "anyone",
  quota: "calculation",
  cost: { of: ({ items }) => items.length, pointer: "/items" },
  open: true,
  body: batchEnvelope,
  handle: ({ body, request, requestId }) => runBatch(body.items, { acceptLanguage: request.headers.get("accept-language"), requestId }),
});
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
