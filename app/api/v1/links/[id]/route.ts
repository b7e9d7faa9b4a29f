import { endpoint } from "@/lib/http/endpoint";
import { otherMethods } from "@/lib/http/other-methods";
import { Problem } from "@/lib/http/problem";
import { presentLink } from "@/lib/presenters/link";
import { openLink } from "@/lib/services/links/open-link";

/**
 * Open a short link
 * @description The kept calculation, and what the calculator of today makes of the same input. Counts as one calculation.
 * @pathParams linkParams
 * @response linkAnswer
 * @operationId openLink
 * @tag Links
 * @openapi
 */
export const GET = endpoint({
  access: "anyone",
  quota: "calculation",
  problems: ["not-found", "not-ready"],
  handle: async ({ params }: { params: { id: string } }) => {
    const opened = await openLink(params.id);
    if (opened === null) throw new Problem("not-found");
    return presentLink(opened);
  },
});
export const { POST, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ GET });
