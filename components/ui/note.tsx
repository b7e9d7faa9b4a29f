import type { ReactNode } from "react";

const tones = { plain: "", warn: "note-warn", out: "note-out", good: "note-good" } as const;

/** A boxed remark with a heavy left edge: what the readings prove, a warning, an agreement. */
export function Note({ title, tone = "plain", children }: { title?: ReactNode; tone?: keyof typeof tones; children: ReactNode }) {
  return (
    <div className={`note ${tones[tone]}`}>
      {title === undefined ? null : <p className="note-title">{title}</p>}
      <div className="note-body">{children}</div>
    </div>
  );
}
