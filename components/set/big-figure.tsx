/** A character of the figures' type is some 0.6 of its size wide; a little more keeps edges whole. */
const advance = 62;
const line = 122;
/** Of the figure's size, for the numbers of a fraction. */
const small = 0.62;

/** A reading as large as its box allows: feet and inches under each other on a tall screen, in one line on a wide one. */
export function BigFigure({ text }: { text: string }) {
  const feet = /^(-?\d+')\s*(.+)$/.exec(text);
  return (
    <p className="reading-figure">
      <span className="sr-only">{text}</span>
      <Lines lines={feet === null ? [text] : [feet[1]!, feet[2]!]} className="reading-tall" />
      <Lines lines={[text]} className="reading-wide" />
    </p>
  );
}

type Part = { text: string; width: number; top?: string; bottom?: string };

/** A line's pieces from left to right; a fraction is one, its numbers over each other. */
function partsOf(text: string): Part[] {
  return text.split(/\s*(\d+\/\d+)/).flatMap((piece): Part[] => {
    const [, top, bottom] = /^(\d+)\/(\d+)$/.exec(piece) ?? [];
    if (top !== undefined && bottom !== undefined) return [{ text: piece, top, bottom, width: Math.max(top.length, bottom.length) * advance * small + 22 }];
    return piece === "" ? [] : [{ text: piece, width: piece.length * advance }];
  });
}

function Lines({ lines, className }: { lines: readonly string[]; className: string }) {
  const laid = lines.map(partsOf);
  const widthOf = (parts: readonly Part[]) => parts.reduce((sum, { width }) => sum + width, 0);
  const width = Math.max(3 * advance, ...laid.map(widthOf)) + 12;
  return (
    <svg className={className} viewBox={`0 0 ${width} ${lines.length * line}`} aria-hidden="true" focusable="false">
      {laid.map((parts, index) => {
        const start = (width - widthOf(parts)) / 2;
        return (
          <g key={index} transform={`translate(0 ${index * line})`}>
            {parts.map((part, place) => (
              <Piece key={place} part={part} x={start + widthOf(parts.slice(0, place))} />
            ))}
          </g>
        );
      })}
    </svg>
  );
}

function Piece({ part: { text, width, top, bottom }, x }: { part: Part; x: number }) {
  const middle = x + width / 2;
  const common = { x: middle, textAnchor: "middle", className: "num", fontWeight: "700", fill: "currentColor" } as const;
  if (top === undefined || bottom === undefined) {
    return (
      <text {...common} y={94} fontSize="100" xmlSpace="preserve">
        {text}
      </text>
    );
  }
  return (
    <>
      <text {...common} y={52} fontSize={100 * small}>
        {top}
      </text>
      <path d={`M${x + 7} 62h${width - 14}`} stroke="currentColor" strokeWidth="6" />
      <text {...common} y={114} fontSize={100 * small}>
        {bottom}
      </text>
    </>
  );
}
