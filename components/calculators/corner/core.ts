import { cornerOperation } from "@/calculators/corner";
import { answerTo } from "@/calculators/schema";

/** The lazily loaded piece of the page. */
export const loaded = { operation: cornerOperation, answerTo };
