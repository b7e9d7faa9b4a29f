import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { checkOperation } from "@/calculators/anchors";
import { fitOperation } from "@/calculators/fit";
import { footprintOperation } from "@/calculators/footprint";
import { insetOperation } from "@/calculators/inset";
import { platesOperation } from "@/calculators/plates";
import { answerTo, inputFromQuery, type Operation } from "@/calculators/schema";
import { squarenessOperation } from "@/calculators/squareness";
import { preparePlates } from "@/components/calculators/plates/plates-fields";
import { meant } from "@/lib/client/calculator/form-fields";
import { adapterOf } from "@/lib/client/set/calculations";
import { carriedInto, changedSince, mayTakeQuietly, takingPatch } from "@/lib/client/set/carry";
import { newSet } from "@/lib/client/set/new-set";
import { applyPatch } from "@/lib/client/set/patch";
import { planOf } from "@/lib/client/set/plan-layers";
import type { SillSet } from "@/lib/client/set/schema";
import { fingerprint, stageStates } from "@/lib/client/set/stage-state";
import { slotsOf, stagesWith, type Slot } from "@/lib/client/set/stages";

const now = "2026-12-01T08:00:00.000Z";
const stages = stagesWith(["squareness", "inset", "anchors", "plates", "marks"]);
const operations: Readonly<Record<string, Operation>> = { squareness: squarenessOperation as Operation, inset: insetOperation as Operation, anchors: checkOperation as Operation };

const slot = (stage: string, wall?: string): Slot => slotsOf(newSet("x", "", now), stages.find(({ name }) => name === stage)!).find((known) => known.wall === wall)!;

/** The plain input of a form, as the stage's page makes it, without the fields that are the page's own. */
function inputOf(fields: Readonly<Record<string, string>>): Record<string, unknown> {
  const { mode: _, ...input } = inputFromQuery(Object.entries(fields));
  if (Array.isArray(input.pieces)) input.pieces = input.pieces.map((piece: object) => ({ from: "0", ...piece }));
  return input;
}

/** Types into a stage and answers it as its page would, with the real core. */
function type(set: SillSet, at: Slot, fields: Record<string, string | null>): SillSet {
  const typed = applyPatch(set, { calculations: { [at.id]: { fields } } }, now);
  const calculation = typed.calculations[at.id]!;
  const input = inputOf(calculation.fields);
  const { answer } = answerTo(operations[at.calculator]!, input);
  const adapter = adapterOf(at.calculator)!;
  const asked = { unit: calculation.unit, input, wall: at.wall };
  const result = answer === null ? null : { operation: adapter.operation(answer), core: "1.0.0", input, of: fingerprint(calculation), key: adapter.key(answer), gives: adapter.gives(answer, asked), layers: adapter.layers(answer, asked) };
  return applyPatch(typed, { calculations: { [at.id]: { result } } }, now);
}

function take(set: SillSet, at: Slot): SillSet {
  const carried = carriedInto(set, stages, at);
  return carried === null ? set : applyPatch(set, { calculations: { [at.id]: takingPatch(set, at, carried) } }, now);
}

const concrete = slot("concrete");
const chalk = slot("chalk");
const recheck = slot("recheck");
const readings = { length: "28'", width: "22'", "diagonals.ac": "428 9/16", "diagonals.bd": "428 1/16", burn: "1 in", tolerance: "3/16" };
const begun = type(newSet("a", "Lot 14", now), concrete, readings);

const stateOf = (set: SillSet, name: string) => stageStates(set, stages).find(({ stage }) => stage.name === name)!.state;

describe("values go from stage to stage", () => {
  test("the chalk lines take the slab and its diagonals as read, burn and all", () => {
    expect(carriedInto(begun, stages, chalk)).toEqual({ length: "336 in", width: "264 in", burn: "1 in", "slabDiagonals.ac": "428 9/16 in", "slabDiagonals.bd": "428 1/16 in" });
  });

  test("the recheck and the bolts take the lines: 336 and 264 less two insets of 7/16 each", () => {
    const set = type(take(begun, chalk), chalk, { inset: "7/16" });
    // by hand: 336 − 7/8 = 335 1/8, 264 − 7/8 = 263 1/8
    expect(carriedInto(set, stages, recheck)).toEqual({ length: "335 1/8 in", width: "263 1/8 in", burn: "1 in" });
    expect(carriedInto(set, stages, slot("bolts", "bc"))).toEqual({ "pieces.0.to": "263 1/8 in", inset: "7/16 in", mode: "check", wall: "bc" });
  });

  test("the plates take every wall with its bolts, and the plates' own core accepts them", () => {
    let set = type(take(begun, chalk), chalk, { inset: "7/16" });
    for (const wall of ["ab", "bc", "cd", "da"]) set = type(take(set, slot("bolts", wall)), slot("bolts", wall), { rule: "us-irc", plateWidth: "5 1/2", "bolts.0.station": "9", "bolts.0.offset": "2 3/4", "bolts.1.station": "66", "bolts.2.station": "130", "bolts.3.station": "190", "bolts.4.station": "250" });
    const carried = carriedInto(set, stages, slot("plates"))!;
    expect([carried["walls.0.name"], carried["walls.0.length"], carried["walls.3.bolts.0.station"], carried["walls.3.bolts.0.offset"]]).toEqual(["ab", "335 1/8 in", "9 in", "2 3/4 in"]);
    const request = inputFromQuery(Object.entries({ ...carried, "stock.0.length": "16 ft" }));
    expect(answerTo(platesOperation as Operation, request).issues).toEqual([]);
  });

  test("nothing is carried on from readings that cannot be true together", () => {
    const wrong = type(begun, concrete, { "diagonals.ac": "440" });
    expect(carriedInto(wrong, stages, chalk)).toEqual({});
  });

  test("what is taken is read by the next stage's schema without a complaint, for any slab", () => {
    const length = fc.integer({ min: 64, max: 16_000 }).map((sixteenths) => `${sixteenths}/16`);
    fc.assert(
      fc.property(length, length, fc.integer({ min: -8, max: 8 }), fc.constantFrom("in" as const, "mm" as const), (ab, da, rack, unit) => {
        const [a, b] = [Number(ab.slice(0, -3)) / 16, Number(da.slice(0, -3)) / 16];
        const diagonal = Math.hypot(a, b);
        const fields = { length: ab, width: da, "diagonals.ac": (diagonal + rack / 32).toFixed(3), "diagonals.bd": (diagonal - rack / 32).toFixed(3) };
        const set = type(applyPatch(newSet("a", "", now), { calculations: { [concrete.id]: { unit: "in" } } }, now), concrete, fields);
        const carried = carriedInto(set, stages, chalk);
        if (carried === null || Object.keys(carried).length === 0) return;
        // a bare number would mean another thing in a form of another unit; none is bare
        for (const text of Object.values(carried)) expect(meant(text, unit)).toBe(text);
        expect(answerTo(insetOperation as Operation, { ...inputOf(carried), inset: "7/16 in", unit }).issues.filter(({ code }) => code !== "inset-swallows")).toEqual([]);
      }),
      { numRuns: 60 },
    );
  });
});

describe("staleness", () => {
  const followed = type(take(type(take(begun, chalk), chalk, { inset: "7/16" }), recheck), recheck, { "diagonals.ac": "427 3/8", "diagonals.bd": "427 3/8" });

  test("nothing is stale while nothing changed", () => {
    expect(stageStates(followed, stages).map(({ state }) => state)).not.toContain("stale");
    expect(stateOf(followed, "chalk")).toBe("done");
  });

  test("a changed reading makes the chalk lines stale, and what rests on them", () => {
    const changed = type(followed, concrete, { width: "22' 1\"", "diagonals.ac": "429 3/16", "diagonals.bd": "428 11/16" });
    expect(changedSince(changed, stages, chalk).sort()).toEqual(["slabDiagonals.ac", "slabDiagonals.bd", "width"]);
    expect([stateOf(changed, "chalk"), stateOf(changed, "recheck")]).toEqual(["stale", "stale"]);
  });

  test("a change that carries nothing on, such as another tolerance, makes nothing stale", () => {
    expect(stageStates(type(followed, concrete, { tolerance: "1/4" }), stages).map(({ state }) => state)).not.toContain("stale");
  });

  test("taking the new values clears it, keeps what the person typed and takes away what is given no longer", () => {
    const changed = type(type(followed, chalk, { "chalkDiagonals.ac": "427 1/2" }), concrete, { burn: null, "diagonals.ac": "427 9/16", "diagonals.bd": "427 1/16" });
    const taken = take(changed, chalk);
    expect(changedSince(taken, stages, chalk)).toEqual([]);
    const { fields } = taken.calculations[chalk.id]!;
    expect([fields.inset, fields["chalkDiagonals.ac"], fields.burn]).toEqual(["7/16", "427 1/2", undefined]);
  });

  test("while the earlier stage has no answer the later one waits and is not called stale", () => {
    expect(changedSince(type(followed, concrete, { width: null }), stages, chalk)).toEqual([]);
  });

  test("values go in without asking only where nothing would be typed over", () => {
    const carried = carriedInto(begun, stages, chalk)!;
    expect(mayTakeQuietly(begun, chalk, carried)).toBe(true);
    expect(mayTakeQuietly(applyPatch(begun, { calculations: { [chalk.id]: { fields: { length: "30 ft" } } } }, now), chalk, carried)).toBe(false);
    expect(mayTakeQuietly(followed, chalk, carried)).toBe(false);
  });
});

test("an L goes from its footprint to the best fit, and on to the bolts and plates of all six walls", () => {
  const all = stagesWith(["squareness", "footprint", "inset", "fit", "anchors", "plates"]);
  const chosen = applyPatch(newSet("a", "L", now), { choices: { concrete: "footprint", chalk: "fit" } }, now);
  const at = (set: SillSet, stage: string, wall?: string) => slotsOf(set, all.find(({ name }) => name === stage)!).find((known) => known.wall === wall)!;
  const answered = (set: SillSet, place: Slot, operation: Operation, fields: Record<string, string>) => {
    const carried = carriedInto(set, all, place)!;
    const typedIn = applyPatch(set, { calculations: { [place.id]: { ...takingPatch(set, place, carried), fields: { ...carried, ...fields } } } }, now);
    const calculation = typedIn.calculations[place.id]!;
    const input = inputFromQuery(Object.entries(calculation.fields));
    const { answer, issues } = answerTo(operation, input);
    expect(issues).toEqual([]);
    const adapter = adapterOf(place.calculator)!;
    const asked = { unit: "in" as const, input, wall: place.wall };
    return applyPatch(typedIn, { calculations: { [place.id]: { result: { operation: "", core: "", input, of: fingerprint(calculation), key: adapter.key(answer), gives: adapter.gives(answer, asked), layers: adapter.layers(answer, asked) } } } }, now);
  };
  const walked = answered(chosen, at(chosen, "concrete"), footprintOperation as Operation, { walk: "E 40 ft, N 20 ft, W 16 ft, N 12 ft, W 24 ft, S 32 ft", inset: "7/16" });
  const fitted = answered(walked, at(walked, "chalk"), fitOperation as Operation, { inset: "7/16" });
  const walls = slotsOf(fitted, all.find(({ name }) => name === "bolts")!).map(({ wall }) => wall);
  expect(walls).toEqual(["ab", "bc", "cd", "de", "ef", "fa"]);
  const chalk = fitted.calculations["chalk.fit"]!.result!;
  // by hand: 40 ft less 7/16 at A and at B; 16 ft with an outside corner at C and an inside one at D keeps its length
  expect(chalk.gives["line.ab"]).toMatch(/^479 1\/8 in$|^479\.125 in$/);
  expect(chalk.gives["line.cd"]).toMatch(/^192(\.0+)? in$/);
  expect(planOf(fitted, all).chalk).toHaveLength(6);
  const plates = carriedInto(fitted, all, at(fitted, "plates"))!;
  expect(plates["inside.D"]).toBe("true");
  expect(answerTo(platesOperation as Operation, preparePlates(inputFromQuery(Object.entries({ ...plates, "stock.0.length": "16 ft" })))).issues).toEqual([]);
  // its chalk is pulled again as a footprint: six lines, then the diagonals that prove them
  expect(at(fitted, "recheck").calculator).toBe("footprint");
  const pulls = carriedInto(fitted, all, at(fitted, "recheck"))!;
  expect([0, 5].map((row) => pulls[`readings.${row}.from`]! + pulls[`readings.${row}.to`]!)).toEqual(["AB", "FA"]);
  expect([pulls["readings.8.to"] !== undefined, pulls.inside, pulls.inset]).toEqual([true, "D", "0 in"]);
});

test("the bolts are done once every wall is", () => {
  let set = type(take(begun, chalk), chalk, { inset: "7/16" });
  const bolts = { rule: "us-irc", "bolts.0.station": "9", "bolts.1.station": "66", "bolts.2.station": "130", "bolts.3.station": "190", "bolts.4.station": "254" };
  for (const wall of ["bc", "da"]) set = type(take(set, slot("bolts", wall)), slot("bolts", wall), bolts);
  expect(stateOf(set, "bolts")).toBe("open");
  for (const wall of ["ab", "cd"]) set = type(take(set, slot("bolts", wall)), slot("bolts", wall), { ...bolts, "bolts.5.station": "326" });
  expect(["done", "look"]).toContain(stateOf(set, "bolts"));
});
