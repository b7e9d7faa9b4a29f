import { between, pathOf, type Point } from "./plan-geometry";

/** Broken concrete in section and plan: the speckle of the trade's drawings. `id` must be the page's own. */
export function Concrete({ points, id, edge = true }: { points: readonly Point[]; id: string; edge?: boolean }) {
  return (
    <>
      <defs>
        <pattern id={id} width="14" height="14" patternUnits="userSpaceOnUse">
          <circle cx="3" cy="4" r="1" fill="var(--speckle)" />
          <circle cx="10" cy="9" r=".8" fill="var(--speckle)" />
          <circle cx="6" cy="12" r=".6" fill="var(--speckle)" />
        </pattern>
      </defs>
      <polygon points={pathOf(points)} fill="var(--concrete)" />
      <polygon points={pathOf(points)} fill={`url(#${id})`} stroke={edge ? "var(--edge-strong)" : "none"} strokeWidth="2" />
    </>
  );
}

/** A pull of the tape, numbered where the eye finds it; the second is dashed, so that the two differ without colour. */
export function Pull({ from, to, number, dashed = false }: { from: Point; to: Point; number: number; dashed?: boolean }) {
  const dot = between(from, to, 0.76);
  return (
    <g>
      <line x1={from.x} y1={from.y} x2={to.x} y2={to.y} stroke="var(--chalk-line)" strokeWidth="2.2" strokeDasharray={dashed ? "9 5" : undefined} />
      <circle cx={dot.x} cy={dot.y} r="14" fill="var(--chalk)" />
      <text x={dot.x} y={dot.y + 5.5} textAnchor="middle" className="num on-chalk">
        {number}
      </text>
    </g>
  );
}

/** A chalk line or lines, snapped. */
export function Chalk({ points }: { points: readonly Point[] }) {
  return <polygon points={pathOf(points)} fill="none" stroke="var(--chalk-line)" strokeWidth="2.6" />;
}

/** A corner's letter, outside the corner. `toward` is the plan's middle. */
export function CornerLetter({ at, toward, name }: { at: Point; toward: Point; name: string }) {
  return (
    <text x={at.x + (at.x < toward.x ? -13 : 13)} y={at.y + (at.y < toward.y ? -9 : 20)} textAnchor="middle" className="disp">
      {name}
    </text>
  );
}

/** A dimension along a side, its text set off the line; sides that stand are read from the left. */
export function Dimension({ from, to, text, off = 30 }: { from: Point; to: Point; text: string; off?: number }) {
  const middle = between(from, to, 0.5);
  const stands = Math.abs(to.y - from.y) > Math.abs(to.x - from.x);
  return stands ? (
    <text transform={`translate(${middle.x - off + 8} ${middle.y}) rotate(-90)`} textAnchor="middle" className="num halo">
      {text}
    </text>
  ) : (
    <text x={middle.x} y={middle.y + off + 4} textAnchor="middle" className="num halo">
      {text}
    </text>
  );
}

/** Which way to move, and how far, in keel red with a head. */
export function MoveArrow({ from, to, text }: { from: Point; to: Point; text: string }) {
  const points = to.x < from.x ? -1 : 1;
  return (
    <g>
      <line x1={from.x} y1={from.y} x2={to.x - points * 8} y2={to.y} stroke="var(--keel)" strokeWidth="3" />
      <polygon points={pathOf([to, { x: to.x - points * 13, y: to.y - 7 }, { x: to.x - points * 13, y: to.y + 7 }])} fill="var(--keel)" />
      <text x={from.x - points * 7} y={from.y + 5} textAnchor={points < 0 ? "start" : "end"} className="num out">
        {text}
      </text>
    </g>
  );
}
