import { describe, expect, test } from "vitest";
import { parseLength } from "@/calculators/length";
import { endMinimumFor, listRules, notStatedBy, publishedRuleTexts, ruleIds, ruleOf, rulesAnswer, spacingFor } from "@/calculators/rules";
import { checkOperation } from "@/calculators/anchors";
import { answerTo } from "@/calculators/schema";
import { ruleRows } from "@/tests/reference/rules-rows";

describe("published rules", () => {
  test.each(ruleRows)("$id holds in $rule for a $diameter bolt", ({ rule: id, diameter: text, ...row }) => {
    const rule = ruleOf(id);
    const diameter = parseLength(text);
    if ("endMinimum" in row) expect(endMinimumFor(rule, diameter)?.toString()).toBe(row.endMinimum);
    if ("endMaximum" in row) expect(rule.endMaximum.value?.toString()).toBe(row.endMaximum);
    if ("spacing" in row) expect(spacingFor(rule, diameter)?.value.toString()).toBe(row.spacing);
  });

  test("Canadian figures stay exact in millimetres (B28, B29)", () => {
    expect(ruleOf("ca-nbc").embedment.value?.in("mm").toString()).toBe("100");
    expect(ruleOf("ca-nbc-braced").foundationEndMaximum.value?.in("mm").toString()).toBe("500");
  });

  test("plate washers are those of the quotation (B22), and only of the seismic rules", () => {
    expect(publishedRuleTexts["us-irc-seismic"].washer).toMatchObject({ size: "3 in", thickness: "0.229 in", slotLength: "1 3/4 in", slotOver: "3/16 in" });
    expect(ruleIds.filter((id) => ruleOf(id).washer.size !== null)).toEqual(["us-irc-seismic", "us-irc-seismic-3-storey"]); // domain.md 12, row 11
  });

  test("a figure that its source does not state is null and told, never borrowed", () => {
    expect(notStatedBy(ruleOf("us-irc"))).toEqual(["edgeCover", "washer"]);
    expect(notStatedBy(ruleOf("ibc"))).toEqual(["middleThird", "edgeCover", "washer"]);
    expect(notStatedBy(ruleOf("ca-nbc"))).toEqual(["endMinimum", "endMaximum", "boltsPerPiece", "middleThird", "edgeCover", "washer"]);
  });

  test("every stated figure has its clause, source and status", () => {
    for (const rule of Object.values(publishedRuleTexts)) {
      for (const [name, figure] of Object.entries(rule)) {
        if (figure === null || typeof figure !== "object" || Array.isArray(figure)) continue;
        const { clause, source, status, ...values } = figure as Record<string, unknown>;
        const isStated = Object.values(values).some((value) => value !== null);
        expect([clause !== null, source !== null, status !== null], `${rule.id} ${name}`).toEqual([isStated, isStated, isStated]);
      }
    }
  });

  test("what GET /rules lists has the documented shape, and each item is accepted back as a rule", () => {
    const { items } = rulesAnswer.parse(listRules());
    expect(items.map(({ id }) => id)).toEqual([...ruleIds]);
    for (const rule of items) {
      const request = { pieces: [{ from: "0", to: "8 ft" }], bolts: [{ station: "12" }, { station: "84" }] };
      expect(answerTo(checkOperation, { ...request, rule })).toEqual(answerTo(checkOperation, { ...request, rule: rule.id }));
    }
  });

  test("a rule of one's own may state one figure, and its faults are told at their place", () => {
    const request = (rule: unknown) => ({ pieces: [{ from: "0", to: "8 ft" }], bolts: [{ station: "12" }, { station: "61" }], rule });
    expect(answerTo(checkOperation, request({ spacing: { value: "4 ft" } })).answer).toMatchObject({ ok: false, findings: [{ code: "spacing", limit: { exact: "48" } }] });
    expect(answerTo(checkOperation, request({ spacing: { value: "4 fx" }, colour: 1 })).issues.map(({ pointer, code }) => `${pointer} ${code}`)).toEqual(["/rule/spacing/value unexpected-text", "/rule/colour unknown-field"]);
    expect(answerTo(checkOperation, request("uk")).issues).toEqual([{ pointer: "/rule", code: "expected-rule", params: {} }]);
  });
});
