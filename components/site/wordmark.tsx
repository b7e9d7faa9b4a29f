/** Our own mark: two plates at a corner, the diagonal pulled across, and the right angle proved. */
export function Mark({ size = 30 }: { size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 30 30" aria-hidden="true" focusable="false">
      <path d="M3 3v24h24" fill="none" stroke="var(--ink)" strokeWidth="4" />
      <path d="M4 26 26 4" stroke="var(--chalk-line)" strokeWidth="2.4" strokeDasharray="5 2.4" />
      <path d="M3 20h7v7" fill="none" stroke="var(--ink)" strokeWidth="1.6" />
    </svg>
  );
}
