import { Concrete } from "@/components/drawing/plan-parts";

/** Two people and one tape: first from A to C, then the same hands at B and D; below, the 1 in mark held on the corner. Decorative: the steps beside it say the same. */
export function SquarenessShowMe() {
  return (
    <svg className="plan show-me-drawing" viewBox="0 0 390 360" aria-hidden="true" focusable="false">
      <Concrete points={[{ x: 78, y: 54 }, { x: 312, y: 54 }, { x: 312, y: 196 }, { x: 78, y: 196 }]} id="show-me-slab" />
      <path d="M78 196 312 54" stroke="var(--chalk-line)" strokeWidth="3" />
      <path d="M312 196 78 54" stroke="var(--chalk-line)" strokeWidth="2.4" strokeDasharray="9 6" />
      <path d="M110 216h170m-9-6 10 6-10 6M280 34H110m9-6-10 6 10 6" fill="none" stroke="var(--edge)" strokeWidth="2.4" />
      <Person x={58} y={212} turn={-31} />
      <Person x={332} y={38} turn={149} />
      <Person x={332} y={212} turn={211} later />
      <Person x={58} y={38} turn={31} later />
      <Pulled x={236} y={100} number={1} />
      <Pulled x={154} y={100} number={2} />
      <text x="94" y="186" className="disp halo">A</text>
      <text x="284" y="186" className="disp halo">B</text>
      <text x="284" y="76" className="disp halo">C</text>
      <text x="94" y="76" className="disp halo">D</text>
      <Concrete points={[{ x: 130, y: 282 }, { x: 396, y: 282 }, { x: 396, y: 366 }, { x: 130, y: 366 }]} id="show-me-corner" />
      <path d="M46 262h350v40H46z" fill="var(--blade)" stroke="var(--ink)" strokeWidth="1.6" />
      <path d="M46 258v52h-7" fill="none" stroke="var(--steel)" strokeWidth="5" />
      <path d={ticks()} stroke="var(--ink)" strokeWidth="1.5" />
      {[1, 2, 3].map((inch) => (
        <text key={inch} x={46 + 84 * inch + 5} y="297" className="num">
          {inch}
        </text>
      ))}
      <path d="M130 236v20m-7-9 7 10 7-10" fill="none" stroke="var(--keel)" strokeWidth="3" />
      <path d="M112 360v-40c0-26 36-26 36 0v40" fill="var(--sheet)" stroke="var(--ink)" strokeWidth="2.4" />
      <path d="M121 318c2-9 16-9 18 0" fill="none" stroke="var(--ink)" strokeWidth="1.6" />
    </svg>
  );
}

/** Seen from above: shoulders, head, and two hands at the tape. */
function Person({ x, y, turn, later = false }: { x: number; y: number; turn: number; later?: boolean }) {
  return (
    <g transform={`translate(${x} ${y}) rotate(${turn})`} fill={later ? "var(--sheet)" : "var(--ink)"} stroke="var(--ink)" strokeWidth="2" strokeDasharray={later ? "4 3" : undefined}>
      <ellipse cx="-6" cy="0" rx="9" ry="20" />
      <path d="M-4-15 16-3M-4 15 16 3" fill="none" strokeWidth="5" />
      <circle cx="-5" cy="0" r="8" fill={later ? "var(--sheet)" : "var(--timber)"} />
    </g>
  );
}

function Pulled({ x, y, number }: { x: number; y: number; number: number }) {
  return (
    <g>
      <circle cx={x} cy={y} r="13" fill="var(--chalk)" />
      <text x={x} y={y + 5.5} textAnchor="middle" className="num on-chalk">
        {number}
      </text>
    </g>
  );
}

/** Quarters of an inch, 84 px to the inch, from the hook. */
function ticks(): string {
  return Array.from({ length: 16 }, (_, index) => `M${46 + 21 * (index + 1)} 262v${(index + 1) % 4 === 0 ? 20 : (index + 1) % 2 === 0 ? 14 : 9}`).join("");
}
