"use client";

import { memo } from "react";
import type { platesAnswer } from "@/calculators/plates";
import { LengthField } from "@/components/length-field/length-field";
import { CheckRow } from "@/components/ui/check-row";
import { Disclosure } from "@/components/ui/disclosure";
import { Segmented } from "@/components/ui/segmented";
import { Select } from "@/components/ui/select";
import { TextField } from "@/components/ui/text-field";
import type { useCalculator } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { RuleChoice } from "../anchors/rule-choice";
import { RowList } from "../plan/row-list";
import { planFromOf, sharedCorners, wallNameOf, type PlanFrom } from "./plates-fields";
import { WallRows } from "./wall-rows";

export type PlatesForm = ReturnType<typeof useCalculator<typeof platesAnswer>>;

const times = ["1", "4", "20"] as const;

/** What the fields are drawn from. A better plan that comes in changes none of it, and forty walls are much to draw again. */
const isSame = (before: PlatesForm, after: PlatesForm) =>
  before.fields === after.fields && before.unit === after.unit && before.precision === after.precision && before.asked === after.asked && before.problems.map(({ text }) => text).join() === after.problems.map(({ text }) => text).join();

/** Walls, or pieces for the cut list alone; boards to cut from; saw, rule and plate. */
export const PlatesInputs = memo(Inputs, (before, after) => isSame(before.form, after.form));

function Inputs({ form }: { form: PlatesForm }) {
  const t = useTranslate();
  const planFrom = planFromOf(form.value);
  const isTyped = (...names: string[]) => names.some((name) => form.value(name) !== "");
  const metric = form.unit === "mm";
  const blank = (imperial: string, other: string) => t("plates.fields.blank", { length: metric ? other : imperial });
  return (
    <>
      <div className="field">
        <Segmented name="planFrom" legend={t("plates.from.legend")} legendIs="hidden" value={planFrom} onChange={(value) => form.set("planFrom", value)} options={(["walls", "pieces"] as const satisfies readonly PlanFrom[]).map((value) => ({ value, label: t(`plates.from.${value}`) }))} />
      </div>
      {planFrom === "walls" ? (
        <>
          <WallRows form={form} />
          <CornerChoices form={form} />
        </>
      ) : (
        <PieceRows form={form} />
      )}
      <StockRows form={form} />
      <div className="plan-pair">
        <LengthField {...form.field("kerf")} label={t("plates.fields.kerf")} hint={blank('1/8"', "3 mm")} />
        <LengthField {...form.field("trim")} label={t("plates.fields.trim")} hint={t("plates.fields.trimHint")} />
      </div>
      {planFrom === "walls" ? (
        <>
          <RuleChoice form={form} />
          <Disclosure summary={t("plates.more.title")} open={isTyped("plateWidth", "diameter", "bit", "inset", "endDistance", "clearOfBolts", "timeLimit", "measuredFrom")}>
            <Segmented name="measuredFrom" legend={t("plates.more.measuredFrom")} value={form.value("measuredFrom") || "chalk"} onChange={(value) => form.set("measuredFrom", value)} options={(["chalk", "slab"] as const).map((value) => ({ value, label: t(`plates.more.${value}`) }))} />
            <LengthField {...form.field("inset")} label={t("plates.more.inset")} hint={t("plates.more.insetHint")} />
            <div className="plan-pair">
              <LengthField {...form.field("plateWidth")} label={t("plates.more.plateWidth")} hint={blank('5 1/2"', "140 mm")} />
              <LengthField {...form.field("shortest")} label={t("plates.more.shortest")} hint={t("plates.more.shortestHint")} />
            </div>
            <div className="plan-pair">
              <LengthField {...form.field("diameter")} label={t("plates.more.diameter")} hint={t("plates.more.diameterHint")} />
              <LengthField {...form.field("bit")} label={t("plates.more.bit")} hint={t("plates.more.bitHint")} />
            </div>
            <LengthField {...form.field("endDistance")} label={t("plates.more.endDistance")} hint={blank('8"', "203 mm")} />
          </Disclosure>
        </>
      ) : null}
      <div className="field">
        <Segmented name="timeLimit" legend={t("plates.time.legend")} hint={t("plates.time.hint")} value={times.find((time) => time === form.value("timeLimit")) ?? "4"} onChange={(time) => form.set("timeLimit", time === "4" ? "" : time)} options={times.map((value) => ({ value, label: t("plates.time.seconds", { count: Number(value) }) }))} />
      </div>
    </>
  );
}

/** Which plate runs through where two walls meet, and which corners point inward. */
function CornerChoices({ form }: { form: PlatesForm }) {
  const t = useTranslate();
  const names = Array.from({ length: form.rows("walls") }, (_, row) => wallNameOf(form.value, row));
  const corners = sharedCorners(names);
  if (corners.length === 0) return null;
  const spoken = (wall: string) => wall.toUpperCase().split("").join("-");
  return (
    <Disclosure summary={t("plates.corners.title")} open={corners.some(({ corner }) => form.value(`corners.${corner}`) !== "")}>
      <p>{t("plates.corners.hint")}</p>
      {corners.map(({ corner, walls }) => (
        <div key={corner} className="plan-pair">
          <Select
            name={`corners.${corner}`}
            label={t("plates.corners.through", { corner })}
            value={form.value(`corners.${corner}`).toLowerCase()}
            onChange={(wall) => form.set(`corners.${corner}`, wall)}
            error={form.errorAt(`corners.${corner}`)}
            options={[{ value: "", label: t("plates.corners.none") }, ...walls.map((wall) => ({ value: wall, label: spoken(wall) }))]}
          />
          <CheckRow name={`inside.${corner}`} checked={form.value(`inside.${corner}`) === "true"} onChange={(on) => form.set(`inside.${corner}`, on ? "true" : "")}>
            {t("plates.corners.inside", { corner })}
          </CheckRow>
        </div>
      ))}
    </Disclosure>
  );
}

function PieceRows({ form }: { form: PlatesForm }) {
  const t = useTranslate();
  const rows = Math.max(1, form.rows("pieces"));
  return (
    <RowList form={form} list="pieces" title={t("plates.pieces.title")} rows={rows} most={200} first="length" add={t("plates.pieces.add")} remove={(row) => t("plates.pieces.remove", { number: row + 1 })} blanks={<Blanks list="pieces" from={rows} names={["length", "count"]} />}>
      {(row) => (
        <div className="plan-pair plan-run">
          <LengthField {...form.field(`pieces.${row}.length`)} label={t("plates.pieces.length", { number: row + 1 })} />
          <TextField name={`pieces.${row}.count`} label={t("plates.pieces.count", { number: row + 1 })} inputMode="numeric" value={form.value(`pieces.${row}.count`)} onChange={(text) => form.set(`pieces.${row}.count`, text)} error={form.errorAt(`pieces.${row}.count`)} />
        </div>
      )}
    </RowList>
  );
}

function StockRows({ form }: { form: PlatesForm }) {
  const t = useTranslate();
  const rows = Math.max(1, form.rows("stock"));
  const text = (row: number, name: "price" | "count", inputMode: "decimal" | "numeric") => (
    <TextField name={`stock.${row}.${name}`} label={t(`plates.stock.${name}`, { number: row + 1 })} hint={t(`plates.stock.${name}Hint`)} inputMode={inputMode} value={form.value(`stock.${row}.${name}`)} onChange={(value) => form.set(`stock.${row}.${name}`, value)} error={form.errorAt(`stock.${row}.${name}`)} />
  );
  return (
    <RowList form={form} list="stock" title={t("plates.stock.title")} rows={rows} most={20} first="length" add={t("plates.stock.add")} remove={(row) => t("plates.stock.remove", { number: row + 1 })} blanks={<Blanks list="stock" from={rows} names={["length", "price", "count"]} />}>
      {(row) => (
        <>
          <LengthField {...form.field(`stock.${row}.length`)} error={form.errorAt(`stock.${row}.length`) ?? (row === 0 ? form.errorAt("stock") : undefined)} label={t("plates.stock.length", { number: row + 1 })} />
          <div className="plan-pair">
            {text(row, "price", "decimal")}
            {text(row, "count", "numeric")}
          </div>
        </>
      )}
    </RowList>
  );
}

function Blanks({ list, from, names }: { list: "pieces" | "stock"; from: number; names: readonly string[] }) {
  const t = useTranslate();
  return (
    <>
      {[from, from + 1, from + 2].map((row) => (
        <div key={row} className="plan-pair">
          {names.map((name) => (
            <label key={name} className="rows-blank">
              {t(`plates.${list}.${name}`, { number: row + 1 })}
              <input type="text" name={`${list}.${row}.${name}`} className="control" />
            </label>
          ))}
        </div>
      ))}
    </>
  );
}
