import { listRules } from "@/calculators/rules";
import { endpoint } from "@/lib/http/endpoint";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * The bolt rules
 * @description Every published rule with its figures, each with its clause, its source and how far that source was read. A figure its source does not state is null.
 * @response rulesAnswer
 * @operationId rules
 * @tag Rules
 * @openapi
 */
export const GET = endpoint({ access: "anyone", quota: "none", open: true, handle: listRules });
export const { POST, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ GET });
