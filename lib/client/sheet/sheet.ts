import type { Locale } from "@/lib/client/i18n/locales";

/** Sizes in points, 72 to the inch, as printed. */
export const papers = {
  letter: { width: 612, height: 792 },
  a4: { width: 595.28, height: 841.89 },
} as const;
export type Paper = keyof typeof papers;
export const margin = 36;

export type Pair = readonly [number, number];
/** Told apart by shape, for a printer without colour: dot, crossed square, ring, diamond, open circle. */
export type MarkShape = "good" | "bad" | "added" | "engineered" | "hole";
export type LineRole = "slab" | "chalk" | "plate" | "board" | "offcut" | "joint" | "joist" | "bar" | "pull";
export type FontRole = "heading" | "text" | "bold" | "figure" | "figure-bold";

/** What a drawing is made of. Points with y downward, so that page and PDF draw the very same figures. */
export type Drawn =
  | { kind: "line"; role: LineRole; points: readonly Pair[]; closed: boolean }
  | { kind: "mark"; shape: MarkShape; at: Pair }
  | { kind: "text"; text: string; at: Pair; anchor: "start" | "middle" | "end"; size: number; font: FontRole; turn?: number };

export interface Drawing {
  width: number;
  height: number;
  items: readonly Drawn[];
}

export interface PlanPart {
  drawing: Drawing;
  /** One sentence for whoever cannot see it. */
  description: string;
  /** What a length on paper is multiplied by, such as 96. */
  ratio: number;
  scale: string;
  notes: readonly string[];
  legend: readonly { sample: LineRole | MarkShape; text: string }[];
}

export interface Table {
  kind: "table";
  id: string;
  title: string;
  note?: string;
  /** `share` of the width; figures stand right. */
  columns: readonly { text: string; figure?: boolean; share: number }[];
  rows: readonly (readonly string[])[];
}

export interface Strips {
  kind: "strips";
  id: string;
  title: string;
  notes: readonly string[];
  strips: readonly { id: string; title: string; length: string; drawing: Drawing; description: string }[];
}

export interface Figures {
  kind: "figures";
  id: string;
  title: string;
  notes: readonly string[];
  items: readonly string[];
}

export interface Words {
  kind: "words";
  id: string;
  title: string;
  items: readonly string[];
}

export interface SignOff {
  kind: "signOff";
  id: string;
  title: string;
  lines: readonly string[];
}

export type Section = Table | Strips | Figures | Words | SignOff;

/** The printed page for the crew, every word and figure settled: a rendering only places them. */
export interface Sheet {
  locale: Locale;
  paper: Paper;
  brand: string;
  title: string;
  facts: readonly { label: string; text: string | null }[];
  /** What is stale or wants a decision: said before any figure. */
  warnings: readonly string[];
  plan: PlanPart | null;
  /** Short tables beside the plan. */
  beside: readonly Table[];
  sections: readonly Section[];
  code: { address: string; title: string; text: string };
  empty: string | null;
  sheetOf(number: number, count: number): string;
}

export const contentWidth = (paper: Paper) => papers[paper].width - 2 * margin;

/** The share of the width that the plan takes; the short tables stand beside it. */
export const planShare = 0.58;
export const gap = 18;
