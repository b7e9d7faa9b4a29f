"use client";

import { useEffect, useSyncExternalStore } from "react";
import type * as lengthCore from "./length";

export type LengthCore = typeof lengthCore;

let core: LengthCore | null = null;
let loading: Promise<void> | null = null;
const listeners = new Set<() => void>();

/** Fetches the core once; a lost connection leaves the way open for another try at the next mount. */
export function loadLengthCore(): Promise<void> {
  return takeLengthCore(() => import("./length"));
}

/** A calculator's own lazy piece holds the core too: told before the fields ask for it, it spares them a second copy. `undefined` is a piece without. */
export function bringLengthCore(coming: Promise<LengthCore | undefined>): void {
  void takeLengthCore(async () => (await coming) ?? import("./length"));
}

function takeLengthCore(fetchCore: () => Promise<LengthCore>): Promise<void> {
  loading ??= fetchCore().then(
    (module) => {
      core = module;
      for (const listener of listeners) listener();
    },
    () => {
      loading = null;
    },
  );
  return loading;
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** The parser and printer, or null until they have come: after first paint, so that the page shows before the math. */
export function useLengthCore(): LengthCore | null {
  const found = useSyncExternalStore(subscribe, () => core, () => null);
  useEffect(() => afterFirstPaint(() => void loadLengthCore()), []);
  return found;
}

/** Runs once the first frame is on screen and the browser has a moment. Returns the way to call it off. */
export function afterFirstPaint(run: () => void): () => void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  const frame = requestAnimationFrame(() => {
    timer = setTimeout(run, 0);
  });
  return () => {
    cancelAnimationFrame(frame);
    clearTimeout(timer);
  };
}
