import { defaultPrecision, defaultUnit } from "@/lib/client/calculator/form-fields";
import type { Calculation, Result, SillSet, Texts } from "./schema";

/** A change to a set, by its leaves: two tabs that change different fields both keep their change, and the last one to change the same field wins. */
export interface SetPatch {
  name?: string;
  deleted?: string | null;
  choices?: Readonly<Record<string, string | null>>;
  calculations?: Readonly<Record<string, CalculationPatch>>;
}

export interface CalculationPatch {
  /** null takes the field away. */
  fields?: Readonly<Record<string, string | null>>;
  unit?: Calculation["unit"];
  precision?: Calculation["precision"];
  taken?: Texts;
  result?: Result | null;
}

const blank: Calculation = { fields: {}, unit: defaultUnit, precision: defaultPrecision, taken: {}, result: null };
const knownKeys = new Set(Object.keys(blank));

function withEntries<Value>(record: Readonly<Record<string, Value>>, changes: Readonly<Record<string, Value | null>> = {}): Record<string, Value> {
  const next = new Map(Object.entries(record));
  for (const [key, value] of Object.entries(changes)) {
    if (value === null) next.delete(key);
    else next.set(key, value);
  }
  return Object.fromEntries(next);
}

/** Nothing typed, nothing taken, nothing answered, and nothing a later edition put there. */
const isBlank = (calculation: Calculation) =>
  Object.keys(calculation.fields).length === 0 && Object.keys(calculation.taken).length === 0 && calculation.result === null && Object.keys(calculation).every((key) => knownKeys.has(key));

/** The set with the change made. `now` is when, as ISO text. */
export function applyPatch(set: SillSet, patch: SetPatch, now: string): SillSet {
  const calculations = new Map(Object.entries(set.calculations));
  for (const [id, change] of Object.entries(patch.calculations ?? {})) {
    const { fields, ...rest } = change;
    const before = calculations.get(id) ?? blank;
    const after: Calculation = { ...before, ...rest, fields: fields === undefined ? before.fields : withEntries(before.fields, fields) };
    if (isBlank(after)) calculations.delete(id);
    else calculations.set(id, after);
  }
  return {
    ...set,
    ...(patch.name === undefined ? {} : { name: patch.name }),
    ...(patch.deleted === undefined ? {} : { deleted: patch.deleted }),
    choices: withEntries(set.choices, patch.choices),
    calculations: Object.fromEntries(calculations),
    changed: now,
  };
}

/** The change that takes `patch` back, of the set as it was before. */
export function inversePatch(set: SillSet, patch: SetPatch): SetPatch {
  const before = <Value>(record: Readonly<Record<string, Value>>, keys: object) => Object.fromEntries(Object.keys(keys).map((key) => [key, Object.hasOwn(record, key) ? record[key]! : null]));
  const calculations = Object.entries(patch.calculations ?? {}).map(([id, change]): [string, CalculationPatch] => {
    const was = Object.hasOwn(set.calculations, id) ? set.calculations[id]! : blank;
    const inverse: CalculationPatch = {
      ...(change.fields === undefined ? {} : { fields: before(was.fields, change.fields) }),
      ...(change.unit === undefined ? {} : { unit: was.unit }),
      ...(change.precision === undefined ? {} : { precision: was.precision }),
      ...(change.taken === undefined ? {} : { taken: was.taken }),
      ...(change.result === undefined ? {} : { result: was.result }),
    };
    return [id, inverse];
  });
  return {
    ...(patch.name === undefined ? {} : { name: set.name }),
    ...(patch.deleted === undefined ? {} : { deleted: set.deleted }),
    ...(patch.choices === undefined ? {} : { choices: before(set.choices, patch.choices) }),
    ...(patch.calculations === undefined ? {} : { calculations: Object.fromEntries(calculations) }),
  };
}

/** One change that does what both do, the second after the first. */
export function mergePatches(first: SetPatch, second: SetPatch): SetPatch {
  const calculations: Record<string, CalculationPatch> = { ...first.calculations };
  for (const [id, change] of Object.entries(second.calculations ?? {})) {
    const earlier = calculations[id];
    calculations[id] = { ...earlier, ...change, ...(earlier?.fields === undefined && change.fields === undefined ? {} : { fields: { ...earlier?.fields, ...change.fields } }) };
  }
  return {
    ...first,
    ...second,
    ...(first.choices === undefined && second.choices === undefined ? {} : { choices: { ...first.choices, ...second.choices } }),
    ...(first.calculations === undefined && second.calculations === undefined ? {} : { calculations }),
  };
}
