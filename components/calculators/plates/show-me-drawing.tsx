/** The plate stood on edge beside the bolts, marks squared across, a joint between two bolts. Decorative: the steps beside it say the same. */
export function PlatesShowMe() {
  return (
    <svg className="plan" viewBox="0 0 390 210" aria-hidden="true" focusable="false">
      <rect x="16" y="128" width="358" height="58" fill="var(--concrete)" stroke="var(--edge-strong)" strokeWidth="2.5" />
      <path d="M16 174h358" fill="none" stroke="var(--chalk-line)" strokeWidth="2.6" />
      <rect x="16" y="56" width="198" height="40" fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
      <rect x="218" y="56" width="156" height="40" fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
      {[48, 122, 190, 244, 330].map((x) => (
        <g key={x}>
          <circle cx={x} cy="150" r="7" fill="var(--steel)" />
          <path d={`M${x} 140V56`} fill="none" stroke="var(--keel)" strokeWidth="2" strokeDasharray="6 4" />
        </g>
      ))}
      <path d="M190 40h54m-48-5-6 5 6 5m42-10 6 5-6 5" fill="none" stroke="var(--ink)" strokeWidth="1.8" />
      <text x="42" y="44" className="num small">
        1
      </text>
      <text x="116" y="44" className="num small">
        2
      </text>
      <text x="212" y="32" className="num small">
        3
      </text>
    </svg>
  );
}
