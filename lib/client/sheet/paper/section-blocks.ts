import type { Figures, Section, SignOff, Strips, Table, Words } from "../sheet";
import { stack, type Block, type Placed, type Typesetter } from "./typesetter";

const labelWidth = 116;

export function headBlock(set: Typesetter, title: string, notes: readonly string[], width: number, size = 13): Block {
  const lines = set.wrap(title, "heading", size, width);
  const head: Block = {
    height: lines.length * size * 1.15 + 6,
    withNext: true,
    place: (x, y) => [...lines.map((line, index) => set.text(x, y + size * (index * 1.15 + 0.95), line, "heading", size)), { kind: "rule", x, y: y + lines.length * size * 1.15 + 2, width, thickness: 1.4, ink: "ink" } as Placed],
  };
  return { ...stack([head, ...notes.map((note) => set.paragraph(note, width, { ink: "soft" }))]), withNext: true };
}

/** Everything of a section, as strips that a page may break between. */
export function sectionBlocks(set: Typesetter, section: Section, width: number): Block[] {
  if (section.kind === "table") return tableBlocks(set, section, width);
  if (section.kind === "strips") return stripBlocks(set, section, width);
  if (section.kind === "figures") return figureBlocks(set, section, width);
  if (section.kind === "words") return wordBlocks(set, section, width);
  return signOffBlocks(set, section, width);
}

export function tableBlocks(set: Typesetter, { title, note, columns, rows }: Table, width: number, size = 9.5): Block[] {
  const head = headBlock(set, title, note === undefined ? [] : [note], width);
  if (columns.length === 0) return [{ ...head, withNext: false }];
  const pad = size < 9.5 ? 6 : 8;
  const widths = columnWidths(set, { columns, rows }, width, size, pad);
  const lefts = widths.map((_, index) => widths.slice(0, index).reduce((sum, own) => sum + own, 0));
  const rowBlock = (cells: readonly string[], bold: boolean): Block => {
    const wrapped = cells.map((cell, column) => set.wrap(cell, fontOf(column, bold), size, widths[column]! - (column === widths.length - 1 ? 0 : pad) + 0.01));
    const lines = Math.max(1, ...wrapped.map(({ length }) => length));
    const height = lines * size * 1.25 + 5;
    return {
      height,
      place: (x, y) => [
        ...wrapped.flatMap((own, column) =>
          own.map((line, index): Placed => {
            const font = fontOf(column, bold);
            const left = x + lefts[column]!;
            const room = widths[column]! - (column === widths.length - 1 ? 0 : pad);
            return set.text(columns[column]!.figure ? left + room - set.width(line, font, size) : left, y + 2 + size + index * size * 1.25, line, font, size);
          }),
        ),
        { kind: "rule", x, y: y + height - 0.5, width, thickness: bold ? 0.9 : 0.4, ink: bold ? "ink" : "soft" },
      ],
    };
  };
  const fontOf = (column: number, bold: boolean) => (bold ? "bold" : columns[column]!.figure ? "figure" : column === 0 ? "bold" : "text");
  const names = { ...rowBlock(columns.map(({ text }) => text), true), withNext: true };
  return [head, names, ...rows.map((cells) => ({ ...rowBlock(cells, false), again: names }))];
}

/** The largest of some sizes at which no figure of the table is broken; null when even the least is too wide. */
export function sizeThatFits(set: Typesetter, { columns, rows }: Table, width: number, sizes: readonly number[]): number | null {
  return sizes.find((size) => leastWidths(set, { columns, rows }, size, 6).reduce((sum, own) => sum + own, 0) <= width) ?? null;
}

/** Columns as wide as their shares ask, but no figure is broken while another column has room to give. */
function columnWidths(set: Typesetter, { columns, rows }: Pick<Table, "columns" | "rows">, width: number, size: number, pad: number): number[] {
  const all = columns.reduce((sum, { share }) => sum + share, 0);
  const asked = columns.map(({ share }) => (share / all) * width);
  const least = leastWidths(set, { columns, rows }, size, pad);
  const lacking = least.map((need, index) => Math.max(0, need - asked[index]!));
  const spare = asked.map((own, index) => Math.max(0, own - least[index]!));
  const [lack, give] = [lacking.reduce((sum, own) => sum + own, 0), spare.reduce((sum, own) => sum + own, 0)];
  const taken = give === 0 ? 0 : Math.min(1, lack / give);
  return asked.map((own, index) => own + lacking[index]! - spare[index]! * taken);
}

function leastWidths(set: Typesetter, { columns, rows }: Pick<Table, "columns" | "rows">, size: number, pad: number): number[] {
  return columns.map(({ text, figure }, column) => {
    const cells = rows.map((row) => (figure ? set.width(row[column] ?? "", "figure", size) : Math.max(0, ...(row[column] ?? "").split(" ").map((word) => set.width(word, column === 0 ? "bold" : "text", size)))));
    const words = text.split(" ").map((word) => set.width(word, "bold", size));
    return Math.max(...cells, ...words, 0) + (column === columns.length - 1 ? 0.5 : pad + 0.5);
  });
}

function stripBlocks(set: Typesetter, { title, notes, strips }: Strips, width: number): Block[] {
  const head = headBlock(set, title, notes, width);
  return [
    head,
    ...strips.map(({ title: name, length, drawing }): Block => {
      const lines = set.wrap(name, "bold", 9.5, labelWidth - 6);
      const words = lines.length * 12 + 13;
      const height = Math.max(drawing.height, words) + 7;
      return {
        height,
        place: (x, y) => {
          const top = y + (height - 4 - words) / 2;
          return [
            ...lines.map((line, index) => set.text(x, top + 9.5 + index * 12, line, "bold", 9.5)),
            set.text(x, top + 9.5 + lines.length * 12, length, "figure", 9.5),
            { kind: "drawing", x: x + labelWidth, y: y + (height - 4 - drawing.height) / 2, drawing },
            { kind: "rule", x, y: y + height - 2, width, thickness: 0.4, ink: "soft" },
          ];
        },
      };
    }),
  ];
}

function figureBlocks(set: Typesetter, { title, notes, items }: Figures, width: number): Block[] {
  const size = 10;
  const number = set.width(`${items.length}`, "text", 7.5) + 4;
  const cell = number + Math.max(0, ...items.map((item) => set.width(item, "figure", size))) + 10;
  const perRow = Math.max(1, Math.floor((width + 10) / cell));
  const step = width / perRow;
  const rows = Array.from({ length: Math.ceil(items.length / perRow) }, (_, row) => items.slice(row * perRow, (row + 1) * perRow));
  return [
    headBlock(set, title, notes, width),
    ...rows.map((row, index): Block => ({
      height: 17,
      place: (x, y) => [
        ...row.flatMap((item, column) => {
          const left = x + column * step;
          const figure = set.width(item, "figure", size);
          return [set.text(left, y + 12, `${index * perRow + column + 1}`, "text", 7.5, "soft"), set.text(left + cell - 10 - figure, y + 12, item, "figure", size)];
        }),
        { kind: "rule", x, y: y + 16, width, thickness: 0.4, ink: "soft" },
      ],
    })),
  ];
}

/** Sentences are kept together: half a list of warnings reads as the whole of it. */
function wordBlocks(set: Typesetter, { title, items }: Words, width: number): Block[] {
  const lines = items.map((item): Block => {
    const words = set.paragraph(item, width - 12, { size: 9, after: 3 });
    return { height: words.height, place: (x, y) => [{ kind: "rule", x: x + 1, y: y + 5.8, width: 5, thickness: 1.4, ink: "ink" }, ...words.place(x + 12, y)] };
  });
  return [headBlock(set, title, [], width), stack(lines)];
}

function signOffBlocks(set: Typesetter, { title, lines }: SignOff, width: number): Block[] {
  const step = 36;
  return [
    stack([
      headBlock(set, title, [], width),
      { height: lines.length * step, place: (x, y) => lines.flatMap((line, index): Placed[] => [{ kind: "rule", x, y: y + (index + 1) * step - 12, width, thickness: 0.7, ink: "ink" }, set.text(x, y + (index + 1) * step - 3, line, "text", 8.5, "soft")]) },
    ]),
  ];
}
