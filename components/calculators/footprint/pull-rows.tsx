"use client";

import { useState } from "react";
import type { FootprintAnswer } from "@/calculators/footprint";
import { LengthField } from "@/components/length-field/length-field";
import { Button } from "@/components/ui/button";
import { Select } from "@/components/ui/select";
import { TextField } from "@/components/ui/text-field";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { PlanForm } from "../plan/inset-inputs";
import { pullsFor, type PullRow } from "./footprint-fields";

const mostReadings = 120;
const cornerCounts = ["3", "4", "5", "6", "7", "8", "9", "10", "11", "12"];
const blankRows = 4;

/** The pulls of a braced polygon: sides and diagonals by their corners, one reading each. */
export function PullRows({ form, answer }: { form: PlanForm; answer: FootprintAnswer | null }) {
  const t = useTranslate();
  const rows = Array.from({ length: form.rows("readings") }, (_, row): PullRow => ({ from: form.value(`readings.${row}.from`).toUpperCase(), to: form.value(`readings.${row}.to`).toUpperCase(), reading: form.value(`readings.${row}.reading`) }));
  const letters = [...new Set(rows.flatMap(({ from, to }) => [...from, ...to]))].sort();
  const replace = (next: readonly PullRow[]) => {
    const blank = Object.fromEntries(rows.flatMap((_, row) => ["from", "to", "reading"].map((name) => [`readings.${row}.${name}`, ""])));
    form.change({ ...blank, ...fieldsOf(next, 0) });
  };
  const add = (from: string, to: string) => {
    form.change(fieldsOf([{ from, to, reading: "" }], rows.length));
    requestAnimationFrame(() => document.getElementById(fieldId(`readings.${rows.length}.reading`))?.focus());
  };
  const burn = form.value("burn");
  return (
    <fieldset className="plan-rows">
      <legend className="plan-rows-title">{t("footprint.pulls.title")}</legend>
      <Select name="" id="field-corner-count" label={t("footprint.pulls.corners")} options={cornerCounts.map((value) => ({ value, label: value }))} value={String(Math.max(3, letters.length))} onChange={(count) => replace(pullsFor(Number(count), rows))} />
      {rows.map(({ from, to }, row) => (
        <div key={row} className="plan-row">
          <input type="hidden" name={`readings.${row}.from`} value={from} />
          <input type="hidden" name={`readings.${row}.to`} value={to} />
          <LengthField {...form.field(`readings.${row}.reading`)} error={["reading", "from", "to"].map((name) => form.errorAt(`readings.${row}.${name}`)).find(Boolean)} label={t("footprint.pulls.pull", { from, to })} burn={burn} blade />
          {row >= letters.length ? (
            <Button kind="ghost" small className="no-print" onClick={() => form.removeRow("readings", row)}>
              {t("footprint.pulls.remove", { from, to })}
            </Button>
          ) : null}
        </div>
      ))}
      <noscript>
        {Array.from({ length: blankRows }, (_, index) => rows.length + index).map((row) => (
          <div key={row} className="plan-blank">
            <span>
              <input type="text" name={`readings.${row}.from`} className="control" size={3} aria-label={t("footprint.pulls.from")} /> <input type="text" name={`readings.${row}.to`} className="control" size={3} aria-label={t("footprint.pulls.to")} />
            </span>
            <input type="text" name={`readings.${row}.reading`} className="control" aria-label={t("footprint.pulls.reading")} />
          </div>
        ))}
      </noscript>
      <div className="plan-pad-buttons no-print">
        {(answer?.fixWith ?? []).slice(0, 3).map(({ from, to }) => (
          <Button key={from + to} kind="ghost" small onClick={() => add(from, to)}>
            {t("footprint.pulls.suggest", { from, to })}
          </Button>
        ))}
      </div>
      {rows.length < mostReadings ? <NewPull letters={letters} add={add} /> : null}
      <TextField name="inside" label={t("footprint.pulls.inside")} hint={t("footprint.pulls.insideHint")} inputMode="text" value={form.value("inside")} onChange={(text) => form.set("inside", text)} error={form.errorAt("inside")} />
      <LengthField {...form.field("readingError")} label={t("footprint.pulls.error")} hint={t("footprint.pulls.errorHint")} />
    </fieldset>
  );
}

export function fieldsOf(rows: readonly PullRow[], from: number): Record<string, string> {
  return Object.fromEntries(rows.flatMap((row, index) => (["from", "to", "reading"] as const).map((name) => [`readings.${from + index}.${name}`, row[name]])));
}

/** Any two corners, or the middle of a side. */
function NewPull({ letters, add }: { letters: readonly string[]; add: (from: string, to: string) => void }) {
  const t = useTranslate();
  const middles = letters.map((letter, index) => letter + letters[(index + 1) % letters.length]!);
  const options = [...letters.map((value) => ({ value, label: value })), ...middles.map((value) => ({ value, label: t("footprint.pulls.middle", { side: value }) }))];
  const [from, setFrom] = useState("A");
  const [to, setTo] = useState("C");
  return (
    <div className="no-print">
      <div className="plan-pair">
        <Select name="" id="field-new-from" label={t("footprint.pulls.from")} options={options} value={from} onChange={setFrom} />
        <Select name="" id="field-new-to" label={t("footprint.pulls.to")} options={options} value={to} onChange={setTo} />
      </div>
      <Button kind="ghost" small onClick={() => add(from, to)} disabled={from === to}>
        {t("footprint.pulls.add", { from, to })}
      </Button>
    </div>
  );
}
