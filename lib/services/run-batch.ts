import "server-only";
import { setImmediate as othersFirst } from "node:timers/promises";
import { batchItem, type BatchAnswer } from "@/api-spec";
import { problems } from "@/api-spec/problems";
import { operations } from "@/calculators";
import { logUnexpected, problemBody, problemOf } from "@/lib/http/problem-response";

interface Asking {
  acceptLanguage: string | null;
  requestId: string;
}

/** Milliseconds a batch works at a stretch before others have their turn. */
const stretch = 10;

/** Each item answered or failed on its own, in the order asked. Pointers lead from the whole body: `/items/3/input/length`. */
export async function runBatch(items: readonly unknown[], { acceptLanguage, requestId }: Asking): Promise<BatchAnswer> {
  const answers: BatchAnswer["items"] = [];
  let began = performance.now();
  for (const [index, item] of items.entries()) {
    answers.push(runItem(item, `/items/${index}`));
    if (performance.now() - began < stretch) continue;
    await othersFirst();
    began = performance.now();
  }
  return { items: answers };

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
