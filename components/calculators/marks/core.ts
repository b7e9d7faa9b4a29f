import { marksOperation } from "@/calculators/marks";
import { answerTo } from "@/calculators/schema";
import * as lengthCore from "@/lib/client/core/length";

/** The lazily loaded piece of the page. */
export const loaded = { operation: marksOperation, answerTo, lengthCore };
