import { test } from "vitest";
import { ruleOf, ruleField, listRules, rulesAnswer, notStatedBy } from "@/calculators/rules";
import { calculatorInput, issuesOf } from "@/calculators/schema";
import { z } from "zod";
test("x", () => {
  console.log(ruleOf("us-irc").spacing, ruleOf("ca-nbc").spacing.value!.toString(), notStatedBy(ruleOf("ca-nbc")));
  const s = calculatorInput({ rule: ruleField });
  console.log(s.parse({ rule: { spacing: { value: 48 } } }).rule);
  console.log(s.safeParse({ rule: { spacing: { value: "x7" }, foo: 1 } }).error?.issues.map((i) => JSON.stringify(i)));
  console.log(issuesOf(s.safeParse({ rule: "nope" }).error!), issuesOf(s.safeParse({ rule: { spacing: { value: "x7" }, foo: 1 } }).error!));
  rulesAnswer.parse(listRules());
  console.log(JSON.stringify(z.toJSONSchema(s, { io: "input", target: "openapi-3.0" })).length);
});
