import { inflateSync } from "node:zlib";
import * as pdfjs from "pdfjs-dist/legacy/build/pdf.mjs";
import { beforeAll, describe, expect, test } from "vitest";
import { parseLength } from "@/calculators/length";
import { newSet } from "@/lib/client/set/new-set";
import { longestCode, packSet, unpackSet } from "@/lib/client/sheet/packed-set";
import { makePdf } from "@/lib/client/sheet/pdf/make-pdf";
import { papers, type Drawing, type Pair, type Sheet } from "@/lib/client/sheet/sheet";
import { boltSet, ellSet, sheetFonts, sheetFor, sheetOperations, sheetStages, slabSet, wholeSet } from "../setup/sheet-sets";

const now = new Date("2026-12-01T00:00:00Z");

interface Read {
  bytes: Uint8Array;
  pages: { width: number; height: number; words: { text: string; x: number; y: number; width: number }[] }[];
  text: string;
}

/** Reads a PDF back with Mozilla's reader, a program that is not ours. */
async function readBack(sheet: Sheet): Promise<Read> {
  const bytes = await makePdf(sheet, sheetFonts(), now);
  const document = await pdfjs.getDocument({ data: bytes.slice(), useSystemFonts: false, verbosity: 0 }).promise;
  const pages: Read["pages"] = [];
  for (let number = 1; number <= document.numPages; number += 1) {
    const page = await document.getPage(number);
    const { width, height } = page.getViewport({ scale: 1 });
    const { items } = await page.getTextContent();
    pages.push({ width, height, words: items.flatMap((item) => ("str" in item ? [{ text: item.str, x: item.transform[4], y: height - item.transform[5], width: item.width }] : [])) });
  }
  return { bytes, pages, text: squeezed(pages.flatMap(({ words }) => words.map(({ text }) => text)).join(" ")) };
}

const squeezed = (text: string) => text.replace(/\s+/g, "");

/** Every word and figure that the model says. */
function saidBy(sheet: Sheet): string[] {
  const drawn = ({ items }: Drawing) => items.flatMap((item) => (item.kind === "text" ? [item.text] : []));
  const tables = (sections: Sheet["sections"] | Sheet["beside"]) =>
    sections.flatMap((section): string[] => {
      if (section.kind === "table") return [section.title, section.note ?? "", ...section.columns.map(({ text }) => text), ...section.rows.flat()];
      if (section.kind === "strips") return [section.title, ...section.notes, ...section.strips.flatMap(({ title, length, drawing }) => [title, length, ...drawn(drawing)])];
      if (section.kind === "figures") return [section.title, ...section.notes, ...section.items];
      if (section.kind === "words") return [section.title, ...section.items];
      return [section.title, ...section.lines];
    });
  const plan = sheet.plan === null ? [] : [sheet.plan.scale, ...sheet.plan.notes, ...sheet.plan.legend.map(({ text }) => text), ...drawn(sheet.plan.drawing)];
  return [sheet.brand, sheet.title, ...sheet.facts.flatMap(({ label, text }) => [label, text ?? ""]), ...sheet.warnings, ...plan, ...tables(sheet.beside), ...tables(sheet.sections), sheet.code.title, sheet.code.text].filter((text) => text !== "");
}

const kinds = (["letter", "a4"] as const).flatMap((paper) => (["en", "es"] as const).flatMap((locale) => [false, true].map((metric) => ({ paper, locale, metric }))));

describe.each(kinds)("the whole job on $paper in $locale, metric $metric", (kind) => {
  let sheet: Sheet;
  let read: Read;
  beforeAll(async () => {
    sheet = sheetFor(wholeSet(), kind);
    read = await readBack(sheet);
  }, 60_000);

  test("the PDF says every word and figure of the model, as text that can be selected", () => {
    expect(saidBy(sheet).filter((said) => !read.text.includes(squeezed(said)))).toEqual([]);
  });

  test("pages have the paper's size and tell their number and count", () => {
    for (const [index, page] of read.pages.entries()) {
      expect(page.width).toBeCloseTo(papers[kind.paper].width, 1);
      expect(page.height).toBeCloseTo(papers[kind.paper].height, 1);
      expect(squeezed(page.words.map(({ text }) => text).join(""))).toContain(squeezed(sheet.sheetOf(index + 1, read.pages.length)));
    }
    expect(read.pages.length).toBeGreaterThan(1);
    expect(read.pages.length).toBeLessThan(6);
  });

  test("nothing stands outside the margins of half an inch", () => {
    for (const { width, height, words } of read.pages) {
      for (const { text, x, y, width: wide } of words.filter(({ text: word }) => word.trim() !== "")) {
        expect(x, text).toBeGreaterThanOrEqual(35.5);
        if (y > 0) expect(x + wide, text).toBeLessThanOrEqual(width - 35);
        expect(y, text).toBeLessThanOrEqual(height - 35);
      }
    }
  });

  test("no glyph is missing: neither a question mark in place of a character nor the font's own empty box", () => {
    expect(saidBy(sheet).join("").includes("?")).toBe(false);
    expect(read.text).not.toMatch(/[?\uFFFD\u0000]/);
  });

  test("the plan is measured on paper: side AB is as long as 28 ft over the stated scale", () => {
    const slab = sheet.plan!.drawing.items.find((item) => item.kind === "line" && item.role === "slab")!;
    const points = (slab as { points: readonly Pair[] }).points;
    const along = Math.hypot(points[1]![0] - points[0]![0], points[1]![1] - points[0]![1]);
    // 72 points to the inch, by the PDF's own definition (ISO 32000-1, 8.3.2.3); the slab's AB is typed as 28 ft, 336 in
    expect((along / 72) * sheet.plan!.ratio).toBeCloseTo(336, 6);
    expect(sheet.plan!.scale).toContain(`1:${sheet.plan!.ratio}`);
    // The letters A and B stand in the PDF where the drawing puts them: to the scale, and as far apart as the slab is long and two letters' room
    const letters = read.pages[0]!.words.filter(({ text }) => text === "A" || text === "B").map(({ x, width, y }) => ({ middle: x + width / 2, y })).filter(({ y }) => y > 300);
    const apart = Math.abs(letters[0]!.middle - letters[1]!.middle);
    expect(apart - along).toBeGreaterThan(0);
    expect(apart - along).toBeLessThan(30);
  });
});

test("the drawn slab in the PDF's own path is 336 in over the scale", async () => {
  const sheet = sheetFor(slabSet());
  const bytes = await makePdf(sheet, sheetFonts(), now);
  const streams = contentStreams(bytes);
  const slab = /1\.8 w[^]*?(-?[\d.]+) (-?[\d.]+) m\s+(-?[\d.]+) (-?[\d.]+) l\s+(-?[\d.]+) (-?[\d.]+) l/.exec(streams)!;
  expect((Math.hypot(Number(slab[3]) - Number(slab[1]), Number(slab[4]) - Number(slab[2])) / 72) * sheet.plan!.ratio).toBeCloseTo(336, 1);
});

/** The inflated streams of a PDF, as text. */
function contentStreams(bytes: Uint8Array): string {
  const raw = Buffer.from(bytes);
  const found: string[] = [];
  for (let at = raw.indexOf("stream\n"); at !== -1; at = raw.indexOf("stream\n", at + 1)) {
    if (raw.subarray(at - 3, at).toString() === "end") continue;
    try {
      found.push(inflateSync(raw.subarray(at + 7)).toString("latin1"));
    } catch {
      // a stream that is not deflated text
    }
  }
  return found.join("\n");
}

test("fonts are embedded, each as a subset with a map back to characters", async () => {
  const document = await pdfjs.getDocument({ data: await makePdf(sheetFor(boltSet()), sheetFonts(), now), verbosity: 0 }).promise;
  const page = await document.getPage(1);
  await page.getOperatorList();
  const names = new Set<string>();
  const { items } = await page.getTextContent();
  for (const item of items) if ("fontName" in item) names.add(item.fontName);
  const fonts = [...names].map((name) => page.commonObjs.get(name) as { name: string; missingFile: boolean });
  expect(fonts.length).toBeGreaterThanOrEqual(4);
  expect(fonts.filter(({ missingFile }) => missingFile)).toEqual([]);
  expect(fonts.map(({ name }) => name).sort().join(" ")).toMatch(/Archivo.*Atkinson/);
});

describe("figures of the model", () => {
  const table = (sheet: Sheet, id: string) => [...sheet.beside, ...sheet.sections].find((section) => section.id === id) as Extract<Sheet["sections"][number], { kind: "table" }>;

  test("readings before and after stand as typed, with the burn in", () => {
    const { rows, note } = table(sheetFor(slabSet()), "readings");
    expect(rows.find(([pull]) => pull === "A-C")).toEqual(["A-C", '428 9/16"', expect.any(String), '427 1/8"']);
    expect(rows.find(([pull]) => pull === "B-D")).toEqual(["B-D", '428 1/16"', expect.any(String), '427 1/16"']);
    expect(rows.at(-1)).toEqual(["Difference", '1/2"', "", '1/16"']); // 428 9/16 − 428 1/16; 427 1/8 − 427 1/16
    expect(note).toContain('1"');
  });

  test("chalk lines are the slab less two insets: 336 − 7/8 and 264 − 7/8", () => {
    expect(table(sheetFor(slabSet()), "lines").rows).toEqual([["A-B", `27' 11 1/8"`], ["B-C", `21' 11 1/8"`], ["C-D", `27' 11 1/8"`], ["D-A", `21' 11 1/8"`]]);
  });

  test("pieces of a wall add up to it, and their holes stand on its bolts", () => {
    const pieces = sheetFor(wholeSet()).sections.find(({ id }) => id === "pieces") as Extract<Sheet["sections"][number], { kind: "strips" }>;
    const said = pieces.strips.filter(({ title }) => title.includes("A-B")).flatMap(({ drawing }) => drawing.items.flatMap((item) => (item.kind === "text" ? [item.text] : [])));
    expect(said.slice(0, 4)).toEqual(["9", "66", "124 at 2 5/8", "183 1/2"]); // the surveyed stations of wall AB, the third bolt at 2 5/8
    const lengths = pieces.strips.filter(({ title }) => title.includes("A-B")).map(({ length }) => parseLength(length));
    expect(lengths.reduce((sum, length) => sum.plus(length)).toNumber()).toBe(329.625); // 335 1/8 less the 5 1/2 plate of BC, which runs through at B
  });

  test("the demo's bolt at 1 5/8 is found outside the middle third of a 5 1/2 plate (1 5/6)", () => {
    const { rows } = table(sheetFor(boltSet()), "findings");
    expect(rows).toHaveLength(1);
    expect(rows[0]!.join(" ")).toMatch(/1 5\/8.*1 13\/16/);
  });

  test("an L has six corners, six lines and its own diagonals", () => {
    const sheet = sheetFor(ellSet());
    expect(table(sheet, "offsets").rows.map(([corner]) => corner)).toEqual(["A", "B", "C", "D", "E", "F"]);
    expect(table(sheet, "lines").rows).toHaveLength(6);
    expect(table(sheet, "readings").rows).toHaveLength(3);
  });

  test("stages that a set lacks are left out, and an empty set says so", () => {
    const ids = ({ beside, sections }: Sheet) => [...beside, ...sections].map(({ id }) => id);
    expect(ids(sheetFor(slabSet()))).toEqual(["readings", "offsets", "lines", "cautions", "sign-off"]);
    expect(ids(sheetFor(wholeSet()))).toEqual(expect.arrayContaining(["pieces", "boards", "takeoff", "marks", "level", "rule"]));
    const empty = sheetFor(newSet("none", "Nothing", now.toISOString()));
    expect(empty.empty).not.toBeNull();
    expect(ids(empty)).toEqual(["cautions", "sign-off"]);
  });

  test("the rule is named with clause, source and how it was read; what it does not state is said so", () => {
    const rule = table(sheetFor(boltSet()), "rule");
    expect(rule.note).toContain("2024 IRC");
    expect(rule.rows.find(([figure]) => figure === "Greatest spacing")).toEqual(["Greatest spacing", `6' 0"`, "R403.1.6", "read in the source"]);
  });

  test("plates that come out otherwise than in their stage are not passed off as them", () => {
    const set = wholeSet();
    const plates = set.calculations["plates.plates"]!;
    const moved = { ...set, calculations: { ...set.calculations, "plates.plates": { ...plates, result: { ...plates.result!, layers: { ...plates.result!.layers, pieces: plates.result!.layers.pieces!.map((piece) => ({ ...piece, to: piece.to + 1 })) } } } } };
    expect(sheetFor(set).warnings.join()).not.toContain("otherwise");
    expect(sheetFor(moved).warnings.join()).toContain("otherwise");
  });

  test("a stage whose ground has changed is told before any figure", () => {
    const set = wholeSet();
    const taken = { ...set, calculations: { ...set.calculations, "chalk.inset": { ...set.calculations["chalk.inset"]!, taken: { length: "337 in" } } } };
    expect(sheetFor(taken).warnings.some((warning) => warning.includes("Chalk lines") && warning.includes("Do not cut"))).toBe(true);
  });
});

describe("the square code", () => {
  test.each([["slab", slabSet], ["bolts", boltSet], ["whole job", wholeSet], ["L", ellSet]])("brings the inputs of the %s to another phone, and the same sheet comes out", (_, make) => {
    const set = make();
    const brought = unpackSet(packSet(set), "other", sheetOperations);
    const [here, there] = [sheetFor(set), sheetFor(brought)];
    expect(JSON.stringify({ ...there, sheetOf: null })).toBe(JSON.stringify({ ...here, sheetOf: null }));
    expect(here.code.address.length).toBeLessThanOrEqual(longestCode);
    expect(here.code.address).toContain("/set/sheet#");
  });

  test("a spoiled code is refused", () => {
    const packed = packSet(slabSet());
    expect(() => unpackSet(packed.slice(0, packed.length / 2), "x", sheetOperations)).toThrow();
    expect(() => unpackSet("nonsense!", "x", sheetOperations)).toThrow();
  });

  test("a set too long for a code falls back to its first readings", () => {
    const set = boltSet();
    let seed = 1;
    const noise = () => String((seed = (seed * 48271) % 2147483647)); // what deflate cannot shorten
    const long = { ...set, calculations: { ...set.calculations, "bolts.anchors.ab": { ...set.calculations["bolts.anchors.ab"]!, fields: Object.fromEntries(Array.from({ length: 300 }, (__, index) => [`bolts.${index}.station`, noise()])) } } };
    expect(sheetFor(long).code.address).toContain("/calculators/squareness?");
  });
});

test("a name no font can print is printed as far as it goes, and never breaks the sheet", async () => {
  const read = await readBack(sheetFor({ ...slabSet(), name: "Taller \u{1F528} ñandú 工 " + "x".repeat(150) }));
  expect(read.text).toContain("ñandú");
});

test("the sheet knows every stage of the job", () => {
  expect(sheetStages.map(({ name }) => name)).toEqual(["concrete", "chalk", "recheck", "bolts", "plates", "takeoff", "marks"]);
});
