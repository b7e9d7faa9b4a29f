import type { TakeoffAnswer, TakeoffLine } from "@/calculators/takeoff";
import type { Translate } from "@/lib/client/i18n/translate";

/** A line of the list in words: what, of what size, how much of it is used, and what to mind. */
export function lineTexts(line: TakeoffLine, isMetric: boolean, t: Translate) {
  const { item, size, quantity, unit, amount, note } = line;
  return {
    item: t(`takeoff.item.${item}`),
    size: size === null ? "" : size.text,
    quantity,
    unit: t(`takeoff.unit.${unit}`, { count: quantity }),
    used: amount === null ? "" : amountText(amount, isMetric, t),
    note: note === null ? "" : t(`takeoff.note.${note}`),
  };
}

function amountText({ value, unit, metric, metricUnit }: NonNullable<TakeoffLine["amount"]>, isMetric: boolean, t: Translate): string {
  const [shown, of] = isMetric ? [metric, metricUnit] : [value, unit];
  const digits = shown < 10 ? 1 : 0;
  return t(`takeoff.amount.${of}`, { value: Number(shown.toFixed(digits)) });
}

/** The list as plain text, a line each, for a letter. */
export function listAsText(answer: TakeoffAnswer, isMetric: boolean, t: Translate): string {
  return answer.lines
    .map((line) => {
      const { item, size, quantity, unit, note } = lineTexts(line, isMetric, t);
      return `${quantity} ${unit} · ${item}${size === "" ? "" : `, ${size}`}${note === "" ? "" : ` (${note})`}`;
    })
    .join("\n");
}

/** The list as rows for a spreadsheet, with its headings. */
export function listAsRows(answer: TakeoffAnswer, isMetric: boolean, t: Translate): (string | number)[][] {
  const head = (["item", "size", "quantity", "unit", "used", "note"] as const).map((name) => t(`takeoff.table.${name}`));
  return [head, ...answer.lines.map((line) => Object.values(lineTexts(line, isMetric, t)))];
}
