"use client";

import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { Translate } from "@/lib/client/i18n/translate";
import type { KeyFigure } from "@/lib/client/set/schema";
import { setAddress } from "@/lib/client/set/set-address";
import type { StageState } from "@/lib/client/set/stage-state";
import { SetLink } from "./set-link";
import { StateMark } from "./state-mark";

/** A key figure as a sentence; one whose code this edition does not know is left out. */
export function keySentence(t: Translate, calculator: string, key: KeyFigure | null): string | null {
  if (key === null) return null;
  const message = `set.key.${calculator}.${key.code}`;
  return t.has(message) ? t(message, key.params) : null;
}

/** Every stage in order with its state (mark, colour and word) and its figure; the one in hand is marked. */
export function StageRail({ setId, states, current }: { setId: string; states: readonly StageState[]; current: string | null }) {
  const t = useTranslate();
  return (
    <nav className="stage-rail" aria-label={t("set.stages.label")}>
      <ol>
        {states.map(({ stage, state, key, slots }) => {
          const calculator = slots.find((slot) => slot.key === key)?.slot.calculator ?? stage.main[0]!;
          const figure = state === "empty" ? null : keySentence(t, calculator, key);
          return (
            <li key={stage.name}>
              <SetLink href={setAddress(t.locale, { set: setId, stage: stage.name })} aria-current={stage.name === current ? "step" : undefined}>
                <StateMark state={state} />
                <span className="stage-words">
                  <span className="stage-name">{t(`set.stages.${stage.name}`)}</span>
                  <span className="stage-figure">{figure ?? (state === "empty" ? t(`set.about.${stage.name}`) : null)}</span>
                  <span className="stage-state" data-state={state}>
                    {t(`set.state.${state}`)}
                  </span>
                </span>
              </SetLink>
            </li>
          );
        })}
      </ol>
    </nav>
  );
}
