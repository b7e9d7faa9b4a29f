import { endpoint } from "@/lib/http/endpoint";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Is the process alive
 * @description Answers as long as the process does, whatever else is away.
 * @response liveAnswer
 * @operationId live
 * @tag Health
 * @openapi
 */
export const GET = endpoint({ access: "anyone", quota: "none", handle: () => ({ live: true }) });
export const { POST, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ GET });
