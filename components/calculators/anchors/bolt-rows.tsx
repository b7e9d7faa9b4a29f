"use client";

import { useState } from "react";
import { LengthField } from "@/components/length-field/length-field";
import { Button } from "@/components/ui/button";
import { CheckRow } from "@/components/ui/check-row";
import { Disclosure } from "@/components/ui/disclosure";
import { Segmented } from "@/components/ui/segmented";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { AnchorsForm } from "./anchors-calculator";
import { readPastedBolts } from "./pasted-bolts";

const mostBolts = 200;
const blankRows = 6;

/** The bolts as measured, one row each: added, removed, or pasted as text. */
export function BoltRows({ form }: { form: AnchorsForm }) {
  const t = useTranslate();
  const rows = form.rows("bolts");
  const from = form.value("measuredFrom") || form.value("bolts.0.from") || "chalk";
  const measureFrom = (value: string) => form.change({ measuredFrom: value, ...Object.fromEntries(Array.from({ length: rows }, (_, row) => [`bolts.${row}.from`, ""])) });
  const add = () => {
    form.set(`bolts.${rows}.station`, "");
    requestAnimationFrame(() => document.getElementById(fieldId(`bolts.${rows}.station`))?.focus());
  };
  return (
    <fieldset className="rows">
      <legend className="rows-title">{t("anchors.bolts.title")}</legend>
      <Segmented name="measuredFrom" legend={t("anchors.bolts.from")} value={from} onChange={measureFrom} options={[{ value: "chalk", label: t("anchors.bolts.chalk") }, { value: "slab", label: t("anchors.bolts.slab") }]} />
      {from === "slab" ? (
        <div className="rows-pair">
          <LengthField {...form.field("inset")} label={t("anchors.bolts.inset")} hint={t("anchors.bolts.insetHint")} />
          <LengthField {...form.field("insetFirst")} label={t("anchors.bolts.insetFirst")} hint={t("anchors.bolts.insetFirstHint")} />
        </div>
      ) : (
        <noscript>
          <label className="rows-blank">
            {t("anchors.bolts.inset")}
            <input type="text" name="inset" className="control" />
          </label>
        </noscript>
      )}
      {Array.from({ length: rows }, (_, row) => (
        <BoltRow key={row} form={form} row={row} />
      ))}
      <noscript>
        {Array.from({ length: blankRows }, (_, index) => rows + index).map((row) => (
          <div key={row} className="rows-pair">
            <label className="rows-blank">
              {t("anchors.bolts.station", { number: row + 1 })}
              <input type="text" name={`bolts.${row}.station`} className="control" />
            </label>
            <label className="rows-blank">
              {t("anchors.bolts.offset", { number: row + 1 })}
              <input type="text" name={`bolts.${row}.offset`} className="control" />
            </label>
          </div>
        ))}
      </noscript>
      <div className="rows-buttons no-print">
        <Button kind="ghost" small onClick={add} disabled={rows >= mostBolts}>
          {t("anchors.bolts.add")}
        </Button>
      </div>
      <PasteBolts form={form} rows={rows} />
    </fieldset>
  );
}

function BoltRow({ form, row }: { form: AnchorsForm; row: number }) {
  const t = useTranslate();
  const number = row + 1;
  const engineered = form.value(`bolts.${row}.engineered`) === "true";
  const hasMore = engineered || ["projection", "diameter"].some((name) => form.value(`bolts.${row}.${name}`) !== "");
  return (
    <div className="rows-item">
      <div className="rows-pair">
        <LengthField {...form.field(`bolts.${row}.station`)} label={t("anchors.bolts.station", { number })} />
        <LengthField {...form.field(`bolts.${row}.offset`)} label={t("anchors.bolts.offset", { number })} />
      </div>
      <div className="rows-foot">
        <Disclosure summary={t("anchors.bolts.more", { number })} open={hasMore}>
          <div className="rows-pair">
            <LengthField {...form.field(`bolts.${row}.projection`)} label={t("anchors.bolts.projection")} />
            <LengthField {...form.field(`bolts.${row}.diameter`)} label={t("anchors.bolts.diameter")} />
          </div>
          <CheckRow name={`bolts.${row}.engineered`} checked={engineered} onChange={(on) => form.set(`bolts.${row}.engineered`, on ? "true" : "")}>
            {t("anchors.bolts.engineered")}
          </CheckRow>
        </Disclosure>
        <Button kind="ghost" small className="no-print" onClick={() => form.removeRow("bolts", row)}>
          {t("anchors.bolts.remove", { number })}
        </Button>
      </div>
    </div>
  );
}

/** A survey pasted as text. With script its lines become rows; without, the text itself is sent. */
function PasteBolts({ form, rows }: { form: AnchorsForm; rows: number }) {
  const t = useTranslate();
  const [text, setText] = useState("");
  const use = () => {
    const pasted = readPastedBolts(text).slice(0, mostBolts - rows);
    if (pasted.length === 0) return;
    const entries = pasted.flatMap((bolt, index) => Object.entries(bolt).map(([name, value]): [string, string] => [`bolts.${rows + index}.${name}`, String(value)]));
    form.change({ ...(rows === 0 ? { measuredFrom: "slab" } : {}), ...Object.fromEntries(entries) });
    setText("");
  };
  return (
    <Disclosure summary={t("anchors.paste.title")}>
      <label htmlFor="paste-bolts">{t("anchors.paste.hint")}</label>
      <textarea id="paste-bolts" name="paste" className="control rows-paste" rows={5} spellCheck={false} value={text} onChange={(event) => setText(event.target.value)} placeholder={t("anchors.paste.example")} />
      <Button kind="ghost" small className="no-print" onClick={use}>
        {t("anchors.paste.use")}
      </Button>
    </Disclosure>
  );
}
