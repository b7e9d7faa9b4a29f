"use client";

import { useState } from "react";
import { LengthField } from "@/components/length-field/length-field";
import { Button } from "@/components/ui/button";
import { Disclosure } from "@/components/ui/disclosure";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { PlanForm } from "../plan/inset-inputs";
import { RowList } from "../plan/row-list";
import { readPastedStations } from "./marks-fields";

const mostBolts = 200;
const blankRows = 6;

/** Bolts in a plate by their station: one row each, or pasted. */
export function StationRows({ form, list }: { form: PlanForm; list: "bolts" | "oppositeBolts" }) {
  const t = useTranslate();
  const [text, setText] = useState("");
  const rows = form.rows(list);
  const use = () => {
    const stations = readPastedStations(text).slice(0, mostBolts - rows);
    if (stations.length === 0) return;
    form.change(Object.fromEntries(stations.map((station, index) => [`${list}.${rows + index}.station`, station])));
    setText("");
  };
  return (
    <RowList
      form={form}
      list={list}
      title={t(`marks.${list}.title`)}
      rows={rows}
      most={mostBolts}
      first="station"
      add={t("marks.bolts.add")}
      remove={(row) => t("marks.bolts.remove", { number: row + 1 })}
      blanks={Array.from({ length: blankRows }, (_, index) => rows + index).map((row) => (
        <label key={row} className="rows-blank">
          {t("marks.bolts.station", { number: row + 1 })}
          <input type="text" name={`${list}.${row}.station`} className="control" />
        </label>
      ))}
      after={
        <Disclosure summary={t("marks.paste.title")}>
          <label htmlFor={`paste-${list}`}>{t("marks.paste.hint")}</label>
          <textarea id={`paste-${list}`} name={list === "bolts" ? "paste" : undefined} className="control rows-paste" rows={4} spellCheck={false} value={text} onChange={(event) => setText(event.target.value)} />
          <Button kind="ghost" small className="no-print" onClick={use}>
            {t("marks.paste.use")}
          </Button>
        </Disclosure>
      }
    >
      {(row) => <LengthField {...form.field(`${list}.${row}.station`)} label={t("marks.bolts.station", { number: row + 1 })} />}
    </RowList>
  );
}
