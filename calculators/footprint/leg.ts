import type { Length } from "../length";
import type { Toward } from "./toward";

/** One straight run of a walk round the plan. `run` is the row or the leg of the text it came from, counted from 1; 0 for a leg we added. */
export interface Leg {
  toward: Toward;
  length: Length;
  run: number;
}
