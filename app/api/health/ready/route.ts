import { endpoint } from "@/lib/http/endpoint";
import { otherMethods } from "@/lib/http/other-methods";
import { readiness } from "@/lib/services/health";

/**
 * Is the site ready for people
 * @description False, as 503, while the database is away. Calculations still answer then.
 * @response readyAnswer
 * @operationId ready
 * @tag Health
 * @openapi
 */
export const GET = endpoint({ access: "anyone", quota: "none", problems: ["not-ready"], handle: readiness });
export const { POST, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ GET });
