import type { Translate } from "@/lib/client/i18n/translate";

const left = 40;
const inch = 560;
const top = 30;
const lengths: readonly [part: number, height: number][] = [[2, 120], [4, 92], [8, 68], [16, 46]];

/** For "Show me": one inch of tape, four times as wide as a thumb, and what its lines are called. Server-rendered. */
export function InchDrawing({ t }: { t: Translate }) {
  const ticks = Array.from({ length: 17 }, (_, place) => {
    const height = place % 16 === 0 ? 150 : (lengths.find(([part]) => (place * part) % 16 === 0)?.[1] ?? 46);
    return { place, x: left + (inch * place) / 16, height };
  });
  const named = [
    { place: 8, text: "1/2" },
    { place: 4, text: "1/4" },
    { place: 2, text: "1/8" },
    { place: 1, text: "1/16" },
    { place: 12, text: "3/4" },
    { place: 14, text: "7/8" },
    { place: 11, text: "11/16" },
  ];
  return (
    <svg className="plan inch-drawing" viewBox="0 0 640 230" role="img" aria-label={t("conversions.page.inchDrawing")}>
      <rect x="0" y={top} width="640" height="170" fill="var(--blade)" stroke="var(--edge-strong)" strokeWidth="1.5" />
      {ticks.map(({ place, x, height }) => (
        <line key={place} x1={x} x2={x} y1={top} y2={top + height} stroke="var(--ink)" strokeWidth={place % 16 === 0 ? 3 : 2} />
      ))}
      {named.map(({ place, text }) => {
        const tick = ticks[place]!;
        return (
          <text key={place} x={tick.x} y={top + tick.height + 19} textAnchor="middle" className="num">
            {text}
          </text>
        );
      })}
      <text x={left + 8} y={top + 160} className="disp">
        111
      </text>
      <text x={left + inch - 8} y={top + 160} textAnchor="end" className="disp">
        112
      </text>
    </svg>
  );
}
