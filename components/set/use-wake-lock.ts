"use client";

import { useEffect, useState } from "react";

/** Keeps the screen on while mounted. `null` until known; false where the browser cannot or will not. */
export function useWakeLock(): boolean | null {
  const [held, setHeld] = useState<boolean | null>(null);
  useEffect(() => {
    let lock: WakeLockSentinel | null = null;
    let over = false;
    const ask = async () => {
      if (document.visibilityState !== "visible") return;
      try {
        if (!("wakeLock" in navigator)) throw new Error("no wake lock");
        lock = await navigator.wakeLock.request("screen");
        if (over) void lock.release();
        else setHeld(true);
      } catch {
        if (!over) setHeld(false);
      }
    };
    // The browser lets go whenever the page is hidden; it must be asked again.
    const again = () => void ask();
    document.addEventListener("visibilitychange", again);
    void ask();
    return () => {
      over = true;
      document.removeEventListener("visibilitychange", again);
      void lock?.release().catch(() => undefined);
    };
  }, []);
  return held;
}
