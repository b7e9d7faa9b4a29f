import type { FormState, IsLength } from "@/lib/client/calculator/form-fields";
import { defaultPrecision, defaultUnit, inUnit } from "@/lib/client/calculator/form-fields";
import type { Report } from "@/lib/client/calculator/form-home";
import type { FormStore } from "@/lib/client/calculator/form-store";
import type { Adapter } from "./calculations/adapter";
import type { CalculationPatch } from "./patch";
import type { Calculation, Result } from "./schema";
import type { SetStore } from "./set-store";
import { fingerprint } from "./stage-state";
import type { Slot } from "./stages";

/** A form's state of a stored calculation, the same object while what was typed is the same, so that nothing is worked out twice. */
const forms = new WeakMap<Calculation["fields"], FormState>();

function formOf({ fields, unit, precision }: Calculation): FormState {
  const known = forms.get(fields);
  if (known !== undefined && known.unit === unit && known.precision === precision) return known;
  const form = { fields, unit, precision };
  forms.set(fields, form);
  return form;
}

/** A field of a numbered row: `bolts.3.station`, `pieces.0`. */
const inRow = (name: string) => /\.\d+(?:\.|$)/.test(name);

/** What must change for the stored calculation to say what the form says. Blank fields go, save those of rows: a row just added is there before anything is typed in it. */
export function formPatch(before: FormState, after: FormState): CalculationPatch {
  const fields: Record<string, string | null> = {};
  for (const name of new Set([...Object.keys(before.fields), ...Object.keys(after.fields)])) {
    const [was = null, text = null] = [before.fields[name], after.fields[name]];
    const is = text === "" && !inRow(name) ? null : text;
    if (was !== is) fields[name] = is;
  }
  return {
    ...(Object.keys(fields).length === 0 ? {} : { fields }),
    ...(before.unit === after.unit ? {} : { unit: after.unit }),
    ...(before.precision === after.precision ? {} : { precision: after.precision }),
  };
}

/** Binds a calculator's form to its place in a set. Until something is typed or carried in, the set holds nothing of it. */
export function stageFormStore(store: SetStore, setId: string, slotId: string, { defaults, isLength }: { defaults: FormState["fields"]; isLength: IsLength }): FormStore {
  let fresh: FormState = { fields: defaults, unit: defaultUnit, precision: defaultPrecision };
  const listeners = new Set<() => void>();
  const initial = fresh;
  const stored = () => store.find(setId)?.calculations[slotId];
  const get = () => {
    const calculation = stored();
    return calculation === undefined ? fresh : formOf(calculation);
  };

  function change(next: FormState, quietly = false): void {
    const before = stored();
    const patch = formPatch(before === undefined ? { ...fresh, fields: {} } : formOf(before), next);
    if (Object.keys(patch).length === 0) return;
    const whole = before === undefined ? { ...patch, unit: next.unit, precision: next.precision } : patch;
    const count = Object.keys(patch.fields ?? {}).length;
    store.change(setId, { calculations: { [slotId]: whole } }, quietly ? undefined : { what: count > 1 && before !== undefined && Object.keys(next.fields).length < Object.keys(before.fields).length ? "row" : "typing", slot: slotId });
  }

  // What was carried in came without the page's own first choices: they join it while nothing has been typed.
  const begun = stored();
  if (begun !== undefined && begun.result === null && Object.entries(begun.fields).every(([name, text]) => begun.taken[name] === text)) change({ ...formOf(begun), fields: { ...defaults, ...begun.fields } }, true);

  return {
    get,
    getInitial: () => initial,
    change: (next) => change(next),
    flush: () => void store.flush(),
    adopt(unit, precision) {
      const next = inUnit(get(), unit, precision, isLength);
      if (next.unit === get().unit && next.precision === get().precision) return;
      if (stored() !== undefined) return change(next, true);
      fresh = next;
      for (const listener of listeners) listener();
    },
    subscribe(listener) {
      listeners.add(listener);
      const stop = store.subscribe(listener);
      return () => {
        listeners.delete(listener);
        stop();
      };
    },
  };
}

interface Told {
  store: SetStore;
  setId: string;
  slot: Slot;
  adapter: Adapter<unknown>;
  core: string;
}

/** Keeps what a stage's calculator answered: key figure, what it gives and what it adds to the plan. Writes only what is new, so that two tabs come to rest. */
export function keepReport({ store, setId, slot, adapter, core }: Told, { form, input, answer }: Report): void {
  const calculation = store.find(setId)?.calculations[slot.id];
  if (calculation === undefined || formOf(calculation).fields !== form.fields) return;
  const asked = { unit: form.unit, input, wall: slot.wall };
  const result: Result | null =
    answer === null ? null : { operation: adapter.operation(answer), core, input, of: fingerprint(calculation), key: adapter.key(answer), gives: adapter.gives(answer, asked), layers: adapter.layers(answer, asked) };
  if (JSON.stringify(result) === JSON.stringify(calculation.result)) return;
  // Tabs of two editions must not take turns: the newer one's answer to the same fields stands.
  if (calculation.result !== null && calculation.result.of === fingerprint(calculation) && isOlder(core, calculation.result.core)) return;
  store.change(setId, { calculations: { [slot.id]: { result } } });
}

/** Whether a version such as 1.2.0 is older than another. */
function isOlder(version: string, other: string): boolean {
  return version.localeCompare(other, "en", { numeric: true }) < 0;
}
