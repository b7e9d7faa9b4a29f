import { openDB, type DBSchema, type IDBPDatabase } from "idb";
import type { SillSet } from "./schema";

/** Where sets are kept. `update` reads and writes in one transaction, so that two tabs never lose each other's change. */
export interface SetDatabase {
  all(): Promise<SillSet[]>;
  get(id: string): Promise<SillSet | undefined>;
  /** @throws QuotaExceededError when the device has no room. */
  update(id: string, change: (before: SillSet | undefined) => SillSet | undefined): Promise<void>;
  remove(id: string): Promise<void>;
}

interface Schema extends DBSchema {
  sets: { key: string; value: SillSet };
}

const name = "sillwright";
const version = 1;

/**
 * The sets in this browser's IndexedDB.
 *
 * @throws whatever the browser says when it refuses storage.
 */
export async function openSetDatabase(onOutdated: () => void): Promise<SetDatabase> {
  const database: IDBPDatabase<Schema> = await openDB<Schema>(name, version, {
    upgrade(opened) {
      opened.createObjectStore("sets", { keyPath: "id" });
    },
    // A newer edition of the site in another tab wants to change the store: this tab lets go, and says so.
    blocking() {
      database.close();
      onOutdated();
    },
    terminated: onOutdated,
  });
  return {
    all: () => database.getAll("sets"),
    get: (id) => database.get("sets", id),
    async update(id, change) {
      const transaction = database.transaction("sets", "readwrite");
      const after = change(await transaction.store.get(id));
      await Promise.all([after === undefined ? undefined : transaction.store.put(after), transaction.done]);
    },
    remove: (id) => database.delete("sets", id),
  };
}
