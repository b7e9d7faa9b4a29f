import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { platesOperation } from "@/calculators/plates";
import { answerTo } from "@/calculators/schema";
import { takeoffOperation, toCsv, type TakeoffAnswer } from "@/calculators/takeoff";
import { takeoffRows } from "@/tests/reference/takeoff-rows";
import { runs } from "@/tests/setup/runs";

function takeoff(request: object): TakeoffAnswer {
  const { answer, issues } = answerTo(takeoffOperation, request);
  expect(issues).toEqual([]);
  return answer!;
}
const lumber = [{ length: "16 ft", count: 12 }];
const lineOf = (answer: TakeoffAnswer, item: string) => answer.lines.find((line) => line.item === item);

test.each(takeoffRows)("$what", ({ request, item, quantity, needed }) => {
  const line = lineOf(takeoff({ lumber, ...request }), item)!;
  expect(line.quantity).toBe(quantity);
  expect(line.needed).toBeCloseTo(needed, 4); // convert-units is right to 5e-6, which serves for a volume
});

describe("from a plates answer", () => {
  const plates = answerTo(platesOperation, {
    walls: [{ name: "ab", length: "28 ft", bolts: [8, 72, 136, 200, 264, 328].map((station) => ({ station })) }],
    stock: [{ length: "16 ft" }, { length: "12 ft" }],
    rule: "us-irc-seismic",
  }).answer!;

  test("boards, sealer and hardware are counted from it", () => {
    const answer = takeoff({ plates, waste: 0 });
    expect(answer.lines.filter(({ item }) => item === "board").map(({ size, quantity }) => [size!.exact, quantity])).toEqual([["192", 1], ["144", 1]]);
    expect(lineOf(answer, "sill-sealer")!.needed).toBeCloseTo(28 / 50, 12);
    expect(lineOf(answer, "nut")!.quantity).toBe(7); // six bolts and the added anchor
    expect(lineOf(answer, "threaded-rod")!.quantity).toBe(1);
    expect(lineOf(answer, "washer")).toBeUndefined(); // the seismic rule states plate washers
    expect(lineOf(answer, "plate-washer")!.quantity).toBe(7);
  });

  test("it may come as it was answered, with waste beside its fields", () => {
    expect(takeoff({ ...plates, waste: 0 })).toEqual(takeoff({ plates, waste: 0 }));
    expect(takeoff(JSON.parse(JSON.stringify({ ...plates, waste: 10 })))).toEqual(takeoff({ plates, waste: 10 }));
  });
});

test("waste adds spare boards of the longest kind, since those can stand in for any", () => {
  const answer = takeoff({ lumber: [{ length: "8 ft", count: 5 }, { length: "16 ft", count: 12 }], waste: 10 });
  expect(answer.lines.filter(({ item }) => item === "board").map(({ size, quantity }) => [size!.exact, quantity])).toEqual([["192", 14], ["96", 5]]); // 17 × 0.1, rounded up
});

test("waste that comes out whole adds no more than that", () => {
  expect(lineOf(takeoff({ lumber, bolts: 100, waste: 10 }), "nut")!.quantity).toBe(110); // 100 × 1.1 is 110.00000000000001 in doubles
});

test("what is not used is not listed", () => {
  expect(takeoff({ lumber }).lines.map(({ item }) => item)).toEqual(["board", "sill-sealer", "preservative"]);
});

test("the longest board's weight tells what two have to carry", () => {
  // 16 ft 2x6: 1.5 × 5.5 × 192 / 1728 = 0.91667 ft³ × 49 lb = 44.9 lb; domain.md says 40 to 50 (customary)
  const { totals } = takeoff({ lumber });
  expect(totals.heaviestPounds).toBeCloseTo(44.9167, 3);
  expect(totals.heaviestKilograms).toBeCloseTo(44.9167 * 0.45359237, 3);
  expect(totals.boardFeet).toBeCloseTo(192, 9); // 12 × 16 ft of 2x6 is 192 board feet
});

test.each([
  ["nothing to order for", {}, "/lumber plates-or-lumber"],
  ["half a plates answer", { boards: [] }, "/pieces required"],
  ["a waste over 100", { lumber, waste: 101 }, "/waste too-big"],
  ["a board of no length", { lumber: [{ length: "0", count: 1 }] }, "/lumber/0/length zero"],
])("%s is told", (_what, request, told) => {
  expect(answerTo(takeoffOperation, request).issues.map(({ pointer, code }) => `${pointer} ${code}`)).toContain(told);
});

describe("the list as CSV", () => {
  test.each(["=1+1", "+1", "-1", "@SUM(A1)", "\t=1", "\r=1", "\n=1", " =1+1", "＝1+1", "＋1", "－1", "＠A1", "−1", "\u00a0=1"])("a text such as %j is no formula in a spreadsheet", (text) => {
    const [written] = parse(toCsv([[text]]))[0]!;
    expect(written).toBe(`'${text}`);
  });

  test("numbers stay numbers, negative ones too, and nothing is an empty cell", () => {
    expect(toCsv([[-3, 2.5, null, NaN]])).toBe("-3,2.5,,\r\n");
  });

  test("whatever is written is read back the same, save for the apostrophe", () => {
    fc.assert(
      fc.property(fc.array(fc.array(fc.string({ unit: "binary", maxLength: 12 }), { minLength: 1, maxLength: 4 }), { minLength: 1, maxLength: 4 }), (rows) => {
        const back = parse(toCsv(rows));
        expect(back.map((row) => row.map((cell, index) => (index >= 0 ? cell.replace(/^'/, "") : cell)))).toEqual(rows.map((row) => row.map((cell) => cell.replace(/^'/, ""))));
        for (const cell of back.flat()) expect(cell).not.toMatch(/^\s*[=+\-@＝＋－＠]/);
      }),
      { numRuns: runs(300), seed: 20260801 },
    );
  });
});

/** A reader of RFC 4180, one character at a time. */
function parse(text: string): string[][] {
  const rows: string[][] = [[]];
  let cell = "";
  let quoted = false;
  for (let at = 0; at < text.length; at += 1) {
    const character = text[at]!;
    if (quoted) {
      if (character !== '"') cell += character;
      else if (text[at + 1] === '"') {
        cell += '"';
        at += 1;
      } else quoted = false;
    } else if (character === '"' && cell === "") quoted = true;
    else if (character === ",") {
      rows.at(-1)!.push(cell);
      cell = "";
    } else if (character === "\r" && text[at + 1] === "\n") {
      rows.at(-1)!.push(cell);
      cell = "";
      rows.push([]);
      at += 1;
    } else cell += character;
  }
  return rows.slice(0, -1);
}
