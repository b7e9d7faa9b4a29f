import { cornerOperation } from "@/calculators/corner";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Set a corner
 * @description From two legs: the diagonal that makes their corner square, what the tape must read, and the largest whole-number triangle inside them.
 * @body cornerInput
 * @response cornerAnswer
 * @operationId corners
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(cornerOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
