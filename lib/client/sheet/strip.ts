import type { Drawing, Drawn, MarkShape } from "./sheet";

export interface StripMark {
  /** Inches from the strip's left end. */
  at: number;
  text: string;
  shape: MarkShape;
  /** Share of the width from the near (outer, lower) edge; the middle when not known. */
  across?: number;
}

interface StripOptions {
  length: number;
  /** The longest of its kind: all are drawn to one scale. */
  longest: number;
  width: number;
  marks?: readonly StripMark[];
  parts?: readonly { from: number; to: number; text: string; offcut?: boolean }[];
  pull?: boolean;
}

const size = 7.6;
/** Advance of the figure font over its size. */
export const figureAdvance = 0.6;
const rowHeight = 9;
const end = 9;
const depth = 14;
const most = 4;

const textWidth = (text: string) => text.length * figureAdvance * size;

/** A piece or a board from above, lengths to one scale, with its holes' figures above it; figures that would touch climb a row. */
export function stripDrawing({ length, longest, width, marks = [], parts, pull = false }: StripOptions): Drawing {
  const scale = (width - 2 * end) / Math.max(longest, 1);
  const right = end + length * scale;
  const rows: number[] = [];
  const placed = marks.map((mark) => {
    const x = end + mark.at * scale;
    const half = textWidth(mark.text) / 2;
    const centre = Math.min(Math.max(x, half), width - half);
    let row = rows.findIndex((taken) => taken + 4 <= centre - half);
    if (row === -1) row = rows.length < most ? rows.length : rows.indexOf(Math.min(...rows));
    rows[row] = centre + half;
    return { mark, x, centre, row };
  });
  const top = Math.max(1, rows.length) * rowHeight + 3;
  const items: Drawn[] = [{ kind: "line", role: parts === undefined ? "plate" : "board", closed: true, points: [[end, top], [right, top], [right, top + depth], [end, top + depth]] }];
  for (const { from, to, text, offcut = false } of parts ?? []) {
    const [x0, x1] = [end + from * scale, end + to * scale];
    items.push({ kind: "line", role: offcut ? "offcut" : "plate", closed: true, points: [[x0, top], [x1, top], [x1, top + depth], [x0, top + depth]] });
    if (textWidth(text) + 4 < x1 - x0) items.push({ kind: "text", text, at: [(x0 + x1) / 2, top + depth / 2 + size * 0.34], anchor: "middle", size, font: offcut ? "figure" : "figure-bold" });
    else items.push({ kind: "text", text, at: [Math.min((x0 + x1) / 2, width - textWidth(text) / 2), top - 3], anchor: "middle", size, font: "figure" });
  }
  if (pull) items.push({ kind: "line", role: "pull", closed: true, points: [[0, top + depth / 2 - 5], [end - 1.5, top + depth / 2], [0, top + depth / 2 + 5]] });
  for (const { mark, x, centre, row } of placed) {
    const y = top - 3 - row * rowHeight;
    if (row > 0) items.push({ kind: "line", role: "bar", closed: false, points: [[x, y + 1.5], [x, top]] });
    items.push({ kind: "text", text: mark.text, at: [centre, y], anchor: "middle", size, font: "figure" });
    items.push({ kind: "mark", shape: mark.shape, at: [x, top + depth * (1 - (mark.across ?? 0.5))] });
  }
  return { width, height: top + depth + 2, items };
}
