import { footprintOperation } from "@/calculators/footprint";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Footprint
 * @description Any plan from a walk round it or from the pulls of a braced polygon: closure, area, perimeter, chalk lines, the diagonals that prove every corner, and corners that are not fixed.
 * @body footprintInput
 * @response footprintAnswer
 * @operationId footprints
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(footprintOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
