import type { Length } from "../length";
import type { Point } from "../geometry/point";

/** A place known exactly, in inches east and north of A. */
export interface ExactPoint {
  x: Length;
  y: Length;
}

/** What the walk was not quite, and what was done about it; one for each thing, by name. */
export type NoteCode = "clockwise" | "collinear" | "start-on-side" | "closing-leg-added" | "balanced" | "three-corners";

export interface Note {
  code: NoteCode;
  /** Row or leg, from 1. */
  run: number | null;
  toward: string | null;
  length: Length | number | null;
}

export function note(code: NoteCode, details: Partial<Omit<Note, "code">> = {}): Note {
  return { code, run: null, toward: null, length: null, ...details };
}

/** A closed counter-clockwise plan. `exact` when every side runs along an axis, so that all of it is rational. */
export interface Outline {
  points: Point[];
  exact: ExactPoint[] | null;
  /** Each side's length: from one corner to the next. */
  sides: (Length | number)[];
  /** Each side's direction, as walked; null when it is not known. */
  toward: (string | null)[];
}
