"use client";

import { LengthField } from "@/components/length-field/length-field";
import { Disclosure } from "@/components/ui/disclosure";
import { Segmented } from "@/components/ui/segmented";
import { TextField } from "@/components/ui/text-field";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { SquarenessForm } from "./squareness-inputs";

const figures = ["nominalLength", "trueLength", "temperature", "standardTemperature", "pull", "standardPull", "section", "weight", "span"] as const;

/** Optional: what is known of a steel tape. Each correction needs its own fields and is left out without them. */
export function TapeInputs({ form }: { form: SquarenessForm }) {
  const t = useTranslate();
  const system = form.value("tape.system") || (form.unit === "mm" ? "metric" : "imperial");
  const length = (name: "nominalLength" | "trueLength" | "span") => <LengthField {...form.field(`tape.${name}`)} label={t(`squareness.tape.${name}`)} hint={t.has(`squareness.tape.${name}Hint`) ? t(`squareness.tape.${name}Hint`) : undefined} />;
  const number = (name: "temperature" | "standardTemperature" | "pull" | "standardPull" | "section" | "weight", kind: string) => (
    <TextField
      name={`tape.${name}`}
      label={t(`squareness.tape.${name}`)}
      hint={t.has(`squareness.tape.${name}Hint`) ? t(`squareness.tape.${name}Hint`, { system }) : undefined}
      value={form.value(`tape.${name}`)}
      onChange={(text) => form.set(`tape.${name}`, text)}
      suffix={t(`squareness.tape.unit.${kind}`, { system })}
      error={form.errorAt(`tape.${name}`)}
    />
  );
  return (
    <Disclosure summary={t("squareness.tape.title")} id="tape" open={figures.some((name) => form.value(`tape.${name}`) !== "")}>
      <p>{t("squareness.tape.intro")}</p>
      <div className="field">
        <Segmented
          name="tape.system"
          legend={t("squareness.tape.system")}
          value={system}
          onChange={(value) => form.set("tape.system", value)}
          options={[
            { value: "imperial", label: t("squareness.tape.imperial") },
            { value: "metric", label: t("squareness.tape.metric") },
          ]}
        />
      </div>
      {length("nominalLength")}
      {length("trueLength")}
      {number("temperature", "degrees")}
      {number("standardTemperature", "degrees")}
      {number("pull", "force")}
      {number("standardPull", "force")}
      {number("section", "area")}
      {number("weight", "weight")}
      {length("span")}
    </Disclosure>
  );
}
