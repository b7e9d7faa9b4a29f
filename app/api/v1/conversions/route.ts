import { conversionsOperation } from "@/calculators/conversions";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Fractions
 * @description One length in every form with the error of each, or exact tape arithmetic on a running strip.
 * @body conversionsInput
 * @response conversionsAnswer
 * @operationId conversions
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(conversionsOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
