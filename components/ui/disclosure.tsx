import type { ReactNode } from "react";

/** A part of the page that opens on demand; it is in the page and in print without script. */
export function Disclosure({ summary, open, id, children }: { summary: ReactNode; open?: boolean; id?: string; children: ReactNode }) {
  return (
    <details className="disclosure" open={open} id={id}>
      <summary>{summary}</summary>
      <div className="disclosure-body prose">{children}</div>
    </details>
  );
}
