"use client";

import { LengthField } from "@/components/length-field/length-field";
import { Select } from "@/components/ui/select";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { PlanForm } from "../plan/inset-inputs";
import { spokenSide } from "../plan/plan-fields";
import { RowList } from "../plan/row-list";

interface Rows {
  form: PlanForm;
  sides: readonly string[];
}

/** Places read along bowed edges. */
export function EdgeRows(props: Rows) {
  return <PlaceRows {...props} list="edges" first="offset" most={60} />;
}

/** Bolts as poured. */
export function BoltRows(props: Rows) {
  return <PlaceRows {...props} list="bolts" first="station" most={200} />;
}

function PlaceRows({ form, sides, list, first, most }: Rows & { list: "edges" | "bolts"; first: string; most: number }) {
  const t = useTranslate();
  const fields = first === "offset" ? (["offset", "station"] as const) : (["station", "offset"] as const);
  return (
    <RowList form={form} list={list} title={t(`fit.${list}.list`)} rows={form.rows(list)} most={most} first={first} add={t(`fit.${list}.add`)} remove={(row) => t(`fit.${list}.remove`, { number: row + 1 })} fresh={(row) => ({ [`${list}.${row}.wall`]: form.value(`${list}.${row - 1}.wall`) || sides[0]! })}>
      {(row) => (
        <>
          <Select name={`${list}.${row}.wall`} label={t(`fit.${list}.wall`, { number: row + 1 })} options={sides.map((value) => ({ value, label: spokenSide(value) }))} value={form.value(`${list}.${row}.wall`)} onChange={(wall) => form.set(`${list}.${row}.wall`, wall)} error={form.errorAt(`${list}.${row}.wall`)} />
          <div className="plan-pair">
            {fields.map((name) => (
              <LengthField key={name} {...form.field(`${list}.${row}.${name}`)} label={t(`fit.${list}.${name}`, { number: row + 1 })} />
            ))}
          </div>
        </>
      )}
    </RowList>
  );
}
