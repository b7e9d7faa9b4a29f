import { Length, rangeLimit } from "../length";
import { CalculationError } from "../schema";
import type { ConversionsInput } from "./input";

type Strip = NonNullable<ConversionsInput["strip"]>;

/** No strip of a real job comes near this denominator; past it, each further line would cost more than the last. */
const denominatorLimit = 10n ** 80n;

/**
 * The running total after every line, from zero. Exact: thirds stay thirds, and nothing is rounded between lines.
 *
 * @throws CalculationError at the line whose total leaves the range, or grows too long to carry on exactly.
 */
export function runStrip(strip: Strip): Length[] {
  const totals: Length[] = [];
  let total = Length.zero;
  for (const [index, line] of strip.entries()) {
    total = after(total, line);
    const refuse = (code: string, params = {}) => new CalculationError([{ pointer: `/strip/${index}/value`, code, params }]);
    if (total.magnitude().compare(rangeLimit) > 0) throw refuse("out-of-range", { limit: "10000 ft" });
    if (total.inches.d > denominatorLimit) throw refuse("running-total-too-fine");
    totals.push(total);
  }
  return totals;
}

function after(total: Length, line: Strip[number]): Length {
  switch (line.op) {
    case "add":
      return total.plus(line.length);
    case "subtract":
      return total.minus(line.length);
    case "times":
      return total.times(line.factor);
    case "divide":
      return total.over(line.factor);
  }
}
