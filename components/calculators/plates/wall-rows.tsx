"use client";

import { useState } from "react";
import { LengthField } from "@/components/length-field/length-field";
import { Button } from "@/components/ui/button";
import { CheckRow } from "@/components/ui/check-row";
import { Disclosure } from "@/components/ui/disclosure";
import { TextField } from "@/components/ui/text-field";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { readPastedBolts } from "../anchors/pasted-bolts";
import type { PlanForm } from "../plan/inset-inputs";
import { RowList } from "../plan/row-list";
import { BoltFields } from "./bolt-fields";
import { wallNameOf } from "./plates-fields";

const mostWalls = 60;
const blankWalls = 3;

/** The walls round the house: name and length, then what interrupts them and the bolts in them. */
export function WallRows({ form }: { form: PlanForm }) {
  const t = useTranslate();
  const rows = Math.max(1, form.rows("walls"));
  return (
    <RowList
      form={form}
      list="walls"
      title={t("plates.walls.title")}
      rows={rows}
      most={mostWalls}
      first="length"
      add={t("plates.walls.add")}
      remove={(row) => t("plates.walls.remove", { name: spoken(wallNameOf(form.value, row)) })}
      blanks={Array.from({ length: blankWalls }, (_, index) => rows + index).map((row) => (
        <div key={row}>
          {(["name", "length"] as const).map((name) => (
            <label key={name} className="rows-blank">
              {t(`plates.walls.${name}`, { number: row + 1 })}
              <input type="text" name={`walls.${row}.${name}`} className="control" />
            </label>
          ))}
          <label className="rows-blank">
            {t("plates.paste.hint")}
            <textarea name={`paste.${row}`} className="control rows-paste" rows={4} />
          </label>
        </div>
      ))}
    >
      {(row) => <WallRow form={form} row={row} />}
    </RowList>
  );
}

const spoken = (name: string) => (/^[a-z]{2}$/i.test(name) ? name.toUpperCase().split("").join("-") : name);

function WallRow({ form, row }: { form: PlanForm; row: number }) {
  const t = useTranslate();
  const at = `walls.${row}`;
  const number = row + 1;
  const bolts = form.rows(`${at}.bolts`);
  const openings = form.rows(`${at}.openings`);
  const steps = form.rows(`${at}.steps`);
  const isTyped = openings + steps > 0 || ["inset", "joinsOffsetPanels"].some((name) => form.value(`${at}.${name}`) !== "");
  return (
    <>
      <div className="plan-pair plan-run">
        <LengthField {...form.field(`${at}.length`)} error={form.errorAt(`${at}.length`) ?? form.errorAt(at)} label={t("plates.walls.length", { number })} hint={t("plates.walls.lengthHint")} />
        <TextField name={`${at}.name`} label={t("plates.walls.name", { number })} inputMode="text" value={form.value(`${at}.name`) || wallNameOf(form.value, row)} onChange={(text) => form.set(`${at}.name`, text)} error={form.errorAt(`${at}.name`)} />
      </div>
      <BoltFields form={form} wall={row} count={bolts} />
      <Disclosure summary={t("plates.walls.more", { name: spoken(wallNameOf(form.value, row)) })} open={isTyped}>
        <OpeningRows form={form} at={at} openings={openings} />
        <StepRows form={form} at={at} steps={steps} />
        <LengthField {...form.field(`${at}.inset`)} label={t("plates.walls.inset")} hint={t("plates.walls.insetHint")} />
        <CheckRow name={`${at}.joinsOffsetPanels`} checked={form.value(`${at}.joinsOffsetPanels`) === "true"} onChange={(on) => form.set(`${at}.joinsOffsetPanels`, on ? "true" : "")}>
          {t("plates.walls.joinsOffsetPanels")}
        </CheckRow>
      </Disclosure>
    </>
  );
}

function OpeningRows({ form, at, openings }: { form: PlanForm; at: string; openings: number }) {
  const t = useTranslate();
  const list = `${at}.openings`;
  return (
    <RowList form={form} list={list} title={t("plates.openings.title")} rows={openings} most={20} first="from" add={t("plates.openings.add")} remove={(row) => t("plates.openings.remove", { number: row + 1 })}>
      {(row) => (
        <div className="plan-pair">
          <LengthField {...form.field(`${list}.${row}.from`)} label={t("plates.openings.from", { number: row + 1 })} />
          <LengthField {...form.field(`${list}.${row}.to`)} label={t("plates.openings.to", { number: row + 1 })} />
        </div>
      )}
    </RowList>
  );
}

function StepRows({ form, at, steps }: { form: PlanForm; at: string; steps: number }) {
  const t = useTranslate();
  return (
    <>
      {Array.from({ length: steps }, (_, row) => (
        <LengthField key={row} {...form.field(`${at}.steps.${row}`)} label={t("plates.steps.at", { number: row + 1 })} />
      ))}
      <Button kind="ghost" small className="no-print" onClick={() => form.set(`${at}.steps.${steps}`, "")} disabled={steps >= 20}>
        {t("plates.steps.add")}
      </Button>
    </>
  );
}

/** A wall's bolts pasted as text. */
export function PasteBolts({ form, wall, from }: { form: PlanForm; wall: number; from: number }) {
  const t = useTranslate();
  const [text, setText] = useState("");
  const use = () => {
    const pasted = readPastedBolts(text).slice(0, 200 - from);
    if (pasted.length === 0) return;
    form.change(Object.fromEntries(pasted.flatMap((bolt, index) => Object.entries(bolt).map(([name, value]): [string, string] => [`walls.${wall}.bolts.${from + index}.${name}`, String(value)]))));
    setText("");
  };
  return (
    <>
      <label htmlFor={`paste-bolts-${wall}`}>{t("plates.paste.hint")}</label>
      <textarea id={`paste-bolts-${wall}`} name={`paste.${wall}`} className="control rows-paste" rows={4} spellCheck={false} value={text} onChange={(event) => setText(event.target.value)} placeholder={t("plates.paste.example")} />
      <Button kind="ghost" small className="no-print" onClick={use}>
        {t("plates.paste.use")}
      </Button>
    </>
  );
}
