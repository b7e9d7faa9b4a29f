import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { checkOperation, layoutOperation, type LayoutAnswer } from "@/calculators/anchors";
import { answerTo } from "@/calculators/schema";
import { layoutRows } from "@/tests/reference/anchors-rows";

const lay = (request: object): LayoutAnswer => {
  const { answer, issues } = answerTo(layoutOperation, request);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return layoutOperation.answer.parse(answer);
};
const issuesFor = (request: object) => answerTo(layoutOperation, request).issues;
const exact = (lengths: readonly { exact: string | null }[]) => lengths.map((length) => length.exact);

describe("a new layout", () => {
  test.each(layoutRows)("$id: a $piece piece under $rule takes $count bolts $spacing in apart", ({ piece, rule, count, spacing }) => {
    const [laid] = lay({ pieces: [piece], endDistance: "12", rule }).pieces;
    expect([laid!.count, laid!.spacing?.exact, laid!.even, laid!.endDistance?.exact]).toEqual([count, spacing, true, "12"]);
  });

  test("stations run along the wall, holes from each piece's own end, 8 in from the ends by default", () => {
    const { pieces, bolts } = lay({ pieces: ["8 ft", "10 ft"] });
    expect(exact(pieces[0]!.stations)).toEqual(["8", "48", "88"]); // (96 − 16)/72 is over 1: three bolts
    expect(exact(pieces[1]!.stations)).toEqual(["104", "156", "208"]);
    expect(exact(pieces[1]!.holes)).toEqual(["8", "60", "112"]);
    expect(bolts).toBe(6);
  });

  test("every worked example comes out as it says", () => {
    for (const example of layoutOperation.examples) expect(lay(example.input), example.id).toMatchObject(example.answer);
  });

  test("a metric wall under the Canadian code keeps 2.4 m exactly", () => {
    const [piece] = lay({ unit: "mm", precision: "1mm", pieces: [2806.4], endDistance: 203.2, rule: "ca-nbc" }).pieces;
    expect([piece!.count, piece!.spacing?.mm]).toEqual([2, 2400]); // 2806.4 − 2 × 203.2
    expect(lay({ unit: "mm", precision: "1mm", pieces: [2806.5], endDistance: 203.2, rule: "ca-nbc" }).pieces[0]!.count).toBe(3);
  });

  test("a piece in which two bolts cannot both keep 7 diameters from the ends is refused (B26)", () => {
    expect(issuesFor({ pieces: ["16 ft", "6"], rule: "us-irc" })).toMatchObject([{ pointer: "/pieces/1", code: "piece-too-short" }]);
    expect(issuesFor({ pieces: ["7"], rule: "us-irc" })).toMatchObject([{ code: "piece-too-short" }]);
  });

  test("short-wall exceptions hold only for a whole short wall that joins offset panels (B24, B25)", () => {
    const joined = { rule: "us-irc", joinsOffsetPanels: true };
    expect(exact(lay({ ...joined, pieces: ["20"] }).pieces[0]!.stations)).toEqual(["10"]);
    expect(lay({ ...joined, pieces: ["12"] })).toMatchObject({ bolts: 0, exception: { bolts: 0, clause: "R403.1.6 exception 2" } });
    expect(lay({ rule: "us-irc", pieces: ["20"] })).toMatchObject({ bolts: 2, exception: null });
    expect(lay({ ...joined, pieces: ["25"] })).toMatchObject({ bolts: 2, exception: null });
    expect(issuesFor({ ...joined, pieces: ["16 ft", "6"] })).toMatchObject([{ pointer: "/pieces/1", code: "piece-too-short" }]); // B26
  });

  test("holes are told by the standard, and a bit past it is warned of (B19, B20, B21)", () => {
    expect(lay({ pieces: ["8 ft"], diameter: "1/2" }).hole).toMatchObject({ least: { exact: "17/32" }, most: { exact: "9/16" }, status: "second-hand" });
    expect(lay({ pieces: ["8 ft"], diameter: "5/8" }).hole).toMatchObject({ least: { exact: "21/32" }, most: { exact: "11/16" } });
    expect(lay({ pieces: ["8 ft"], diameter: "1/2", hole: "3/4" }).warnings).toMatchObject([{ code: "hole-too-big", limit: { exact: "9/16" }, actual: { exact: "3/4" } }]);
    expect(lay({ pieces: ["8 ft"], diameter: "1/2", hole: "9/16" }).warnings).toEqual([]);
  });

  test("plate washers and their slot come with the seismic rules alone (B22)", () => {
    expect(lay({ pieces: ["8 ft"], rule: "us-irc-seismic", diameter: "1/2" }).washer).toMatchObject({ size: { exact: "3" }, thickness: { exact: "229/1000" }, slotLength: { exact: "7/4" }, slotWidth: { exact: "11/16" } });
    expect(lay({ pieces: ["8 ft"], rule: "us-irc" })).toMatchObject({ washer: null, notStated: ["edgeCover", "washer"] });
  });

  test("on a module every bolt stands on a mark", () => {
    const { pieces } = lay({ pieces: ["16 ft"], module: "16", moduleStart: "8", rule: "us-irc" });
    const stations = pieces[0]!.stations.map(({ in: station }) => station);
    expect(stations.every((station) => (station - 8) % 16 === 0)).toBe(true);
    expect([stations[0]! <= 12, stations.at(-1)! >= 180, stations.length]).toEqual([true, true, 4]);
  });

  test("what cannot be laid is refused at its field", () => {
    expect(issuesFor({ pieces: ["8 ft"], endDistance: "3" })).toMatchObject([{ pointer: "/endDistance", code: "end-distance-outside-rule", params: { least: '3 1/2"', most: "1' 0\"" } }]);
    expect(issuesFor({ pieces: ["8 ft"], diameter: "3/8" })).toMatchObject([{ pointer: "/diameter", code: "diameter-under-rule" }]);
    expect(issuesFor({ pieces: ["8 ft"], module: "16", moduleStart: "0", rule: "us-irc" })).toMatchObject([{ pointer: "/pieces/0", code: "no-layout" }]); // no multiple of 16 in lies 3 1/2 to 12 in from either end
    expect(issuesFor({ pieces: ["9000 ft"], rule: { spacing: { value: "1/8" } } })).toMatchObject([{ pointer: "/pieces", code: "too-many-bolts", params: { maximum: 500 } }]);
    expect(issuesFor({ pieces: ["900 ft"], members: { spacing: "1/8" } })).toMatchObject([{ pointer: "/members/spacing", code: "too-many" }]);
    expect(issuesFor({ pieces: [] })).toMatchObject([{ pointer: "/pieces", code: "too-few" }]);
  });
});

describe("laws of a layout", () => {
  const walls = fc.record({
    pieces: fc.array(fc.integer({ min: 24, max: 400 }), { minLength: 1, maxLength: 4 }),
    rule: fc.constantFrom("us-irc", "us-irc-seismic-3-storey", "ibc", "ca-nbc", "ca-nbc-braced"),
    spacing: fc.constantFrom(12, 16, 24),
  });
  const toCheck = (answer: LayoutAnswer, request: object) => ({
    ...request,
    pieces: answer.pieces.map(({ from, to }) => ({ from: `${from.exact} in`, to: `${to.exact} in` })),
    bolts: answer.pieces.flatMap(({ stations }) => stations.map((station) => ({ station: `${station.exact} in` }))),
  });

  test("the check finds nothing wrong with a layout, and pieces take the fewest even bolts", () => {
    fc.assert(
      fc.property(walls, ({ pieces, rule }) => {
        const answer = lay({ pieces, rule });
        expect(answerTo(checkOperation, toCheck(answer, { rule })).answer).toMatchObject({ ok: true, additions: [] });
        for (const piece of answer.pieces) if (piece.count > 2) expect((piece.length.in - 2 * piece.endDistance!.in) / (piece.count - 2)).toBeGreaterThan(answer.limits.spacing!.in);
      }),
      { numRuns: 60 },
    );
  });

  test("clear of joists: no bolt stands under one, and the rule still holds", () => {
    fc.assert(
      fc.property(walls, ({ pieces, rule, spacing }) => {
        const members = { spacing, thickness: "1 1/2" };
        const asked = answerTo(layoutOperation, { pieces, rule, members });
        if (asked.answer === null) return expect(asked.issues.every(({ code }) => code === "no-layout" || code === "piece-too-short")).toBe(true);
        expect(answerTo(checkOperation, toCheck(asked.answer, { rule, members })).answer).toMatchObject({ ok: true });
      }),
      { numRuns: 60 },
    );
  });
});
