import { queryFromInput } from "@/calculators/schema/query";
import { publishedRuleTexts, ruleIds } from "@/calculators/rules";
import type { Translate } from "@/lib/client/i18n/translate";

/** One line of a kept calculation: what it is, and its value as text. */
export interface SummaryRow {
  path: string;
  label: string;
  text: string;
}

/** The figures of an answer that a reader looks for first; `[]` goes through a list. Others are in the calculator, one tap away. */
const headlines: Readonly<Record<string, readonly string[]>> = {
  squareness: ["shape", "verdict", "difference", "rack.distance", "rack.toward", "target.diagonal", "target.reading", "taper.length", "taper.width"],
  corners: ["diagonal", "reading", "triangle.a", "triangle.b", "triangle.c"],
  insets: ["lines.ab", "lines.bc", "lines.cd", "lines.da", "diagonal", "reading", "drop", "drops.ac", "drops.bd"],
  footprints: ["closure.distance", "closure.oneIn", "areaSquareFeet", "areaSquareMetres", "perimeter", "lines[].length", "checks[].reading"],
  fits: ["worst", "fits", "overhang", "lines.ab", "lines.bc", "lines.cd", "lines.da", "checks[].reading"],
  levels: ["verdict", "spread", "high.wall", "high.station", "low.wall", "low.station", "shims[].shim", "misclosure"],
  plates: ["ok", "totals.boards", "totals.boardLength", "totals.pieces", "boards[].stock", "addedAnchors[].station", "cost", "anchorsProved", "boardsProved"],
  takeoffs: ["totals.boards", "totals.boardLength", "totals.boardFeet", "totals.pounds"],
  marks: ["marks", "lastBay", "bays"],
  "anchors/layout": ["bolts", "pieces[].count", "pieces[].spacing", "pieces[].stations"],
  "anchors/check": ["ok", "findings[].code", "additions[].station"],
  conversions: ["total", "feetInches", "inches", "decimalFeet", "millimetres", "metres", "spacing.each"],
};

/** Without a list of its own an answer is shown by its first lengths and words. */
const mostUnlisted = 16;

export function inputRows(input: object, t: Translate): SummaryRow[] {
  return Object.entries(input).flatMap(([name, value]): SummaryRow[] => {
    if (holdsAnswers(value)) return t.has(`links.words.${name}`) ? [{ path: name, label: labelOf(name, t), text: t("links.handedOn") }] : [];
    return [...queryFromInput({ [name]: value })].map(([path, text]) => ({ path, label: labelOf(path, t), text: wordOf(text, t) }));
  });
}

/** Whether this part of an input was another calculator's answer: people type lengths, and only answers have them in every form. */
function holdsAnswers(value: unknown): boolean {
  if (value === null || typeof value !== "object") return false;
  return isPrinted(value) || Object.values(value).some(holdsAnswers);
}

export function answerRows(operation: string, answer: Record<string, unknown>, t: Translate): SummaryRow[] {
  const listed = headlines[operation];
  const found = listed === undefined ? unlisted(answer).slice(0, mostUnlisted) : listed.flatMap((path) => valuesAt(answer, path.split("."), ""));
  return found.flatMap(({ path, value }) => {
    const text = /^findings\.\d+\.code$/.test(path) ? t(`anchors.code.${value as string}`) : textOf(value, t);
    return text === null ? [] : [{ path, label: labelOf(path, t), text }];
  });
}

interface Found {
  path: string;
  value: unknown;
}

function valuesAt(value: unknown, [step, ...rest]: readonly string[], above: string): Found[] {
  if (step === undefined || value === null || value === undefined) return [{ path: above.slice(1), value }];
  const through = step.endsWith("[]");
  const name = through ? step.slice(0, -2) : step;
  const next = (value as Record<string, unknown>)[name];
  if (!through) return valuesAt(next, rest, `${above}.${name}`);
  return Array.isArray(next) ? next.flatMap((item, index) => valuesAt(item, rest, `${above}.${name}.${index}`)) : [];
}

function unlisted(value: unknown, above = ""): Found[] {
  if (value === null || typeof value !== "object" || isPrinted(value)) return typeof value === "number" ? [] : [{ path: above.slice(1), value }];
  return Object.entries(value).flatMap(([name, item]) => unlisted(item, `${above}.${name}`));
}

const isPrinted = (value: object): value is { text: string; lean?: string } => typeof (value as { text?: unknown }).text === "string";

function textOf(value: unknown, t: Translate): string | null {
  if (value === null || value === undefined) return null;
  if (Array.isArray(value)) return value.length === 0 ? null : value.map((item) => textOf(item, t) ?? "").join(", ");
  if (typeof value !== "object") return wordOf(String(value), t);
  if (!isPrinted(value)) return null;
  return value.lean === undefined || value.lean === "exact" ? value.text : `${value.text} ${t(`common.lean.${value.lean}`)}`;
}

/** A code in words where it has some, a rule by its title, anything else as it is. */
function wordOf(value: string, t: Translate): string {
  const rule = ruleIds.find((id) => id === value);
  if (rule !== undefined) return publishedRuleTexts[rule].title ?? rule;
  return t.has(`links.values.${value}`) ? t(`links.values.${value}`) : value;
}

/** `diagonals.ac` is “Diagonals, AC”, `bolts.0.station` “Bolts 1, Station”. */
function labelOf(path: string, t: Translate): string {
  const words: string[] = [];
  for (const step of path.split(".")) {
    const last = words.at(-1);
    if (/^\d+$/.test(step)) words[words.length - 1] = last === undefined ? step : t("links.numbered", { word: last, number: Number(step) + 1 });
    else words.push(stepWord(step, t));
  }
  return words.reduce((first, second) => t("links.both", { first, second }));
}

/** Corners and sides are named by their letters; a field without a word of its own by its name, taken apart. */
export function stepWord(step: string, t: Translate): string {
  if (t.has(`links.words.${step}`)) return t(`links.words.${step}`);
  return /^([A-Z]|[a-z]{2})$/.test(step) ? step.toUpperCase() : step.replace(/([a-z])(?=[A-Z])/g, "$1 ").toLowerCase();
}
