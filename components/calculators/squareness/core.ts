import { squarenessOperation } from "@/calculators/squareness";
import { answerTo } from "@/calculators/schema";

/** The lazily loaded piece of the page. */
export const loaded = { operation: squarenessOperation, answerTo };
