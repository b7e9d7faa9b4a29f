import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { checkOperation } from "@/calculators/anchors";
import { planSill, platesInput, platesOperation, type PlatesAnswer } from "@/calculators/plates";
import { answerTo } from "@/calculators/schema";
import { bitRows } from "@/tests/reference/plates-rows";
import { runs } from "@/tests/setup/runs";

const ask = (request: object) => answerTo(platesOperation, request);
function planned(request: object): PlatesAnswer {
  const { answer, issues } = ask(request);
  expect(issues).toEqual([]);
  return answer!;
}
const bolts = (...stations: (number | string)[]) => stations.map((station) => ({ station }));
const sixteens = [{ length: "16 ft" }];

describe("holes", () => {
  test("N07: a bolt 2 3/4 in from the slab edge with the plate set back 1/2 in is bored 2 1/4 in from the plate's edge", () => {
    // domain.md N07, which corrects NAVEDTRA 14044 p. 1-2
    const { pieces, findings } = planned({ walls: [{ name: "ab", length: "8 ft", bolts: [{ station: "8 1/2", offset: "2 3/4", from: "slab" }, { station: "88 1/2", offset: "2 3/4", from: "slab" }] }], inset: "1/2", plateWidth: "5 1/2", stock: sixteens, rule: "us-irc" });
    const poured = pieces[0]!.holes.filter(({ kind }) => kind === "bolt");
    expect(poured.map((hole) => [hole.station.exact, hole.running.exact, hole.across?.exact])).toEqual([["8", "8", "9/4"], ["88", "88", "9/4"]]);
    expect(findings.filter(({ code }) => code === "middle-third")).toEqual([]); // 2 1/4 lies within 1.8333 and 3.6667
  });

  test("run from the end of their own piece, and across from the plate's outer edge", () => {
    const { pieces } = planned({ walls: [{ name: "ab", length: "28 ft", bolts: bolts(8, 72, 136, 200, 264, 328) }], stock: [{ length: "16 ft" }, { length: "12 ft" }] });
    const second = pieces[1]!;
    expect(second.from!.exact).toBe("192");
    expect(second.holes.map((hole) => hole.running.exact)).toEqual(["8", "72", "136"]); // 200, 264 and 328 less 192
    expect(second.holes.every((hole) => hole.across === null)).toBe(true);
  });

  test.each(bitRows)("$id: a $bit bit for a $diameter bolt is answered $warning", ({ diameter, bit, warning, least, most }) => {
    const answer = planned({ pieces: [{ length: "8 ft" }], stock: sixteens, diameter, bit });
    expect([answer.bit.warning, answer.hole.least.exact, answer.hole.most.exact]).toEqual([warning, least, most]);
  });
});

describe("walls", () => {
  test("bolts at 5 to 6 ft cost an added anchor at every joint, since two astride it stand 7 to 24 in apart", () => {
    const answer = planned({ walls: [{ name: "ab", length: "40 ft", bolts: bolts(9, 75, 141, 207, 273, 339, 405, 471) }], stock: sixteens });
    expect(answer.joints.length).toBe(2);
    expect(answer.addedAnchors.length).toBe(2);
    expect([answer.astride?.least.exact, answer.astride?.most.exact]).toEqual(["7", "24"]);
    expect(answer.notes.map(({ code }) => code)).toContain("joints-cost-anchors");
  });

  test("bolts that do stand astride a joint cost none", () => {
    const answer = planned({ walls: [{ name: "ab", length: "28 ft", bolts: bolts(8, 72, 136, 184, 200, 264, 328) }], stock: sixteens });
    expect(answer.addedAnchors).toEqual([]);
    const at = answer.joints[0]!.at.in;
    expect(at - 184 >= 3.5 && 200 - at >= 3.5).toBe(true);
    expect([answer.joints[0]!.window.from.exact, answer.joints[0]!.window.to.exact]).toEqual(["188", "192"]); // no more than 12 in before the bolt at 200, and no further than the board reaches
  });

  test("the wall that runs through a corner keeps its length, the other stops a plate's width short", () => {
    const wall = (name: string, length: string) => ({ name, length, bolts: bolts(9, 60) });
    const answer = planned({ walls: [wall("ab", "10 ft"), wall("bc", "10 ft")], corners: { A: "ab", B: "ab" }, plateWidth: "5 1/2", stock: sixteens });
    expect(answer.walls.map(({ from, to }) => [from.exact, to.exact])).toEqual([["0", "120"], ["11/2", "120"]]);
    // At an inside corner the one that runs through goes a plate's width past it.
    const inside = planned({ walls: [wall("ab", "10 ft"), wall("bc", "10 ft")], corners: { B: "ab" }, insideCorners: ["B"], plateWidth: "5 1/2", stock: sixteens });
    expect(inside.walls.map(({ from, to }) => [from.exact, to.exact])).toEqual([["0", "251/2"], ["0", "120"]]);
  });

  test("an opening ends the pieces on both sides, and a step too", () => {
    const answer = planned({ walls: [{ name: "ab", length: "30 ft", bolts: bolts(8, 72, 112, 248, 300, 352), openings: [{ from: "10 ft", to: "20 ft" }], steps: ["25 ft"] }], stock: sixteens });
    expect(answer.pieces.map(({ from, to }) => [from!.exact, to!.exact])).toEqual([["0", "120"], ["240", "300"], ["300", "360"]]);
    expect(answer.joints).toEqual([]);
  });

  test("hold-downs and straps are never moved nor counted; a hold-down is bored, a strap is not", () => {
    const held = [{ station: 8, engineered: true }, { station: 4, strap: true }];
    const answer = planned({ walls: [{ name: "ab", length: "8 ft", bolts: [...held, ...bolts(20, 88)] }], stock: sixteens });
    expect(answer.addedAnchors.length).toBe(1); // within 12 in of the first end: the hold-down at 8 in does not count
    expect(Math.abs(answer.addedAnchors[0]!.station.in - 8)).toBeGreaterThanOrEqual(3); // clear of it
    const holes = answer.pieces[0]!.holes.map(({ kind, station }) => `${kind} ${station.exact}`);
    expect(holes.sort()).toEqual([`added ${answer.addedAnchors[0]!.station.exact}`, "bolt 20", "bolt 88", "engineered 8"]);
    expect(answer.walls[0]!.boltsLeftOut).toEqual([{ bolt: 0, reason: "engineered" }, { bolt: 1, reason: "engineered" }]);
  });

  test("a bolt off the middle third, or too near the wall's end, does not count, and is told", () => {
    const answer = planned({ walls: [{ name: "ab", length: "8 ft", bolts: [{ station: 2, offset: "2 3/4" }, { station: 20, offset: "1" }, { station: 88, offset: "2 3/4" }] }], plateWidth: "5 1/2", stock: sixteens });
    expect(answer.ok).toBe(false);
    expect(answer.findings.map(({ code, bolt }) => [code, bolt])).toEqual(expect.arrayContaining([["near-end", 0], ["middle-third", 1]]));
    expect(answer.addedAnchors.length).toBe(2); // one by the end, and 84 in from there to 88 in wants another
  });

  test("a short wall that joins offset braced panels takes one bolt in its middle third, or none (B24, B25)", () => {
    const short = (length: string) => planned({ walls: [{ name: "ab", length, joinsOffsetPanels: true }], stock: sixteens });
    expect(short("20 in").addedAnchors.map(({ station }) => station.in >= 20 / 3 && station.in <= 40 / 3)).toEqual([true]);
    expect(short("12 in").addedAnchors).toEqual([]);
  });

  test("the Canadian rule asks for its spacing along the wall, wherever the joints are, and borrows no end distance", () => {
    const answer = planned({ walls: [{ name: "ab", length: "9 m", bolts: ["1 m", "3.4 m", "5.8 m", "8.2 m"].map((station) => ({ station })) }], stock: [{ length: "4.88 m" }], rule: "ca-nbc", precision: "1mm" });
    expect(answer.addedAnchors).toEqual([]);
    expect(answer.astride).toBeNull();
    expect(answer.notStated).toContain("endMinimum");
    const gap = planned({ walls: [{ name: "ab", length: "9 m", bolts: ["1 m", "5.8 m", "8.2 m"].map((station) => ({ station })) }], stock: [{ length: "4.88 m" }], rule: "ca-nbc", precision: "1mm" });
    expect(gap.addedAnchors.map(({ station }) => station.mm)).toEqual([3400]);
  });
});

describe("the as-poured check", () => {
  const wall = fc.record({ feet: fc.integer({ min: 3, max: 60 }), gaps: fc.array(fc.integer({ min: 14, max: 90 }), { maxLength: 14 }), first: fc.integer({ min: 4, max: 20 }), opening: fc.integer({ min: 0, max: 3 }) });
  test.each(["us-irc", "us-irc-seismic-3-storey", "ibc", "ca-nbc", "ca-nbc-braced"])("finds nothing in the pieces, with the added anchors in, under %s", (rule) => {
    fc.assert(
      fc.property(wall, ({ feet, gaps, first, opening }) => {
        const length = feet * 12;
        let at = first;
        const stations = [first, ...gaps.map((gap) => (at += gap))].filter((station) => station <= length - 4);
        const openings = opening === 0 && feet > 24 ? [{ from: 100, to: 190 }] : [];
        const request = { walls: [{ name: "ab", length, bolts: bolts(...stations), openings }], stock: [{ length: "16 ft" }, { length: "12 ft" }], shortest: "20 in", rule, timeLimit: 0.05 };
        const { answer, issues } = ask(request);
        if (answer === null) {
          expect(issues.map(({ code }) => code).every((code) => ["no-place-for-joint", "part-too-short", "no-room-for-anchors"].includes(code))).toBe(true);
          return;
        }
        const inOpening = new Set(answer.walls[0]!.boltsLeftOut.filter(({ reason }) => reason === "in-opening").map(({ bolt }) => bolt));
        const check = answerTo(checkOperation, {
          pieces: answer.pieces.map(({ from, to }) => ({ from: from!.exact, to: to!.exact })),
          bolts: [...stations.filter((_, index) => !inOpening.has(index)), ...answer.addedAnchors.map(({ station }) => station.exact)].map((station) => ({ station })),
          rule,
        }).answer!;
        // What is left is what no joint mends: a bolt poured too near an end that stands there.
        const cured = check.findings.filter(({ code }) => code !== "near-end");
        expect(cured).toEqual([]);
        expect(answer.findings.map(({ code }) => code).sort()).toEqual(check.findings.map(({ code }) => code).sort());
        expect(answer.ok).toBe(check.ok);
      }),
      { numRuns: runs(60), seed: 20260501 },
    );
  });
});

describe("each its own answer", () => {
  const codes = (request: object) => ask(request).issues.map(({ pointer, code }) => `${pointer} ${code}`);
  test.each([
    ["a piece longer than any board", { pieces: [{ length: "17 ft" }], stock: sixteens }, "/pieces/0/length piece-too-long"],
    ["a piece as long as a board that is trimmed", { pieces: [{ length: "16 ft" }], stock: sixteens, trim: "1/4" }, "/pieces/0/length piece-too-long"],
    ["no stock left", { pieces: [{ length: "8 ft" }], stock: [{ length: "16 ft", count: 0 }] }, "/stock no-stock-left"],
    ["too little stock", { pieces: [{ length: "8 ft", count: 3 }], stock: [{ length: "16 ft", count: 1 }] }, "/stock not-enough-stock"],
    ["neither walls nor pieces", { stock: sixteens }, "/walls walls-or-pieces"],
    ["walls and pieces", { walls: [{ name: "ab", length: "8 ft" }], pieces: [{ length: "8 ft" }], stock: sixteens }, "/walls walls-or-pieces"],
    ["no walls at all", { walls: [], stock: sixteens }, "/walls too-few"],
    ["a wall named twice", { walls: [{ name: "ab", length: "8 ft" }, { name: "AB", length: "8 ft" }], stock: sixteens }, "/walls/1/name same-name"],
    ["a wall that does not touch the corner", { walls: [{ name: "ab", length: "8 ft" }], corners: { C: "ab" }, stock: sixteens }, "/corners/C not-a-wall-here"],
    ["an opening past the wall", { walls: [{ name: "ab", length: "8 ft", openings: [{ from: "7 ft", to: "9 ft" }] }], stock: sixteens }, "/walls/0/openings/0/to past-the-wall"],
    ["openings one in the other", { walls: [{ name: "ab", length: "20 ft", openings: [{ from: "2 ft", to: "9 ft" }, { from: "8 ft", to: "12 ft" }] }], stock: sixteens }, "/walls/0/openings/1/from openings-overlap"],
    ["nothing but opening", { walls: [{ name: "ab", length: "8 ft", openings: [{ from: "0", to: "8 ft" }] }], stock: sixteens }, "/walls/0 no-plate-left"],
    ["a bolt from the slab with no inset", { walls: [{ name: "ab", length: "8 ft", bolts: [{ station: 8, from: "slab" }] }], stock: sixteens }, "/inset inset-needed"],
    ["a part too short for two bolts (B26)", { walls: [{ name: "ab", length: "6 in" }], stock: sixteens }, "/walls/0 part-too-short"],
    ["lengths that share no measure", { pieces: [{ length: "8.1234567891" }, { length: "7.7654321" }], stock: [{ length: "10.333333333" }] }, " no-common-measure"],
    ["a wall too long", { walls: [{ name: "ab", length: "501 ft" }], stock: sixteens }, "/walls/0/length wall-too-long"],
  ])("%s", (_what, request, told) => {
    expect(codes(request)).toContain(told);
  });

  test("bolts so close that no joint fits: which wall, which joint, and the board that would do", () => {
    const close = Array.from({ length: 60 }, (_, index) => 5 + index * 6);
    const { issues } = ask({ walls: [{ name: "ab", length: "8 ft", bolts: bolts(8, 88) }, { name: "bc", length: "30 ft", bolts: bolts(...close) }], stock: sixteens });
    expect(issues).toEqual([{ pointer: "/walls/1", code: "no-place-for-joint", params: expect.objectContaining({ wall: "bc", joint: 1, longest: "16' 0\"", needed: "30' 0\"" }) }]);
  });

  test("a kerf of nothing lets two halves come from one board, a kerf of 1/8 does not (C06)", () => {
    const halves = { pieces: [{ length: "72", count: 2 }], stock: [{ length: "144" }] };
    expect(planned({ ...halves, kerf: "0" }).totals.boards).toBe(1);
    expect(planned({ ...halves, kerf: "1/8" }).totals.boards).toBe(2);
    expect(planned({ ...halves, kerf: "1/8", stock: [{ length: "144 1/8" }] }).totals.boards).toBe(1);
    expect(planned({ ...halves, kerf: "1/8", trim: "1/4", stock: [{ length: "144 1/2" }] }).totals.boards).toBe(2);
    expect(planned({ ...halves, kerf: "1/8", trim: "1/4", stock: [{ length: "144 5/8" }] }).totals.boards).toBe(1);
  });

  test("too few long boards: shorter pieces take their place, and the answer says so", () => {
    const answer = planned({ walls: [{ name: "ab", length: "38 ft", bolts: bolts(8, 72, 136, 200, 264, 328, 392, 448) }], stock: [{ length: "20 ft", count: 1 }, { length: "10 ft" }] });
    expect(answer.notes.map(({ code }) => code)).toContain("shorter-pieces-for-stock");
    expect(answer.ok).toBe(true);
  });

  test("offcuts that cost nothing are used first", () => {
    const answer = planned({ pieces: [{ length: "6 ft", count: 3 }], stock: [{ length: "12 ft 1 in", price: 12 }, { length: "6 ft", price: 0, count: 1 }] });
    expect(answer.cost).toBe(12);
    expect(answer.boards.map(({ stockIndex }) => stockIndex).sort()).toEqual([0, 1]);
  });
});

test("a search that is cancelled, or has no time, still answers with a sound plan and its gap", () => {
  const walls = Array.from({ length: 12 }, (_, index) => ({ name: `w${index}x`, length: 300 + 31 * index, bolts: bolts(...Array.from({ length: 8 }, (__, at) => 9 + at * 67).filter((at) => at < 290 + 31 * index)) }));
  const input = platesInput.parse({ walls, stock: [{ length: "16 ft" }, { length: "10 ft" }], shortest: "24 in" });
  const told: number[] = [];
  const answer = planSill(input, { now: () => 0, isCancelled: () => true, onProgress: ({ share }) => told.push(share) });
  expect(answer.ended).not.toBe("looked");
  expect(answer.gap).toBeGreaterThanOrEqual(0);
  expect(answer.boards.flatMap(({ pieces }) => pieces).sort()).toEqual(answer.pieces.map(({ id }) => id).sort());
  expect(told.length).toBeGreaterThan(12);
  expect(told.every((share) => share >= 0 && share <= 1)).toBe(true);
});

test("pieces, kerfs, trims and offcuts make up every board, and pieces every wall", () => {
  fc.assert(
    fc.property(fc.array(fc.integer({ min: 60, max: 700 }), { minLength: 1, maxLength: 5 }), fc.integer({ min: 0, max: 3 }), fc.integer({ min: 0, max: 2 }), (lengths, kerf, trim) => {
      const request = { walls: lengths.map((length, index) => ({ name: `w${index}x`, length, bolts: bolts(...Array.from({ length: 12 }, (_, at) => 8 + at * 62).filter((at) => at < length - 4)) })), stock: [{ length: "16 ft" }, { length: "144" }], kerf: `${kerf}/16`, trim: `${trim}/8`, timeLimit: 0.05 };
      const { answer } = ask(request);
      if (answer === null) return;
      for (const board of answer.boards) {
        const pieces = board.pieces.map((id) => answer.pieces.find((piece) => piece.id === id)!);
        const used = pieces.reduce((sum, piece) => sum + piece.length.in, 0) + ((pieces.length - 1) * kerf) / 16 + (2 * trim) / 8;
        const left = board.stock.in - used;
        expect(left).toBeGreaterThanOrEqual(0);
        expect(board.offcut.in).toBe(Math.max(0, left - kerf / 16)); // cutting the last piece off costs a kerf too
      }
      lengths.forEach((length, index) => expect(answer.pieces.filter(({ wall }) => wall === `w${index}x`).reduce((sum, piece) => sum + piece.length.in, 0)).toBe(length));
    }),
    { numRuns: runs(40), seed: 20260502 },
  );
});
