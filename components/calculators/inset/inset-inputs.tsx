"use client";

import type { insetAnswer, InsetAnswer } from "@/calculators/inset";
import { LengthField } from "@/components/length-field/length-field";
import { CheckRow } from "@/components/ui/check-row";
import { Disclosure } from "@/components/ui/disclosure";
import { LengthText } from "@/components/ui/length-text";
import { Segmented } from "@/components/ui/segmented";
import { fieldId } from "@/lib/client/calculator/field-id";
import type { useCalculator } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { BurnChoice } from "./burn-choice";
import { presets, sides, type Side } from "./inset-fields";

export type InsetForm = ReturnType<typeof useCalculator<typeof insetAnswer>>;

/** What is typed: the slab, the inset, and the readings on concrete and chalk. */
export function InsetInputs({ form, answer }: { form: InsetForm; answer: InsetAnswer | null }) {
  const t = useTranslate();
  const hasChalk = sides.some((side) => form.value(`chalkLines.${side}`) !== "");
  const burn = form.value("burn");
  return (
    <>
      <LengthField {...form.field("length")} label={t("inset.fields.length")} hint={t("inset.fields.onConcrete")} />
      <LengthField {...form.field("width")} label={t("inset.fields.width")} hint={t("inset.fields.onConcrete")} />
      <Thickness form={form} />
      <Disclosure summary={t("inset.fields.eachTitle")} id="each" open={sides.some((side) => ownInset(form, side) !== "") || form.value("veneer") !== ""}>
        <p>{t("inset.fields.eachHint")}</p>
        {sides.map((side) => (
          <LengthField key={side} {...form.field(`each.${side}`)} id={fieldId(`inset.${side}`)} value={ownInset(form, side)} onChange={(text) => form.change({ [`each.${side}`]: text, [`inset.${side}`]: "" })} error={form.errorAt(`inset.${side}`)} label={t("inset.fields.each", { side: t(`inset.side.${side}`) })} />
        ))}
        <LengthField {...form.field("veneer")} label={t("inset.fields.veneer")} hint={t("inset.fields.veneerHint")} />
        <fieldset className="inset-veneer">
          <legend className="field-label">{t("inset.fields.veneerOn")}</legend>
          {sides.map((side) => (
            <CheckRow key={side} name={`veneerOn.${side}`} checked={form.value(`veneerOn.${side}`) === "true"} onChange={(on) => form.set(`veneerOn.${side}`, on ? "true" : "")}>
              {t(`inset.side.${side}`)}
            </CheckRow>
          ))}
        </fieldset>
      </Disclosure>
      <h2 className="inset-part">{t("inset.fields.slabTitle")}</h2>
      <BurnChoice value={burn} onChange={(value) => form.set("burn", value)} unit={form.unit} />
      <LengthField {...form.field("slabDiagonals.ac")} label={t("inset.fields.slabAc")} hint={t("inset.fields.asRead")} dot={1} burn={burn} blade />
      <LengthField {...form.field("slabDiagonals.bd")} label={t("inset.fields.slabBd")} hint={t("inset.fields.asRead")} dot={2} burn={burn} blade />
      <h2 className="inset-part">{t("inset.fields.chalkTitle")}</h2>
      <LengthField {...form.field("chalkDiagonals.ac")} label={t("inset.fields.chalkAc")} hint={t("inset.fields.asRead")} dot={1} burn={burn} blade />
      <LengthField {...form.field("chalkDiagonals.bd")} label={t("inset.fields.chalkBd")} hint={t("inset.fields.asRead")} dot={2} burn={burn} blade />
      <Disclosure summary={t("inset.fields.chalkLines")} id="chalk-lines" open={hasChalk || answer?.ask === "chalk-lines"}>
        <p>{t("inset.fields.chalkLinesHint")}</p>
        {sides.map((side) => (
          <LengthField key={side} {...form.field(`chalkLines.${side}`)} label={t("inset.fields.chalkLine", { side: t(`inset.side.${side}`) })} hint={t("inset.fields.asRead")} burn={burn} />
        ))}
        <LengthField {...form.field("readingError")} label={t("inset.fields.readingError")} hint={t("inset.fields.readingErrorHint", { length: form.unit === "mm" ? "3 mm" : '1/8"' })} />
      </Disclosure>
    </>
  );
}

/** A side's own inset, typed here or sent in the API's own name. */
function ownInset(form: InsetForm, side: Side): string {
  return form.value(`each.${side}`) || form.value(`inset.${side}`);
}

/** The thickness as text, and four labels that fill it. Without script the label chosen counts while the text is blank. */
function Thickness({ form }: { form: InsetForm }) {
  const t = useTranslate();
  const typed = form.value("inset").trim();
  const fromAddress = sides.some((side) => form.value(`inset.${side}`) !== "");
  const set = (text: string) => {
    const own = fromAddress ? Object.fromEntries(sides.flatMap((side) => [[`each.${side}`, ownInset(form, side)], [`inset.${side}`, ""]])) : {};
    form.change({ ...own, preset: "", inset: text });
  };
  const chosen = typed === "" ? form.value("preset") : (presets.find((preset) => preset === typed || preset === `${typed} in`) ?? "");
  return (
    <>
      <LengthField {...form.field("inset")} onChange={set} label={t("inset.fields.inset")} hint={t("inset.fields.insetHint")} />
      <Segmented name="preset" legend={t("inset.fields.preset")} legendIs="hidden" value={chosen} onChange={set} options={presets.map((preset) => ({ value: preset, label: <LengthText text={preset.replace(" in", '"')} />, spoken: preset }))} />
      <p className="field-hint inset-preset-hint">{t("inset.fields.presetHint")}</p>
    </>
  );
}
