"use client";

import { useEffect, useState } from "react";
import { Button } from "@/components/ui/button";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** After the page and its core are in: what the worker then fetches must not stand in their way. */
const delayMilliseconds = 2_000;

/** Registers the service worker, and offers a new edition of the site once it waits: quietly, and never by itself. */
export function OfflineReady() {
  const t = useTranslate();
  const [waiting, setWaiting] = useState<ServiceWorker | "elsewhere" | null>(null);

  useEffect(() => {
    if (process.env.NODE_ENV !== "production" || !("serviceWorker" in navigator)) return;
    const { serviceWorker } = navigator;
    const hadOne = serviceWorker.controller !== null;
    let registration: ServiceWorkerRegistration | undefined;
    const look = () => {
      if (registration?.waiting && serviceWorker.controller) setWaiting(registration.waiting);
    };
    const found = () => registration?.installing?.addEventListener("statechange", look);
    // Another tab took the new edition: this one's scripts may be gone.
    const replaced = () => hadOne && setWaiting("elsewhere");
    const ask = () => {
      if (document.visibilityState === "visible") void registration?.update().catch(() => undefined);
    };
    const register = async () => {
      registration = await serviceWorker.register("/sw.js").catch(() => undefined);
      registration?.addEventListener("updatefound", found);
      found();
      look();
    };
    let timer: ReturnType<typeof setTimeout> | undefined;
    const begin = () => {
      timer = setTimeout(() => void register(), delayMilliseconds);
    };
    if (document.readyState === "complete") begin();
    else window.addEventListener("load", begin, { once: true });
    serviceWorker.addEventListener("controllerchange", replaced);
    document.addEventListener("visibilitychange", ask);
    return () => {
      clearTimeout(timer);
      window.removeEventListener("load", begin);
      registration?.removeEventListener("updatefound", found);
      serviceWorker.removeEventListener("controllerchange", replaced);
      document.removeEventListener("visibilitychange", ask);
    };
  }, []);

  if (waiting === null) return null;
  const take = () => {
    if (waiting === "elsewhere") return window.location.reload();
    navigator.serviceWorker.addEventListener("controllerchange", () => window.location.reload(), { once: true });
    waiting.postMessage({ type: "SKIP_WAITING" });
  };
  return (
    <div className="update-bar no-print" role="status">
      <span>{t(waiting === "elsewhere" ? "common.update.taken" : "common.update.ready")}</span>
      <Button small onClick={take}>
        {t("common.update.use")}
      </Button>
    </div>
  );
}
