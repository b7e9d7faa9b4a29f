import { z } from "zod";
import { Length } from "../length";
import { CalculationError, lengthField, type Issue } from "../schema";
import { sideNames } from "./corner-names";

type Options = Parameters<typeof lengthField>[0];

/** One length for every side, or one for each by name, `{ ab, bc, … }`, however many sides there are. */
export function perSide(options: Options) {
  const one = lengthField(options);
  const raw = z.union([z.string(), z.number()]);
  return z
    .union([raw, z.record(z.string(), raw)], { error: (issue) => (issue.input === undefined ? "required" : "expected-length") })
    .meta({ description: `${options.description}: one for all sides, or one each by name (ab, bc …), with \`other\` for those not named`, examples: [options.example] })
    .transform((given, context) => {
      const read = (value: unknown, path: string[]) => {
        const result = one.safeParse(value);
        if (result.success) return result.data;
        for (const issue of result.error.issues) context.issues.push({ ...issue, path: [...path, ...issue.path], input: value } as never);
        return z.NEVER;
      };
      if (typeof given !== "object") return read(given, []);
      return Object.fromEntries(Object.entries(given).map(([side, value]) => [side, read(value, [side])]));
    });
}

/**
 * The value of each side in order.
 *
 * @throws CalculationError `side-unknown` at a name the plan has not, `required` at one that is missing.
 */
export function forSides(value: Length | Readonly<Record<string, Length>>, count: number, pointer: string): Length[] {
  const names = sideNames(count);
  if (value instanceof Length) return names.map(() => value);
  const unknown = Object.keys(value).filter((name) => name !== "other" && !names.includes(name.toLowerCase()));
  const bySide = new Map(Object.entries(value).map(([name, length]) => [name.toLowerCase(), length]));
  const issues: Issue[] = [
    ...unknown.map((name) => ({ pointer: `${pointer}/${name}`, code: "side-unknown", params: { found: name.slice(0, 8), first: names[0]!, last: names.at(-1)! } })),
    ...names.filter((name) => value.other === undefined && !bySide.has(name)).map((name) => ({ pointer: `${pointer}/${name}`, code: "required", params: {} })),
  ];
  if (issues.length > 0) throw new CalculationError(issues);
  return names.map((name) => (bySide.get(name) ?? value.other)!);
}
