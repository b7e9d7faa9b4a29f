"use client";

import { useState } from "react";
import { LengthField } from "@/components/length-field/length-field";
import { Button } from "@/components/ui/button";
import { CheckRow } from "@/components/ui/check-row";
import { Disclosure } from "@/components/ui/disclosure";
import { TextField } from "@/components/ui/text-field";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { PlanForm } from "../plan/inset-inputs";
import { RowList } from "../plan/row-list";
import { readPastedReadings } from "./level-fields";

const mostReadings = 200;
const mostSetups = 20;
const blankRows = 6;

/** The readings by set-up of the instrument: one set-up at first, more by a tap. */
export function SetupRows({ form }: { form: PlanForm }) {
  const t = useTranslate();
  const setups = Math.max(1, form.rows("setups"));
  const add = () => form.change({ [`setups.${setups}.backsight`]: "", [`setups.${setups}.readings.0.rod`]: "" });
  return (
    <>
      {Array.from({ length: setups }, (_, setup) => (
        <Setup key={setup} form={form} setup={setup} setups={setups} />
      ))}
      <PasteReadings form={form} />
      <div className="plan-pad-buttons no-print">
        <Button kind="ghost" small onClick={add} disabled={setups >= mostSetups}>
          {t("level.setup.add")}
        </Button>
      </div>
    </>
  );
}

function Setup({ form, setup, setups }: { form: PlanForm; setup: number; setups: number }) {
  const t = useTranslate();
  const list = `setups.${setup}.readings`;
  const rows = Math.max(1, form.rows(list));
  const isCarried = setup > 0 && Array.from({ length: form.rows(`setups.${setup - 1}.readings`) }, (_, row) => form.value(`setups.${setup - 1}.readings.${row}.turn`)).includes("true");
  return (
    <>
      <LengthField {...form.field(`setups.${setup}.backsight`)} label={setups > 1 ? t("level.setup.backsightOf", { number: setup + 1 }) : t("level.setup.backsight")} hint={t(isCarried ? "level.setup.onTurn" : "level.setup.onBenchmark")} blade={setup === 0} />
      <RowList
        form={form}
        list={list}
        title={setups > 1 ? t("level.readings.titleOf", { number: setup + 1 }) : t("level.readings.title")}
        rows={rows}
        most={mostReadings}
        first="rod"
        add={t("level.readings.add")}
        remove={(row) => t("level.readings.remove", { number: row + 1 })}
        fresh={(row) => ({ [`${list}.${row}.wall`]: form.value(`${list}.${row - 1}.wall`) })}
        blanks={<BlankReadings list={list} from={rows} />}
      >
        {(row) => (
          <>
            <LengthField {...form.field(`${list}.${row}.rod`)} error={form.errorAt(`${list}.${row}.rod`) ?? (row === 0 ? form.errorAt(list) : undefined)} label={t("level.readings.rod", { number: row + 1 })} />
            <div className="plan-pair">
              <TextField name={`${list}.${row}.wall`} label={t("level.readings.wall", { number: row + 1 })} inputMode="text" value={form.value(`${list}.${row}.wall`)} onChange={(text) => form.set(`${list}.${row}.wall`, text)} error={form.errorAt(`${list}.${row}.wall`)} />
              <LengthField {...form.field(`${list}.${row}.station`)} label={t("level.readings.station", { number: row + 1 })} />
            </div>
            {setups > 1 && setup < setups - 1 ? (
              <CheckRow name={`${list}.${row}.turn`} checked={form.value(`${list}.${row}.turn`) === "true"} onChange={(on) => form.set(`${list}.${row}.turn`, on ? "true" : "")}>
                {t("level.readings.turn")}
              </CheckRow>
            ) : null}
          </>
        )}
      </RowList>
    </>
  );
}

function BlankReadings({ list, from }: { list: string; from: number }) {
  const t = useTranslate();
  return (
    <>
      {Array.from({ length: blankRows }, (_, index) => from + index).map((row) => (
        <div key={row} className="plan-pair">
          {(["wall", "station", "rod"] as const).map((name) => (
            <label key={name} className="rows-blank">
              {t(`level.readings.${name}`, { number: row + 1 })}
              <input type="text" name={`${list}.${row}.${name}`} className="control" />
            </label>
          ))}
        </div>
      ))}
    </>
  );
}

/** A list of readings pasted as text. With script its lines become rows of the first set-up; without, the text itself is sent. */
function PasteReadings({ form }: { form: PlanForm }) {
  const t = useTranslate();
  const [text, setText] = useState("");
  const use = () => {
    const start = Array.from({ length: form.rows("setups.0.readings") }, (_, row) => form.value(`setups.0.readings.${row}.rod`)).findLastIndex((rod) => rod !== "") + 1;
    const pasted = readPastedReadings(text).slice(0, mostReadings - start);
    if (pasted.length === 0) return;
    form.change(Object.fromEntries(pasted.flatMap((reading, index) => Object.entries(reading).map(([name, value]): [string, string] => [`setups.0.readings.${start + index}.${name}`, String(value)]))));
    setText("");
  };
  return (
    <Disclosure summary={t("level.paste.title")}>
      <label htmlFor="paste-readings">{t("level.paste.hint")}</label>
      <textarea id="paste-readings" name="paste" className="control rows-paste" rows={5} spellCheck={false} value={text} onChange={(event) => setText(event.target.value)} placeholder={t("level.paste.example")} />
      <Button kind="ghost" small className="no-print" onClick={use}>
        {t("level.paste.use")}
      </Button>
    </Disclosure>
  );
}
