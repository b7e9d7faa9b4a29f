import { footprintOperation } from "@/calculators/footprint";
import { answerTo } from "@/calculators/schema";

/** The lazily loaded piece of the page. */
export const loaded = { operation: footprintOperation, answerTo };
