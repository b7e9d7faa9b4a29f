import { degrees, PDFDocument, rgb, type Color, type PDFFont, type PDFPage } from "@cantoo/pdf-lib";
import * as fontkit from "fontkit";
import { codeOf } from "../code";
import { layOut } from "../paper/lay-out";
import type { Measure, Placed } from "../paper/typesetter";
import { brandPaths, hatchPath, isMark, linePath, markPath, samplePoints } from "../paths";
import { papers, type Drawing, type FontRole, type LineRole, type MarkShape, type Sheet } from "../sheet";

/** The bytes of the sheet's fonts (public/fonts/sheet-*.ttf): fetched by a browser, read from disk by a server. */
export type SheetFonts = Readonly<Record<FontRole, Uint8Array>>;

const ink = rgb(0.04, 0.07, 0.1);
const soft = rgb(0.25, 0.29, 0.33);
const chalk = rgb(0.12, 0.25, 0.68);
const paper = rgb(1, 1, 1);
const styles: Readonly<Record<LineRole, { fill?: Color; stroke?: Color; width?: number; dash?: number[] }>> = {
  slab: { fill: rgb(0.93, 0.925, 0.905), stroke: ink, width: 1.8 },
  chalk: { stroke: chalk, width: 1.2, dash: [7, 2.5] },
  plate: { fill: rgb(0.9, 0.905, 0.82), stroke: ink, width: 0.7 },
  board: { fill: paper, stroke: ink, width: 0.7 },
  offcut: { stroke: ink, width: 0.7 },
  joint: { stroke: ink, width: 1 },
  joist: { stroke: ink, width: 0.6 },
  bar: { stroke: ink, width: 0.6 },
  pull: { fill: ink },
};

/**
 * The sheet as a PDF of selectable text in our own fonts, each cut down to the characters used. No DOM in it: the same runs in a browser and on a server.
 *
 * pdf-lib's kept line (@cantoo/pdf-lib) with fontkit: it runs anywhere, embeds subsets with a character map, and draws SVG paths, so that
 * page and PDF share every outline. jsPDF wants fonts as base64 text and brings a DOM renderer; fontkit reads our woff2 files but cannot cut
 * a weight out of a variable font, so weights are shipped as TTF.
 */
export async function makePdf(sheet: Sheet, fontBytes: SheetFonts, now: Date): Promise<Uint8Array> {
  const document = await PDFDocument.create();
  document.registerFontkit(fontkit as unknown as Parameters<PDFDocument["registerFontkit"]>[0]);
  const roles = Object.keys(fontBytes) as FontRole[];
  const fonts = Object.fromEntries(await Promise.all(roles.map(async (role) => [role, await document.embedFont(fontBytes[role], { subset: true })] as const))) as Record<FontRole, PDFFont>;
  document.setTitle(sheet.title, { showInWindowTitleBar: true });
  document.setLanguage(sheet.locale === "es" ? "es-US" : "en-US");
  document.setCreator(sheet.brand);
  document.setProducer(sheet.brand);
  document.setCreationDate(now);
  document.setModificationDate(now);
  const { width, height } = papers[sheet.paper];
  for (const placed of layOut(sheet, measureBy(fonts), (text) => codeOf(text).size)) {
    const page = document.addPage([width, height]);
    for (const item of placed) draw(page, item, fonts, height);
  }
  return document.save();
}

function measureBy(fonts: Record<FontRole, PDFFont>): Measure {
  const known = new Map(Object.entries(fonts).map(([role, font]) => [role, new Set(font.getCharacterSet())]));
  return {
    width: (text, font, size) => fonts[font].widthOfTextAtSize(text, size),
    printable: (text, font) => [...text.normalize("NFC")].map((character) => (known.get(font)!.has(character.codePointAt(0)!) ? character : /\s/.test(character) ? " " : "?")).join(""),
  };
}

function draw(page: PDFPage, item: Placed, fonts: Record<FontRole, PDFFont>, height: number): void {
  const y = height - item.y;
  if (item.kind === "text") page.drawText(item.text, { x: item.x, y, font: fonts[item.font], size: item.size, color: item.ink === "ink" ? ink : soft });
  else if (item.kind === "rule") page.drawLine({ start: { x: item.x, y }, end: { x: item.x + item.width, y }, thickness: item.thickness, color: item.ink === "ink" ? ink : soft });
  else if (item.kind === "box") page.drawRectangle({ x: item.x, y: y - item.height, width: item.width, height: item.height, borderColor: ink, borderWidth: 1.6 });
  else if (item.kind === "brand") for (const { path, width, dash } of brandPaths) page.drawSvgPath(path, { x: item.x, y, scale: item.size / 30, borderColor: dash === null ? ink : chalk, borderWidth: width, ...(dash === null ? {} : { borderDashArray: [...dash] }) });
  else if (item.kind === "code") {
    const { path, size } = codeOf(item.text);
    page.drawSvgPath(path, { x: item.x, y, scale: item.size / size, color: ink });
  } else if (item.kind === "sample") {
    const sample = item.sample as LineRole | MarkShape;
    const drawing: Drawing = { width: 18, height: 10, items: [isMark(sample) ? { kind: "mark", shape: sample, at: [9, 5] } : { kind: "line", role: sample, points: samplePoints[sample], closed: samplePoints[sample].length > 2 }] };
    drawDrawing(page, drawing, item.x, y, fonts);
  } else drawDrawing(page, item.drawing, item.x, y, fonts);
}

function drawDrawing(page: PDFPage, { items }: Drawing, x: number, y: number, fonts: Record<FontRole, PDFFont>): void {
  for (const item of items) {
    if (item.kind === "line") {
      const { fill, stroke, width, dash } = styles[item.role];
      page.drawSvgPath(linePath(item), { x, y, ...(fill === undefined ? {} : { color: fill }), ...(stroke === undefined ? {} : { borderColor: stroke, borderWidth: width }), ...(dash === undefined ? {} : { borderDashArray: dash }) });
      if (item.role === "offcut") page.drawSvgPath(hatchPath(item.points), { x, y, borderColor: soft, borderWidth: 0.45 });
    } else if (item.kind === "mark") {
      const { path, fill, stroke } = markPath(item.shape, item.at);
      page.drawSvgPath(path, { x, y, color: fill === "ink" ? ink : paper, ...(stroke === 0 ? {} : { borderColor: ink, borderWidth: stroke }) });
    } else {
      const font = fonts[item.font];
      const turn = ((item.turn ?? 0) * Math.PI) / 180;
      const back = font.widthOfTextAtSize(item.text, item.size) * (item.anchor === "middle" ? 0.5 : item.anchor === "end" ? 1 : 0);
      page.drawText(item.text, { x: x + item.at[0] - Math.cos(turn) * back, y: y - (item.at[1] - Math.sin(turn) * back), size: item.size, font, color: ink, rotate: degrees(-(item.turn ?? 0)) });
    }
  }
}
