import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { cornerDistance, inset, insetOperation, type InsetAnswer } from "@/calculators/inset";
import { answerTo } from "@/calculators/schema";
import { cornerRows, insetRows } from "@/tests/reference/inset-rows";

const ask = (request: object): InsetAnswer => {
  const { answer, issues } = answerTo(insetOperation, request);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return insetOperation.answer.parse(answer);
};
const issuesFor = (request: object) => answerTo(insetOperation, request).issues.map(({ pointer, code }) => `${pointer} ${code}`);

describe("chalk lines of a rectangle", () => {
  test.each(insetRows)("$id comes out as printed", ({ request, ab, bc, diagonal }) => {
    const answer = ask(request);
    expect([answer.lines.ab.text, answer.lines.cd.text, answer.lines.bc.text, answer.lines.da.text, answer.diagonal.text]).toEqual([ab, ab, bc, bc, diagonal]);
  });

  test("lines, offsets and drops are exact where they are rational", () => {
    // 28 by 21 ft is 7 times a 3-4-5; inset 0 leaves its diagonal at 35 ft exactly.
    const flush = ask({ length: "28 ft", width: "21 ft", inset: "0" });
    expect([flush.diagonal.exact, flush.drop.exact]).toEqual(["420", "0"]);
    const sides = ask({ length: "336", width: "252", inset: { ab: "7/16", bc: "15/32", cd: "1/2", da: "19/32" } });
    expect([sides.lines.ab.exact, sides.lines.bc.exact]).toEqual(["5359/16", "4017/16"]); // 336 − 15/32 − 19/32; 252 − 7/16 − 1/2
    expect(sides.offsets).toMatchObject({ A: { ab: { exact: "7/16" }, da: { exact: "19/32" } }, C: { bc: { exact: "15/32" }, cd: { exact: "1/2" } } });
  });

  test("a veneer setback adds to the inset, on all sides or on some", () => {
    const all = ask({ length: "28 ft", width: "40 ft", inset: "1/2", veneer: "4 1/2" });
    expect(all.offsets.A.ab.exact).toBe("5");
    const some = ask({ length: "28 ft", width: "40 ft", inset: "1/2", veneer: { ab: "4 1/2" } });
    expect([some.offsets.A.ab.exact, some.offsets.C.cd.exact, some.lines.bc.exact]).toEqual(["5", "1/2", "949/2"]); // 480 − 5 − 1/2
  });

  test("a negative inset overhangs and says so", () => {
    const answer = ask({ length: "28 ft", width: "40 ft", inset: "-3/4" });
    expect([answer.lines.ab.text, answer.warnings]).toMatchObject(["28' 1 1/2\"", [{ code: "overhang", by: { text: '3/4"' } }]]);
  });

  test("only `reading` holds the burn", () => {
    const [held, burned] = [ask({ ...insetRows[0].request }), ask({ ...insetRows[0].request, burn: "1" })];
    expect(burned.reading.in - burned.diagonal.in).toBeCloseTo(1, 12);
    expect(burned.lines).toEqual(held.lines);
  });

  test.each(cornerRows)("$id: the inset corner stands t / sin(angle/2) from the slab's", ({ inset: t, angleDegrees, distance }) => {
    expect(cornerDistance(t, t, Math.cos((angleDegrees * Math.PI) / 180))).toBeCloseTo(distance, 4);
  });

  test("every worked example comes out as it says", () => {
    for (const example of insetOperation.examples) expect(ask(example.input), example.id).toMatchObject(example.answer);
    expect(inset.operations).toContain(insetOperation);
  });
});

/** An independent model: polar geometry of a parallelogram, no code shared with the core. */
function independentDiagonals(length: number, width: number, angle: number, inset: Record<"ab" | "bc" | "cd" | "da", number>) {
  const along = length - (inset.da + inset.bc) / Math.sin(angle);
  const across = width - (inset.ab + inset.cd) / Math.sin(angle);
  const by = (sign: 1 | -1) => Math.sqrt(along ** 2 + across ** 2 + sign * 2 * along * across * Math.cos(angle));
  return { ac: by(1), bd: by(-1), along, across };
}
const diagonalsAt = (length: number, width: number, angle: number) => independentDiagonals(length, width, angle, { ab: 0, bc: 0, cd: 0, da: 0 });

describe("a racked slab", () => {
  const slabs = fc.record({
    length: fc.integer({ min: 100, max: 900 }),
    width: fc.integer({ min: 100, max: 900 }),
    degrees: fc.double({ min: 84, max: 96, noNaN: true }),
    inset: fc.record({ ab: fc.integer({ min: -12, max: 80 }), bc: fc.integer({ min: -12, max: 80 }), cd: fc.integer({ min: -12, max: 80 }), da: fc.integer({ min: -12, max: 80 }) }),
  });

  test("each diagonal's drop is that of the parallelogram inset side by side", () => {
    fc.assert(
      fc.property(slabs, ({ length, width, degrees, inset: sixteenths }) => {
        const angle = (degrees * Math.PI) / 180;
        const insets = { ab: sixteenths.ab / 16, bc: sixteenths.bc / 16, cd: sixteenths.cd / 16, da: sixteenths.da / 16 };
        const slab = diagonalsAt(length, width, angle);
        const answer = ask({ length, width, inset: insets, slabDiagonals: { ac: slab.ac, bd: slab.bd } });
        const chalk = independentDiagonals(length, width, angle, insets);
        expect(answer.drops.ac.in).toBeCloseTo(slab.ac - chalk.ac, 6);
        expect(answer.drops.bd.in).toBeCloseTo(slab.bd - chalk.bd, 6);
        expect(answer.expected.ac.diagonal.in).toBeCloseTo(chalk.ac, 6);
        expect(Math.abs(chalk.along - answer.lines.ab.in)).toBeLessThanOrEqual(answer.lineBound + 1e-6);
        expect(answer.corners.A.angleDegrees).toBeCloseTo(degrees, 5);
      }),
    );
  });

  test("the two drops differ on a racked slab and agree on a true one", () => {
    const racked = ask({ length: "28 ft", width: "24 ft", inset: "1/2", slabDiagonals: { ac: "446 1/2", bd: "438 9/16" } });
    expect(Math.abs(racked.drops.ac.in - racked.drops.bd.in)).toBeGreaterThan(0.001);
    expect(racked.warnings.map(({ code }) => code)).toEqual(["slab-racked"]);
    const level = ask({ length: "28 ft", width: "24 ft", inset: "1/2" });
    expect(level.drops.ac).toEqual(level.drops.bd);
    expect(level.drops.ac).toEqual(level.drop);
  });

  test("diagonals that do not fit the slab's sizes are said to contradict them", () => {
    const answer = ask({ length: "28 ft", width: "24 ft", inset: "1/2", slabDiagonals: { ac: "443 9/16", bd: "443 9/16" } }); // true 442.538
    expect(answer.warnings.map(({ code }) => code)).toEqual(["slab-contradictory"]);
  });
});

type Mark = { line: "ab" | "bc" | "cd" | "da"; end: "A" | "B" | "C" | "D" | null };
const marks: Mark[] = [
  { line: "ab", end: "A" }, { line: "ab", end: "B" }, { line: "bc", end: "B" }, { line: "bc", end: "C" },
  { line: "cd", end: "C" }, { line: "cd", end: "D" }, { line: "da", end: "D" }, { line: "da", end: "A" },
];

/** The chalk of a true rectangle with one mark or one line off, by coordinates of its own: lines as y = k + m·x or x = k + m·y. */
function chalkWithMistake(length: number, width: number, inset: number, { line, end }: Mark, off: number) {
  const at = (side: Mark["line"], corner: string) => inset + (side === line && (end === null || end === corner) ? off : 0);
  const ab = (x: number) => at("ab", "A") + ((at("ab", "B") - at("ab", "A")) * x) / length;
  const cd = (x: number) => width - at("cd", "D") - ((at("cd", "C") - at("cd", "D")) * x) / length;
  const da = (y: number) => at("da", "A") + ((at("da", "D") - at("da", "A")) * y) / width;
  const bc = (y: number) => length - at("bc", "B") - ((at("bc", "C") - at("bc", "B")) * y) / width;
  const meet = (level: (x: number) => number, upright: (y: number) => number) => {
    let [x, y] = [0, 0];
    for (let round = 0; round < 60; round += 1) [x, y] = [upright(y), level(x)];
    return { x, y };
  };
  const [a, b, c, d] = [meet(ab, da), meet(ab, bc), meet(cd, bc), meet(cd, da)];
  const between = (p: { x: number; y: number }, q: { x: number; y: number }) => Math.hypot(p.x - q.x, p.y - q.y);
  return { diagonals: { ac: between(a, c), bd: between(b, d) }, lines: { ab: between(a, b), bc: between(b, c), cd: between(c, d), da: between(d, a) } };
}

describe("a wrong mark shows itself", () => {
  const slab = { length: 336, width: 288, inset: 0.5, slabDiagonals: { ac: Math.hypot(336, 288), bd: Math.hypot(336, 288) } };
  const sizes = fc.record({ length: fc.integer({ min: 150, max: 700 }), width: fc.integer({ min: 150, max: 700 }), off: fc.double({ min: 0.9, max: 3, noNaN: true }), sign: fc.constantFrom(1, -1) });
  const request = (length: number, width: number) => ({ length, width, inset: 0.5, slabDiagonals: { ac: Math.hypot(length, width), bd: Math.hypot(length, width) } });

  test("readings within their error raise nothing", () => {
    const chalk = chalkWithMistake(336, 288, 0.5, { line: "ab", end: null }, 0);
    const answer = ask({ ...slab, chalkDiagonals: { ac: chalk.diagonals.ac + 0.125, bd: chalk.diagonals.bd - 0.125 } });
    expect([answer.check?.agrees, answer.suspects, answer.ask]).toEqual([true, [], null]);
  });

  test("for each line it says how far it alone would have to be off, and that opposite lines look alike", () => {
    const chalk = chalkWithMistake(336, 288, 0.5, { line: "ab", end: null }, 1);
    const answer = ask({ ...slab, chalkDiagonals: chalk.diagonals });
    const lines = answer.suspects.filter(({ line, end }) => line !== null && end === null);
    expect(lines.map(({ line }) => line).sort()).toEqual(["ab", "bc", "cd", "da"]);
    const of = (name: string) => lines.find(({ line }) => line === name)!;
    expect(of("ab").off.in).toBeCloseTo(1, 6);
    expect(of("cd").off.in).toBeCloseTo(1, 6);
    expect(of("bc").off.in).toBeCloseTo(288 / 336, 2); // the same drop from the other pair: δ·24 = δ'·28
    expect(lines.every(({ fits, toward }) => fits && toward === "in")).toBe(true);
    expect(answer.ask).toBe("chalk-lines");
  });

  test("with the chalk's lengths the pair is told, and that only offsets can part it", () => {
    const chalk = chalkWithMistake(336, 288, 0.5, { line: "ab", end: null }, 1);
    const answer = ask({ ...slab, chalkDiagonals: chalk.diagonals, chalkLines: chalk.lines });
    const fitting = answer.suspects.filter(({ fits }) => fits);
    expect(fitting.map(({ line, end, reading }) => `${line} ${end} ${reading}`).sort()).toEqual(["ab null null", "cd null null"]);
    expect(answer.ask).toBe("offsets");
  });

  test("a single wrong mark on any slab is named, alone when the lengths are read", () => {
    fc.assert(
      fc.property(sizes, fc.constantFrom(...marks), ({ length, width, off, sign }, mark) => {
        const chalk = chalkWithMistake(length, width, 0.5, mark, sign * off);
        const answer = ask({ ...request(length, width), chalkDiagonals: chalk.diagonals, chalkLines: chalk.lines, readingError: "1/16" });
        const fitting = answer.suspects.filter(({ fits, end }) => fits && end !== null);
        expect(fitting.map(({ line, end }) => ({ line, end }))).toContainEqual(mark);
        const found = fitting.find(({ line, end }) => line === mark.line && end === mark.end)!;
        expect(found.off.in).toBeCloseTo(off, 3);
        expect(found.toward).toBe(sign > 0 ? "in" : "out");
      }),
      { numRuns: 60 },
    );
  });

  test("a whole line off on any slab is named, with its distance", () => {
    fc.assert(
      fc.property(sizes, fc.constantFrom("ab" as const, "bc" as const, "cd" as const, "da" as const), ({ length, width, off, sign }, line) => {
        const chalk = chalkWithMistake(length, width, 0.5, { line, end: null }, sign * off);
        const answer = ask({ ...request(length, width), chalkDiagonals: chalk.diagonals, chalkLines: chalk.lines, readingError: "1/16" });
        const found = answer.suspects.find((suspect) => suspect.line === line && suspect.end === null)!;
        expect([found.fits, found.toward]).toEqual([true, sign > 0 ? "in" : "out"]);
        expect(found.off.in).toBeCloseTo(off, 3);
      }),
      { numRuns: 60 },
    );
  });

  test("a forgotten burn in one chalk diagonal is among the suspects", () => {
    const chalk = chalkWithMistake(336, 288, 0.5, { line: "ab", end: null }, 0);
    const answer = ask({ ...slab, slabDiagonals: { ac: slab.slabDiagonals.ac + 1, bd: slab.slabDiagonals.bd + 1 }, burn: "1", chalkDiagonals: { ac: chalk.diagonals.ac, bd: chalk.diagonals.bd + 1 } });
    expect(answer.suspects).toContainEqual(expect.objectContaining({ reading: "chalkDiagonals.ac", toward: "more", likely: "burn", fits: true }));
  });

  test("a chalk reading may have its own burn", () => {
    const chalk = chalkWithMistake(336, 288, 0.5, { line: "ab", end: null }, 0);
    const read = { ac: chalk.diagonals.ac + 1, bd: chalk.diagonals.bd };
    expect(ask({ ...slab, chalkDiagonals: read, chalkBurns: { ac: "1" } }).check?.agrees).toBe(true);
    expect(ask({ ...slab, chalkDiagonals: read }).check?.agrees).toBe(false);
  });

  test("without the slab's diagonals the rack is free: only what both say together is tested", () => {
    const rack = { ac: Math.hypot(335, 287) + 0.5, bd: Math.hypot(335, 287) - 0.5 };
    expect(ask({ length: 336, width: 288, inset: 0.5, chalkDiagonals: rack }).check?.agrees).toBe(true);
    const short = { ac: rack.ac - 1, bd: rack.bd - 1 };
    expect(ask({ length: 336, width: 288, inset: 0.5, chalkDiagonals: short }).check?.agrees).toBe(false);
  });
});

describe("figures that cannot be", () => {
  test.each([
    [{ length: "28 ft", width: "24 ft" }, ["/inset required"]],
    [{ length: "28 ft", width: "24 ft", inset: "x" }, ["/inset unexpected-text"]],
    [{ length: "28 ft", width: "24 ft", inset: { ab: "1/2", bc: "1/2", cd: "1/2" } }, ["/inset/da required"]],
    [{ length: "28 ft", width: "24 ft", inset: "13 ft" }, ["/inset inset-too-big"]],
    [{ length: "28 ft", width: "24 ft", inset: "1/2", burn: "500", slabDiagonals: { ac: "443", bd: "443" } }, ["/slabDiagonals/ac burn-over-reading", "/slabDiagonals/bd burn-over-reading"]],
    [{ length: "28 ft", width: "24 ft", inset: "1/2", slabDiagonals: { ac: "53 ft", bd: "443" } }, ["/slabDiagonals/ac diagonal-impossible"]],
    [{ length: "28 ft", width: "24 ft", inset: "1/2", colour: "blue" }, ["/colour unknown-field"]],
  ])("%j is refused field by field", (request, issues) => {
    expect(issuesFor(request)).toEqual(issues);
  });
});
