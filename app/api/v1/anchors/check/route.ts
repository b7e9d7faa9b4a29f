import { checkOperation } from "@/calculators/anchors";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Bolts, as poured
 * @description Every bolt judged against a rule, each finding with its clause and remedy, and the fewest bolts to add.
 * @body checkInput
 * @response checkAnswer
 * @operationId anchorsCheck
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(checkOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
