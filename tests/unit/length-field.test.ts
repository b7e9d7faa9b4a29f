import fc from "fast-check";
import { describe, expect, test } from "vitest";
import * as core from "@/lib/client/core/length";
import { bladeEnd, bladeReading, bladeStart, bladeTicks, nudged, writtenLike } from "@/components/length-field/blade-scale";
import { echoOf } from "@/components/length-field/echo";
import { insertMark, type Mark } from "@/components/length-field/insert-mark";
import { parseLength, precisions } from "@/calculators/length";

/** `|` is the caret, `[…]` a selection. */
function press(written: string, mark: Mark): string {
  const start = written.includes("[") ? written.indexOf("[") : written.indexOf("|");
  const end = written.includes("]") ? written.indexOf("]") - 1 : start;
  const { text, caret } = insertMark(written.replace(/[[\]|]/g, ""), start, end, mark);
  return `${text.slice(0, caret)}|${text.slice(caret)}`;
}

describe("the slim row", () => {
  test.each([
    ["28|", "feet", "28' |"],
    ["28 |", "feet", "28' |"], // the thumb's own space is the one that is meant
    ["28| 7", "feet", "28' |7"],
    ["28' 7|", "inches", `28' 7"|`],
    ["28' 7 1|", "slash", "28' 7 1/|"],
    ["28' 7 1 |", "slash", "28' 7 1/|"],
    ["|", "space", "|"],
    ["7|", "space", "7 |"],
    ["7 |", "space", "7 |"],
    ["28' [7]1/2", "space", "28' |1/2"],
    ["2[8 7]", "slash", "2/|"],
  ] as const)("%s and %s gives %s", (before, mark, after) => expect(press(before, mark)).toBe(after));

  test("types a whole length by thumb", () => {
    let typed = { text: "", caret: 0 };
    const digits = (text: string) => (typed = { text: typed.text.slice(0, typed.caret) + text + typed.text.slice(typed.caret), caret: typed.caret + text.length });
    const mark = (name: Mark) => (typed = insertMark(typed.text, typed.caret, typed.caret, name));
    digits("28");
    mark("feet");
    digits("7");
    mark("space");
    digits("1");
    mark("slash");
    digits("2");
    mark("inches");
    expect(typed.text).toBe(`28' 7 1/2"`);
    expect(parseLength(typed.text).toString()).toBe("687/2");
  });

  test("never moves the caret out of the text", () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 20 }), fc.nat(20), fc.nat(20), fc.constantFrom<Mark>("feet", "inches", "slash", "space"), (text, one, other, mark) => {
        const [start, end] = [Math.min(one, other, text.length), Math.min(Math.max(one, other), text.length)];
        const typed = insertMark(text, start, end, mark);
        expect(typed.caret).toBeGreaterThanOrEqual(0);
        expect(typed.caret).toBeLessThanOrEqual(typed.text.length);
      }),
    );
  });
});

describe("the echo", () => {
  test.each([
    ["113", "in", undefined, { kind: "plain", text: `9' 5"` }], // so that 113 cannot pass for 11 ft 3
    [`28' 0"`, "in", undefined, { kind: "inches", text: "336" }],
    ["28 ft 7 1/2 in", "in", undefined, { kind: "inches", text: "343 1/2" }],
    ["428 9/16", "in", "1 in", { kind: "actual", text: `35' 7 9/16"` }], // the screen phone-square.png
    ["428 9/16", "in", "0", { kind: "plain", text: `35' 8 9/16"` }],
    ["8724.9 mm", "in", undefined, { kind: "plain", text: `28' 7 1/2"` }], // U rows of domain.md
    ["8724.9", "mm", undefined, { kind: "plain", text: "8.7249 m" }],
    [`28' 7 1/2"`, "mm", undefined, { kind: "plain", text: "8725 mm" }],
    ["28 7", "in", undefined, null],
    ["28' 7/", "in", undefined, null],
  ] as const)("of %s in a field of %s, burned %s, says %j", (text, unit, burn, echo) => {
    expect(echoOf(core, text, unit, unit === "mm" ? "1mm" : "1/16", burn)).toEqual(echo);
  });
});

describe("the blade", () => {
  test.each(precisions)("at %s has its two labelled graduations where their figures stand", (precision) => {
    const whole = bladeTicks(precision).filter((tick) => tick.whole);
    expect(whole.map((tick) => tick.x)).toEqual([bladeStart, bladeEnd]);
  });

  test("marks 428 9/16 nine graduations past 428", () => {
    const reading = bladeReading(core, "428 9/16", "in", "1/16")!;
    expect(reading.labels).toEqual(["428", "429"]);
    expect(reading.x).toBeCloseTo(bladeStart + ((bladeEnd - bladeStart) * 9) / 16, 2);
  });

  test("shows the centimeter a metric reading stands in", () => expect(bladeReading(core, "8534", "mm", "1mm")!.labels).toEqual(["8530", "8540"]));

  test.each([
    ["428 9/16", 1, "1/16", "428 5/8"],
    ["428 9/16", -1, "1/16", "428 1/2"],
    ["428 19/32", 1, "1/16", "428 5/8"], // from between two graduations to the nearer one that way
    ["428 19/32", -1, "1/16", "428 9/16"],
    [`35' 11 15/16"`, 1, "1/16", `36' 0"`],
    [`428"`, 1, "1/16", `428 1/16"`],
    ["0", -1, "1/16", "0"],
  ] as const)("nudges %s by %i at %s to %s", (text, by, precision, wanted) => {
    const reading = bladeReading(core, text, "in", precision)!;
    expect(writtenLike(core, text, nudged(core, reading.length, precision, by), "in", precision)).toBe(wanted);
  });

  test.each([
    ["8534", "mm", "8535"],
    ["8534 mm", "in", "8535 mm"],
  ] as const)("nudges the metric %s in a field of %s to %s", (text, unit, wanted) => {
    const reading = bladeReading(core, text, unit, "1mm")!;
    expect(writtenLike(core, text, nudged(core, reading.length, "1mm", 1), unit, "1mm")).toBe(wanted);
  });

  test("what it writes reads back as what was tapped", () => {
    fc.assert(
      fc.property(fc.constantFrom("28'", "336", `336"`, "8534 mm", "7 ft 3 in"), fc.constantFrom(...precisions), fc.integer({ min: -40, max: 40 }), (text, precision, by) => {
        const unit = precision.endsWith("mm") ? "mm" : "in";
        const next = nudged(core, parseLength(text, unit), precision, by);
        expect(parseLength(writtenLike(core, text, next, unit, precision), unit).equals(next)).toBe(true);
      }),
    );
  });
});
