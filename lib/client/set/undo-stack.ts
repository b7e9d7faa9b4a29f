import { inversePatch, mergePatches, type SetPatch } from "./patch";
import type { SillSet } from "./schema";

/** What the bar says can be undone: a message key under `set.undo`, and the calculation it happened in. */
export interface UndoLabel {
  what: "typing" | "taking" | "rename" | "choice" | "reset" | "row";
  slot?: string;
}

export interface UndoEntry extends UndoLabel {
  inverse: SetPatch;
  /** The one field typed into, so that a word is undone and not a letter. */
  field: string | null;
  at: number;
}

export type UndoStack = readonly UndoEntry[];

const depth = 100;
/** Keys pressed closer than this belong together. */
const pause = 1_500;

const soleField = ({ calculations = {} }: SetPatch): string | null => {
  const names = Object.entries(calculations).flatMap(([id, { fields = {} }]) => Object.keys(fields).map((name) => `${id} ${name}`));
  return names.length === 1 ? names[0]! : null;
};

/** Notes a change about to be made to `set`. */
export function remember(stack: UndoStack, set: SillSet, patch: SetPatch, label: UndoLabel, at: number): UndoStack {
  const inverse = inversePatch(set, patch);
  const field = soleField(patch);
  const last = stack.at(-1);
  if (last !== undefined && label.what === "typing" && last.what === "typing" && field !== null && last.field === field && at - last.at < pause) {
    // the older inverse goes further back, and so has the last word
    return [...stack.slice(0, -1), { ...last, inverse: mergePatches(inverse, last.inverse), at }];
  }
  return [...stack.slice(-(depth - 1)), { ...label, inverse, field, at }];
}

/** The newest entry and the stack without it. */
export function takeBack(stack: UndoStack): { entry: UndoEntry; rest: UndoStack } | null {
  const entry = stack.at(-1);
  return entry === undefined ? null : { entry, rest: stack.slice(0, -1) };
}
