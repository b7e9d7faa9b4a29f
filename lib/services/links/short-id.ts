import "server-only";
import { randomBytes } from "node:crypto";

const letters = "0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz";

/** Ten base62 characters, each as likely as any other: 59 bits, so that nobody finds another's link by trying. */
export function shortId(length = 10): string {
  let id = "";
  while (id.length < length) {
    for (const byte of randomBytes(length * 2)) {
      if (byte < 248 && id.length < length) id += letters[byte % 62]; // 248 = 4 × 62: a remainder of more would favour the first letters
    }
  }
  return id;
}
