"use client";

import { useMemo } from "react";
import { ButtonLink } from "@/components/ui/button";
import { Segmented } from "@/components/ui/segmented";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { SillSet } from "@/lib/client/set/schema";
import { setAddress } from "@/lib/client/set/set-address";
import type { StageState } from "@/lib/client/set/stage-state";
import { chosenFor, type Slot, type Stage } from "@/lib/client/set/stages";
import { setStore } from "@/lib/client/set/use-sets";
import { goByChoice, goTo, SetLink } from "./set-link";
import { StagePanel } from "./stage-panel";
import { StaleNote } from "./stale-note";

interface StageViewProps {
  set: SillSet;
  stages: readonly Stage[];
  states: readonly StageState[];
  state: StageState;
  part: string | null;
  versions: Readonly<Record<string, string>>;
}

/** A stage in hand: which of its calculations, whether it is stale, and the calculator itself. */
export function StageView({ set, stages, states, state, part, versions }: StageViewProps) {
  const t = useTranslate();
  const { stage, slots } = state;
  const index = states.indexOf(state);
  const shown = slots.find(({ slot }) => partOf(slot) === part) ?? slots[0]!;
  const { slot } = shown;
  const ground = states.slice(0, index).find((earlier) => earlier.state === "stale")?.stage;
  const following = states[index + 1];
  const [nextHref, nextLabel] = following === undefined ? [setAddress(t.locale, { set: set.id }), t("set.stages.last")] : [setAddress(t.locale, { set: set.id, stage: following.stage.name }), t("set.stages.next", { stage: t(`set.stages.${following.stage.name}`) })];
  const next = useMemo(
    () => (
      <ButtonLink
        href={nextHref}
        onClick={(event) => {
          event.preventDefault();
          goTo(nextHref);
        }}
      >
        {nextLabel}
      </ButtonLink>
    ),
    [nextHref, nextLabel],
  );

  const choose = (calculator: string) => {
    if (stage.main.includes(calculator) && calculator !== chosenFor(set, stage)) setStore().change(set.id, { choices: { [stage.name]: calculator } }, { what: "choice" });
    goByChoice(setAddress(t.locale, { set: set.id, stage: stage.name, part: stage.beside.includes(calculator) ? calculator : null }));
  };
  const offered = [...stage.main, ...stage.beside];
  const walls = slots.flatMap((known) => (known.slot.wall === undefined ? [] : [known.slot.wall]));
  return (
    <>
      <div className="set-stage-head">
        <p className="set-place">
          <SetLink href={setAddress(t.locale, { set: set.id })}>{t("set.stages.all")}</SetLink>
          <span>{t("set.stages.of", { place: index + 1, of: states.length })}</span>
        </p>
        <h2>{t(`set.stages.${stage.name}`)}</h2>
        {offered.length < 2 ? null : (
          <div className="field">
            <Segmented name="set-choice" legend={t("set.stages.choice")} value={slot.calculator} onChange={choose} options={offered.map((name) => ({ value: name, label: t(`common.calculators.${name}`) }))} />
          </div>
        )}
        {walls.length < 2 ? null : (
          <div className="field">
            <Segmented
              name="set-wall"
              legend={t("set.stages.walls")}
              value={slot.wall ?? ""}
              onChange={(wall) => goByChoice(setAddress(t.locale, { set: set.id, stage: stage.name, part: wall }))}
              options={walls.map((wall) => ({ value: wall, label: wall.toUpperCase() }))}
            />
          </div>
        )}
        <StaleNote set={set} stages={stages} state={shown} ground={ground} />
      </div>
      <StagePanel set={set} stages={stages} slot={slot} core={versions[slot.calculator] ?? ""} next={next} />
    </>
  );
}

/** How a calculation within its stage is named in the address. */
export function partOf({ wall, calculator }: Slot): string {
  return wall ?? calculator;
}
