import { levelOperation } from "@/calculators/level";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Level
 * @description From rod readings by set-up: elevations, shims from the highest point, falls, the verdict by pairs of points at plan distance, page check and misclosure.
 * @body levelInput
 * @response levelAnswer
 * @operationId levels
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(levelOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
