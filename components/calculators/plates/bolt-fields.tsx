"use client";

import { useState } from "react";
import { LengthField } from "@/components/length-field/length-field";
import { CheckRow } from "@/components/ui/check-row";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { PlanForm } from "../plan/inset-inputs";
import { RowList } from "../plan/row-list";
import { PasteBolts } from "./wall-rows";

const fieldsOfBolt = ["station", "offset", "from", "projection", "diameter", "engineered", "strap"] as const;

/** A wall's bolts, folded away: while closed they are only sent along, so that a house of two hundred bolts stays quick to edit. */
export function BoltFields({ form, wall, count }: { form: PlanForm; wall: number; count: number }) {
  const t = useTranslate();
  const list = `walls.${wall}.bolts`;
  const hasFault = Array.from({ length: count }, (_, row) => row).some((row) => fieldsOfBolt.some((name) => form.errorAt(`${list}.${row}.${name}`) !== undefined));
  const [isOpen, setOpen] = useState(false);
  const open = isOpen || hasFault;
  return (
    <details className="disclosure" open={open} onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary>{t("plates.bolts.summary", { count })}</summary>
      <div className="disclosure-body prose">
        {open ? (
          <RowList form={form} list={list} title={t("plates.bolts.title")} rows={count} most={200} first="station" add={t("plates.bolts.add")} remove={(row) => t("plates.bolts.remove", { number: row + 1 })}>
            {(row) => <BoltRow form={form} at={`${list}.${row}`} number={row + 1} />}
          </RowList>
        ) : (
          Array.from({ length: count }, (_, row) => row).flatMap((row) =>
            fieldsOfBolt.flatMap((name) => {
              const value = form.value(`${list}.${row}.${name}`);
              return value === "" ? [] : [<input key={`${row}.${name}`} type="hidden" name={`${list}.${row}.${name}`} value={value} />];
            }),
          )
        )}
        <PasteBolts form={form} wall={wall} from={count} />
      </div>
    </details>
  );
}

function BoltRow({ form, at, number }: { form: PlanForm; at: string; number: number }) {
  const t = useTranslate();
  const flag = (name: "engineered" | "strap") => (
    <CheckRow name={`${at}.${name}`} checked={form.value(`${at}.${name}`) === "true"} onChange={(on) => form.set(`${at}.${name}`, on ? "true" : "")}>
      {t(`plates.bolts.${name}`)}
    </CheckRow>
  );
  return (
    <>
      <div className="plan-pair">
        <LengthField {...form.field(`${at}.station`)} label={t("plates.bolts.station", { number })} />
        <LengthField {...form.field(`${at}.offset`)} label={t("plates.bolts.offset", { number })} />
      </div>
      {flag("engineered")}
      {flag("strap")}
    </>
  );
}
