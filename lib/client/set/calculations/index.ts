import type { Adapter } from "./adapter";
import { anchors } from "./anchors";
import { fit } from "./fit";
import { footprint } from "./footprint";
import { inset } from "./inset";
import { level } from "./level";
import { marks } from "./marks";
import { plates } from "./plates";
import { squareness } from "./squareness";
import { takeoff } from "./takeoff";

const adapters: Readonly<Record<string, unknown>> = { squareness, footprint, level, inset, fit, anchors, plates, takeoff, marks };

/** The adapter of a calculator by its folder name; the answer given to it must be that calculator's. */
export function adapterOf(calculator: string): Adapter<unknown> | undefined {
  return adapters[calculator] as Adapter<unknown> | undefined;
}
