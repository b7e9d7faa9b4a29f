import { insetOperation } from "@/calculators/inset";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Chalk lines
 * @description From the slab and the inset: lengths of the chalk lines, offsets at every corner, recheck diagonals, how much each diagonal drops, and what a wrong mark would look like.
 * @body insetInput
 * @response insetAnswer
 * @operationId insets
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(insetOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
