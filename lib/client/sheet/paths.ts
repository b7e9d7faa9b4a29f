import type { Drawn, LineRole, MarkShape, Pair } from "./sheet";

const at = ([x, y]: Pair) => `${round(x)} ${round(y)}`;
const round = (value: number) => Math.round(value * 100) / 100;

/** The outline of a drawn thing as SVG path data, which page and PDF both take. */
export function linePath({ points, closed }: Pick<Extract<Drawn, { kind: "line" }>, "points" | "closed">): string {
  return `M${points.map(at).join("L")}${closed ? "Z" : ""}`;
}

const circle = ([x, y]: Pair, r: number) => `M${at([x - r, y])}A${r} ${r} 0 1 0 ${at([x + r, y])}A${r} ${r} 0 1 0 ${at([x - r, y])}Z`;

/** A bolt's or hole's mark: `fill` and `stroke` say how its path is drawn, in black. */
export function markPath(shape: MarkShape, place: Pair): { path: string; fill: "ink" | "paper"; stroke: number } {
  const [x, y] = place;
  if (shape === "bad") return { path: `M${at([x - 3.2, y - 3.2])}H${round(x + 3.2)}V${round(y + 3.2)}H${round(x - 3.2)}ZM${at([x - 3.2, y - 3.2])}L${at([x + 3.2, y + 3.2])}M${at([x + 3.2, y - 3.2])}L${at([x - 3.2, y + 3.2])}`, fill: "paper", stroke: 0.9 };
  if (shape === "added") return { path: `${circle(place, 3.4)}${circle(place, 1.5)}`, fill: "paper", stroke: 1 };
  if (shape === "engineered") return { path: `M${at([x, y - 4])}L${at([x + 4, y])}L${at([x, y + 4])}L${at([x - 4, y])}Z`, fill: "ink", stroke: 0 };
  if (shape === "hole") return { path: circle(place, 2.5), fill: "paper", stroke: 1 };
  return { path: circle(place, 2.2), fill: "ink", stroke: 0 };
}

/** Slanted strokes over a box: what is left over stays told apart without colour. */
export function hatchPath(points: readonly Pair[], step = 5): string {
  const [xs, ys] = [points.map(([x]) => x), points.map(([, y]) => y)];
  const [left, right, top, bottom] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const high = bottom - top;
  const strokes: string[] = [];
  for (let start = left - high + step; start < right; start += step) {
    const [from, to] = [Math.max(start, left), Math.min(start + high, right)];
    if (to - from > 0.5) strokes.push(`M${at([from, bottom - (from - start)])}L${at([to, bottom - (to - start)])}`);
  }
  return strokes.join("");
}

/** A sample of a line for the legend, in a box of 18 by 10. */
export const samplePoints: Readonly<Record<LineRole, readonly Pair[]>> = {
  slab: [[1, 1], [17, 1], [17, 9], [1, 9]],
  plate: [[1, 2], [17, 2], [17, 8], [1, 8]],
  board: [[1, 2], [17, 2], [17, 8], [1, 8]],
  offcut: [[1, 2], [17, 2], [17, 8], [1, 8]],
  chalk: [[0, 5], [18, 5]],
  joint: [[9, 0], [9, 10]],
  joist: [[9, 0], [9, 10]],
  bar: [[0, 5], [18, 5]],
  pull: [[4, 0], [12, 5], [4, 10]],
};

export const isMark = (sample: LineRole | MarkShape): sample is MarkShape => sample === "good" || sample === "bad" || sample === "added" || sample === "engineered" || sample === "hole";

/** The mark of Sillwright in a box of 30: a square with a chalk line across. */
export const brandPaths = [
  { path: "M3 3v24h24", width: 4, dash: null },
  { path: "M4 26L26 4", width: 2.4, dash: [5, 2.4] as const },
  { path: "M3 20h7v7", width: 1.6, dash: null },
];

/** A square code's dark modules as one path, a unit to the module. */
export function codePath(modules: readonly (readonly boolean[])[]): string {
  return modules
    .flatMap((row, y) => {
      const runs: string[] = [];
      for (let x = 0; x < row.length; x += 1) {
        if (!row[x]) continue;
        const from = x;
        while (row[x + 1]) x += 1;
        runs.push(`M${from} ${y}H${x + 1}V${y + 1}H${from}Z`);
      }
      return runs;
    })
    .join("");
}
