import type Fraction from "fraction.js";
import { z } from "zod";
import { Length, LengthError, lengthUnits, precisions, readLength, ReadLength, type LengthUnit } from "../length";

/**
 * The zod pieces that all calculators share. A union's message is its issue code: `required`, or what was expected.
 * Text is accepted beside numbers and truth values, since a form and an address can send nothing else.
 */

/** The error of a union: `required` where nothing came, else `code`. */
export const orRequired = (code: string) => ({ error: (issue: { input?: unknown }) => (issue.input === undefined ? "required" : code) });

interface LengthFieldOptions {
  /** `positive` by default; `any` for offsets, which may be negative. */
  sign?: "positive" | "not-negative" | "any";
  description: string;
  example: string;
}

/**
 * A length as text, or as a number in the input's `unit`. Its text is read at once, so that all faulty fields are told
 * together; `withLengths` settles the unit.
 */
export function lengthField({ sign = "positive", description, example }: LengthFieldOptions) {
  return z
    .union([z.string(), z.number()], orRequired("expected-length"))
    .meta({ description, examples: [example] })
    .transform((raw, context): ReadLength => {
      const refuse = (code: string, params: object = {}) => {
        context.issues.push({ code: "custom", input: raw, params: { code, params } });
        return z.NEVER;
      };
      try {
        const read = typeof raw === "number" ? ReadLength.bare(Length.from(raw).inches) : readLength(raw);
        if (read.sign < 0 && sign !== "any") return refuse("negative");
        if (read.sign === 0 && sign === "positive") return refuse("zero");
        return read;
      } catch (error) {
        if (error instanceof LengthError) return refuse(error.code, error.params);
        throw error;
      }
    });
}

/** A plain number (a count, a temperature, a pull), or the text of one. */
export function numberField({ minimum, maximum, whole = false, description, example }: { minimum: number; maximum: number; whole?: boolean; description: string; example: number }) {
  return z
    .union([z.number(), z.string()], orRequired("expected-number"))
    .meta({ description, examples: [example] })
    .transform((raw, context): number => {
      const text = typeof raw === "string" ? raw.trim() : String(raw);
      const value = text.length <= 32 && /^[-\u2212]?(\d+(\.\d*)?|\.\d+)(e[+-]?\d+)?$/i.test(text) ? Number(text.replace("\u2212", "-")) + 0 : NaN; // + 0 turns −0 into 0
      const refuse = (code: string, params: object = {}) => {
        context.issues.push({ code: "custom", input: raw, params: { code, params } });
        return z.NEVER;
      };
      if (!Number.isFinite(value)) return refuse("expected-number");
      if (whole && !Number.isInteger(value)) return refuse("expected-whole-number");
      if (value < minimum) return refuse("too-small", { minimum });
      if (value > maximum) return refuse("too-big", { maximum });
      return value;
    });
}

/** Yes or no, or the words `true` and `false`. */
export function flagField({ description }: { description: string }) {
  return z
    .union([z.boolean(), z.enum(["true", "false"])], orRequired("expected-flag"))
    .meta({ description })
    .transform((raw): boolean => raw === true || raw === "true");
}

/** One of a few words; missing is told as `required`. */
export function choiceField<const Options extends readonly string[]>(options: Options, { description }: { description: string }) {
  return z.enum(options, { error: (issue) => (issue.input === undefined ? "required" : undefined) }).meta({ description });
}

/** Fields of every calculator's input. */
const commonFields = {
  unit: z.enum(lengthUnits).default("in").meta({ description: "What a bare number means" }),
  precision: z.enum(precisions).default("1/16").meta({ description: "What texts are rounded to" }),
};

type Settled<T> = T extends ReadLength
  ? Length
  : T extends Fraction
    ? Fraction
    : T extends readonly (infer Item)[]
      ? Settled<Item>[]
      : T extends object
        ? { [Key in keyof T]: Settled<T[Key]> }
        : T;

/**
 * The input of a calculator: `shape` with `unit` and `precision` beside it, unknown fields refused, every length
 * settled in its unit. A length out of range is told together with the other faults, and so is what `missing` finds: fields
 * that are optional one by one but of which some are required. It sees the value before it is settled, faults and all.
 */
export function calculatorInput<Shape extends z.ZodRawShape>(shape: Shape, missing?: (value: Readonly<Record<string, unknown>>) => readonly PropertyKey[][]) {
  return z
    .strictObject({ ...commonFields, ...shape })
    .superRefine(
      (value, context) => {
        for (const path of missing?.((value ?? {}) as Record<string, unknown>) ?? []) context.issues.push({ code: "custom", input: undefined, path, params: { code: "required" } });
        const unit = unitOf(value);
        mapLengths(value, [], (read, path) => {
          try {
            return read.in(unit);
          } catch (error) {
            if (!(error instanceof LengthError)) throw error;
            context.issues.push({ code: "custom", input: undefined, path, params: { code: error.code, params: error.params } });
            return Length.zero;
          }
        });
      },
      { when: () => true },
    )
    .transform((value) => {
      const unit = unitOf(value);
      return mapLengths(value, [], (read) => read.in(unit)) as Settled<typeof value>;
    });
}

/** The unit asked for, or inches while that field itself is at fault. */
function unitOf(value: unknown): LengthUnit {
  const asked = (value as { unit?: unknown } | null)?.unit;
  return lengthUnits.find((unit) => unit === asked) ?? "in";
}

function mapLengths(part: unknown, path: PropertyKey[], settle: (read: ReadLength, path: PropertyKey[]) => Length): unknown {
  if (part instanceof ReadLength) return settle(part, path);
  if (Array.isArray(part)) return part.map((item, index) => mapLengths(item, [...path, index], settle));
  if (part === null || typeof part !== "object" || Object.getPrototypeOf(part) !== Object.prototype) return part;
  return Object.fromEntries(Object.entries(part).map(([key, item]) => [key, mapLengths(item, [...path, key], settle)]));
}
