/** Boards stacked, a roll of sealer, a box of nuts and washers. Decorative: the steps beside it say the same. */
export function TakeoffShowMe() {
  return (
    <svg className="plan" viewBox="0 0 390 190" aria-hidden="true" focusable="false">
      {[132, 112, 92].map((y) => (
        <rect key={y} x="24" y={y} width="240" height="18" fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
      ))}
      <circle cx="312" cy="122" r="30" fill="var(--sheet)" stroke="var(--steel)" strokeWidth="3" />
      <circle cx="312" cy="122" r="10" fill="none" stroke="var(--steel)" strokeWidth="3" />
      <circle cx="60" cy="48" r="14" fill="none" stroke="var(--steel)" strokeWidth="5" />
      <path d="M104 34l14 8v14l-14 8-14-8V42z" fill="none" stroke="var(--steel)" strokeWidth="4" />
      <path d="M150 28v44M146 34h8M146 42h8M146 50h8" stroke="var(--steel)" strokeWidth="4" />
      <text x="24" y="174" className="num small">
        1
      </text>
      <text x="306" y="174" className="num small">
        2
      </text>
      <text x="180" y="54" className="num small">
        3
      </text>
    </svg>
  );
}
