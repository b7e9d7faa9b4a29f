import { setFormat, setVersion } from "./new-set";
import { sillSet, type SillSet } from "./schema";

/** Files past this are not sets: the largest whole job is some hundred kilobytes. */
export const fileLimit = 8_000_000;

export type ReadFile = { set: SillSet; problem: null } | { set: null; problem: { code: "too-big" | "not-json" | "not-a-set" | "newer" | "damaged"; params: Record<string, string | number> } };

const refused = (code: NonNullable<ReadFile["problem"]>["code"], params: Record<string, string | number> = {}): ReadFile => ({ set: null, problem: { code, params } });

/** Takes a set of an earlier version to the next: `migrations[1]` makes version 2 of version 1. There has been one version so far. */
const migrations: Readonly<Record<number, (file: Record<string, unknown>) => Record<string, unknown>>> = {};

/** A set as text for a file; nothing is left out. */
export function writeSetFile(set: SillSet): string {
  return `${JSON.stringify(set, null, 2)}\n`;
}

/** What the file is called: letters and figures of the set's name. */
export function setFileName({ name }: SillSet): string {
  const plain = name.normalize("NFKD").replace(/\p{M}+/gu, "").replace(/[^A-Za-z0-9]+/g, "-").replace(/^-+|-+$/g, "").toLowerCase().slice(0, 60);
  return `sillwright-${plain === "" ? "set" : plain}.json`;
}

/** Reads a file that `writeSetFile` made, in this version or an earlier one; of any other it says what it is. */
export function readSetFile(text: string): ReadFile {
  if (text.length > fileLimit) return refused("too-big", { limit: fileLimit / 1_000_000 });
  let file: unknown;
  try {
    // a name that reaches an object's prototype is no field of any form
    file = JSON.parse(text, (key, value: unknown) => (key === "__proto__" ? undefined : value));
  } catch {
    return refused("not-json");
  }
  if (typeof file !== "object" || file === null || !("format" in file) || file.format !== setFormat) return refused("not-a-set");
  let current = file as Record<string, unknown>;
  const version = current.version;
  if (typeof version !== "number" || !Number.isInteger(version) || version < 1) return refused("damaged", { where: "version" });
  if (version > setVersion) return refused("newer", { version });
  for (let from = version; from < setVersion; from += 1) current = migrations[from]!(current);
  const parsed = sillSet.safeParse(current);
  if (!parsed.success) return refused("damaged", { where: parsed.error.issues[0]?.path.join(".") ?? "" });
  return { set: parsed.data, problem: null };
}
