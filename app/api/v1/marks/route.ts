import { marksOperation } from "@/calculators/marks";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Floor marks
 * @description Running marks of joists or studs from one end, each rounded from zero, the last bay, lapped joists, sheet breaks, and what stands on a bolt or washer.
 * @body marksInput
 * @response marksAnswer
 * @operationId marks
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(marksOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
