export const legs = ["legs.0", "legs.1"] as const;

/** A list closes its gaps, so that a second leg typed first would pass for the first: which fields are still blank is told from the form. */
export function blankLegs(value: (name: string) => string): string[] {
  return legs.filter((name) => value(name).trim() === "");
}

export function isLengthField(name: string): boolean {
  return name.startsWith("legs.") || name === "burn" || name === "burnOther";
}
