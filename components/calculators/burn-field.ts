/** Where the tape was held: a few marks to choose from, or `other` with the mark as text in the field `burnOther`. */
export const burns = ["0", "1 in", "1 ft", "100 mm"] as const;
export const other = "other";

type Value = (name: string) => string;

/** Which choice is in use and the burn it stands for, "" for none; a length that is none of the marks is `other`. */
export function burnChosen(value: Value, unit: string): { choice: string; text: string } {
  const burn = value("burn").trim();
  if (burn === other) return { choice: other, text: value("burnOther") };
  const known = burns.find((choice) => choice === burn || choice === `${burn} ${unit}`) ?? (burn === "" ? "0" : undefined);
  return known === undefined ? { choice: other, text: burn } : { choice: known, text: known === "0" ? "" : known };
}

const names: Readonly<Record<string, string>> = { "1 in": "inch", "1 ft": "foot", "100 mm": "hundred" };

/** A burn in the page's language; one that is none of the marks as it was typed. The messages are under `<namespace>.burn`. */
export function burnName(text: string, t: (key: string) => string, namespace: string): string {
  const name = names[text];
  return name === undefined ? text : t(`${namespace}.burn.${name}`);
}

/** The page's input with its burn as the API takes it. */
export function withBurn({ burn, burnOther, ...rest }: Record<string, unknown>): Record<string, unknown> {
  const held = burn === other ? burnOther : burn;
  return held === undefined ? rest : { ...rest, burn: held };
}
