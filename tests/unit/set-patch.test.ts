import fc from "fast-check";
import { expect, test } from "vitest";
import { newSet } from "@/lib/client/set/new-set";
import { applyPatch, inversePatch, mergePatches, type SetPatch } from "@/lib/client/set/patch";
import type { SillSet } from "@/lib/client/set/schema";
import { remember, takeBack, type UndoStack } from "@/lib/client/set/undo-stack";

const now = "2026-12-01T08:00:00.000Z";
const name = fc.constantFrom("length", "width", "diagonals.ac", "burn");
const slot = fc.constantFrom("concrete.squareness", "chalk.inset", "bolts.anchors.ab");
const text = fc.constantFrom("28'", "336 in", "7/16", "1", "22 ft");
const patches: fc.Arbitrary<SetPatch> = fc.record(
  {
    name: fc.string(),
    choices: fc.dictionary(fc.constantFrom("concrete", "chalk"), fc.option(fc.constantFrom("squareness", "fit"))),
    calculations: fc.dictionary(slot, fc.record({ fields: fc.dictionary(name, fc.option(text)), unit: fc.constantFrom("in" as const, "mm" as const), taken: fc.dictionary(name, text) }, { requiredKeys: [] })),
  },
  { requiredKeys: [] },
);
const sets: fc.Arbitrary<SillSet> = fc.array(patches, { maxLength: 4 }).map((list) => list.reduce<SillSet>((set, patch) => applyPatch(set, patch, now), newSet("a", "Lot 14", now)));

test("a change and its inverse leave a set as it was", () =>
  fc.assert(
    fc.property(sets, patches, (set, patch) => {
      // A calculation whose unit alone is told is a blank one with a unit: the unit has nothing to say and goes with it.
      const back = applyPatch(applyPatch(set, patch, now), inversePatch(set, patch), now);
      expect(back).toEqual(set);
    }),
  ));

test("two changes merged do what both do one after the other", () =>
  fc.assert(
    fc.property(sets, patches, patches, (set, first, second) => {
      const merged = applyPatch(set, mergePatches(first, second), now);
      const stepwise = applyPatch(applyPatch(set, first, now), second, now);
      // Blank calculations in between may lose a unit that was all they had: fields and taken values never differ.
      const told = (one: SillSet) => Object.fromEntries(Object.entries(one.calculations).map(([id, { fields, taken }]) => [id, { fields, taken }]));
      expect([told(merged), merged.name, merged.choices]).toEqual([told(stepwise), stepwise.name, stepwise.choices]);
    }),
  ));

test("changes to different fields give the same set in either order, so that two tabs agree", () =>
  fc.assert(
    fc.property(sets, text, text, (set, one, other) => {
      const first: SetPatch = { calculations: { "concrete.squareness": { fields: { length: one } } } };
      const second: SetPatch = { calculations: { "concrete.squareness": { fields: { width: other } }, "chalk.inset": { fields: { inset: "7/16" } } } };
      expect(applyPatch(applyPatch(set, first, now), second, now)).toEqual(applyPatch(applyPatch(set, second, now), first, now));
    }),
  ));

test("undoing everything leads back to the beginning, whatever was done", () =>
  fc.assert(
    fc.property(sets, fc.array(patches, { maxLength: 12 }), (begin, changes) => {
      let set = begin;
      let stack: UndoStack = [];
      changes.forEach((patch, index) => {
        stack = remember(stack, set, patch, { what: "taking" }, index);
        set = applyPatch(set, patch, now);
      });
      for (let back = takeBack(stack); back !== null; back = takeBack(stack)) {
        set = applyPatch(set, back.entry.inverse, now);
        stack = back.rest;
      }
      expect(set).toEqual(begin);
    }),
  ));

test("keys pressed in one field without a pause are taken back at once, another field by itself", () => {
  const typed = (field: string, value: string): SetPatch => ({ calculations: { "concrete.squareness": { fields: { [field]: value } } } });
  let set = newSet("a", "Lot 14", now);
  let stack: UndoStack = [];
  const type = (field: string, value: string, at: number) => {
    stack = remember(stack, set, typed(field, value), { what: "typing" }, at);
    set = applyPatch(set, typed(field, value), now);
  };
  type("length", "2", 0);
  type("length", "28", 200);
  type("length", "28'", 400);
  type("width", "22'", 500);
  type("width", "22' 6\"", 9_000);
  expect(stack.map(({ field }) => field)).toEqual(["concrete.squareness length", "concrete.squareness width", "concrete.squareness width"]);
  set = applyPatch(set, takeBack(stack)!.entry.inverse, now);
  expect(set.calculations["concrete.squareness"]?.fields).toEqual({ length: "28'", width: "22'" });
});
