import type { SetDatabase } from "./database";
import { applyPatch, mergePatches, type SetPatch } from "./patch";
import type { SillSet } from "./schema";
import { remember, takeBack, type UndoLabel, type UndoStack } from "./undo-stack";

/** Whether what is typed is kept: `kept`; `full` no room on the device; `refused` the browser keeps nothing; `outdated` a newer site took the store over. */
export type Keeping = "kept" | "full" | "refused" | "outdated";

export interface SetsState {
  /** null until they have been read. */
  sets: readonly SillSet[] | null;
  keeping: Keeping;
  /** Changes that have not reached the store yet. */
  waiting: number;
}

/** Tells other tabs which set changed. */
export interface Herald {
  tell(id: string): void;
  listen(heard: (id: string) => void): void;
}

interface Clock {
  now(): number;
}

interface Change {
  /** Puts a whole set where none was; nothing happens to one that is there. */
  put?: SillSet;
  patch: SetPatch;
  at: string;
}

/**
 * Every set on the device, as this tab sees it. A change shows at once and is written at once, leaf by leaf over what other
 * tabs wrote; one that cannot be written stays here and is tried again with the next.
 */
export function createSetStore(open: (onOutdated: () => void) => Promise<SetDatabase>, herald: Herald, clock: Clock = Date) {
  let state: SetsState = { sets: null, keeping: "kept", waiting: 0 };
  let database: SetDatabase | null = null;
  const listeners = new Set<() => void>();
  const pending = new Map<string, Change>();
  const stacks = new Map<string, UndoStack>();
  let writing: Promise<void> | null = null;
  let inFlight: { id: string; change: Change } | null = null;
  /** How many writes are done: what was read before one of them is out of date. */
  let written = 0;

  const set = (next: Partial<SetsState>) => {
    state = { ...state, ...next };
    for (const listener of listeners) listener();
  };
  const isoNow = () => new Date(clock.now()).toISOString();
  const find = (id: string) => state.sets?.find((known) => known.id === id);
  const withSet = (changed: SillSet) => {
    const sets = state.sets ?? [];
    return sets.some(({ id }) => id === changed.id) ? sets.map((known) => (known.id === changed.id ? changed : known)) : [...sets, changed];
  };

  async function write(id: string, { put, patch, at }: Change): Promise<void> {
    await database!.update(id, (before) => {
      const base = before ?? put;
      return base === undefined ? undefined : applyPatch(base, patch, at);
    });
    herald.tell(id);
  }

  async function writeAll(): Promise<void> {
    while (pending.size > 0 && database !== null && state.keeping !== "outdated") {
      const [id, change] = pending.entries().next().value!;
      pending.delete(id);
      inFlight = { id, change };
      try {
        await write(id, change);
        inFlight = null;
        written += 1;
      } catch (error) {
        inFlight = null;
        const newer = pending.get(id);
        pending.set(id, newer === undefined ? change : { put: change.put, patch: mergePatches(change.patch, newer.patch), at: newer.at });
        set({ keeping: error instanceof Error && error.name === "QuotaExceededError" ? "full" : "refused", waiting: pending.size });
        return;
      }
    }
    if (state.keeping !== "outdated" && database !== null && (state.keeping !== "kept" || state.waiting !== pending.size)) set({ keeping: "kept", waiting: pending.size });
  }

  function flush(): Promise<void> {
    writing ??= writeAll().finally(() => {
      writing = null;
    });
    return writing;
  }

  function enqueue(id: string, change: Change): void {
    const earlier = pending.get(id);
    pending.set(id, earlier === undefined ? change : { put: earlier.put ?? change.put, patch: mergePatches(earlier.patch, change.patch), at: change.at });
    void flush();
  }

  /** What another tab wrote, with what this one has not written yet on top. */
  async function reread(id: string): Promise<void> {
    const before = written;
    const stored = await database?.get(id).catch(() => undefined);
    if (written !== before) return reread(id);
    const mine = [...(inFlight?.id === id ? [inFlight.change] : []), ...(pending.has(id) ? [pending.get(id)!] : [])];
    if (stored === undefined) {
      if (mine.length === 0) set({ sets: (state.sets ?? []).filter((known) => known.id !== id) });
      return;
    }
    const whole = mine.reduce((known, { patch, at }) => applyPatch(known, patch, at), stored);
    set({ sets: withSet(sharing(find(id), whole)) });
  }

  return {
    get: () => state,
    find,
    subscribe(listener: () => void): () => void {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    /** Reads the store once; without one the sets last as long as the page, and `keeping` says so. */
    async start(): Promise<void> {
      try {
        database = await open(() => set({ keeping: "outdated" }));
        herald.listen((id) => void reread(id));
        set({ sets: await database.all() });
      } catch {
        set({ sets: state.sets ?? [], keeping: "refused" });
      }
    },
    add(added: SillSet): void {
      set({ sets: withSet(added) });
      enqueue(added.id, { put: added, patch: {}, at: added.changed });
    },
    /** `label` when the person may want it back. */
    change(id: string, patch: SetPatch, label?: UndoLabel): void {
      const before = find(id);
      if (before === undefined) return;
      if (label !== undefined) stacks.set(id, remember(stacks.get(id) ?? [], before, patch, label, clock.now()));
      const at = isoNow();
      set({ sets: withSet(applyPatch(before, patch, at)) });
      enqueue(id, { patch, at });
    },
    /** What would be taken back next. */
    undoable: (id: string) => stacks.get(id)?.at(-1) ?? null,
    undo(id: string): UndoLabel | null {
      const taken = takeBack(stacks.get(id) ?? []);
      if (taken === null) return null;
      stacks.set(id, taken.rest);
      this.change(id, taken.entry.inverse);
      return taken.entry;
    },
    /** For good: the set is out of the store and cannot come back. */
    async purge(id: string): Promise<void> {
      pending.delete(id);
      set({ sets: (state.sets ?? []).filter((known) => known.id !== id) });
      await database?.remove(id).catch(() => undefined);
      herald.tell(id);
    },
    /** Resolves once everything is written or cannot be. */
    flush,
  };
}

/** The newer set, with the very objects of the older one wherever a calculation is the same: what did not change is not worked out again. */
function sharing(older: SillSet | undefined, newer: SillSet): SillSet {
  if (older === undefined) return newer;
  const calculations = Object.entries(newer.calculations).map(([id, calculation]) => {
    const known = older.calculations[id];
    if (known === undefined) return [id, calculation] as const;
    if (JSON.stringify(known) === JSON.stringify(calculation)) return [id, known] as const;
    return [id, JSON.stringify(known.fields) === JSON.stringify(calculation.fields) ? { ...calculation, fields: known.fields } : calculation] as const;
  });
  return { ...newer, calculations: Object.fromEntries(calculations) };
}

export type SetStore = ReturnType<typeof createSetStore>;
