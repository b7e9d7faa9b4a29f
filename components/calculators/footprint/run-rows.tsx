"use client";

import { LengthField } from "@/components/length-field/length-field";
import { Segmented } from "@/components/ui/segmented";
import { TextField } from "@/components/ui/text-field";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { PlanForm } from "../plan/inset-inputs";
import { RowList } from "../plan/row-list";
import { nextToward, towards } from "./footprint-fields";

const mostRuns = 60;
const blankRows = 4;

/** The runs of the plan in order: direction, length, how many times. */
export function RunRows({ form }: { form: PlanForm }) {
  const t = useTranslate();
  const rows = Math.max(4, form.rows("runs"));
  return (
    <RowList
      form={form}
      list="runs"
      title={t("footprint.runs.title")}
      rows={rows}
      most={mostRuns}
      first="length"
      add={t("footprint.runs.add")}
      remove={(row) => t("footprint.runs.remove", { number: row + 1 })}
      fresh={(row) => ({ [`runs.${row}.toward`]: nextToward(form.value(`runs.${row - 1}.toward`)) || "N" })}
      blanks={Array.from({ length: blankRows }, (_, index) => rows + index).map((row) => (
        <div key={row} className="plan-blank">
          <select name={`runs.${row}.toward`} className="control" aria-label={t("footprint.runs.toward", { number: row + 1 })}>
            {towards.map((toward) => (
              <option key={toward} value={toward}>
                {t(`footprint.toward.${toward}.long`)}
              </option>
            ))}
          </select>
          <input type="text" name={`runs.${row}.length`} className="control" aria-label={t("footprint.runs.length", { number: row + 1 })} />
        </div>
      ))}
    >
      {(row) => <RunRow form={form} row={row} />}
    </RowList>
  );
}

function RunRow({ form, row }: { form: PlanForm; row: number }) {
  const t = useTranslate();
  const number = row + 1;
  const toward = form.value(`runs.${row}.toward`);
  const isBearing = !(towards as readonly string[]).includes(toward);
  const bearing = form.value(`runs.${row}.bearing`) || (toward === "bearing" ? "" : toward);
  const set = (value: string) => form.change({ [`runs.${row}.toward`]: value });
  return (
    <>
      <Segmented
        name={`runs.${row}.toward`}
        legend={t("footprint.runs.toward", { number })}
        value={isBearing ? "bearing" : toward}
        onChange={set}
        options={[...towards.map((value) => ({ value: value as string, label: t(`footprint.toward.${value}.short`), spoken: t(`footprint.toward.${value}.long`) })), { value: "bearing", label: t("footprint.runs.other"), spoken: t("footprint.runs.otherLong") }]}
      />
      {isBearing ? (
        <TextField
          name={`runs.${row}.bearing`}
          id={fieldId(`runs.${row}.toward`)}
          label={t("footprint.runs.bearing", { number })}
          hint={t("footprint.runs.bearingHint")}
          inputMode="text"
          value={bearing}
          onChange={(text) => form.change({ [`runs.${row}.toward`]: "bearing", [`runs.${row}.bearing`]: text })}
          error={form.errorAt(`runs.${row}.toward`)}
        />
      ) : null}
      <div className="plan-pair plan-run">
        <LengthField {...form.field(`runs.${row}.length`)} label={t("footprint.runs.length", { number })} />
        <TextField name={`runs.${row}.times`} label={t("footprint.runs.times", { number })} inputMode="numeric" value={form.value(`runs.${row}.times`)} onChange={(text) => form.set(`runs.${row}.times`, text)} error={form.errorAt(`runs.${row}.times`)} />
      </div>
    </>
  );
}
