"use client";

import { use, useDeferredValue, useEffect, useMemo, useRef, useState, useSyncExternalStore, type FocusEvent, type FormEvent } from "react";
import type { z } from "zod";
import type { Answered, Issue, Operation } from "@/calculators/schema";
import { inputFromQuery } from "@/calculators/schema/query";
import { afterFirstPaint, bringLengthCore, type LengthCore } from "@/lib/client/core/use-length-core";
import { localePath } from "@/lib/client/i18n/locales";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { precisionOf, unitOf } from "@/lib/client/settings/device-settings";
import { deviceSettings, useDeviceSettings } from "@/lib/client/settings/use-device-settings";
import { fieldId } from "./field-id";
import { defaultPrecision, defaultUnit, queryFromForm, rowCount, withoutRow, type Fields, type FormState, type IsLength } from "./form-fields";
import { FormHomeContext } from "./form-home";
import { createFormStore } from "./form-store";
import { createTypedText } from "./typed-text";

/** What an answer page worked out on the server: the form as sent, and its answer or issues. */
export interface Initial<Answer> {
  form: FormState;
  answered: Answered<Answer>;
}

/** The core of one operation, fetched after first paint. */
export interface LoadedOperation {
  operation: Operation;
  answerTo: (operation: Operation, request: unknown) => Answered<unknown>;
  /** The parser and printer that the piece holds anyway, for the fields. */
  lengthCore?: LengthCore;
}

interface Options<Answer> {
  /** The folder and page name. */
  name: string;
  /** Fetches the operation: `() => import("./core").then(({ loaded }) => loaded)`; called once, after first paint. */
  load: () => Promise<LoadedOperation>;
  /** Whether a field holds a length, so that a change of unit keeps its meaning. */
  isLength: IsLength;
  /** Fields a fresh page starts with. */
  defaults?: Fields;
  initial?: Initial<Answer>;
  /** Fields sent along that no input shows, or shaped otherwise: changes the input before it is asked. */
  prepare?: (input: Record<string, unknown>) => Record<string, unknown>;
}

const nothingTyped: Answered<never> = { answer: null, issues: [] };

/**
 * A calculator's page: what is typed, in the address and here; the answer as soon as it can be worked out, in the
 * browser; and the sentences to show beside fields. Errors show once a field is left, or when the answer is asked for.
 */
export function useCalculator<AnswerSchema extends z.ZodType>({ name, load, isLength, defaults, initial, prepare }: Options<z.output<AnswerSchema>>) {
  type Answer = z.output<AnswerSchema>;
  const t = useTranslate();
  const { unit, precision } = useDeviceSettings();
  const home = use(FormHomeContext);
  const [store] = useState(() => home?.open({ defaults: defaults ?? {}, isLength }) ?? createFormStore(initial?.form ?? { fields: defaults ?? {}, unit: defaultUnit, precision: defaultPrecision }));
  const [typed] = useState(() => createTypedText((fields) => store.change({ ...store.get(), fields: { ...store.get().fields, ...fields } })));
  const form = useSyncExternalStore(store.subscribe, store.get, store.getInitial);
  const [loaded, setLoaded] = useState<LoadedOperation | null>(null);
  const [focused, setFocused] = useState<string | null>(null);
  const [asked, setAsked] = useState(initial === undefined ? 0 : 1);
  const loader = useRef(load);
  const lengthTest = useRef(isLength);

  useEffect(() => {
    let callOff = () => {};
    const coming = new Promise<LoadedOperation>((resolve, reject) => {
      const stop = afterFirstPaint(() => void loader.current().then(resolve, reject));
      callOff = () => {
        stop();
        reject(new Error("The page was left before its core was asked for"));
      };
    });
    bringLengthCore(coming.then(({ lengthCore }) => lengthCore));
    coming.then(setLoaded, () => undefined);
    return () => callOff();
  }, []);
  useEffect(() => {
    typed.flush();
    const settings = deviceSettings(); // not the rendered ones: the first client render still sees the defaults
    store.adopt(unitOf(settings.units), precisionOf(settings), lengthTest.current);
  }, [store, typed, unit, precision]);

  const deferred = useDeferredValue(form);
  const input = useMemo(() => inputOf(deferred, prepare), [deferred, prepare]);
  const answered = useMemo((): Answered<Answer> => {
    if (loaded !== null) return loaded.answerTo(loaded.operation, input) as Answered<Answer>;
    return initial?.answered ?? nothingTyped;
  }, [loaded, input, initial]);

  useEffect(() => {
    window.addEventListener("pagehide", typed.flush, true); // before the store writes the address
    return () => {
      window.removeEventListener("pagehide", typed.flush, true);
      typed.flush();
    };
  }, [typed]);

  useEffect(() => {
    if (loaded !== null) home?.report({ form: deferred, input, answer: answered.answer });
  }, [home, loaded, deferred, input, answered]);

  const sentence = (issue: Issue): string => {
    const key = `errors.${issue.code}`;
    const example = form.unit === "mm" ? "8725 mm" : "28' 7 1/2\"";
    return t(t.has(key) ? key : "errors.not-valid", { example, ...issue.params });
  };
  const nameOf = (issue: Issue) => issue.pointer.slice(1).replaceAll("/", ".");
  const shown = answered.issues.filter((issue) => {
    const field = nameOf(issue);
    if (asked > 0) return true;
    return field !== focused && (form.fields[field] ?? "").trim() !== "";
  });
  const errorAt = (field: string) => {
    const issue = shown.find((candidate) => nameOf(candidate) === field);
    return issue === undefined ? undefined : sentence(issue);
  };
  const changeForm = (next: (state: FormState) => FormState) => {
    typed.flush();
    store.change(next(store.get()));
  };
  const change = (fields: Fields) => changeForm((state) => ({ ...state, fields: { ...state.fields, ...fields } }));

  return {
    ...form,
    /** The answer to what is typed now, or null while something is missing or wrong. */
    answer: answered.answer as Answer | null,
    issues: answered.issues,
    /** Issues to show in the summary above the form, each leading to its field. */
    problems: shown.map((issue) => ({ fieldId: form.fields[nameOf(issue)] !== undefined || issue.code === "required" ? fieldId(nameOf(issue)) : undefined, text: sentence(issue) })),
    /** Whether the answer belongs to an older key press than the one on screen. */
    settling: deferred !== form,
    ready: loaded !== null,
    /** How often the answer was asked for. */
    asked,
    /** The plain input, as the API takes it. */
    input,
    query: queryFromForm(form).toString(),
    value: (field: string) => form.fields[field] ?? "",
    set: (field: string, text: string) => change({ [field]: text }),
    change,
    errorAt,
    rows: (list: string) => rowCount(form.fields, list),
    removeRow: (list: string, row: number) => changeForm((state) => ({ ...state, fields: withoutRow(state.fields, list, row) })),
    /** Everything back to a fresh page. */
    reset: () => {
      setAsked(0);
      changeForm((state) => ({ ...state, fields: defaults ?? {} }));
    },
    /** Writes the address at once, for a copy of it. */
    flush: () => {
      typed.flush();
      store.flush();
    },
    /** Spread on a length field: its name, text, error, unit and precision. */
    field: (field: string) => ({
      id: fieldId(field),
      name: field,
      value: form.fields[field] ?? "",
      onChange: (text: string) => typed.type(field, text),
      error: errorAt(field),
      unit: form.unit,
      precision: form.precision,
    }),
    /** Spread on the form: without script it goes to the answer page. */
    formProps: {
      method: "get" as const,
      action: localePath(t.locale, `/calculators/${name}/answer`),
      noValidate: true,
      autoComplete: "off",
      onSubmit: (event: FormEvent) => {
        event.preventDefault();
        typed.flush();
        setAsked((count) => count + 1);
        store.flush();
      },
      onFocus: (event: FocusEvent) => setFocused((event.target as HTMLInputElement).name || null),
      onBlur: () => {
        typed.flush();
        setFocused(null);
      },
    },
  };
}

function inputOf(form: FormState, prepare?: (input: Record<string, unknown>) => Record<string, unknown>): Record<string, unknown> {
  const input = inputFromQuery(queryFromForm(form));
  return prepare === undefined ? input : prepare(input);
}
