"use client";

import { publishedRuleTexts } from "@/calculators/rules/published-rules";
import { LengthField } from "@/components/length-field/length-field";
import { CheckRow } from "@/components/ui/check-row";
import { Disclosure } from "@/components/ui/disclosure";
import { Select } from "@/components/ui/select";
import { TextField } from "@/components/ui/text-field";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { PlanForm } from "../plan/inset-inputs";
import { ownFigures } from "./anchors-fields";
import { RuleTable } from "./rule-table";

const ids = Object.keys(publishedRuleTexts) as (keyof typeof publishedRuleTexts)[];

/** A form with a `rule`, published or `own.*`; its texts are those of the bolts' page. */
export type RuleForm = Omit<PlanForm, "rows" | "removeRow" | "unit"> & { fields: Readonly<Record<string, string>> };

/** The rule to judge by: a published one with each figure's clause and status, or figures from one's own drawings. */
export function RuleChoice({ form }: { form: RuleForm }) {
  const t = useTranslate();
  const isOwn = form.value("rule") === "own" || Object.keys(form.fields).some((name) => name.startsWith("rule."));
  const id = ids.find((known) => known === form.value("rule")) ?? "us-irc";
  const own = (name: string) => form.value(`own.${name}`) || form.value(`rule.${name}.value`);
  const setOwn = (name: string, value: string) => form.change({ rule: "own", [`own.${name}`]: value, [`rule.${name}.value`]: "" });
  const ownName = (name: string) => `rule.${name}.value`;
  return (
    <>
      <Select
        name="rule"
        label={t("anchors.rule.label")}
        hint={t("anchors.rule.hint")}
        value={isOwn ? "own" : id}
        onChange={(value) => form.set("rule", value)}
        error={form.errorAt("rule")}
        options={[...ids.map((value) => ({ value, label: t(`anchors.rule.name.${value}`) })), { value: "own", label: t("anchors.rule.own") }]}
      />
      {isOwn ? (
        <Disclosure summary={t("anchors.rule.ownTitle")} open id="own-rule">
          <p>{t("anchors.rule.ownHint")}</p>
          {ownFigures.map((name) => (
            <LengthField key={name} {...form.field(`own.${name}`)} id={fieldId(ownName(name))} value={own(name)} onChange={(text) => setOwn(name, text)} error={form.errorAt(ownName(name))} label={t(`anchors.figure.${name}`)} />
          ))}
          <TextField name="own.boltsPerPiece" id={fieldId(ownName("boltsPerPiece"))} label={t("anchors.figure.boltsPerPiece")} inputMode="numeric" value={own("boltsPerPiece")} onChange={(text) => setOwn("boltsPerPiece", text)} error={form.errorAt(ownName("boltsPerPiece"))} />
          <CheckRow name="own.middleThird" checked={own("middleThird") === "true"} onChange={(on) => setOwn("middleThird", on ? "true" : "")}>
            {t("anchors.figure.middleThird")}
          </CheckRow>
        </Disclosure>
      ) : (
        <Disclosure summary={t("anchors.rule.says")} id="rule-figures">
          <RuleTable rule={publishedRuleTexts[id]} />
        </Disclosure>
      )}
    </>
  );
}
