import { anchors } from "./anchors";
import { conversions } from "./conversions";
import { corner } from "./corner";
import { fit } from "./fit";
import { footprint } from "./footprint";
import { inset } from "./inset";
import { level } from "./level";
import { marks } from "./marks";
import { plates } from "./plates";
import type { Calculator, Operation } from "./schema";
import { squareness } from "./squareness";
import { takeoff } from "./takeoff";

/** Every calculator, in the order of the job. Pages, API, OpenAPI, short links and tests read this list. */
export const calculators: readonly Calculator[] = [
  squareness,
  footprint,
  level,
  corner,
  inset,
  fit,
  anchors,
  plates,
  takeoff,
  marks,
  conversions,
];

/** Every operation of the API by its path under /api/v1. */
export const operations: ReadonlyMap<string, Operation> = new Map(
  calculators.flatMap((calculator) => calculator.operations.map((operation) => [operation.path, operation] as const)),
);

/** The calculator that an operation belongs to. */
export function calculatorOf(path: string): Calculator | undefined {
  return calculators.find((calculator) => calculator.operations.some((operation) => operation.path === path));
}
