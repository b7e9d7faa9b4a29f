import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { squarenessOperation, type SquarenessAnswer } from "@/calculators/squareness";
import { digitSlips } from "@/calculators/squareness/blunders/digit-slips";
import { Length } from "@/calculators/length";
import { answerTo } from "@/calculators/schema";
import { names, type Name, type SixReadings } from "@/tests/reference/squareness-judge";

const asked = (request: object) => answerTo(squarenessOperation, request);
const ask = (request: object): SquarenessAnswer => {
  const { answer, issues } = asked(request);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return answer as SquarenessAnswer;
};
const request = ({ ac, bd, ...sides }: SixReadings, more: object = {}) => ({ sides, diagonals: { ac, bd }, ...more });

/** A slab up to 2 1/2 to 1 and its six readings, burned, to 1/64 in: what a careful person reads. */
const slabs = fc
  .record({
    length: fc.integer({ min: 240, max: 720 }),
    slender: fc.double({ min: 0.4, max: 2.5, noNaN: true }),
    out: fc.array(fc.double({ min: -1.5, max: 1.5, noNaN: true }), { minLength: 4, maxLength: 4 }),
    burn: fc.constantFrom(1, 12, 100 / 25.4),
  })
  .map(({ length, slender, out, burn }) => {
    const width = length * slender;
    const points = [[0, 0], [length, 0], [length + out[0]!, width + out[1]!], [out[2]!, width + out[3]!]] as const;
    const ends = { ab: [0, 1], bc: [1, 2], cd: [2, 3], da: [3, 0], ac: [0, 2], bd: [1, 3] } as const;
    const read = (name: Name) => Math.round((Math.hypot(points[ends[name][0]]![0] - points[ends[name][1]]![0], points[ends[name][0]]![1] - points[ends[name][1]]![1]) + burn) * 64) / 64;
    return { burn, readings: Object.fromEntries(names.map((name) => [name, read(name)])) as SixReadings };
  });
const everyReading = fc.constantFrom(...names);

const opposite: Record<Name, Name> = { ab: "cd", bc: "da", cd: "ab", da: "bc", ac: "bd", bd: "ac" };

/** Asks with one reading spoiled, and expects it among the named with what it was. */
function expectNamed(six: SixReadings, burn: number, name: Name, spoiled: number, likely: readonly string[]) {
  const { answer, issues } = asked(request({ ...six, [name]: spoiled }, { burn }));
  if (answer === null) {
    // A slip of hundreds of inches may leave no slab at all: then it is refused at a diagonal, never answered.
    expect(issues.every(({ pointer, code }) => /^\/diagonals\//.test(pointer) && /impossible|cross/.test(code))).toBe(true);
    return null;
  }
  const found = answer.suspects.find(({ reading }) => reading === name);
  expect(found, `${name} among ${JSON.stringify(answer.suspects.map(({ reading }) => reading))}`).toBeDefined();
  expect(found!.changeIn).toBeCloseTo(six[name] - spoiled, 0);
  expect(likely).toContain(found!.likely);
  return answer;
}

describe("one blunder in six readings", () => {
  test("a missed burn, in each reading in turn, is among the named", () => {
    fc.assert(fc.property(slabs, everyReading, ({ readings, burn }, name) => void expectNamed(readings, burn, name, readings[name] - burn, ["burn-missed", "foot-misread", "digits-swapped", "six-for-nine"])), { numRuns: 300 });
  });

  test("a burn taken twice is among the named", () => {
    fc.assert(fc.property(slabs, everyReading, ({ readings, burn }, name) => void expectNamed(readings, burn, name, readings[name] + burn, ["burn-twice", "foot-misread", "digits-swapped", "six-for-nine"])), { numRuns: 300 });
  });

  test("a burn held though none was told is among the named", () => {
    fc.assert(
      fc.property(slabs, everyReading, ({ readings, burn }, name) => {
        const unburned = Object.fromEntries(names.map((other) => [other, readings[other] - burn])) as SixReadings;
        expectNamed(unburned, 0, name, unburned[name] + 1, ["burn-unsaid", "digits-swapped", "six-for-nine"]);
      }),
      { numRuns: 200 },
    );
  });

  test("a foot misread either way is among the named", () => {
    fc.assert(fc.property(slabs, everyReading, fc.constantFrom(12, -12), ({ readings, burn }, name, foot) => void expectNamed(readings, burn, name, readings[name] + foot, ["foot-misread", "burn-missed", "burn-twice", "digits-swapped", "six-for-nine"])), { numRuns: 300 });
  });

  test("a 6 for a 9 and two digits swapped, in inches or in feet and inches, are among the named", () => {
    fc.assert(
      fc.property(slabs, everyReading, fc.nat(), ({ readings, burn }, name, pick) => {
        const slips = wrongReadings(readings[name]).filter((spoiled) => Math.abs(spoiled - readings[name]) >= 1);
        if (slips.length === 0) return;
        expectNamed(readings, burn, name, slips[pick % slips.length]!, ["digits-swapped", "six-for-nine", "burn-missed", "burn-twice", "foot-misread"]);
      }),
      { numRuns: 400 },
    );
  });

  test("the other reading that fits as well is named too, and a pull that parts the two", () => {
    fc.assert(
      fc.property(slabs, everyReading, ({ readings, burn }, name) => {
        const burned = Object.fromEntries(names.map((other) => [other, readings[other] - burn + 1])) as SixReadings;
        const answer = expectNamed(burned, 1, name, burned[name] - 1, ["burn-missed", "digits-swapped", "six-for-nine"]);
        if (answer === null) return;
        expect(answer.suspects.map(({ reading }) => reading)).toContain(opposite[name]);
        expect(answer.separatingPull).not.toBeNull();
      }),
      { numRuns: 100 },
    );
  });

  test("readings that close name nobody", () => {
    fc.assert(fc.property(slabs, ({ readings, burn }) => void expect(ask(request(readings, { burn })).suspects).toEqual([])), { numRuns: 100 });
  });
});

/** Every reading that a slip makes of the true one: written here on text, the core works on numbers. */
function wrongReadings(truth: number): number[] {
  const whole = Math.floor(truth);
  const rest = truth - whole;
  const [feet, inches] = [Math.floor(whole / 12), whole % 12];
  const slipped = (digits: string): string[] => {
    const turned = [...digits].flatMap((digit, at) => (digit === "6" || digit === "9" ? [digits.slice(0, at) + (digit === "6" ? "9" : "6") + digits.slice(at + 1)] : []));
    const swapped = [...digits].slice(1).map((digit, at) => digits.slice(0, at) + digit + digits[at]! + digits.slice(at + 2));
    return [...turned, ...swapped].filter((text) => text !== digits && !(text.length > 1 && text.startsWith("0")));
  };
  return [
    ...slipped(String(whole)).map((text) => Number(text) + rest),
    ...slipped(String(feet)).map((text) => Number(text) * 12 + inches + rest),
    ...slipped(String(inches)).filter((text) => Number(text) < 12).map((text) => feet * 12 + Number(text) + rest),
  ];
}

describe("slips of digits", () => {
  test("443 5/16 may have been 434, 344 or 449's kin; 36' 11\" has its own", () => {
    const of = (inches: number) => digitSlips(Length.from(inches), false).map(({ inches: by }) => inches + by).sort((a, b) => a - b);
    expect(of(443.3125)).toEqual([344.3125, 434.3125, 443.3125 + 24 * 12 + 36, 443.3125 + 36].sort((a, b) => a - b)); // 36' to 63' and 39'
    expect(of(446)).toEqual([449, 464, 644, 446 + 12 * (73 - 37)].sort((a, b) => a - b)); // 37' 2"
  });

  test("a metric tape's digits are its millimetres", () => {
    expect(digitSlips(Length.from(8624, "mm"), true).map(({ inches }) => Math.round(8624 + inches * 25.4)).sort((a, b) => a - b)).toEqual([2684, 4628, 6824, 8264, 8426, 8642, 8924]);
  });
});

describe("two sides", () => {
  const slab = { length: "40 ft", width: "30 ft" };

  test("a missed burn in a diagonal names both, and the pull that parts them", () => {
    const answer = ask({ ...slab, diagonals: { ac: 600, bd: 601 }, burn: 1 });
    expect(answer.verdict).toBe("contradictory");
    expect(answer.suspects.map(({ reading, likely }) => [reading, likely])).toEqual(expect.arrayContaining([["ac", "burn-missed"], ["bd", "burn-missed"]]));
    expect(answer.separatingPull).toMatchObject({ separatesAll: true });
  });

  test("a size mistyped by a foot is among the named", () => {
    expect(ask({ length: "41 ft", width: "30 ft", diagonals: { ac: 600, bd: 600 } }).suspects).toContainEqual(expect.objectContaining({ reading: "ab", likely: "foot-misread" }));
    expect(ask({ length: "40 ft", width: "29 ft", diagonals: { ac: 600, bd: 600 } }).suspects).toContainEqual(expect.objectContaining({ reading: "da", likely: "foot-misread" }));
  });
});

describe("the pull that separates", () => {
  test("a reading that alone is named is pulled again", () => {
    // A 3-4-5 slab of 40 by 30 ft, DA misread by a foot. BC would have to be 348.39 (Ptolemy: 480² + 372·BC = 600²), 0.39 in from a foot.
    const answer = ask({ sides: { ab: 480, bc: 360, cd: 480, da: 372 }, diagonals: { ac: 600, bd: 600 } });
    expect(answer.suspects.map(({ reading, changeIn }) => [reading, Math.round(changeIn * 1e6) / 1e6])).toEqual([["da", -12]]);
    expect(answer.separatingPull).toMatchObject({ kind: "again", from: { corner: "D" }, to: { corner: "A" }, separatesAll: true });
  });

  test("what it must show is what the slab of each blunder shows, and the answers lie further apart than the readings can err", () => {
    fc.assert(
      fc.property(slabs, everyReading, ({ readings, burn }, name) => {
        const { answer } = asked(request({ ...readings, [name]: readings[name] + 12 }, { burn }));
        if (answer === null || !("separatingPull" in answer) || answer.separatingPull === null) return;
        const { expected, separatesAll, from, to, kind } = answer.separatingPull;
        expect(expected.map(({ suspect }) => suspect)).toEqual(answer.suspects.map(({ reading }) => reading));
        if (separatesAll) {
          for (const [index, one] of expected.entries()) for (const other of expected.slice(index + 1)) expect(Math.abs(one.length.in - other.length.in)).toBeGreaterThan(answer.closureLimitIn);
        }
        for (const { length, reading } of expected) expect(reading.in - length.in).toBeCloseTo(burn, 9);
        if (kind === "triangle") {
          const legs = [from.distance!.in, to.distance!.in].sort((a, b) => a - b);
          expect(legs[0]! / 3).toBeCloseTo(legs[1]! / 4, 9);
        }
      }),
      { numRuns: 200 },
    );
  });
});
