import { deflateSync, inflateSync, strFromU8, strToU8 } from "fflate";
import { inputFromQuery, queryFromInput } from "@/calculators/schema/query";
import { answerTo } from "@/calculators/schema/answer-to";
import type { Operation } from "@/calculators/schema";
import { localePath, type Locale } from "@/lib/client/i18n/locales";
import { adapterOf } from "@/lib/client/set/calculations";
import { newSet } from "@/lib/client/set/new-set";
import { sillSet, type Calculation, type SillSet } from "@/lib/client/set/schema";
import { fingerprint } from "@/lib/client/set/stage-state";

/**
 * A set's inputs inside an address, after `#`, which no browser sends to a server: a phone that reads the sheet's square code has the same
 * inputs without account or upload. Answers are not carried: they are worked out again.
 */
type Packed = { n: string; c: string; h: Record<string, string>; k: Record<string, [operation: string | null, unit: string, precision: string, input: string, rest: string]> };

/** Past this many characters a printed code grows too fine for a phone to read. */
export const longestCode = 1900;
const mostBytes = 200_000;

export function packSet(set: SillSet): string {
  const k: Packed["k"] = {};
  for (const [slot, { fields, unit, precision, result }] of Object.entries(set.calculations)) {
    const input = result === null ? new URLSearchParams() : queryFromInput(result.input);
    const rest = new URLSearchParams(Object.entries(fields).filter(([name, text]) => input.get(name) !== text));
    k[slot] = [result?.operation ?? null, unit, precision, input.toString(), rest.toString()];
  }
  const packed: Packed = { n: set.name, c: set.changed, h: set.choices, k };
  return toBase64Url(deflateSync(strToU8(JSON.stringify(packed)), { level: 9 }));
}

/** @throws when the text is no packed set, or a spoiled one. */
export function unpackSet(text: string, id: string, operations: ReadonlyMap<string, Operation>): SillSet {
  const bytes = inflateSync(fromBase64Url(text), { out: new Uint8Array(mostBytes) }); // a small text that swells past this is none of ours
  const { n, c, h, k } = JSON.parse(strFromU8(bytes)) as Packed;
  const calculations = Object.fromEntries(
    Object.entries(k).map(([slot, [operation, unit, precision, query, rest]]): [string, Calculation] => {
      const input = inputFromQuery(new URLSearchParams(query));
      const own = Object.fromEntries([...new URLSearchParams(query)].filter(([name]) => name !== "unit" && name !== "precision"));
      const fields = { ...own, ...Object.fromEntries(new URLSearchParams(rest)) };
      const shape = { fields, unit: unit as Calculation["unit"], precision: precision as Calculation["precision"], taken: {} };
      return [slot, { ...shape, result: resultOf(slot, operation, shape, input, operations) }];
    }),
  );
  return sillSet.parse({ ...newSet(id, n, c), choices: h, calculations });
}

function resultOf(slot: string, path: string | null, shape: Pick<Calculation, "fields" | "unit" | "precision">, input: Record<string, unknown>, operations: ReadonlyMap<string, Operation>): Calculation["result"] {
  const [, calculator = "", wall] = slot.split(".");
  const [operation, adapter] = [path === null ? undefined : operations.get(path), adapterOf(calculator)];
  if (path === null || operation === undefined || adapter === undefined) return null;
  const { answer } = answerTo(operation, input);
  if (answer === null) return null;
  const asked = { fields: shape.fields, unit: shape.unit, input, wall };
  return { operation: path, core: "", input, of: fingerprint(shape), key: adapter.key(answer), gives: adapter.gives(answer, asked), layers: adapter.layers(answer, asked) };
}

/** The address that opens this sheet from the same inputs; of the first readings alone where all of them are too many for a code. */
export function sheetAddress(set: SillSet, locale: Locale, origin: string): { address: string; whole: boolean } {
  const whole = `${origin}${localePath(locale, "/set/sheet")}#${packSet(set)}`;
  if (whole.length <= longestCode) return { address: whole, whole: true };
  const first = Object.entries(set.calculations).find(([slot, { result }]) => slot.startsWith("concrete.") && result !== null);
  if (first === undefined) return { address: `${origin}${localePath(locale, "/set")}`, whole: false };
  const address = `${origin}${localePath(locale, `/calculators/${first[0].split(".")[1]}`)}?${queryFromInput(first[1].result!.input).toString()}`;
  return address.length <= longestCode ? { address, whole: false } : { address: `${origin}${localePath(locale, "/set")}`, whole: false };
}

function toBase64Url(bytes: Uint8Array): string {
  let text = "";
  for (const byte of bytes) text += String.fromCharCode(byte);
  return btoa(text).replaceAll("+", "-").replaceAll("/", "_").replaceAll("=", "");
}

function fromBase64Url(text: string): Uint8Array {
  return Uint8Array.from(atob(text.replaceAll("-", "+").replaceAll("_", "/")), (character) => character.charCodeAt(0));
}
