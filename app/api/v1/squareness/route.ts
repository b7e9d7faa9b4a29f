import { squarenessOperation } from "@/calculators/squareness";
import { calculation } from "@/lib/http/calculation";
import { otherMethods } from "@/lib/http/other-methods";

/**
 * Check for square
 * @description From two or four sides and two diagonals, as read: whether the slab is square, how far it is racked, which side to move, what the tape must then read, which reading may be wrong, and what the readings prove.
 * @body squarenessInput
 * @response squarenessAnswer
 * @operationId squareness
 * @tag Calculators
 * @openapi
 */
export const POST = calculation(squarenessOperation);
export const { GET, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ POST });
