import { localePath, type Locale } from "@/lib/client/i18n/locales";
import type { Messages } from "@/lib/client/i18n/translate";

const loaded = new Map<string, Promise<Messages>>();

/** Compiled messages that a page fetches when it needs them: a calculator's for its stage, `reading` for the reading mode. Static files, so they work offline. */
export function loadTexts(locale: Locale, name: string): Promise<Messages> {
  const address = localePath(locale, `/set/texts/${name}`);
  const known = loaded.get(address);
  if (known !== undefined) return known;
  const loading = fetch(address).then((response) => {
    if (!response.ok) throw new Error(`${address} answered ${response.status}`);
    return response.json() as Promise<Messages>;
  });
  loading.catch(() => loaded.delete(address));
  loaded.set(address, loading);
  return loading;
}
