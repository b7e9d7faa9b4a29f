import type { Reading } from "./calculations/adapter";

interface LengthLike {
  text: string;
}

/** The figures of an answer for the reading mode; each calculator's own piece is fetched with it. */
export async function readingsOf(name: string, answer: unknown): Promise<readonly Reading[]> {
  if (answer === null) return [];
  if (name === "corner") {
    const { reading } = answer as { reading: LengthLike };
    return [{ key: "corner.reading", text: reading.text }];
  }
  if (name === "conversions") {
    const { total, feetInches } = answer as { total?: LengthLike | null; feetInches?: LengthLike | null };
    return [total, feetInches].flatMap((length) => (length ? [{ key: "conversions.length", text: length.text }] : [])).slice(0, 1);
  }
  const { adapterOf } = await import("./calculations");
  return adapterOf(name)?.readings(answer) ?? [];
}
