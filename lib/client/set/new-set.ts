import type { SillSet } from "./schema";

export const setFormat = "sillwright-set";
export const setVersion = 1;

/** A set with nothing in it yet. */
export function newSet(id: string, name: string, now: string): SillSet {
  return { format: setFormat, version: setVersion, id, name, created: now, changed: now, deleted: null, choices: {}, calculations: {} };
}

/** The same set once more, under an id and a name of its own. */
export function duplicateOf(set: SillSet, id: string, name: string, now: string): SillSet {
  return { ...structuredClone(set), id, name, created: now, changed: now, deleted: null };
}
