import { pixel } from "./plan-geometry";

/** Lengths in inches along the wall's line, from its first corner. */
export interface WallPiece {
  from: number;
  to: number;
  /** Stands at the left of the piece's row: `1 · A-B`. */
  label?: string;
}

export interface WallBolt {
  station: number;
  /** From the plate's outer edge, in inches; the middle of the plate when not given. */
  across?: number;
  /** The station as text, over the bolt. */
  label?: string;
  /** The bolt's own number, under the plate. */
  number?: number | string;
  tone?: BoltTone;
}

export interface WallGap {
  from: number;
  to: number;
  label: string;
}

/** `bad` broke a rule, `added` is drilled in later, `engineered` is never moved or counted. Each has its own shape. */
export type BoltTone = "good" | "bad" | "added" | "engineered";

export interface PlacedBolt extends WallBolt {
  x: number;
  y: number;
  /** 0 for the line of labels next to the plate, 1 for the one above it. */
  line: number;
  /** Where the label's middle stands, so that it stays inside the drawing. */
  labelX: number;
}

export interface PieceRow {
  piece: WallPiece;
  left: number;
  width: number;
  bolts: PlacedBolt[];
}

export const plateHeight = 40;
const sideMargin = 22;

/**
 * Pieces below each other at one scale along their length; the longest fills the box. Across, the plate is drawn larger: `acrossTimes`
 * is how many times. A bolt past every piece stands beside the nearest, at most a margin away.
 */
export function wallRows({ pieces, bolts, plateWidth, box }: { pieces: readonly WallPiece[]; bolts: readonly WallBolt[]; plateWidth: number; box: number }) {
  const longest = Math.max(...pieces.map(({ from, to }) => to - from), 1);
  const perInch = (box - 2 * sideMargin) / longest;
  const acrossPerInch = plateHeight / plateWidth;
  const rows: PieceRow[] = pieces.map((piece) => ({ piece, left: sideMargin, width: pixel((piece.to - piece.from) * perInch), bolts: [] }));
  for (const bolt of [...bolts].sort((a, b) => a.station - b.station)) {
    const row = rows.reduce((best, candidate) => (distanceTo(candidate.piece, bolt.station) < distanceTo(best.piece, bolt.station) ? candidate : best), rows[0]!);
    const along = (bolt.station - row.piece.from) * perInch;
    const x = pixel(sideMargin + Math.min(row.width + sideMargin - 8, Math.max(8 - sideMargin, along)));
    const y = pixel(plateHeight - (bolt.across ?? plateWidth / 2) * acrossPerInch);
    row.bolts.push({ ...bolt, x, y: Math.min(plateHeight + 14, Math.max(-14, y)), line: 0, labelX: x });
  }
  for (const row of rows) stagger(row.bolts, box);
  return { rows, perInch, acrossTimes: Math.max(1, Math.round(acrossPerInch / perInch)), acrossPerInch };
}

function distanceTo({ from, to }: WallPiece, station: number): number {
  return Math.max(0, from - station, station - to);
}

/** Figures stand 8.2 px wide at their size: a label that would touch its neighbour goes one line up, one that would leave the drawing moves in. */
function stagger(bolts: PlacedBolt[], box: number): void {
  const ends = [-Infinity, -Infinity];
  for (const bolt of bolts) {
    const half = ((bolt.label?.length ?? 0) * 8.2) / 2;
    bolt.labelX = pixel(Math.max(half + 2, Math.min(box - half - 2, bolt.x)));
    bolt.line = bolt.labelX - half > (ends[0] ?? 0) + 5 ? 0 : 1;
    ends[bolt.line] = bolt.labelX + half;
  }
}
