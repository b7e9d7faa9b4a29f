import type { Drawing, FontRole } from "../sheet";

export type Ink = "ink" | "soft";

/** What a page of paper carries, in points from its upper left corner. */
export type Placed =
  | { kind: "text"; x: number; y: number; text: string; font: FontRole; size: number; ink: Ink }
  | { kind: "rule"; x: number; y: number; width: number; thickness: number; ink: Ink }
  | { kind: "box"; x: number; y: number; width: number; height: number }
  | { kind: "drawing"; x: number; y: number; drawing: Drawing }
  | { kind: "brand"; x: number; y: number; size: number }
  | { kind: "code"; x: number; y: number; size: number; text: string }
  | { kind: "sample"; x: number; y: number; sample: string };

/** Measures words in the sheet's fonts, and says what they can print. */
export interface Measure {
  width(text: string, font: FontRole, size: number): number;
  /** Each character the font lacks becomes a question mark: a hole in a word would go unseen. */
  printable(text: string, font: FontRole): string;
}

/** A strip of the page that is never cut in two. `place` answers what stands there when its top is at y. */
export interface Block {
  height: number;
  place(x: number, y: number): readonly Placed[];
  /** Stays on the page of the block after it. */
  withNext?: boolean;
  /** Printed again at the head of a new page, when the one before this block ended there. */
  again?: Block;
}

export function typesetter(measure: Measure) {
  /** Words broken to a width; a word longer than the line is cut. */
  function wrap(raw: string, font: FontRole, size: number, width: number): string[] {
    const lines: string[] = [];
    let line = "";
    for (const word of measure.printable(raw, font).split(/[\s\u00A0]+/).filter(Boolean)) {
      const longer = line === "" ? word : `${line} ${word}`;
      if (measure.width(longer, font, size) <= width) {
        line = longer;
        continue;
      }
      if (line !== "") lines.push(line);
      line = word;
      while (measure.width(line, font, size) > width && line.length > 1) {
        let fits = line.length - 1;
        while (fits > 1 && measure.width(line.slice(0, fits), font, size) > width) fits -= 1;
        lines.push(line.slice(0, fits));
        line = line.slice(fits);
      }
    }
    if (line !== "") lines.push(line);
    return lines;
  }

  function text(x: number, y: number, raw: string, font: FontRole, size: number, ink: Ink = "ink"): Placed {
    return { kind: "text", x, y, text: measure.printable(raw, font), font, size, ink };
  }

  function paragraph(raw: string, width: number, { font = "text", size = 9, leading = 1.3, after = 2, ink = "ink" }: { font?: FontRole; size?: number; leading?: number; after?: number; ink?: Ink } = {}): Block {
    const lines = wrap(raw, font, size, width);
    const step = size * leading;
    return { height: lines.length * step + after, place: (x, y) => lines.map((line, index) => text(x, y + index * step + size, line, font, size, ink)) };
  }

  const width = (raw: string, font: FontRole, size: number) => measure.width(measure.printable(raw, font), font, size);
  return { wrap, text, paragraph, width };
}

export type Typesetter = ReturnType<typeof typesetter>;

/** Blocks below each other as one. */
export function stack(blocks: readonly Block[]): Block {
  return {
    height: blocks.reduce((sum, { height }) => sum + height, 0),
    place(x, y) {
      let top = y;
      return blocks.flatMap((block) => {
        const placed = block.place(x, top);
        top += block.height;
        return placed;
      });
    },
  };
}

export const space = (height: number): Block => ({ height, place: () => [] });
