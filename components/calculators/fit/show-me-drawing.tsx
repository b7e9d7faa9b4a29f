/** A slab that is out, the true plan moved on it, and the two offsets marked at a corner. Decorative: the steps beside it say the same. */
export function FitShowMe() {
  return (
    <svg className="plan" viewBox="0 0 390 230" aria-hidden="true" focusable="false">
      <path d="M40 196 350 204 344 34 52 26z" fill="var(--concrete)" stroke="var(--edge-strong)" strokeWidth="2.5" />
      <path d="M66 182h266V48H66z" fill="none" stroke="var(--chalk-line)" strokeWidth="2.6" />
      <path d="M112 198v-16m-5 6 5-6 5 6M290 202v-20m-5 6 5-6 5 6M42 150h24m-6-5 6 5-6 5" fill="none" stroke="var(--keel)" strokeWidth="2.6" />
      <text x="22" y="212" className="disp">
        A
      </text>
      <text x="358" y="220" className="disp">
        B
      </text>
      <text x="120" y="220" className="num small">
        1
      </text>
      <text x="298" y="224" className="num small">
        2
      </text>
      <text x="18" y="156" className="num small">
        3
      </text>
    </svg>
  );
}
