"use client";

import { LengthField } from "@/components/length-field/length-field";
import { Button } from "@/components/ui/button";
import { Disclosure } from "@/components/ui/disclosure";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { PlanForm } from "../plan/inset-inputs";
import { cornersIn, letter, type SlabWay } from "./fit-fields";

const mostCorners = 26;

/** The slab as built: two sides and two diagonals (or four sides), or its corners by their places. */
export function SlabInputs({ form, way }: { form: PlanForm; way: SlabWay }) {
  const t = useTranslate();
  const burn = form.value("burn");
  if (way === "corners") return <CornerRows form={form} />;
  const hasSides = ["ab", "bc", "cd", "da"].some((side) => form.value(`sides.${side}`) !== "");
  return (
    <>
      {hasSides ? null : (
        <>
          <LengthField {...form.field("length")} error={form.errorAt("length") ?? form.errorAt("corners")} label={t("fit.slab.length")} hint={t("fit.slab.outside")} />
          <LengthField {...form.field("width")} label={t("fit.slab.width")} hint={t("fit.slab.outside")} />
        </>
      )}
      <LengthField {...form.field("diagonals.ac")} error={form.errorAt("diagonals.ac") ?? form.errorAt("diagonals")} label={t("fit.slab.ac")} hint={t("fit.slab.asRead")} dot={1} burn={burn} blade />
      <LengthField {...form.field("diagonals.bd")} label={t("fit.slab.bd")} hint={t("fit.slab.asRead")} dot={2} burn={burn} blade />
      <Disclosure summary={t("fit.slab.four")} open={hasSides}>
        <p>{t("fit.slab.fourHint")}</p>
        {["ab", "bc", "cd", "da"].map((side) => (
          <LengthField key={side} {...form.field(`sides.${side}`)} label={t("fit.slab.side", { side: side.toUpperCase().split("").join("-") })} hint={t("fit.slab.asRead")} burn={burn} />
        ))}
      </Disclosure>
    </>
  );
}

function CornerRows({ form }: { form: PlanForm }) {
  const t = useTranslate();
  const count = Math.max(4, cornersIn(form.value));
  const add = () => {
    form.change({ [`corners.${letter(count)}.x`]: "0", [`corners.${letter(count)}.y`]: "0" });
    requestAnimationFrame(() => document.getElementById(fieldId(`corners.${letter(count)}.x`))?.focus());
  };
  const removeLast = () => form.change({ [`corners.${letter(count - 1)}.x`]: "", [`corners.${letter(count - 1)}.y`]: "" });
  return (
    <fieldset className="plan-rows">
      <legend className="plan-rows-title">{t("fit.corners.title")}</legend>
      <p>{t("fit.corners.hint")}</p>
      {Array.from({ length: count }, (_, index) => letter(index)).map((name) => (
        <div key={name} className="plan-pair">
          <LengthField {...form.field(`corners.${name}.x`)} error={form.errorAt(`corners.${name}.x`) ?? (name === "A" ? form.errorAt("corners") : undefined)} label={t("fit.corners.x", { corner: name })} />
          <LengthField {...form.field(`corners.${name}.y`)} label={t("fit.corners.y", { corner: name })} />
        </div>
      ))}
      <div className="plan-pad-buttons no-print">
        <Button kind="ghost" small onClick={add} disabled={count >= mostCorners}>
          {t("fit.corners.add", { corner: letter(count) })}
        </Button>
        {count > 3 ? (
          <Button kind="ghost" small onClick={removeLast}>
            {t("fit.corners.remove", { corner: letter(count - 1) })}
          </Button>
        ) : null}
      </div>
    </fieldset>
  );
}
