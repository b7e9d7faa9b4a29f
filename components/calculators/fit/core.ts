import { fitOperation } from "@/calculators/fit";
import { answerTo } from "@/calculators/schema";
import * as lengthCore from "@/lib/client/core/length";

/** The lazily loaded piece of the page. */
export const loaded = { operation: fitOperation, answerTo, lengthCore };
