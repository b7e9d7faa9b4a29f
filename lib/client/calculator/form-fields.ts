import type { LengthUnit, Precision } from "@/calculators/length";

/** A form as typed: dotted names (`diagonals.ac`, `bolts.0.station`) and their texts. Beside it, what a bare number means and what answers are rounded to. */
export type Fields = Readonly<Record<string, string>>;

export interface FormState {
  fields: Fields;
  unit: LengthUnit;
  precision: Precision;
}

const lengthUnits = ["in", "ft", "mm", "cm", "m"] as const satisfies readonly LengthUnit[];
const precisions = ["1/2", "1/4", "1/8", "1/16", "1/32", "1/64", "1mm", "0.5mm"] as const satisfies readonly Precision[];
export const defaultUnit: LengthUnit = "in";
export const defaultPrecision: Precision = "1/16";

/** What an address says of a form. Unknown units and precisions fall back; other names are kept for the schema to judge. */
export function formFromQuery(query: Iterable<[string, string]>): FormState {
  const { unit, precision, ...fields } = Object.fromEntries(query) as Record<string, string>;
  return {
    fields,
    unit: lengthUnits.find((known) => known === unit) ?? defaultUnit,
    precision: precisions.find((known) => known === precision) ?? defaultPrecision,
  };
}

/** The same way back: empty fields and defaults are left out, so that an address stays short. */
export function queryFromForm({ fields, unit, precision }: FormState): URLSearchParams {
  const query = new URLSearchParams(Object.entries(fields).filter(([, text]) => text.trim() !== ""));
  if (unit !== defaultUnit) query.set("unit", unit);
  if (precision !== defaultPrecision) query.set("precision", precision);
  return query;
}

/** A number without a unit or a mark of its own; a dash inside makes it feet and inches. */
const bareNumber = /^\s*[-\u2010-\u2015\u2212]?[\d\s.,/\u2044\u00BC-\u00BE\u2150-\u215E]+$/;

/** A length's text with its unit written out, so that it means the same in a form of another unit. */
export function meant(text: string, unit: LengthUnit): string {
  return /[\d\u00BC-\u00BE\u2150-\u215E]/.test(text) && bareNumber.test(text) ? `${text.trim()} ${unit}` : text;
}

/** Whether a field holds a length; `fields` for a field whose meaning another decides. */
export type IsLength = (name: string, fields: Fields) => boolean;

/** The form under another unit: bare numbers keep their meaning by taking the old unit as their own, so `336` becomes `336 in`. */
export function inUnit(form: FormState, unit: LengthUnit, precision: Precision, isLength: IsLength): FormState {
  if (form.unit === unit) return { ...form, precision };
  const keepMeaning = ([name, text]: [string, string]): [string, string] => [
    name,
    isLength(name, form.fields) ? meant(text, form.unit) : text,
  ];
  return { fields: Object.fromEntries(Object.entries(form.fields).map(keepMeaning)), unit, precision };
}

/** How many rows a list has: one more than its highest number. */
export function rowCount(fields: Fields, list: string): number {
  const start = `${list}.`;
  return Object.keys(fields).reduce((count, name) => (name.startsWith(start) ? Math.max(count, Number(name.slice(start.length).split(".")[0]) + 1) : count), 0);
}

/** The fields without one row; those after it move up. */
export function withoutRow(fields: Fields, list: string, row: number): Fields {
  const start = `${list}.`;
  const kept = Object.entries(fields).flatMap(([name, text]): [string, string][] => {
    if (!name.startsWith(start)) return [[name, text]];
    const [number = "", ...rest] = name.slice(start.length).split(".");
    const index = Number(number);
    if (index === row) return [];
    return [[[list, index > row ? index - 1 : index, ...rest].join("."), text]];
  });
  return Object.fromEntries(kept);
}
