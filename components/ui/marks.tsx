/** Small drawn marks, since the shipped fonts have none. Decorative: words always stand beside them. */

const frame = { width: 26, height: 26, viewBox: "0 0 26 26", "aria-hidden": true, focusable: false } as const;

/** A true square with its check. */
export function GoodMark() {
  return (
    <svg {...frame}>
      <rect x="1" y="1" width="24" height="24" fill="var(--plumb)" />
      <path d="M6 13.5 11 18.5 20 8" fill="none" stroke="var(--on-ink)" strokeWidth="3.2" />
    </svg>
  );
}

/** A racked square, crossed. */
export function OutMark() {
  return (
    <svg {...frame}>
      <path d="M7 2h18l-6 22H1z" fill="var(--keel)" />
      <path d="M9.5 8.5l7 9M17 8.5l-8 9" fill="none" stroke="var(--on-ink)" strokeWidth="2.8" />
    </svg>
  );
}

export function WarnMark() {
  return (
    <svg {...frame}>
      <path d="M13 1.5 25.5 24.5H.5z" fill="var(--amber)" />
      <path d="M13 9.5v7M13 18.6v3" stroke="var(--on-ink)" strokeWidth="2.8" />
    </svg>
  );
}

/** A piece of tape. */
export function TapeMark() {
  return (
    <svg {...frame}>
      <rect x="1" y="5" width="24" height="16" fill="var(--chalk)" />
      <path d="M5 5v9M9 5v5M13 5v9M17 5v5M21 5v9" fill="none" stroke="var(--on-chalk)" strokeWidth="2" />
    </svg>
  );
}

/** A square not yet drawn. */
export function IdleMark() {
  return (
    <svg {...frame}>
      <rect x="2.5" y="2.5" width="21" height="21" fill="none" stroke="var(--edge)" strokeWidth="2" strokeDasharray="4 3" />
    </svg>
  );
}

export function ErrorMark() {
  return (
    <svg width="18" height="18" viewBox="0 0 18 18" aria-hidden focusable={false}>
      <path d="M9 .5 17.5 9 9 17.5.5 9z" fill="var(--keel)" />
      <path d="M9 4.6v5.2M9 11.4v2.2" stroke="var(--on-ink)" strokeWidth="2.1" />
    </svg>
  );
}
