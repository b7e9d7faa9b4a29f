import { insetOperation } from "@/calculators/inset";
import { answerTo } from "@/calculators/schema";
import * as lengthCore from "@/lib/client/core/length";

/** The lazily loaded piece of the page. */
export const loaded = { operation: insetOperation, answerTo, lengthCore };
