/** What the slim row inserts. `feet` and `inches` are written as the marks, which every reader of a tape knows. */
export const marks = { feet: "' ", inches: "\"", slash: "/", space: " " } as const;
export type Mark = keyof typeof marks;

export interface Typed {
  text: string;
  /** Where the caret stands, counted in UTF-16 units as inputs count. */
  caret: number;
}

/**
 * Types a mark in place of the selection from `start` to `end`. Spaces that would double are dropped, since a thumb that
 * already typed one means one.
 */
export function insertMark(text: string, start: number, end: number, mark: Mark): Typed {
  const tight = mark !== "space";
  const before = tight ? text.slice(0, start).replace(/\s+$/, "") : text.slice(0, start);
  const after = text.slice(end);
  const typed = marks[mark];
  if (mark === "space" && (before === "" || before.endsWith(" "))) return { text: before + after, caret: before.length };
  if (typed.endsWith(" ") && after.startsWith(" ")) return { text: before + typed.trimEnd() + after, caret: before.length + typed.length };
  return { text: before + typed + after, caret: before.length + typed.length };
}
