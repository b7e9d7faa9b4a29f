import { platesOperation } from "@/calculators/plates";
import { answerTo } from "@/calculators/schema";

/** The operation where no worker can be had: fetched only then. */
export const loaded = { operation: platesOperation, answerTo };
