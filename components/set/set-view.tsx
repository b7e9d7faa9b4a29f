"use client";

import { useEffect } from "react";
import { SheetActions } from "@/components/sheet/sheet-actions";
import { Button } from "@/components/ui/button";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { duplicateOf } from "@/lib/client/set/new-set";
import type { SillSet } from "@/lib/client/set/schema";
import { setAddress, type SetPlace } from "@/lib/client/set/set-address";
import { stageStates } from "@/lib/client/set/stage-state";
import type { Stage } from "@/lib/client/set/stages";
import { newSetId, setStore } from "@/lib/client/set/use-sets";
import { saveSetFile } from "./save-set-file";
import { goTo, SetLink } from "./set-link";
import { SetName } from "./set-name";
import { SetPlan } from "./set-plan";
import { StageRail } from "./stage-rail";
import { StageView } from "./stage-view";

interface SetViewProps {
  set: SillSet;
  stages: readonly Stage[];
  place: SetPlace;
  versions: Readonly<Record<string, string>>;
}

/** One set: its stages and plan, and the stage in hand. On a phone either the rail or the stage shows, on a desk both. */
export function SetView({ set, stages, place, versions }: SetViewProps) {
  const t = useTranslate();
  const states = stageStates(set, stages);
  const state = states.find(({ stage }) => stage.name === place.stage);
  const undoable = setStore().undoable(set.id);

  useEffect(() => {
    const before = document.title;
    document.title = `${set.name} · ${t("common.name")}`;
    return () => {
      document.title = before;
    };
  }, [set.name, t]);

  const undo = () => {
    const done = setStore().undo(set.id);
    if (done?.slot === undefined) return;
    const [stage = "", calculator = "", wall] = done.slot.split(".");
    goTo(setAddress(t.locale, { set: set.id, stage, part: wall ?? calculator }));
  };
  const duplicate = () => {
    const copy = duplicateOf(set, newSetId(), t("set.actions.copyOf", { name: set.name }), new Date().toISOString());
    setStore().add(copy);
    goTo(setAddress(t.locale, { set: copy.id }));
  };
  const remove = () => {
    setStore().change(set.id, { deleted: new Date().toISOString() });
    goTo(setAddress(t.locale));
  };
  return (
    <div className="set" data-stage={state === undefined ? undefined : ""}>
      <div className="set-head">
        <p className="set-crumb">
          <SetLink href={setAddress(t.locale)}>{t("set.list.all")}</SetLink>
        </p>
        <SetName key={set.id} set={set} />
        <div className="set-buttons no-print">
          <Button small kind="ghost" onClick={undo} disabled={undoable === null}>
            {undoable === null ? t("set.actions.undo") : t(`set.undo.${undoable.what}`)}
          </Button>
          <SheetActions set={set} />
          <Button small kind="ghost" onClick={() => saveSetFile(set)}>
            {t("set.actions.export")}
          </Button>
          <Button small kind="ghost" onClick={duplicate}>
            {t("set.actions.duplicate")}
          </Button>
          <Button small kind="ghost" onClick={remove}>
            {t("set.actions.delete")}
          </Button>
        </div>
      </div>
      <div className="set-side">
        <StageRail setId={set.id} states={states} current={state?.stage.name ?? null} />
        <SetPlan set={set} stages={stages} />
      </div>
      {state === undefined ? null : (
        <div className="set-stage">
          <StageView set={set} stages={stages} states={states} state={state} part={place.part} versions={versions} />
        </div>
      )}
    </div>
  );
}
