import { Concrete } from "@/components/drawing/plan-parts";

/** Marks 8 and 6 ft out from the corner on two strings, and the tape between them at 10. Decorative: the steps beside it say the same. */
export function CornerShowMe() {
  return (
    <svg className="plan show-me-drawing" viewBox="0 0 390 250" aria-hidden="true" focusable="false">
      <Concrete points={[{ x: 70, y: 30 }, { x: 390, y: 30 }, { x: 390, y: 210 }, { x: 70, y: 210 }]} id="show-me-corner" edge={false} />
      <path d="M30 210h360M70 10v232" stroke="var(--edge-strong)" strokeWidth="2.6" />
      <path d="M70 190h20v20" fill="none" stroke="var(--edge-strong)" strokeWidth="1.6" />
      <path d="M70 66 262 210" stroke="var(--chalk-line)" strokeWidth="3.2" />
      <path d="M62 66h16M262 202v16" stroke="var(--keel)" strokeWidth="3.4" />
      <path d="M46 70v-24m-6 9 6-10 6 10M46 190v16m-6-8 6 10 6-10" fill="none" stroke="var(--keel)" strokeWidth="2.6" />
      <text x="166" y="234" textAnchor="middle" className="num">8</text>
      <text x="46" y="136" textAnchor="middle" className="num">6</text>
      <text x="182" y="132" className="num halo">10</text>
      <text x="52" y="232" textAnchor="end" className="disp">A</text>
      <text x="376" y="234" textAnchor="end" className="disp">B</text>
      <text x="84" y="24" className="disp">D</text>
    </svg>
  );
}
