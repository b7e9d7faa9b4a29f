import "server-only";
import compile from "icu-minify/compile";
import type { CompiledMessage } from "icu-minify/format";
import { catalogue, type MessageTree, type Namespace } from "./catalogue";
import type { Locale } from "./locales";
import { createTranslate, type Messages, type Translate } from "./translate";

/** Compiled once for each tree: a static page needs them at build only, an answer page at every request. */
const compiled = new WeakMap<MessageTree, Messages>();

/** The compiled messages of some namespaces, keyed `namespace.key`: plain JSON, fit to be a prop. `under` keeps only keys that begin so (`["squareness.form"]`). */
export function loadMessages(locale: Locale, namespaces: readonly Namespace[], under?: readonly string[]): Messages {
  const all = Object.assign({}, ...namespaces.map((namespace) => compileNamespace(locale, namespace))) as Messages;
  if (under === undefined) return all;
  return Object.fromEntries(Object.entries(all).filter(([key]) => under.some((start) => key.startsWith(start))));
}

/** The translator for a server component, a route handler or metadata. */
export function getTranslate(locale: Locale, namespaces: readonly Namespace[]): Translate {
  return createTranslate(locale, loadMessages(locale, namespaces));
}

function compileNamespace(locale: Locale, namespace: Namespace): Messages {
  const source = catalogue[locale][namespace];
  const known = compiled.get(source);
  if (known !== undefined) return known;
  const messages: Record<string, CompiledMessage> = {};
  const walk = (tree: MessageTree, prefix: string): void => {
    for (const [key, message] of Object.entries(tree)) {
      if (typeof message === "string") messages[`${prefix}.${key}`] = plainObjects(compile(message));
      else walk(message, `${prefix}.${key}`);
    }
  };
  walk(source, namespace);
  compiled.set(source, messages);
  return messages;
}

/** The compiler makes objects without a prototype, which cannot be a prop of a client component. */
function plainObjects(message: CompiledMessage): CompiledMessage {
  return JSON.parse(JSON.stringify(message)) as CompiledMessage;
}
