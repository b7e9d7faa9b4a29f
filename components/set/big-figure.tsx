/** A character of the figures' type is 0.6 of its size wide. */
const advance = 60;
const line = 118;

/** A reading as large as its box allows: feet and inches under each other on a tall screen, in one line on a wide one. */
export function BigFigure({ text }: { text: string }) {
  const feet = /^(-?\d+')\s*(.+)$/.exec(text);
  const lines = feet === null ? [text] : [feet[1]!, feet[2]!];
  return (
    <p className="reading-figure">
      <span className="sr-only">{text}</span>
      <Lines lines={lines} className="reading-tall" />
      <Lines lines={[text]} className="reading-wide" />
    </p>
  );
}

function Lines({ lines, className }: { lines: readonly string[]; className: string }) {
  const width = Math.max(3, ...lines.map(({ length }) => length)) * advance;
  return (
    <svg className={className} viewBox={`0 0 ${width} ${lines.length * line}`} aria-hidden="true" focusable="false">
      {lines.map((text, index) => (
        <text key={text} x={width / 2} y={index * line + 92} textAnchor="middle" className="num" fontSize="100" fill="currentColor">
          {text}
        </text>
      ))}
    </svg>
  );
}
