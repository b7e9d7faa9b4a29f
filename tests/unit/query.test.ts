import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { operations } from "@/calculators";
import { inputFromQuery, queryFromInput } from "@/calculators/schema";
import { runs } from "../setup/runs";

const pairs = (...list: [string, string][]) => inputFromQuery(list);

describe("an address holds the whole input", () => {
  test("dotted names nest, numbered ones are lists", () => {
    expect(pairs(["length", "28 ft"], ["diagonals.ac", "443 1/2"], ["diagonals.bd", "442"], ["bolts.0.station", "12"], ["bolts.1.station", "72"])).toEqual({
      length: "28 ft",
      diagonals: { ac: "443 1/2", bd: "442" },
      bolts: [{ station: "12" }, { station: "72" }],
    });
  });

  test("empty fields are left out and gaps in lists close, in order", () => {
    expect(pairs(["a", " "], ["list.10", "c"], ["list.2", "b"], ["list.1", ""], ["list.0", "a"])).toEqual({ list: ["a", "b", "c"] });
  });

  test("every worked example survives the way through its address", () => {
    for (const { examples } of operations.values()) {
      for (const { input } of examples) {
        const asText = JSON.parse(JSON.stringify(input), (_key, value: unknown) => (typeof value === "object" ? value : String(value))) as unknown;
        expect(inputFromQuery(new URLSearchParams(queryFromInput(input).toString()))).toEqual(asText);
      }
    }
  });

  test("any input of texts comes back as it was", () => {
    const name = fc.stringMatching(/^[a-z][a-zA-Z]{0,8}$/).filter((key) => !["constructor", "prototype"].includes(key));
    const text = fc.string({ unit: "grapheme", minLength: 1 }).filter((value) => value.trim() !== "" && !/\p{Cs}/u.test(value));
    const row = fc.dictionary(name, text, { minKeys: 1, maxKeys: 3, noNullPrototype: true });
    const input = fc.dictionary(name, fc.oneof(text, row, fc.array(row, { minLength: 1, maxLength: 12 }), fc.array(text, { minLength: 1, maxLength: 12 })), { maxKeys: 5, noNullPrototype: true });
    fc.assert(
      fc.property(input, (value) => {
        expect(inputFromQuery(new URLSearchParams(queryFromInput(value).toString()))).toEqual(value);
      }),
      { numRuns: runs(300) },
    );
  });
});

describe("a hostile address", () => {
  test("does not reach an object's prototype", () => {
    const input = pairs(["__proto__.polluted", "1"], ["a.__proto__.polluted", "1"], ["constructor.prototype.polluted", "1"], ["a.constructor.polluted", "1"], ["toString", "x"], ["a.hasOwnProperty", "y"]);
    expect(({} as { polluted?: string }).polluted).toBeUndefined();
    expect(Object.getPrototypeOf(input)).toBe(Object.prototype);
    expect(Object.keys(input).sort()).toEqual(["a", "toString"]);
  });

  test("whatever the names, it is read as plain texts, and nothing is thrown", () => {
    const name = fc.array(fc.constantFrom("a", "b", "0", "1", "999", "__proto__", "constructor", "", "toString", "length", "a b"), { minLength: 1, maxLength: 8 }).map((steps) => steps.join("."));
    fc.assert(
      fc.property(fc.array(fc.tuple(name, fc.string()), { maxLength: 40 }), (query) => {
        const walk = (node: unknown): void => {
          if (typeof node === "string") return;
          expect(Array.isArray(node) || Object.getPrototypeOf(node) === Object.prototype).toBe(true);
          Object.values(node as object).forEach(walk);
        };
        walk(inputFromQuery(query));
        expect(Object.keys(Object.prototype)).toEqual([]);
      }),
      { numRuns: runs(500) },
    );
  });

  test("nesting and lists have an end", () => {
    expect(pairs(["a.b.c.d.e.f.g", "1"])).toEqual({});
    const long = inputFromQuery(Array.from({ length: 1000 }, (_, index): [string, string] => [`list.${index}`, "1"]));
    expect(Array.isArray(long.list)).toBe(false); // more rows than any calculator takes: left for the schema to refuse
    expect(pairs(["list.99999999999", "1"])).toEqual({ list: { "99999999999": "1" } });
  });
});
