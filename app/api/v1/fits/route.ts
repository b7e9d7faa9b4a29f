import { fitOperation } from "@/calculators/fit";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Best fit
 * @description The wanted plan laid on the slab as built so that its worst departure from the wanted inset is least: offsets at every corner, insets along every wall, what each bolt becomes, three ways side by side, and the certificate of the optimum.
 * @body fitInput
 * @response fitAnswer
 * @operationId fits
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(fitOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
