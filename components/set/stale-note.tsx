"use client";

import { Button } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { carriedInto, takingPatch } from "@/lib/client/set/carry";
import type { SillSet } from "@/lib/client/set/schema";
import type { SlotState } from "@/lib/client/set/stage-state";
import type { Stage } from "@/lib/client/set/stages";
import { setStore } from "@/lib/client/set/use-sets";

/** Says that a calculation rests on values changed since, and offers to take the new ones or to leave it as it is. */
export function StaleNote({ set, stages, state, ground }: { set: SillSet; stages: readonly Stage[]; state: SlotState; ground: Stage | undefined }) {
  const t = useTranslate();
  const { slot, changed } = state;
  const now = carriedInto(set, stages, slot);
  if (changed.length === 0 || now === null) {
    return ground === undefined ? null : (
      <div className="set-stale" role="status">
        <Note tone="warn">{t("set.stale.earlier", { stage: t(`set.stages.${ground.name}`) })}</Note>
      </div>
    );
  }
  const take = (patch: { fields?: Record<string, string | null>; taken: Readonly<Record<string, string>> }) => setStore().change(set.id, { calculations: { [slot.id]: patch } }, { what: "taking", slot: slot.id });
  return (
    <div className="set-stale" role="status">
      <Note tone="warn" title={t(`set.stale.${slot.stage}`)}>
        <p>{t("set.stale.was", { count: changed.length })}</p>
        <div className="set-buttons">
          <Button small onClick={() => take(takingPatch(set, slot, now))}>
            {t("set.stale.take")}
          </Button>
          <Button small kind="ghost" onClick={() => take({ taken: now })}>
            {t("set.stale.keep")}
          </Button>
        </div>
      </Note>
    </div>
  );
}
