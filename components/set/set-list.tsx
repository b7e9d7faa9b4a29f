"use client";

import { useEffect, useState, type FormEvent } from "react";
import { Button } from "@/components/ui/button";
import { Disclosure } from "@/components/ui/disclosure";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { demoSet } from "@/lib/client/set/demo-set";
import { newSet } from "@/lib/client/set/new-set";
import type { SillSet } from "@/lib/client/set/schema";
import { setAddress } from "@/lib/client/set/set-address";
import { stageStates } from "@/lib/client/set/stage-state";
import type { Stage } from "@/lib/client/set/stages";
import { newSetId, setStore } from "@/lib/client/set/use-sets";
import { OpenSetFile } from "./open-set-file";
import { goTo, SetLink } from "./set-link";

const dayMilliseconds = 86_400_000;
const keptDays = 30;
/** A set deleted so lately, in milliseconds, is offered back above the list. */
const justNow = 60_000;

/** Every set on the device, and the ways to begin one. */
export function SetList({ sets, stages }: { sets: readonly SillSet[]; stages: readonly Stage[] }) {
  const t = useTranslate();
  const [name, setName] = useState("");
  const [opened] = useState(() => Date.now());
  const live = sets.filter(({ deleted }) => deleted === null).sort((a, b) => b.changed.localeCompare(a.changed));
  const gone = sets.filter(({ deleted }) => deleted !== null).sort((a, b) => b.deleted!.localeCompare(a.deleted!));

  useEffect(() => {
    const limit = new Date(Date.now() - keptDays * dayMilliseconds).toISOString();
    for (const set of sets) if (set.deleted !== null && set.deleted < limit) void setStore().purge(set.id);
  }, [sets]);

  const begin = (set: SillSet) => {
    setStore().add(set);
    goTo(setAddress(t.locale, { set: set.id }));
  };
  const start = (event: FormEvent) => {
    event.preventDefault();
    begin(newSet(newSetId(), name.trim() === "" ? t("set.list.untitled", { number: live.length + 1 }) : name.trim(), new Date().toISOString()));
  };
  const restore = (id: string) => setStore().change(id, { deleted: null });
  return (
    <>
      <form className="set-new" onSubmit={start}>
        <label className="field-label" htmlFor="set-name">
          {t("set.list.name")}
        </label>
        <span className="field-hint" id="set-name-hint">
          {t("set.list.nameHint")}
        </span>
        <input id="set-name" className="control" value={name} maxLength={200} autoComplete="off" aria-describedby="set-name-hint" onChange={(event) => setName(event.target.value)} />
        <Button type="submit">{t("set.list.start")}</Button>
      </form>
      <div className="set-buttons">
        <Button kind="ghost" onClick={() => begin(demoSet(newSetId(), t("set.list.demoName"), new Date().toISOString()))}>
          {t("set.list.demo")}
        </Button>
        <OpenSetFile />
      </div>
      {gone[0] !== undefined && Date.parse(gone[0].deleted!) > opened - justNow ? (
        <p className="set-bar" role="status">
          <span>{t("set.deletedBar", { name: gone[0].name })}</span>
          <Button small onClick={() => restore(gone[0]!.id)}>
            {t("set.bringBack")}
          </Button>
        </p>
      ) : null}
      <h2>{t("set.list.title")}</h2>
      {live.length === 0 ? <p>{t("set.list.empty")}</p> : null}
      <ul className="set-list">
        {live.map((set) => (
          <li key={set.id}>
            <SetLink href={setAddress(t.locale, { set: set.id })}>{set.name}</SetLink>
            <span className="set-list-facts">
              {t("set.list.progress", { done: stageStates(set, stages).filter(({ state }) => state === "done" || state === "look").length, all: stages.length })}, {t("set.list.changed", { date: new Date(set.changed) })}
            </span>
          </li>
        ))}
      </ul>
      {gone.length === 0 ? null : (
        <Disclosure summary={t("set.list.deleted")}>
          <p>{t("set.list.deletedHint")}</p>
          <ul className="set-list">
            {gone.map(({ id, name: title }) => (
              <li key={id}>
                <span>{title}</span>
                <Button small kind="ghost" onClick={() => restore(id)}>
                  {t("set.list.restore", { name: title })}
                </Button>
                <Button small kind="ghost" onClick={() => void setStore().purge(id)}>
                  {t("set.list.purge", { name: title })}
                </Button>
              </li>
            ))}
          </ul>
        </Disclosure>
      )}
    </>
  );
}
