/** A tape along the chalk from the corner to each bolt, and a square from the chalk across to its centre. Decorative: the steps beside it say the same. */
export function AnchorsShowMe() {
  return (
    <svg className="plan" viewBox="0 0 390 170" aria-hidden="true" focusable="false">
      <rect x="0" y="96" width="390" height="74" fill="var(--concrete)" />
      <path d="M0 96h390" stroke="var(--edge-strong)" strokeWidth="2.5" />
      <path d="M30 108h360" stroke="var(--chalk-line)" strokeWidth="2.6" />
      <path d="M30 96v74" stroke="var(--chalk-line)" strokeWidth="2.6" />
      <path d="M30 62h240v22H30zM30 62v11M60 62v6M90 62v8M120 62v6M150 62v11M180 62v6M210 62v8M240 62v6" fill="var(--blade)" stroke="var(--edge)" strokeWidth="1.5" />
      <circle cx="110" cy="136" r="6" fill="var(--steel)" />
      <circle cx="270" cy="140" r="6" fill="var(--steel)" />
      <path d="M270 84v24M270 108v26m-5-6 5 6 5-6" fill="none" stroke="var(--keel)" strokeWidth="2.4" />
      <text x="36" y="52" className="num small">
        1
      </text>
      <text x="280" y="126" className="num small">
        2
      </text>
    </svg>
  );
}
