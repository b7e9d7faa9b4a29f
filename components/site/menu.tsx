"use client";

import { useEffect, useRef, type KeyboardEvent, type ReactNode } from "react";

/** A `<details>` that opens without script, and with it closes on Escape and on a tap elsewhere. */
export function Menu({ className, summary, children }: { className: string; summary: ReactNode; children: ReactNode }) {
  const details = useRef<HTMLDetailsElement>(null);

  useEffect(() => {
    const closeOutside = (event: PointerEvent) => {
      const menu = details.current;
      if (menu?.open && event.target instanceof Node && !menu.contains(event.target)) menu.open = false;
    };
    document.addEventListener("pointerdown", closeOutside);
    return () => document.removeEventListener("pointerdown", closeOutside);
  }, []);

  const closeOnEscape = (event: KeyboardEvent) => {
    const menu = details.current;
    if (event.key !== "Escape" || !menu?.open) return;
    menu.open = false;
    menu.querySelector("summary")?.focus();
  };

  return (
    <details ref={details} className={className} onKeyDown={closeOnEscape}>
      <summary>{summary}</summary>
      {children}
    </details>
  );
}
