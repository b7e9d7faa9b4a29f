import fc from "fast-check";
import { expect, test } from "vitest";
import { demoSet } from "@/lib/client/set/demo-set";
import { duplicateOf, newSet } from "@/lib/client/set/new-set";
import { fileLimit, readSetFile, setFileName, writeSetFile } from "@/lib/client/set/set-file";

const now = "2026-12-01T08:00:00.000Z";
const demo = demoSet("a", "Example", now);

test("a set saved and opened is the same set", () => {
  expect(readSetFile(writeSetFile(demo))).toEqual({ set: demo, problem: null });
});

test("whatever was typed comes back, letter by letter", () =>
  fc.assert(
    fc.property(fc.string({ maxLength: 120 }), fc.dictionary(fc.string({ maxLength: 40 }).filter((name) => name !== "__proto__"), fc.string({ maxLength: 60, unit: "binary" })), (name, fields) => {
      const set = newSet("a", name, now);
      const filled = { ...set, calculations: { "concrete.squareness": { fields, unit: "in" as const, precision: "1/16" as const, taken: {}, result: null } } };
      expect(readSetFile(writeSetFile(filled)).set).toEqual(filled);
    }),
  ));

test("what a later edition added is kept", () => {
  const file = JSON.parse(writeSetFile(demo)) as Record<string, unknown> & { calculations: Record<string, object> };
  const later = { ...file, site: "Quarry Lane", calculations: { ...file.calculations, "roof.pitch": { fields: {}, unit: "in", precision: "1/16", taken: {}, result: null, slope: 7 } } };
  expect(readSetFile(JSON.stringify(later)).set).toMatchObject({ site: "Quarry Lane", calculations: { "roof.pitch": { slope: 7 } } });
});

const damaged = (change: (file: Record<string, never>) => void) => {
  const file = JSON.parse(writeSetFile(demo)) as Record<string, never>;
  change(file);
  return JSON.stringify(file);
};
test.each<[string, string, string]>([
  ["nothing", "", "not-json"],
  ["a picture", "\u0089PNG", "not-json"],
  ["a bare number", "7", "not-a-set"],
  ["another program's JSON", '{"format":"other","version":1}', "not-a-set"],
  ["a set of a later file version", damaged((file) => Object.assign(file, { version: 2 })), "newer"],
  ["a set without its version", damaged((file) => Object.assign(file, { version: null })), "damaged"],
  ["a set without its calculations", damaged((file) => delete (file as Record<string, unknown>).calculations), "damaged"],
  ["a set whose field is a number", damaged((file) => Object.assign(file, { calculations: { "concrete.squareness": { fields: { length: 7 }, unit: "in", precision: "1/16", taken: {}, result: null } } })), "damaged"],
  ["a file of many megabytes", " ".repeat(fileLimit + 1), "too-big"],
])("%s is refused by its name", (_, text, code) => {
  expect(readSetFile(text)).toMatchObject({ set: null, problem: { code } });
});

test("a damaged file is told where", () => {
  const text = damaged((file) => Object.assign(file, { calculations: { "chalk.inset": { fields: { length: 7 } } } }));
  expect(readSetFile(text).problem?.params.where).toContain("calculations.chalk.inset");
});

test("a field named after an object's prototype does no harm", () => {
  const text = writeSetFile(demo).replace('"format"', '"__proto__": { "polluted": true }, "format"');
  expect(readSetFile(text).set).not.toBeNull();
  expect(({} as Record<string, unknown>).polluted).toBeUndefined();
});

test("a copy shares nothing with its original", () => {
  const copy = duplicateOf(demo, "b", "Copy", now);
  expect(copy.calculations).toEqual(demo.calculations);
  expect(copy.calculations["concrete.squareness"]).not.toBe(demo.calculations["concrete.squareness"]);
});

test.each([
  ["Lot 14, garage", "sillwright-lot-14-garage.json"],
  ["Cañón ½", "sillwright-canon-1-2.json"],
  ["///", "sillwright-set.json"],
])("the file of %s is called %s", (name, file) => expect(setFileName({ ...demo, name })).toBe(file));
