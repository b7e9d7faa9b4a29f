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

const textWidth = (text: string) => text.length * figureAdvance * size;

/** A piece or a board from above, lengths to one scale, with its holes' figures above it; figures that would touch climb a row. */
export function stripDrawing({ length, longest, width, marks = [], parts, pull = false }: StripOptions): Drawing {
  const scale = (width - 2 * end) / Math.max(longest, 1);
  const right = end + length * scale;
  const spots = spread(marks.map((mark) => ({ x: end + mark.at * scale, half: textWidth(mark.text) / 2 })), width);
  const placed = marks.map((mark, index) => ({ mark, x: end + mark.at * scale, ...spots[index]! }));
  const rows = Math.max(0, ...placed.map(({ row }) => row + 1), ...(parts ?? []).map(({ from, to, text, offcut }) => (offcut !== true && textWidth(text) + 4 < (to - from) * scale ? 0 : 1)));
  const lead = placed.some(({ x, centre }) => Math.abs(x - centre) > 1) ? 4 : 0;
  const top = rows * rowHeight + 3 + lead;
  const items: Drawn[] = [{ kind: "line", role: parts === undefined ? "plate" : "board", closed: true, points: [[end, top], [right, top], [right, top + depth], [end, top + depth]] }];
  for (const { from, to, text, offcut = false } of parts ?? []) {
    const [x0, x1] = [end + from * scale, end + to * scale];
    items.push({ kind: "line", role: offcut ? "offcut" : "plate", closed: true, points: [[x0, top], [x1, top], [x1, top + depth], [x0, top + depth]] });
    if (!offcut && textWidth(text) + 4 < x1 - x0) items.push({ kind: "text", text, at: [(x0 + x1) / 2, top + depth / 2 + size * 0.34], anchor: "middle", size, font: "figure-bold" });
    else items.push({ kind: "text", text, at: [Math.min((x0 + x1) / 2, width - textWidth(text) / 2), top - 3], anchor: "middle", size, font: "figure" });
  }
  if (pull) items.push({ kind: "line", role: "pull", closed: true, points: [[0, top + depth / 2 - 5], [end - 1.5, top + depth / 2], [0, top + depth / 2 + 5]] });
  for (const { mark, x, centre, row } of placed) {
    const y = top - 3 - lead - row * rowHeight;
    if (lead > 0) items.push({ kind: "line", role: "bar", closed: false, points: [[centre, y + 1.5], [x, top]] });
    items.push({ kind: "text", text: mark.text, at: [centre, y], anchor: "middle", size, font: "figure" });
    items.push({ kind: "mark", shape: mark.shape, at: [x, top + depth * (1 - (mark.across ?? 0.5))] });
  }
  return { width, height: top + depth + 2, items };
}

/**
 * Where each figure's middle goes: as near over its mark as its neighbours allow, all in one row; runs that would touch move
 * apart about their common middle. Where the strip is too short for one row they take turns in two or more.
 */
function spread(labels: readonly { x: number; half: number }[], width: number): { centre: number; row: number }[] {
  const between = 4;
  const rowCount = Math.max(1, Math.ceil(labels.reduce((sum, { half }) => sum + 2 * half + between, 0) / width));
  const order = labels.map((label, index) => ({ ...label, index })).sort((a, b) => a.x - b.x);
  const result: { centre: number; row: number }[] = labels.map(({ x }) => ({ centre: x, row: 0 }));
  for (let row = 0; row < rowCount; row += 1) {
    const own = order.filter((_, place) => place % rowCount === row);
    const groups: { members: typeof own; left: number; size: number }[] = [];
    for (const label of own) {
      let group = { members: [label], left: label.x - label.half, size: 2 * label.half };
      group.left = Math.min(Math.max(group.left, 0), width - group.size);
      for (let before = groups.at(-1); before !== undefined && before.left + before.size + between > group.left; before = groups.at(-1)) {
        groups.pop();
        const members = [...before.members, ...group.members];
        const size = before.size + between + group.size;
        let offset = 0;
        const wanted = members.map(({ x, half }) => {
          const left = x - half - offset;
          offset += 2 * half + between;
          return left;
        });
        const middle = wanted.reduce((sum, left) => sum + left, 0) / wanted.length;
        group = { members, left: Math.min(Math.max(middle, 0), width - size), size };
      }
      groups.push(group);
    }
    for (const { members, left } of groups) {
      let at = left;
      for (const { index, half } of members) {
        result[index] = { centre: at + half, row };
        at += 2 * half + between;
      }
    }
  }
  return result;
}
