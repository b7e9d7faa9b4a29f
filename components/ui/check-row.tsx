"use client";

import type { ReactNode } from "react";

/** A yes or no: sent as `name=value` when ticked. */
export function CheckRow({ name, value = "true", checked, onChange, children }: { name: string; value?: string; checked: boolean; onChange: (checked: boolean) => void; children: ReactNode }) {
  return (
    <label className="check-row">
      <input type="checkbox" name={name} value={value} checked={checked} onChange={(event) => onChange(event.target.checked)} />
      <span>{children}</span>
    </label>
  );
}
