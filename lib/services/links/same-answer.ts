import "server-only";

/** Far below any graduation, and above what a change in the order of a sum can do to a double. */
const tolerance = 1e-9;

/** Whether two answers say the same: texts and exact lengths to the letter, plain numbers to a billionth. */
export function sameAnswer(one: unknown, other: unknown): boolean {
  if (typeof one === "number" && typeof other === "number") return one === other || Math.abs(one - other) <= tolerance * Math.max(1, Math.abs(one), Math.abs(other));
  if (one === null || other === null || typeof one !== "object" || typeof other !== "object") return one === other;
  if (Array.isArray(one) !== Array.isArray(other)) return false;
  const keys = Object.keys(one);
  return keys.length === Object.keys(other).length && keys.every((key) => Object.hasOwn(other, key) && sameAnswer(one[key as never], other[key as never]));
}
