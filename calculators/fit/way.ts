import type { Length } from "../length";
import type { Laid } from "./best-fit";
import type { ExactOffsets } from "./exact-fit";
import type { Mode } from "./input";

/** A way laid out, with the exact figures where slab and plan are true. */
export interface Way {
  way: "hold" | "best" | "follow";
  mode: Mode;
  laid: Laid;
  lengths: (Length | number)[];
  exact: ExactOffsets | null;
}
