import { fitOperation } from "@/calculators/fit";
import { answerTo } from "@/calculators/schema";

/** The lazily loaded piece of the page. */
export const loaded = { operation: fitOperation, answerTo };
