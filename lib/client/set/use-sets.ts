"use client";

import { useEffect, useSyncExternalStore } from "react";
import { openSetDatabase } from "./database";
import { createSetStore, type Herald, type SetsState, type SetStore } from "./set-store";

/** Tabs of one browser, where the browser lets them speak; the store is the truth either way. */
function tabs(): Herald {
  const channel = typeof BroadcastChannel === "undefined" ? null : new BroadcastChannel("sillwright.sets");
  return {
    tell: (id) => channel?.postMessage(id),
    listen: (heard) => channel?.addEventListener("message", ({ data }) => heard(String(data))),
  };
}

let store: SetStore | null = null;

/** One store a tab, made when first asked for: never on the server. */
export function setStore(): SetStore {
  if (store === null) {
    store = createSetStore(openSetDatabase, tabs());
    void store.start();
  }
  return store;
}

const nothing: SetsState = { sets: null, keeping: "kept", waiting: 0 };

export function useSets(): SetsState {
  const state = useSyncExternalStore(
    (listener) => setStore().subscribe(listener),
    () => setStore().get(),
    () => nothing,
  );
  // A phone may clear what a site keeps unless it is asked not to: once there is something to keep. The answer changes nothing here.
  const hasSets = (state.sets?.length ?? 0) > 0;
  useEffect(() => {
    if (hasSets) void navigator.storage?.persist?.().catch(() => false);
  }, [hasSets]);
  return state;
}

/** An id for a set: UUIDv7, so that sets sort by when they were made. */
export function newSetId(now = Date.now()): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  for (let index = 0; index < 6; index += 1) bytes[index] = Math.floor(now / 256 ** (5 - index)) % 256;
  bytes[6] = 0x70 | (bytes[6]! & 0x0f);
  bytes[8] = 0x80 | (bytes[8]! & 0x3f);
  const hex = [...bytes].map((byte) => byte.toString(16).padStart(2, "0")).join("");
  return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join("-");
}
