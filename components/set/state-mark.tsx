import type { State } from "@/lib/client/set/stage-state";

/** A stage's state by shape, beside its word: check, exclamation, arrow, turned arrow, empty square. */
export function StateMark({ state }: { state: State }) {
  return (
    <svg className="state-mark" data-state={state} width="26" height="26" viewBox="0 0 26 26" aria-hidden="true" focusable="false">
      <rect x="1.5" y="1.5" width="23" height="23" className="state-box" />
      {state === "done" ? <path d="M6.5 13.5 11 18 19.5 8.5" className="state-line" /> : null}
      {state === "look" ? <path d="M13 6v8.5M13 17.5v3" className="state-line" /> : null}
      {state === "open" ? <path d="M9.5 7v12L18 13z" className="state-fill" /> : null}
      {state === "stale" ? <path d="M19 10.5A6.5 6.5 0 1 0 19.5 15M19.5 5v6h-6" className="state-line" /> : null}
    </svg>
  );
}
