"use client";

import { useEffect, useState, type ReactNode } from "react";
import { flushSync } from "react-dom";
import { Button } from "@/components/ui/button";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** The first of a long list and a button for the rest: a house makes more rows than a phone draws in one breath. */
export function useFold<Item>(items: readonly Item[], atOnce: number): [shown: readonly Item[], more: ReactNode] {
  const t = useTranslate();
  const [all, setAll] = useState(false);
  useEffect(() => {
    const unfold = () => flushSync(() => setAll(true)); // paper has no button
    addEventListener("beforeprint", unfold);
    return () => removeEventListener("beforeprint", unfold);
  }, []);
  const hidden = all ? 0 : Math.max(0, items.length - atOnce);
  if (hidden === 0) return [items, null];
  return [
    items.slice(0, atOnce),
    <Button key="more" kind="ghost" className="no-print" onClick={() => setAll(true)}>
      {t("plates.more-rows", { count: hidden })}
    </Button>,
  ];
}
