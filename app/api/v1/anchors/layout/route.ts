import { layoutOperation } from "@/calculators/anchors";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Bolts, new
 * @description Stations of new anchor bolts for a wall's pieces under a rule.
 * @body layoutInput
 * @response layoutAnswer
 * @operationId anchorsLayout
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(layoutOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
