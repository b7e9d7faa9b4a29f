import { takeoffOperation } from "@/calculators/takeoff";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Takeoff
 * @description From a plates answer with waste, or from quantities: boards, sill sealer, bolts, rods, nuts, washers, adhesive and cut-end preservative to order.
 * @body takeoffInput
 * @response takeoffAnswer
 * @operationId takeoffs
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(takeoffOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
