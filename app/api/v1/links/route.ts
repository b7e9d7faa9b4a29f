import { linkBodyLimit, linkInput, type MadeLink } from "@/api-spec";
import { endpoint } from "@/lib/http/endpoint";
import { otherMethods } from "@/lib/http/other-methods";
import { presentMadeLink } from "@/lib/presenters/link";
import { makeLink } from "@/lib/services/links/make-link";

/**
 * Make a short link
 * @description Keeps a calculation, its input and its answer under a short address to send to a phone. It is deleted a year after it was last opened. The body may hold 16 KiB; an address may make 10 a minute.
 * @body linkInput
 * @response 201:madeLink
 * @operationId makeLink
 * @tag Links
 * @openapi
 */
export const POST = endpoint({
  access: "anyone",
  quota: "link",
  body: linkInput,
  limit: linkBodyLimit,
  status: 201,
  problems: ["not-ready"],
  headers: ({ id }: MadeLink) => ({ Location: `/api/v1/links/${id}` }),
  handle: async ({ body }) => presentMadeLink(await makeLink(body)),
});
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
