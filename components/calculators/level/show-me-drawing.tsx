/** The instrument on its legs, the line of sight, the rod on the concrete at a high and a low place. Decorative: the steps beside it say the same. */
export function LevelShowMe() {
  return (
    <svg className="plan" viewBox="0 0 390 230" aria-hidden="true" focusable="false">
      <path d="M20 184 130 178 240 190 370 182V216H20z" fill="var(--concrete)" stroke="var(--edge-strong)" strokeWidth="2.5" />
      <path d="M196 60l-26 122M196 60l26 124M196 60v126" fill="none" stroke="var(--steel)" strokeWidth="3" />
      <rect x="180" y="44" width="34" height="16" fill="var(--steel)" />
      <path d="M44 52H352" fill="none" stroke="var(--chalk-line)" strokeWidth="2.6" strokeDasharray="8 4" />
      <path d="M70 24v157M320 24v160" fill="none" stroke="var(--timber-edge)" strokeWidth="7" />
      <path d="M64 52h12M314 52h12" stroke="var(--keel)" strokeWidth="4" />
      <text x="84" y="46" className="num small">
        1
      </text>
      <text x="334" y="46" className="num small">
        2
      </text>
      <text x="232" y="92" className="num small">
        3
      </text>
    </svg>
  );
}
