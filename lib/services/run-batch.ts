import "server-only";
import { batchItem, type BatchAnswer } from "@/api-spec";
import { problems } from "@/api-spec/problems";
import { operations } from "@/calculators";
import { logUnexpected, problemBody, problemOf } from "@/lib/http/problem-response";

interface Asking {
  acceptLanguage: string | null;
  requestId: string;
}

/** Each item answered or failed on its own, in the order asked. Pointers lead from the whole body: `/items/3/input/length`. */
export function runBatch(items: readonly unknown[], { acceptLanguage, requestId }: Asking): BatchAnswer {
  return { items: items.map((item, index) => runItem(item, `/items/${index}`)) };

  function runItem(item: unknown, pointer: string): BatchAnswer["items"][number] {
    let at = pointer;
    try {
      const { operation: path, input } = batchItem.parse(item);
      const operation = operations.get(path)!; // the item's schema names exactly these
      at = `${pointer}/input`;
      return { status: 200, answer: operation.calculate(operation.input.parse(input)) as Record<string, unknown> };
    } catch (error) {
      logUnexpected(error, requestId);
      const problem = problemOf(error, at);
      return { status: problems[problem.code].status, problem: problemBody(problem, acceptLanguage, requestId) };
    }
  }
}
