import { insetOperation } from "@/calculators/inset";
import { answerTo } from "@/calculators/schema";

/** The lazily loaded piece of the page. */
export const loaded = { operation: insetOperation, answerTo };
