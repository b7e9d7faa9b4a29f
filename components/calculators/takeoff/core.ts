import { answerTo } from "@/calculators/schema";
import { takeoffOperation } from "@/calculators/takeoff";
import * as lengthCore from "@/lib/client/core/length";

/** The lazily loaded piece of the page. */
export const loaded = { operation: takeoffOperation, answerTo, lengthCore };
