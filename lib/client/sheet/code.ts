import { encode } from "uqr";
import { codePath } from "./paths";

/** The square code of an address: its dark modules as a path, and how many it has to a side. Level L, since the sheet is fresh paper and the text long. */
export function codeOf(text: string): { path: string; size: number } {
  const { data, size } = encode(text, { ecc: "L", border: 0 });
  return { path: codePath(data), size };
}
