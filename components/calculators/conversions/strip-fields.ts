import type { StripOperation } from "@/calculators/conversions";
import type { SearchParams } from "@/lib/client/calculator/answer-on-server";
import type { Fields } from "@/lib/client/calculator/form-fields";

/** The strip's fields in the form: `strip.0.op`, `strip.0.value` and so on, as the API names them. */

export const stripOperationNames = ["add", "subtract", "times", "divide"] as const satisfies readonly StripOperation[];

export const opField = (row: number) => `strip.${row}.op`;
export const valueField = (row: number) => `strip.${row}.value`;

export function scales(op: string): boolean {
  return op === "times" || op === "divide";
}

/** `value`, and the lines that add or subtract; the others hold plain numbers, which no change of unit may touch. */
export function isLengthField(name: string, fields: Fields): boolean {
  const row = /^strip\.(\d+)\.value$/.exec(name)?.[1];
  return name === "value" || (row !== undefined && !scales(fields[opField(Number(row))] ?? "add"));
}

/** The one length becomes the first line, and a second one follows: `op`, with what it is given. */
export function firstLines(value: string, op: StripOperation, text = ""): Fields {
  return { value: "", [opField(0)]: "add", [valueField(0)]: value, [opField(1)]: op, [valueField(1)]: text };
}

/** A line just added has nothing in it yet, and the lines above it have their total all the same. */
export function withoutBlankEnd(input: Record<string, unknown>): Record<string, unknown> {
  if (!Array.isArray(input.strip)) return input;
  const lines = input.strip as { value?: unknown }[];
  const end = lines.findLastIndex((line) => line.value !== undefined) + 1;
  const { strip: _dropped, ...rest } = input;
  return end === 0 ? rest : { ...rest, strip: lines.slice(0, end) };
}

/**
 * A form sent without script holds the length and some lines, blank ones among them: the filled lines follow each other
 * behind the length, and without any the length stands alone.
 */
export function foldLines(query: SearchParams): SearchParams {
  const first = (name: string) => [query[name]].flat()[0]?.trim() ?? "";
  const rows = Object.keys(query).flatMap((name) => /^strip\.(\d{1,3})\.value$/.exec(name)?.[1] ?? []);
  const lines = rows
    .map(Number)
    .sort((a, b) => a - b)
    .map((row) => ({ op: first(opField(row)), value: first(valueField(row)) }))
    .filter(({ value }) => value !== "");
  const rest = Object.entries(query).filter(([name]) => !/^strip\.\d{1,3}\.(op|value)$/.test(name) && (lines.length === 0 || name !== "value"));
  const value = first("value");
  if (lines.length > 0 && value !== "") lines.unshift({ op: "add", value });
  return Object.fromEntries([...rest, ...lines.flatMap((line, row): [string, string][] => [[opField(row), line.op], [valueField(row), line.value]])]);
}
