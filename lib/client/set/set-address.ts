import { localePath, type Locale } from "@/lib/client/i18n/locales";

/** Where in the sets a page is: read in the browser from one static page's address. */
export interface SetPlace {
  set: string | null;
  stage: string | null;
  /** Which of the stage's calculations, where it has several: `squareness`, or a wall. */
  part: string | null;
}

export function readPlace(query: URLSearchParams): SetPlace {
  return { set: query.get("set"), stage: query.get("stage"), part: query.get("part") };
}

export function setAddress(locale: Locale, { set, stage, part }: Partial<SetPlace> = {}): string {
  const query = new URLSearchParams();
  if (set) query.set("set", set);
  if (set && stage) query.set("stage", stage);
  if (set && stage && part) query.set("part", part);
  return localePath(locale, `/set${query.size === 0 ? "" : `?${query.toString()}`}`);
}
