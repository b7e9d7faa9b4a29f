/** Two short offsets marked from the slab edge near a corner, and the line snapped through them. Decorative: the steps beside it say the same. */
export function InsetShowMe() {
  return (
    <svg className="plan" viewBox="0 0 390 220" aria-hidden="true" focusable="false">
      <path d="M40 220V40h350V220z" fill="var(--concrete)" />
      <path d="M40 220V40h350" fill="none" stroke="var(--edge-strong)" strokeWidth="2.5" />
      <path d="M74 220V24M24 74h366" fill="none" stroke="var(--chalk-line)" strokeWidth="2.6" />
      <path d="M96 40v34m-5-5 5 5 5-5M330 40v34m-5-5 5 5 5-5M40 150h34m-5-5 5 5-5 5" fill="none" stroke="var(--keel)" strokeWidth="2.6" />
      <path d="M88 74h16M322 74h16M74 142v16" fill="none" stroke="var(--ink)" strokeWidth="2.6" />
      <text x="18" y="34" className="disp">
        A
      </text>
      <text x="104" y="62" className="num small">
        1
      </text>
      <text x="338" y="62" className="num small">
        2
      </text>
      <text x="82" y="154" className="num small">
        3
      </text>
    </svg>
  );
}
