import { conversionsOperation } from "@/calculators/conversions";
import { answerTo } from "@/calculators/schema";

/** The lazily loaded piece of the page. */
export const loaded = { operation: conversionsOperation, answerTo };
