"use client";

import type { takeoffAnswer } from "@/calculators/takeoff";
import { LengthField } from "@/components/length-field/length-field";
import { CheckRow } from "@/components/ui/check-row";
import { Disclosure } from "@/components/ui/disclosure";
import { TextField } from "@/components/ui/text-field";
import type { useCalculator } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { RowList } from "../plan/row-list";

export type TakeoffForm = ReturnType<typeof useCalculator<typeof takeoffAnswer>>;

const mostRows = 40;
const blankRows = 4;

/** What is typed, or came from the plates: boards, plate, bolts and anchors; then waste and what the trade usually takes. */
export function TakeoffInputs({ form }: { form: TakeoffForm }) {
  const t = useTranslate();
  const isTyped = (...names: string[]) => names.some((name) => form.value(name) !== "");
  const number = (name: string, hint?: string, suffix?: string) => (
    <TextField name={name} label={t(`takeoff.fields.${name}`)} hint={hint} suffix={suffix} inputMode="numeric" value={form.value(name)} onChange={(text) => form.set(name, text)} error={form.errorAt(name)} />
  );
  const metric = form.unit === "mm";
  const blank = (imperial: string, other: string) => t("takeoff.fields.blank", { length: metric ? other : imperial });
  return (
    <>
      <BoardRows form={form} />
      <LengthField {...form.field("plateLength")} label={t("takeoff.fields.plateLength")} hint={t("takeoff.fields.plateLengthHint")} />
      <div className="plan-pair">
        {number("pieceCount", t("takeoff.fields.pieceCountHint"))}
        {number("bolts", t("takeoff.fields.boltsHint"))}
      </div>
      <div className="plan-pair">
        {number("newAnchors", t("takeoff.fields.newAnchorsHint"))}
        {number("boltsToCast", t("takeoff.fields.boltsToCastHint"))}
      </div>
      {number("waste", t("takeoff.fields.wasteHint"), "%")}
      <CheckRow name="plateWashers" checked={form.value("plateWashers") === "true"} onChange={(on) => form.set("plateWashers", on ? "true" : "")}>
        {t("takeoff.fields.plateWashers")}
      </CheckRow>
      <Disclosure summary={t("takeoff.more.title")} open={isTyped("plateWidth", "plateThickness", "diameter", "sealerRoll", "anchorDepth", "anchorHole", "cartridge", "preservativeCan", "coverage")}>
        <div className="plan-pair">
          <LengthField {...form.field("plateWidth")} label={t("takeoff.more.plateWidth")} hint={blank('5 1/2"', "140 mm")} />
          <LengthField {...form.field("plateThickness")} label={t("takeoff.more.plateThickness")} hint={blank('1 1/2"', "38 mm")} />
        </div>
        <div className="plan-pair">
          <LengthField {...form.field("diameter")} label={t("takeoff.more.diameter")} hint={blank('1/2"', "12.7 mm")} />
          <LengthField {...form.field("sealerRoll")} label={t("takeoff.more.sealerRoll")} hint={blank("50 ft", "15.24 m")} />
        </div>
        <div className="plan-pair">
          <LengthField {...form.field("anchorDepth")} label={t("takeoff.more.anchorDepth")} hint={blank('7"', "178 mm")} />
          <LengthField {...form.field("anchorHole")} label={t("takeoff.more.anchorHole")} hint={t("takeoff.more.anchorHoleHint")} />
        </div>
        <TextField name="cartridge" label={t("takeoff.more.cartridge")} hint={t("takeoff.more.cartridgeHint")} suffix="ml" value={form.value("cartridge")} onChange={(text) => form.set("cartridge", text)} error={form.errorAt("cartridge")} />
        <TextField name="preservativeCan" label={t("takeoff.more.preservativeCan")} hint={t("takeoff.more.preservativeCanHint")} suffix="ml" value={form.value("preservativeCan")} onChange={(text) => form.set("preservativeCan", text)} error={form.errorAt("preservativeCan")} />
      </Disclosure>
    </>
  );
}

function BoardRows({ form }: { form: TakeoffForm }) {
  const t = useTranslate();
  const rows = Math.max(1, form.rows("lumber"));
  return (
    <RowList
      form={form}
      list="lumber"
      title={t("takeoff.boards.title")}
      rows={rows}
      most={mostRows}
      first="length"
      add={t("takeoff.boards.add")}
      remove={(row) => t("takeoff.boards.remove", { number: row + 1 })}
      blanks={Array.from({ length: blankRows }, (_, index) => rows + index).map((row) => (
        <div key={row} className="plan-pair">
          {(["length", "count"] as const).map((name) => (
            <label key={name} className="rows-blank">
              {t(`takeoff.boards.${name}`, { number: row + 1 })}
              <input type="text" name={`lumber.${row}.${name}`} className="control" />
            </label>
          ))}
        </div>
      ))}
    >
      {(row) => (
        <div className="plan-pair">
          <LengthField {...form.field(`lumber.${row}.length`)} label={t("takeoff.boards.length", { number: row + 1 })} />
          <TextField name={`lumber.${row}.count`} label={t("takeoff.boards.count", { number: row + 1 })} inputMode="numeric" value={form.value(`lumber.${row}.count`)} onChange={(text) => form.set(`lumber.${row}.count`, text)} error={form.errorAt(`lumber.${row}.count`)} />
        </div>
      )}
    </RowList>
  );
}
