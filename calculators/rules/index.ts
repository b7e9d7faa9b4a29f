import { publishedRuleTexts } from "./published-rules";
import { ruleIds } from "./rule";

export { figureStatuses, ruleAnswer, ruleIds, ruleInput, rulesAnswer, type FigureStatus, type RuleId, type RuleText } from "./rule";
export { publishedRuleTexts } from "./published-rules";
export { endMinimumFor, figureNames, isThickEnough, notStatedBy, ruleField, ruleOf, spacingFor, type FigureName, type Rule } from "./settled-rule";

/** What GET /rules answers: every published rule, in the order people look for them. */
export function listRules() {
  return { items: ruleIds.map((id) => publishedRuleTexts[id]) };
}
