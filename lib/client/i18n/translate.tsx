import format from "icu-minify/format";
import type { CompiledMessage, FormatOptions, FormatValues } from "icu-minify/format";
import { Fragment, isValidElement, type ReactNode } from "react";
import { formatterTags, type Locale } from "./locales";

/** Compiled messages by full key, such as `common.units.mm`. */
export type Messages = Readonly<Record<string, CompiledMessage>>;

export type TextValues = Record<string, string | number | Date>;
export type RichValues = Record<string, ReactNode | Date | ((chunks: ReactNode) => ReactNode)>;

export interface Translate {
  /** A plain sentence. `values` fill `{name}`, plurals and selects. */
  (key: string, values?: TextValues): string;
  /** A sentence with marked-up parts: `{difference}` may be an element, `<b>…</b>` takes a function (`b` and `num` have one). */
  rich(key: string, values?: RichValues): ReactNode;
  /** Whether there is a message: for keys built from a code. */
  has(key: string): boolean;
  locale: Locale;
}

/** Formatters are dear to make and are used at every key press. */
const formatterCache = new Map<string, unknown>();

function cached<Made>(kind: string, tag: unknown, options: unknown, make: () => Made): Made {
  const key = `${kind} ${String(tag)} ${JSON.stringify(options ?? null)}`;
  const found = formatterCache.get(key) as Made | undefined;
  if (found !== undefined) return found;
  const made = make();
  formatterCache.set(key, made);
  return made;
}

const options: FormatOptions = {
  formatters: {
    getNumberFormat: (...args) => cached("number", args[0], args[1], () => new Intl.NumberFormat(...args)),
    getDateTimeFormat: (...args) => cached("date", args[0], args[1], () => new Intl.DateTimeFormat(...args)),
    getPluralRules: (...args) => cached("plural", args[0], args[1], () => new Intl.PluralRules(...args)),
  },
  formats: { date: { medium: { year: "numeric", month: "short", day: "numeric" } } },
  timeZone: "UTC",
};

const defaultTags = {
  b: (chunks: ReactNode) => <b>{chunks}</b>,
  num: (chunks: ReactNode) => <span className="num">{chunks}</span>,
};

/** Elements travel through the formatter as private-use marks, since it makes text of every argument. */
const openMark = "\uE000";
const closeMark = "\uE001";
const marked = /\uE000(\d+)\uE001/;

export function createTranslate(locale: Locale, messages: Messages): Translate {
  const tag = formatterTags[locale];

  function messageOf(key: string): CompiledMessage {
    const message = messages[key];
    if (message !== undefined) return message;
    // At build a hole fails loudly; in a browser the reader is better served by the rest of the page.
    if (typeof window === "undefined") throw new Error(`No message "${key}" in ${locale}`);
    console.error(`No message "${key}" in ${locale}`);
    return key;
  }

  const translate = (key: string, values?: TextValues): string => String(format(messageOf(key), tag, values as FormatValues, options));

  const rich = (key: string, values: RichValues = {}): ReactNode => {
    const elements: ReactNode[] = [];
    const plain: FormatValues<ReactNode> = {};
    for (const [name, value] of Object.entries({ ...defaultTags, ...values })) {
      if (typeof value === "function") plain[name] = (chunks) => value(restore(chunks, elements)) as never;
      else if (isValidElement(value) || Array.isArray(value)) plain[name] = `${openMark}${elements.push(value) - 1}${closeMark}`;
      else plain[name] = value as string | number | Date;
    }
    return restore(format<ReactNode>(messageOf(key), tag, plain, options), elements);
  };

  return Object.assign(translate, { rich, has: (key: string) => key in messages, locale });
}

/** Puts the elements back where their marks stand. */
function restore(formatted: ReactNode | readonly ReactNode[], elements: readonly ReactNode[]): ReactNode {
  const parts = (Array.isArray(formatted) ? formatted : [formatted]).flatMap((part: ReactNode): ReactNode[] =>
    typeof part === "string" && part.includes(openMark)
      ? part.split(marked).map((piece, index) => (index % 2 === 1 ? elements[Number(piece)] : piece))
      : [part],
  );
  if (parts.length === 1) return parts[0];
  return parts.filter((part) => part !== "").map((part, index) => <Fragment key={index}>{part}</Fragment>);
}
