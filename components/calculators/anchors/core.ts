import { checkOperation, layoutOperation } from "@/calculators/anchors";
import { answerTo, type Operation } from "@/calculators/schema";
import * as lengthCore from "@/lib/client/core/length";

/** The lazily loaded piece of the page. A request whose pieces lie from station to station asks for the check, any other for a layout. */
export const loaded = {
  operation: layoutOperation as Operation,
  lengthCore,
  answerTo: (_: Operation, request: unknown) => {
    const [first] = (request as { pieces?: unknown[] }).pieces ?? [];
    return answerTo<Operation["input"], Operation["answer"]>(typeof first === "object" ? checkOperation : layoutOperation, request);
  },
};
