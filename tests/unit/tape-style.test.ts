import fc from "fast-check";
import { expect, test } from "vitest";
import { Length, printLength } from "@/calculators/length";
import { countsInches, inInches } from "@/components/length-field/tape-style";

test("a printed length is shown as a tape that counts inches shows it, whatever the length", () => {
  fc.assert(
    fc.property(fc.integer({ min: -50000, max: 500000 }), (sixteenths) => {
      const length = Length.from(sixteenths / 16);
      expect(inInches(printLength(length, "1/16"))).toBe(printLength(length, "1/16", "inches")); // the length core's own style
    }),
  );
  expect(inInches("8725 mm")).toBe("8725 mm");
});

test.each([["428 9/16", true], ["428", true], ['428"', true], ["35' 8 9/16\"", false], ["35 ft 8", false], ["35 pies", false], ["10868 mm", false], ["", false]])("%s counts inches: %s", (typed, counts) => {
  expect(countsInches(typed)).toBe(counts);
});
