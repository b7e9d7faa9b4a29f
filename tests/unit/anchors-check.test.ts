import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { anchors, checkOperation, type CheckAnswer } from "@/calculators/anchors";
import { answerTo } from "@/calculators/schema";
import { thirdRows } from "@/tests/reference/anchors-rows";
import { fewestByTrying, judgeByHand, type JudgedBolt } from "@/tests/reference/anchors-judge";

const check = (request: object): CheckAnswer => {
  const { answer, issues } = answerTo(checkOperation, request);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return checkOperation.answer.parse(answer);
};
const issuesFor = (request: object) => answerTo(checkOperation, request).issues.map(({ pointer, code }) => `${pointer} ${code}`);
const codes = (answer: CheckAnswer) => answer.findings.map(({ code }) => code);
const at = (...stations: (string | number)[]) => stations.map((station) => ({ station }));
const eight = [{ from: "0", to: "8 ft" }];

describe("bolts in the concrete", () => {
  test("each kind of violation is found with its clause, limit, actual and remedy", () => {
    const sixteen = [{ from: "0", to: "16 ft" }];
    expect(check({ pieces: sixteen, bolts: at(8, 80, 184) }).findings).toMatchObject([{ code: "spacing", piece: 0, bolt: 1, next: 2, clause: "R403.1.6", status: "read", limit: { exact: "72" }, actual: { exact: "104" }, remedy: "add-anchor" }]);
    expect(check({ pieces: eight, bolts: at(48) }).findings).toMatchObject([{ code: "too-few", limit: 2, actual: 1, bolt: null }, { code: "far-end", limit: { exact: "12" }, actual: { exact: "48" } }, { code: "far-end" }]);
    expect(check({ pieces: eight, bolts: at("3 7/16", "60", "84") }).findings).toMatchObject([{ code: "near-end", bolt: 0, limit: { exact: "7/2" }, actual: { exact: "55/16" }, remedy: "add-anchor" }]);
    expect(check({ pieces: [...eight, { from: "8 ft", to: "16 ft" }], bolts: at(12, 70, 94, 108, 180) }).findings).toMatchObject([{ code: "near-end", bolt: 2, remedy: "move-joint" }]);
    expect(check({ pieces: eight, bolts: [{ station: 12, diameter: "3/8" }, { station: 84 }] }).findings).toMatchObject([{ code: "diameter", remedy: "thicker-anchor", limit: { exact: "1/2" } }]);
    expect(check({ pieces: eight, bolts: [{ station: 12, projection: "2" }, { station: 84, projection: "2 1/2" }] }).findings).toMatchObject([{ code: "too-short", bolt: 0, limit: { exact: "33/16" }, status: "practice", remedy: "extend-bolt" }]); // 1 1/2 + 1/8 + 7/16
    expect(check({ pieces: eight, bolts: at(12, 84), members: { stations: ["12 3/4"] } }).findings).toMatchObject([{ code: "under-joist", bolt: 0, limit: { exact: "1" }, actual: { exact: "3/4" }, remedy: "move-joist" }]);
    expect(check({ pieces: eight, bolts: at(12, 84, 97) }).findings).toMatchObject([{ code: "off-piece", bolt: 2, piece: null, remedy: "no-plate-here" }]);
  });

  test.each(thirdRows)("$id: the middle third of a $width plate", ({ width, from, to }) => {
    const { thirds } = check({ pieces: eight, bolts: at(12, 84), plateWidth: width });
    expect(thirds!.from.in).toBeCloseTo(from, 4);
    expect(thirds!.to.in).toBeCloseTo(to, 4);
  });

  test("the centre is tested exactly against the third; a shank that leaves it is a warning", () => {
    const across = (offset: string) => check({ pieces: eight, bolts: [{ station: 12, offset }, { station: 84, offset: "2 3/4" }], plateWidth: "5 1/2" });
    expect(across("1.8333333333333333")).toMatchObject({ ok: false, findings: [{ code: "middle-third", bolt: 0 }] });
    expect(across("1 27/32")).toMatchObject({ ok: true, warnings: [{ code: "shank-leaves-third", bolt: 0 }] });
    expect(across("2 1/4")).toMatchObject({ ok: true, warnings: [] });
    const third = check({ pieces: eight, bolts: [{ station: 12, offset: "2" }, { station: 84, offset: "4" }], plateWidth: "6" });
    expect(third.ok).toBe(true); // exactly on the third, both sides
  });

  test("a bolt measured from the slab is moved by that corner's insets, and the answer says so (N07)", () => {
    const answer = check({ pieces: eight, bolts: [{ station: "12", offset: "2 3/4", from: "slab" }, { station: 48 }, { station: 84 }], plateWidth: "5 1/2", wall: "bc", inset: { ab: "1/4", bc: "1/2", cd: "3", da: "4" } });
    expect(answer.converted).toMatchObject([{ bolt: 0, station: { exact: "47/4" }, offset: { exact: "9/4" }, stationBy: { exact: "1/4" }, offsetBy: { exact: "1/2" } }]);
    expect(answer.ok).toBe(true);
    expect(issuesFor({ pieces: eight, bolts: [{ station: 12, from: "slab" }] })).toEqual(["/inset inset-needed"]);
  });

  test("a rule's silence is told and nothing is judged by it", () => {
    const answer = check({ pieces: eight, bolts: at(1, 95), rule: "ca-nbc", plateWidth: "5 1/2" });
    expect(answer.ok).toBe(true);
    expect(answer.notStated).toContain("endMinimum");
    expect(answer.thirds).toBeNull();
    expect(codes(check({ pieces: eight, bolts: [], rule: "ca-nbc" }))).toEqual(["too-few"]);
    expect(codes(check({ pieces: [{ from: "0", to: "3 m" }], bolts: at("2.5 m"), rule: "ca-nbc" }))).toEqual(["spacing"]);
    expect(codes(check({ pieces: [{ from: "0", to: "3 m" }], bolts: at("501 mm", "2.6 m"), rule: "ca-nbc-braced", diameter: "5/8" }))).toEqual(["far-end", "spacing"].slice(0, 1));
  });

  test("5/8 in bolts may stand 2.4 m apart in a braced Canadian wall, 1/2 in bolts 1.7 m (B29)", () => {
    const wall = { pieces: [{ from: "0", to: "2.6 m" }], bolts: at("0.1 m", "2.5 m"), rule: "ca-nbc-braced" };
    expect(check({ ...wall, diameter: "5/8" }).ok).toBe(true);
    expect(check({ ...wall, diameter: "12.7 mm" })).toMatchObject({ ok: false, findings: [{ code: "spacing" }] });
  });

  test("short-wall exceptions hold where they apply and nowhere else (B24, B25, B26)", () => {
    const wall = (length: number, stations: number[], joined = true) => check({ pieces: [{ from: "0", to: length }], bolts: at(...stations), joinsOffsetPanels: joined });
    expect(wall(20, [10]).ok).toBe(true);
    expect(wall(20, [4])).toMatchObject({ ok: false, findings: [{ code: "near-end", clause: "R403.1.6 exception 1" }] });
    expect(wall(20, [])).toMatchObject({ findings: [{ code: "too-few", limit: 1 }], additions: [{ station: { exact: "10" } }] });
    expect(wall(12, [])).toMatchObject({ ok: true, exception: { bolts: 0 } });
    expect(codes(wall(20, [10], false))).toContain("too-few");
    expect(wall(25, [12.5]).ok).toBe(false);
    const offcut = check({ pieces: [{ from: "0", to: "16 ft" }, { from: "16 ft", to: "198" }], bolts: at(8, 66, 124, 184, 195), joinsOffsetPanels: true });
    expect(offcut).toMatchObject({ exception: null, unfixable: [{ piece: 1, code: "piece-too-short" }] });
    expect(offcut.findings.filter(({ piece }) => piece === 1).map(({ remedy }) => remedy)).toEqual(["longer-piece", "longer-piece"]);
  });

  test("engineered bolts are neither judged, counted nor moved; bolts entered twice count once", () => {
    const engineered = check({ pieces: eight, bolts: [{ station: 1, engineered: true, diameter: "1/4" }, ...at(12, 84)] });
    expect(engineered).toMatchObject({ ok: true, engineered: [0], additions: [] });
    expect(codes(check({ pieces: eight, bolts: [{ station: 12, engineered: true }, ...at(84)] }))).toEqual(["too-few", "far-end"]);
    const twice = check({ pieces: eight, bolts: at(48, 48) });
    expect(codes(twice)).toContain("too-few");
    expect(twice.warnings).toMatchObject([{ code: "duplicate-bolt", bolt: 1, other: 0 }]);
  });

  test("a 3 in washer centred on a 2x4 keeps to the sheathed edge, on a 2x6 it does not (B23)", () => {
    const gap = (plateWidth: string, offset: string) => check({ pieces: eight, bolts: [{ station: 12, offset }, { station: 84 }], plateWidth, shearWall: true, washer: "3" }).warnings;
    expect(gap("3 1/2", "1 3/4")).toEqual([]);
    expect(gap("5 1/2", "2 3/4")).toMatchObject([{ code: "washer-edge", limit: { exact: "1/2" }, actual: { exact: "5/4" } }]);
  });

  test("pieces that cannot be are refused, and every worked example comes out as it says", () => {
    expect(issuesFor({ pieces: [{ from: 96, to: 0 }], bolts: [] })).toEqual(["/pieces/0/to piece-backwards"]);
    expect(issuesFor({ pieces: [{ from: 0, to: 96 }, { from: 90, to: 192 }], bolts: [] })).toEqual(["/pieces/1/from pieces-overlap"]);
    for (const example of checkOperation.examples) expect(check(example.input), example.id).toMatchObject(example.answer);
    expect(anchors.operations).toContain(checkOperation);
  });
});

/** Half inches; the wall's pieces from lengths and gaps, in a shuffled order. */
const half = (value: number) => `${value}/2`;
const optional = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: null });
const pieces = fc.array(fc.record({ length: fc.integer({ min: 6, max: 120 }), gap: fc.constantFrom(0, 0, 10) }), { minLength: 1, maxLength: 3 });
const laidOut = (parts: readonly { length: number; gap: number }[]) => {
  let from = 0;
  return parts.map(({ length, gap }) => {
    const piece = { from, to: from + length };
    from += length + gap;
    return piece;
  });
};

describe("the check against a judge that shares no code with it", () => {
  const bolts = fc.array(
    fc.record({ station: fc.integer({ min: -4, max: 300 }), offset: optional(fc.integer({ min: 0, max: 12 })), projection: optional(fc.integer({ min: 1, max: 8 })), diameter: fc.constantFrom(1, 2), engineered: fc.boolean() }),
    { maxLength: 12 },
  );
  const figures = fc.record({
    spacing: optional(fc.integer({ min: 10, max: 80 })),
    endMinimum: optional(fc.integer({ min: 1, max: 12 })),
    endMaximum: fc.integer({ min: 12, max: 30 }),
    count: fc.constantFrom(1, 2, 3),
    third: fc.boolean(),
    cover: optional(fc.integer({ min: 1, max: 6 })),
    diameter: optional(fc.constantFrom(1, 2)),
  });

  test("every kind of violation is found, and only those", () => {
    const seen = new Set<string>();
    fc.assert(
      fc.property(pieces, bolts, figures, optional(fc.integer({ min: 4, max: 20 })), fc.array(fc.integer({ min: 0, max: 200 }), { maxLength: 3 }), fc.boolean(), (parts, given, rule, plateWidth, members, reversed) => {
        const wall = laidOut(parts);
        if (reversed) wall.reverse();
        const inset = 1;
        const judged: JudgedBolt[] = given.map((bolt) => ({ ...bolt, slabOffset: bolt.offset === null ? null : bolt.offset + inset }));
        const value = (figure: number | null) => ({ value: figure === null ? null : half(figure) });
        const answer = check({
          pieces: wall.map(({ from, to }) => ({ from: half(from), to: half(to) })),
          bolts: given.map(({ station, offset, projection, diameter, engineered }) => ({ station: half(station), ...(offset === null ? {} : { offset: half(offset) }), ...(projection === null ? {} : { projection: half(projection) }), diameter: half(diameter), engineered })),
          inset: half(inset),
          ...(plateWidth === null ? {} : { plateWidth: half(plateWidth) }),
          ...(members.length === 0 ? {} : { members: { stations: members.map(half), thickness: "1", clearance: "1/4" } }),
          plateThickness: "1",
          washerThickness: "1/16",
          rule: { spacing: value(rule.spacing), endMinimum: { ...value(rule.endMinimum) }, endMaximum: value(rule.endMaximum), boltsPerPiece: { value: rule.count }, middleThird: { value: rule.third }, edgeCover: value(rule.cover), diameter: value(rule.diameter) },
        });
        // Reach: half of a 1 in member and half the bolt, and 1/4: 1 for 1/2 in bolts, 1 1/4 for 1 in ones. The plate, washer and nut want 1 1/2 and 1 15/16.
        const byHand = (diameter: number) => judgeByHand({ pieces: wall, bolts: judged, plateWidth, members, memberReach: diameter === 1 ? 2 : 2.5, projection: diameter === 1 ? 3 : 3.875, figures: rule });
        const own = (code: string) => ["under-joist", "too-short"].includes(code.split(" ")[0]!);
        const diameterAt = (code: string) => given[Number(code.split(" ")[2])]!.diameter;
        const expected = [...byHand(1).filter((code) => !own(code) || diameterAt(code) === 1), ...byHand(2).filter((code) => own(code) && diameterAt(code) === 2)].sort();
        expect(answer.findings.map(({ code, piece, bolt }) => `${code} ${piece ?? "-"} ${bolt ?? "-"}`).sort()).toEqual(expected);
        expect(answer.ok).toBe(expected.length === 0);
        for (const { code } of answer.findings) seen.add(code);
      }),
      { numRuns: 600 },
    );
    expect([...seen].sort()).toEqual(["diameter", "far-end", "middle-third", "near-end", "off-piece", "slab-edge", "spacing", "too-few", "too-short", "under-joist"]);
  });

  test("additions are the fewest, by trying everything, and put the wall right", () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 8, max: 16 }), { minLength: 1, maxLength: 2 }),
        fc.uniqueArray(fc.integer({ min: 0, max: 32 }), { maxLength: 4 }),
        fc.record({ spacing: fc.integer({ min: 3, max: 9 }), endMaximum: fc.integer({ min: 2, max: 5 }), count: fc.constantFrom(1, 2, 3) }),
        fc.uniqueArray(fc.integer({ min: 2, max: 30 }), { maxLength: 2 }),
        (lengths, stations, { spacing, endMaximum, count }, members) => {
          const wall = laidOut(lengths.map((length) => ({ length, gap: 0 })));
          const endMinimum = 1;
          const end = wall.at(-1)!.to;
          const isOn = (mark: number) => wall.some(({ from, to }) => mark >= from + endMinimum && mark <= to - endMinimum);
          const standing = stations.filter(isOn);
          const marks = Array.from({ length: end + 1 }, (_, mark) => mark).filter((mark) => isOn(mark) && !members.some((member) => Math.abs(member - mark) < 1) && !stations.includes(mark));
          const expected = fewestByTrying({ pieces: wall, standing, marks, spacing, endMaximum, count }, 5);
          if (expected === null) return; // more than the trying can afford, or impossible
          const request = {
            pieces: wall,
            bolts: stations.map((station) => ({ station, diameter: 1 })),
            rule: { spacing: { value: spacing }, endMinimum: { value: endMinimum }, endMaximum: { value: endMaximum }, boltsPerPiece: { value: count }, diameter: { value: 1 } },
            diameter: 1,
            ...(members.length === 0 ? {} : { members: { stations: members, thickness: 1 } }),
            clearOfBolts: 1,
          };
          const answer = check(request);
          expect([answer.additions.length, answer.unfixable]).toEqual([expected, []]);
          const after = check({ ...request, bolts: [...request.bolts, ...answer.additions.map(({ station }) => ({ station: `${station.exact} in`, diameter: 1 }))] });
          expect(after.additions).toEqual([]);
          // A bolt too near an end stays in the judge's spacing; with an end reach above the spacing it may leave one.
          const places = endMaximum <= spacing ? ["too-few", "far-end", "spacing"] : ["too-few", "far-end"];
          expect(codes(after).filter((code) => places.includes(code))).toEqual([]);
        },
      ),
      { numRuns: 300 },
    );
  });

  test("added anchors are spread evenly where nothing forbids it, on whole quarters of an inch", () => {
    const even = (answer: CheckAnswer, standing: number[]) => {
      const all = [...standing, ...answer.additions.map(({ station }) => station.in)].sort((a, b) => a - b);
      const gaps = all.slice(1).map((station, index) => station - all[index]!);
      return { ends: [all[0], all.at(-1)], count: answer.additions.length, unevenness: Math.max(...gaps) - Math.min(...gaps), quarters: all.every((station) => Number.isInteger(station * 4)) };
    };
    expect(even(check({ pieces: [{ from: "0", to: "16 ft" }], bolts: [] }), [])).toEqual({ ends: [8, 184], count: 4, unevenness: 0.25, quarters: true });
    expect(even(check({ pieces: [{ from: "0", to: "16 ft" }], bolts: at(8, 184) }), [8, 184])).toEqual({ ends: [8, 184], count: 2, unevenness: 0.25, quarters: true });
    expect(check({ pieces: [{ from: "0", to: "16 ft" }], bolts: at(8, 184), plateWidth: "5 1/2" }).additions[0]).toMatchObject({ across: { exact: "11/4" } });
  });
});
