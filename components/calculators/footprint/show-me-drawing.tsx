/** Walking the plan from A: each run with its direction, and one pull across that places a corner. Decorative: the steps beside it say the same. */
export function FootprintShowMe() {
  return (
    <svg className="plan" viewBox="0 0 390 240" aria-hidden="true" focusable="false">
      <path d="M60 200V50h150v60h120v90z" fill="var(--concrete)" stroke="var(--edge-strong)" strokeWidth="2.5" />
      <path d="M66 216h120m-9-5 9 5-9 5M346 194v-40m-5 9 5-9 5 9M320 96h-50m9-5-9 5 9 5" fill="none" stroke="var(--keel)" strokeWidth="2.6" />
      <path d="M60 200 210 110M330 200 210 110" fill="none" stroke="var(--chalk-line)" strokeWidth="2.2" strokeDasharray="9 5" />
      <text x="44" y="216" className="disp">
        A
      </text>
      <text x="340" y="216" className="disp">
        B
      </text>
      <text x="196" y="100" className="disp">
        D
      </text>
      <text x="194" y="232" className="num small">
        1
      </text>
      <text x="356" y="180" className="num small">
        2
      </text>
      <text x="256" y="90" className="num small">
        3
      </text>
    </svg>
  );
}
