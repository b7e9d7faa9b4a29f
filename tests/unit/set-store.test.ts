import { expect, test } from "vitest";
import type { SetDatabase } from "@/lib/client/set/database";
import { newSet } from "@/lib/client/set/new-set";
import type { SillSet } from "@/lib/client/set/schema";
import { createSetStore, type Herald } from "@/lib/client/set/set-store";

const now = "2026-12-01T08:00:00.000Z";

/** One device: a store that outlives its tabs, and a channel between them. */
function device() {
  const records = new Map<string, SillSet>();
  const heard = new Set<{ tab: number; hear: (id: string) => void }>();
  let full = false;
  const database: SetDatabase = {
    all: async () => structuredClone([...records.values()]),
    get: async (id) => structuredClone(records.get(id)),
    update: async (id, change) => {
      await Promise.resolve();
      if (full) throw Object.assign(new Error("no room"), { name: "QuotaExceededError" });
      const after = change(structuredClone(records.get(id)));
      if (after !== undefined) records.set(id, structuredClone(after));
    },
    remove: async (id) => void records.delete(id),
  };
  const open = async (tab: number) => {
    const herald: Herald = {
      tell: (id) => [...heard].filter((other) => other.tab !== tab).forEach(({ hear }) => hear(id)),
      listen: (hear) => void heard.add({ tab, hear }),
    };
    const store = createSetStore(async () => database, herald, { now: () => Date.parse(now) });
    await store.start();
    return store;
  };
  return { records, open, fill: (to: boolean) => (full = to) };
}

const settle = () => new Promise((resolve) => setTimeout(resolve, 10));
const typed = (field: string, text: string) => ({ calculations: { "concrete.squareness": { fields: { [field]: text } } } });

test("what is typed is there when the page is opened again", async () => {
  const { open } = device();
  const first = await open(1);
  first.add(newSet("a", "Lot 14", now));
  first.change("a", typed("length", "28'"));
  await settle();
  expect((await open(2)).find("a")?.calculations["concrete.squareness"]?.fields).toEqual({ length: "28'" });
});

test("two tabs that type into different fields keep both, and both see both", async () => {
  const { open } = device();
  const one = await open(1);
  one.add(newSet("a", "Lot 14", now));
  await settle();
  const two = await open(2);
  one.change("a", typed("length", "28'"));
  two.change("a", typed("width", "22'"));
  await settle();
  for (const tab of [one, two]) expect(tab.find("a")?.calculations["concrete.squareness"]?.fields).toEqual({ length: "28'", width: "22'" });
});

test("of two tabs that type into one field the last has it, in both", async () => {
  const { open } = device();
  const one = await open(1);
  one.add(newSet("a", "Lot 14", now));
  await settle();
  const two = await open(2);
  one.change("a", typed("length", "28'"));
  await settle();
  two.change("a", typed("length", "30'"));
  await settle();
  for (const tab of [one, two]) expect(tab.find("a")?.calculations["concrete.squareness"]?.fields.length).toBe("30'");
});

test("two tabs that type at once, key by key, end with all of both", async () => {
  const { open, records } = device();
  const one = await open(1);
  one.add(newSet("a", "Lot 14", now));
  await settle();
  const two = await open(2);
  for (let key = 1; key <= 30; key += 1) {
    one.change("a", typed("length", "1".repeat(key)));
    if (key % 3 === 0) await Promise.resolve();
    two.change("a", typed("width", "2".repeat(key)));
    if (key % 4 === 0) await settle();
    // what a tab typed never goes from its own screen
    expect([one.find("a")?.calculations["concrete.squareness"]?.fields.length, two.find("a")?.calculations["concrete.squareness"]?.fields.width]).toEqual(["1".repeat(key), "2".repeat(key)]);
  }
  await settle();
  for (const fields of [one.find("a"), two.find("a"), records.get("a")].map((set) => set?.calculations["concrete.squareness"]?.fields)) expect(fields).toEqual({ length: "1".repeat(30), width: "2".repeat(30) });
});

test("a full device says so, keeps what is typed on the page, and writes all of it once there is room", async () => {
  const { open, fill, records } = device();
  const store = await open(1);
  store.add(newSet("a", "Lot 14", now));
  await settle();
  fill(true);
  store.change("a", typed("length", "28'"));
  await settle();
  store.change("a", typed("width", "22'"));
  await settle();
  expect(store.get().keeping).toBe("full");
  expect(store.find("a")?.calculations["concrete.squareness"]?.fields).toEqual({ length: "28'", width: "22'" });
  expect(records.get("a")?.calculations).toEqual({});
  fill(false);
  store.change("a", typed("burn", "1 in"));
  await settle();
  expect(store.get().keeping).toBe("kept");
  expect(records.get("a")?.calculations["concrete.squareness"]?.fields).toEqual({ length: "28'", width: "22'", burn: "1 in" });
});

test("a browser that refuses storage says so and works on", async () => {
  const store = createSetStore(() => Promise.reject(new Error("SecurityError")), { tell: () => undefined, listen: () => undefined });
  await store.start();
  store.add(newSet("a", "Lot 14", now));
  store.change("a", typed("length", "28'"));
  await settle();
  expect([store.get().keeping, store.find("a")?.calculations["concrete.squareness"]?.fields]).toEqual(["refused", { length: "28'" }]);
});

test("undo takes back typing, a name and a deletion is one change away", async () => {
  const { open } = device();
  const store = await open(1);
  store.add(newSet("a", "Lot 14", now));
  store.change("a", { name: "Lot 15" }, { what: "rename" });
  store.change("a", typed("length", "28'"), { what: "typing", slot: "concrete.squareness" });
  expect(store.undo("a")?.slot).toBe("concrete.squareness");
  expect(store.find("a")?.calculations).toEqual({});
  store.undo("a");
  expect(store.find("a")?.name).toBe("Lot 14");
  expect(store.undo("a")).toBeNull();
  store.change("a", { deleted: now });
  store.change("a", { deleted: null });
  await settle();
  expect((await open(2)).find("a")?.deleted).toBeNull();
});
