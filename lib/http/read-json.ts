import "server-only";
import { Problem } from "./problem";

export const bodyLimit = 256 * 1024;

/**
 * The JSON of a body, never more of it held than `limit` bytes.
 *
 * @throws Problem unsupported-media-type, body-too-large or malformed-json.
 */
export async function readJson(request: Request, limit = bodyLimit): Promise<unknown> {
  if (!isJson(request.headers.get("content-type")) || isEncoded(request.headers.get("content-encoding"))) throw new Problem("unsupported-media-type", { headers: { Accept: "application/json" } });
  const declared = request.headers.get("content-length");
  if (declared !== null && Number(declared) > limit) throw tooLarge(limit);
  // Node's parser ends a body at its declared length, so only one without needs counting.
  const text = declared === null ? await readCounted(request, limit) : await request.text();
  try {
    return JSON.parse(text);
  } catch {
    throw new Problem("malformed-json");
  }
}

const tooLarge = (limit: number) => new Problem("body-too-large", { params: { kibibytes: Math.floor(limit / 1024) } });

/** `application/json`, in no other charset than UTF-8. */
function isJson(type: string | null): boolean {
  if (type === "application/json") return true;
  if (type === null) return false;
  const [media = "", ...parameters] = type.toLowerCase().split(";").map((part) => part.trim());
  return media === "application/json" && parameters.every((parameter) => !parameter.startsWith("charset=") || /^charset="?utf-?8"?$/.test(parameter));
}

const isEncoded = (encoding: string | null) => encoding !== null && encoding.toLowerCase() !== "identity";

async function readCounted(request: Request, limit: number): Promise<string> {
  if (request.body === null) return "";
  const reader = request.body.getReader();
  const chunks: Uint8Array[] = [];
  let size = 0;
  for (;;) {
    const { done, value } = await reader.read();
    if (done) return new TextDecoder().decode(Buffer.concat(chunks));
    size += value.byteLength;
    if (size > limit) {
      await reader.cancel().catch(() => undefined);
      throw tooLarge(limit);
    }
    chunks.push(value);
  }
}
