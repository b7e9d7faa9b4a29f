import { type Length } from "../../length";

/** A reading as it may have stood on the tape, by how many inches it then differs from what was written. */
export interface DigitSlip {
  kind: "digits-swapped" | "six-for-nine";
  inches: number;
}

/**
 * Every other reading that a slip of digits could have turned into this one: a 6 for a 9 or a 9 for a 6, or two digits of
 * one number swapped. The digits are those of the tape: of its count of inches, of feet and of the inches after them;
 * of millimetres on a metric tape.
 */
export function digitSlips(reading: Length, metric: boolean): DigitSlip[] {
  const wholes = metric
    ? [{ count: Number(reading.in("mm").floor()), scale: 1 / 25.4, below: Infinity }]
    : [
        { count: Number(reading.inches.floor()), scale: 1, below: Infinity },
        { count: Number(reading.in("ft").floor()), scale: 12, below: Infinity },
        { count: Number(reading.inches.floor()) % 12, scale: 1, below: 12 },
      ];
  return wholes.flatMap(({ count, scale, below }) =>
    slipsOf(String(count))
      .filter(({ value }) => value < below && value !== count)
      .map(({ kind, value }): DigitSlip => ({ kind, inches: (value - count) * scale })),
  );
}

function slipsOf(digits: string): { kind: DigitSlip["kind"]; value: number }[] {
  const found: { kind: DigitSlip["kind"]; value: number }[] = [];
  const add = (kind: DigitSlip["kind"], changed: readonly string[]) => {
    if (changed[0] !== "0" || changed.length === 1) found.push({ kind, value: Number(changed.join("")) });
  };
  const all = [...digits];
  all.forEach((digit, place) => {
    if (digit === "6" || digit === "9") add("six-for-nine", all.with(place, digit === "6" ? "9" : "6"));
    for (let other = place + 1; other < all.length; other += 1) {
      if (digit !== all[other]) add("digits-swapped", all.with(place, all[other]!).with(other, digit));
    }
  });
  return found;
}
