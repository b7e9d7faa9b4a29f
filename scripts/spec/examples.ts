import { calculatorOf, operations } from "@/calculators";
import type { Namespace } from "@/lib/client/i18n/catalogue";
import { getTranslate } from "@/lib/client/i18n/load-messages";

/** What the page says of a worked example, or the words that came with it. */
export function exampleSummary(address: string, id: string, words: string): string {
  const calculator = calculatorOf(address.replace("/v1/", ""));
  if (calculator === undefined) return words;
  const t = getTranslate("en", [calculator.name as Namespace]);
  const key = `${calculator.name}.page.examples.${id}`;
  return t.has(key) ? t(key).replace(/<[^>]+>/g, "") : words;
}

/** The answer to an operation's first example, worked out now; nothing for addresses that are no calculation. */
export function exampleAnswer(address: string, input: Record<string, unknown> | undefined): unknown {
  const operation = operations.get(address.replace("/v1/", ""));
  if (operation === undefined || input === undefined) return undefined;
  return JSON.parse(JSON.stringify(operation.calculate(operation.input.parse(input)))) as unknown;
}
