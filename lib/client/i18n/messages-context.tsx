"use client";

import { createContext, use, useMemo, type ReactNode } from "react";
import type { Locale } from "./locales";
import { createTranslate, type Messages, type Translate } from "./translate";

const MessagesContext = createContext<{ locale: Locale; messages: Messages }>({ locale: "en", messages: {} });

/** Gives the pieces below it these messages, beside those of providers above. The layout gives `common`; a page adds its own namespaces. */
export function MessagesProvider({ locale, messages, children }: { locale: Locale; messages: Messages; children: ReactNode }) {
  const above = use(MessagesContext);
  const value = useMemo(() => ({ locale, messages: { ...above.messages, ...messages } }), [above.messages, locale, messages]);
  return <MessagesContext value={value}>{children}</MessagesContext>;
}

/** `t("squareness.title")` for client components; server components use `getTranslate`. */
export function useTranslate(): Translate {
  const { locale, messages } = use(MessagesContext);
  return useMemo(() => createTranslate(locale, messages), [locale, messages]);
}
