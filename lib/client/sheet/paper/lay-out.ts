import { gap, margin, papers, type PlanPart, type Sheet } from "../sheet";
import { sectionBlocks, sizeThatFits, tableBlocks } from "./section-blocks";
import { space, stack, typesetter, type Block, type Measure, type Placed, type Typesetter } from "./typesetter";

/** The sheet on its pages: where every word, rule and drawing stands. Pure but for what `measure` says of the fonts. */
export function layOut(sheet: Sheet, measure: Measure, codeModules: (text: string) => number): readonly (readonly Placed[])[] {
  const set = typesetter(measure);
  const paper = papers[sheet.paper];
  const width = paper.width - 2 * margin;
  const bottom = paper.height - margin;
  const pages: Placed[][] = [];
  let top = margin;

  const begin = () => {
    const first = pages.length === 0;
    pages.push([]);
    top = margin + 30;
    if (first) return;
    const title = set.wrap(sheet.title, "bold", 9.5, width * 0.5)[0] ?? "";
    pages.at(-1)!.push(set.text(margin + 130, margin + 15, title, "bold", 9.5));
  };
  const put = (block: Block, x = margin) => {
    pages.at(-1)!.push(...block.place(x, top));
    top += block.height;
  };
  const flow = (blocks: readonly Block[]) => {
    blocks.forEach((block, index) => {
      let needed = block.height;
      for (let next = index; blocks[next]?.withNext === true && blocks[next + 1] !== undefined; next += 1) needed += blocks[next + 1]!.height;
      if (top + needed > bottom && top > margin + 40) {
        begin();
        if (block.again !== undefined) put(block.again);
      }
      put(block);
    });
  };

  begin();
  put(titleBlock(set, sheet, width));
  const beside = sheet.plan === null ? { blocks: [] as Block[], rest: sheet.beside } : planRow(set, sheet, sheet.plan, width, bottom - top);
  for (const block of beside.blocks) put(block);
  if (sheet.empty !== null) put(set.paragraph(sheet.empty, width, { size: 12 }));
  for (const table of beside.rest) flow([space(10), ...tableBlocks(set, table, width)]);
  for (const section of sheet.sections) {
    if (section.kind === "signOff") continue;
    const [head, ...rest] = sectionBlocks(set, section, width);
    flow([{ ...stack([space(14), head!]), withNext: head!.withNext }, ...rest]);
  }
  flow([space(14), endBlock(set, sheet, width, codeModules)]);

  return pages.map((placed, index) => {
    const number = set.text(0, margin + 15, sheet.sheetOf(index + 1, pages.length), "figure", 9.5);
    const brand: Placed[] = [{ kind: "brand", x: margin, y: margin - 1, size: 21 }, set.text(margin + 28, margin + 15, sheet.brand, "heading", 15)];
    return [...brand, { ...number, x: paper.width - margin - set.width(sheet.sheetOf(index + 1, pages.length), "figure", 9.5) } as Placed, ...placed];
  });
}

function titleBlock(set: Typesetter, { title, facts, warnings }: Sheet, width: number): Block {
  const size = 25;
  const lines = set.wrap(title, "heading", size, width).slice(0, 3);
  const titles: Block = { height: lines.length * size * 1.08 + 4, place: (x, y) => lines.map((line, index) => set.text(x, y + size * (0.92 + index * 1.08), line, "heading", size)) };
  const shares = [0.46, 0.2, 0.34];
  const factRow: Block = {
    height: 32,
    place: (x, y) =>
      facts.flatMap(({ label, text }, index): Placed[] => {
        const left = x + shares.slice(0, index).reduce((sum, share) => sum + share, 0) * width;
        const own = shares[index]! * width - 12;
        return [set.text(left, y + 9, label, "text", 8.5, "soft"), ...(text === null ? [{ kind: "rule" as const, x: left, y: y + 24, width: own, thickness: 0.7, ink: "ink" as const }] : [set.text(left, y + 22, set.wrap(text, "bold", 10, own)[0] ?? "", "bold", 10)])];
      }),
  };
  const told = stack(warnings.map((warning) => set.paragraph(warning, width - 34, { font: "bold", size: 10, after: 1 })));
  const warned: Block[] = warnings.length === 0 ? [] : [{ height: told.height + 12, place: (x, y) => [{ kind: "box", x: x + 0.8, y: y + 2, width: width - 1.6, height: told.height + 6 }, set.text(x + 10, y + 16.5, "!", "heading", 13), ...told.place(x + 24, y + 5)] }];
  const rule: Block = { height: 10, place: (x, y) => [{ kind: "rule", x, y: y + 2, width, thickness: 2, ink: "ink" }] };
  return stack([titles, factRow, ...warned, rule]);
}

/** The plan with the short tables beside it; tables that find no room there follow below. */
function planRow(set: Typesetter, sheet: Sheet, plan: PlanPart, width: number, room: number): { blocks: Block[]; rest: Sheet["beside"] } {
  const left = planBlock(set, plan);
  const rightWidth = width - plan.drawing.width - gap;
  const tables: Block[] = [];
  const rest: Sheet["beside"][number][] = [];
  let high = 0;
  for (const table of sheet.beside) {
    const size = sizeThatFits(set, table, rightWidth, [9, 8.5, 8]);
    const block = stack([...(tables.length === 0 ? [] : [space(12)]), ...tableBlocks(set, table, rightWidth, size ?? 8)]);
    if (size === null || rest.length > 0 || high + block.height > Math.max(left.height + 40, Math.min(room, 440))) rest.push(table);
    else {
      tables.push(block);
      high += block.height;
    }
  }
  const right = stack(tables);
  return { blocks: [{ height: Math.max(left.height, right.height), place: (x, y) => [...left.place(x, y), ...right.place(x + plan.drawing.width + gap, y)] }], rest };
}

function planBlock(set: Typesetter, { drawing, scale, notes, legend }: PlanPart): Block {
  const picture: Block = { height: drawing.height + 2, place: (x, y) => [{ kind: "drawing", x, y, drawing }] };
  const key: Placed[] = [];
  let [x0, line] = [0, 0];
  for (const { sample, text } of legend) {
    const own = 24 + set.width(text, "text", 8.5) + 12;
    if (x0 > 0 && x0 + own - 12 > drawing.width) [x0, line] = [0, line + 1];
    key.push({ kind: "sample", x: x0, y: line * 13, sample }, set.text(x0 + 23, line * 13 + 8.5, text, "text", 8.5));
    x0 += own;
  }
  const legendBlock: Block = { height: (line + 1) * 13 + 2, place: (x, y) => key.map((placed) => ({ ...placed, x: placed.x + x, y: placed.y + y })) };
  return stack([picture, set.paragraph(scale, drawing.width, { font: "bold", size: 9 }), ...notes.map((note) => set.paragraph(note, drawing.width, { size: 8.5, ink: "soft" })), space(3), legendBlock]);
}

/** Sign-off lines, and beside them the code that brings the same inputs to a phone. */
function endBlock(set: Typesetter, { sections, code }: Sheet, width: number, codeModules: (text: string) => number): Block {
  const size = Math.min(200, Math.max(84, (codeModules(code.address) + 8) * 1.1)); // about 0.39 mm a module: what a phone reads from a hand's length
  const leftWidth = width - size - 28;
  const signOff = sections.filter(({ kind }) => kind === "signOff").flatMap((section) => sectionBlocks(set, section, leftWidth));
  const signs = stack(signOff);
  const words = stack([space(4), set.paragraph(code.title, size, { font: "bold", size: 9 }), set.paragraph(code.text, size, { size: 7.5, ink: "soft" })]);
  return {
    height: Math.max(signs.height, size + words.height),
    place: (x, y) => [...signs.place(x, y), { kind: "code", x: x + width - size, y, size, text: code.address }, ...words.place(x + width - size, y + size)],
  };
}
