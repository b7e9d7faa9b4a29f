/** The tape hooked at the outside of the rim, a line and an X at each mark. Decorative: the steps beside it say the same. */
export function MarksShowMe() {
  return (
    <svg className="plan" viewBox="0 0 390 200" aria-hidden="true" focusable="false">
      <rect x="24" y="96" width="346" height="48" fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
      <path d="M24 60h346" fill="none" stroke="var(--tape, var(--steel))" strokeWidth="12" />
      <path d="M24 48v26" stroke="var(--steel)" strokeWidth="4" />
      {[110, 204, 298].map((x) => (
        <g key={x}>
          <path d={`M${x} 54V144`} stroke="var(--ink)" strokeWidth="2.2" />
          <path d={`M${x + 5} 112l14 16m0-16l-14 16`} stroke="var(--keel)" strokeWidth="2.6" />
        </g>
      ))}
      <text x="30" y="40" className="num small">
        1
      </text>
      <text x="104" y="40" className="num small">
        2
      </text>
      <text x="116" y="170" className="num small">
        3
      </text>
    </svg>
  );
}
