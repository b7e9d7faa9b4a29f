import { z } from "zod";
import type { Length } from "../length";
import { calculatorInput } from "../schema";
import { publishedRuleTexts } from "./published-rules";
import { ruleIds, ruleInput, type RuleId } from "./rule";

const settling = calculatorInput({ rule: ruleInput });

/** A rule with every length exact. */
export type Rule = z.output<typeof settling>["rule"];

/** A request's `rule`: the id of a published one, or a rule of one's own. */
export const ruleField = z
  .union([z.enum(ruleIds), ruleInput], { error: (issue) => (issue.input === undefined ? "required" : "expected-rule") })
  .default("us-irc")
  .meta({ description: "A published rule by id, or a rule of one's own shaped as GET /rules returns them", examples: ["us-irc"] });

const settled = new Map<RuleId, Rule>(ruleIds.map((id) => [id, settling.parse({ rule: publishedRuleTexts[id] }).rule]));

/** The rule meant: published rules are read once, lengths exact. */
export function ruleOf(rule: RuleId | Rule): Rule {
  return typeof rule === "string" ? settled.get(rule)! : rule;
}

/**
 * A bolt's nominal diameter suffices when it is short by less than half the last digit of a metric figure: a 5/8 in bolt
 * (15.875 mm) is the 15.9 mm bolt of the Canadian code.
 */
export function isThickEnough(diameter: Length, least: Length): boolean {
  return diameter.in("mm").sub(least.in("mm")).valueOf() > -0.05;
}

/** The spacing that holds for bolts of this diameter, null when the rule states none. */
export function spacingFor(rule: Rule, diameter: Length) {
  const { spacing, spacingOfThicker: thicker } = rule;
  if (thicker.diameter !== null && thicker.value !== null && isThickEnough(diameter, thicker.diameter)) return { ...thicker, value: thicker.value };
  return spacing.value === null ? null : { ...spacing, value: spacing.value };
}

/** Least distance from a piece's end for bolts of this diameter: a length, or so many diameters; the larger where both are stated. */
export function endMinimumFor(rule: Rule, diameter: Length): Length | null {
  const { value, diameters } = rule.endMinimum;
  const byDiameters = diameters === null ? null : diameter.times(diameters);
  if (value === null || byDiameters === null) return value ?? byDiameters;
  return value.compare(byDiameters) > 0 ? value : byDiameters;
}

/** The figures that a rule may be silent on, by name. */
export const figureNames = ["diameter", "spacing", "endMinimum", "endMaximum", "boltsPerPiece", "embedment", "middleThird", "edgeCover", "washer"] as const;
export type FigureName = (typeof figureNames)[number];

/** What this rule does not state. */
export function notStatedBy(rule: Rule): FigureName[] {
  return figureNames.filter((name) => {
    if (name === "washer") return rule.washer.size === null;
    if (name === "endMinimum") return rule.endMinimum.value === null && rule.endMinimum.diameters === null;
    return rule[name].value === null;
  });
}
