import { platesOperation } from "@/calculators/plates";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Plates
 * @description Joints with the fewest added anchors and pieces, the cheapest boards with joints free in their windows, and every hole. Or a cut list alone.
 * @body platesInput
 * @response platesAnswer
 * @operationId plates
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(platesOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
