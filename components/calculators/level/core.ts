import { levelOperation } from "@/calculators/level";
import { answerTo } from "@/calculators/schema";
import * as lengthCore from "@/lib/client/core/length";

/** The lazily loaded piece of the page. */
export const loaded = { operation: levelOperation, answerTo, lengthCore };
