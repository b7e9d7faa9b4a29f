"use client";

import { LengthField } from "@/components/length-field/length-field";
import { CheckRow } from "@/components/ui/check-row";
import { Disclosure } from "@/components/ui/disclosure";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { AnchorsForm } from "./anchors-calculator";
import type { Mode } from "./anchors-fields";

/** What not every wall asks: joists and studs, a module, holes and washers, the short-wall exceptions. */
export function MoreInputs({ form, mode }: { form: AnchorsForm; mode: Mode }) {
  const t = useTranslate();
  const isTyped = (...names: string[]) => names.some((name) => form.value(name) !== "");
  const flag = (name: string) => (
    <CheckRow name={name} checked={form.value(name) === "true"} onChange={(on) => form.set(name, on ? "true" : "")}>
      {t(`anchors.more.${name}`)}
    </CheckRow>
  );
  const usual = form.unit === "mm" ? { plate: "38 mm", washer: "3 mm" } : { plate: '1 1/2"', washer: '1/8"' };
  return (
    <>
      <Disclosure summary={t(mode === "layout" ? "anchors.more.moduleTitle" : "anchors.more.joistsTitle")} id="joists" open={isTyped("members.spacing", "module")}>
        <p>{t("anchors.more.joistsHint")}</p>
        <div className="rows-pair">
          <LengthField {...form.field("members.spacing")} label={t("anchors.more.spacing")} />
          <LengthField {...form.field("members.first")} label={t("anchors.more.first")} hint={t("anchors.more.firstHint")} />
        </div>
        <div className="rows-pair">
          <LengthField {...form.field("members.thickness")} label={t("anchors.more.thickness")} hint={t("anchors.more.thicknessHint", { length: usual.plate })} />
          <LengthField {...form.field("members.clearance")} label={t("anchors.more.clearance")} hint={t("anchors.more.clearanceHint")} />
        </div>
        {mode === "layout" ? (
          <div className="rows-pair">
            <LengthField {...form.field("module")} label={t("anchors.more.module")} hint={t("anchors.more.moduleHint")} />
            <LengthField {...form.field("moduleStart")} label={t("anchors.more.moduleStart")} />
          </div>
        ) : null}
      </Disclosure>
      <Disclosure summary={t("anchors.more.hardwareTitle")} id="hardware" open={isTyped("hole", "shearWall", "washer", "plateThickness", "washerThickness")}>
        <LengthField {...form.field("hole")} label={t("anchors.more.hole")} hint={t("anchors.more.holeHint")} />
        {mode === "check" ? (
          <>
            <div className="rows-pair">
              <LengthField {...form.field("plateThickness")} label={t("anchors.more.plateThickness")} hint={t("anchors.more.plateThicknessHint", { length: usual.plate })} />
              <LengthField {...form.field("washerThickness")} label={t("anchors.more.washerThickness")} hint={t("anchors.more.washerThicknessHint", { length: usual.washer })} />
            </div>
            <LengthField {...form.field("washer")} label={t("anchors.more.washer")} hint={t("anchors.more.washerHint")} />
            {flag("shearWall")}
          </>
        ) : null}
      </Disclosure>
      {flag("joinsOffsetPanels")}
    </>
  );
}
