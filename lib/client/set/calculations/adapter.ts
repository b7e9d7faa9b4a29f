import type { LengthAnswer } from "@/calculators/schema/measure";
import { meant } from "@/lib/client/calculator/form-fields";
import type { Calculation, KeyFigure, Layers, Texts } from "../schema";

/** What a set needs to know of one calculator: its key figure, what it gives later stages, and what it adds to the plan. Pure; loaded with the stage. */
export interface Adapter<Answer> {
  /** Its path under /api/v1. */
  operation(answer: Answer): string;
  key(answer: Answer): KeyFigure;
  gives(answer: Answer, asked: Asked): Texts;
  layers(answer: Answer, asked: Asked): Layers;
  /** Figures worth calling across the slab, by the key of their name under `set.readings`. */
  readings(answer: Answer): readonly Reading[];
}

export interface Reading {
  key: string;
  params?: Readonly<Record<string, string | number | undefined>>;
  text: string;
}

/** What was asked: the plain input, what a bare number in it means, and the wall it is about. */
export interface Asked {
  unit: Calculation["unit"];
  input: Readonly<Record<string, unknown>>;
  wall?: string;
}

/** A double of inches as a field takes it: never 1e-9, and a billionth of an inch is more than any tape shows. */
export const inchText = (inches: number) => `${inches.toFixed(9).replace(/\.?0+$/, "").replace(/^-0$/, "0")} in`;

/** A length of an answer as a text that loses nothing, as a tape is read: 335 1/8 in; irrational ones to a billionth of an inch. */
export function exactText({ exact, in: inches }: Pick<LengthAnswer, "exact" | "in">): string {
  if (exact === null) return inchText(inches);
  const [, top, bottom] = /^(\d+)\/(\d+)$/.exec(exact) ?? [];
  if (top === undefined || bottom === undefined || BigInt(top) < BigInt(bottom)) return `${exact} in`;
  return `${BigInt(top) / BigInt(bottom)} ${BigInt(top) % BigInt(bottom)}/${bottom} in`;
}

/** Some lengths of the plain input, by new names, with their unit written out; those left out stay out. */
export function typed({ input, unit }: Asked, names: Readonly<Record<string, string>>): Texts {
  return Object.fromEntries(
    Object.entries(names).flatMap(([name, path]) => {
      const value = path.split(".").reduce<unknown>((node, step) => (typeof node === "object" && node !== null ? (node as Record<string, unknown>)[step] : undefined), input);
      return typeof value === "string" && value.trim() !== "" ? [[name, meant(value.trim(), unit)]] : [];
    }),
  );
}

export const keyFigure = (tone: KeyFigure["tone"], code: string, params: KeyFigure["params"] = {}): KeyFigure => ({ tone, code, params });

export const pointOf = ({ x, y }: { x: number; y: number }): [number, number] => [x, y];
