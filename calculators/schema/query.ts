/** A calculator's whole input as an address: nested names are dotted, list items numbered, `diagonals.ac=428 9/16&bolts.0.station=12`. */

type Tree = { [key: string]: unknown };

const forbidden = new Set(["__proto__", "prototype", "constructor"]);
const listLimit = 200;
const depthLimit = 6;

/**
 * The input that a query or a form sent, still unread: every leaf is text. Empty fields are left out. Names that no
 * input can have stay, so that the schema refuses them by name, save those that would touch an object's prototype.
 */
export function inputFromQuery(query: Iterable<[string, string]>): Tree {
  const root: Tree = {};
  for (const [name, value] of query) {
    const steps = name.split(".");
    if (value.trim() === "" || steps.length > depthLimit || steps.some((step) => step === "" || forbidden.has(step))) continue;
    let node = root;
    for (const step of steps.slice(0, -1)) {
      const next = Object.hasOwn(node, step) ? node[step] : undefined;
      node = (typeof next === "object" && next !== null ? next : (node[step] = {})) as Tree;
    }
    node[steps.at(-1)!] = value;
  }
  return listsOf(root) as Tree;
}

/** An object whose names are all 0, 1, 2 … is a list; gaps close. */
function listsOf(node: unknown): unknown {
  if (typeof node !== "object" || node === null) return node;
  const entries = Object.entries(node).map(([key, item]) => [key, listsOf(item)] as const);
  const isList = entries.length > 0 && entries.length <= listLimit && entries.every(([key]) => /^\d{1,3}$/.test(key));
  if (!isList) return Object.fromEntries(entries);
  return entries.sort(([a], [b]) => Number(a) - Number(b)).map(([, item]) => item);
}

/** The same way back; undefined, null and empty text are left out. */
export function queryFromInput(input: object): URLSearchParams {
  const query = new URLSearchParams();
  const walk = (node: unknown, name: string): void => {
    if (node === undefined || node === null || node === "") return;
    if (typeof node === "object") for (const [key, item] of Object.entries(node)) walk(item, name === "" ? key : `${name}.${key}`);
    else query.append(name, String(node));
  };
  walk(input, "");
  return query;
}
