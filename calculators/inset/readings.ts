import { Length } from "../length";
import { CalculationError, measure, type Issue } from "../schema";
import { sides, type Diagonal, type InsetInput, type Side } from "./input";

export type ByDiagonal<T> = Readonly<Record<Diagonal, T>>;

export type Group = "slabDiagonals" | "chalkDiagonals" | "chalkLines";

/** Where the tape was held for a reading: the chalk's own burn, else the one named for the diagonal, else the common one. */
export function burnOf({ burn, burns, chalkBurns }: InsetInput, group: Group, name: Diagonal | Side): Length {
  const own = group === "slabDiagonals" ? undefined : chalkBurns?.[name];
  const named = name === "ac" || name === "bd" ? burns?.[name] : undefined;
  return own ?? named ?? burn ?? Length.zero;
}

/** Every reading with its burn taken off. */
export function readingsOf(input: InsetInput) {
  const issues: Issue[] = [];
  const actual = (group: Group, name: Diagonal | Side, reading: Length): Length => {
    const burn = burnOf(input, group, name);
    const value = reading.minus(burn);
    if (!value.isPositive()) issues.push({ pointer: `/${group}/${name}`, code: "burn-over-reading", params: { burn: measure(burn, input.precision).text } });
    return value;
  };
  const pair = (group: "slabDiagonals" | "chalkDiagonals"): ByDiagonal<Length> | null => {
    const given = input[group];
    return given === undefined ? null : { ac: actual(group, "ac", given.ac), bd: actual(group, "bd", given.bd) };
  };
  const slabDiagonals = pair("slabDiagonals");
  const chalkDiagonals = pair("chalkDiagonals");
  const chalkLines: Partial<Record<Side, Length>> = {};
  for (const side of sides) {
    const given = input.chalkLines?.[side];
    if (given !== undefined) chalkLines[side] = actual("chalkLines", side, given);
  }
  const impossible = (group: string, name: Diagonal, value: Length) => {
    const [least, most] = [input.length.minus(input.width).magnitude(), input.length.plus(input.width)];
    if (value.compare(least) > 0 && value.compare(most) < 0) return;
    issues.push({ pointer: `/${group}/${name}`, code: "diagonal-impossible", params: { least: measure(least, input.precision).text, most: measure(most, input.precision).text } });
  };
  if (issues.length === 0 && slabDiagonals !== null) for (const name of ["ac", "bd"] as const) impossible("slabDiagonals", name, slabDiagonals[name]);
  if (issues.length > 0) throw new CalculationError(issues);
  return { slabDiagonals, chalkDiagonals, chalkLines };
}

export type Readings = ReturnType<typeof readingsOf>;
