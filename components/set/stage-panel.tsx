"use client";

import { useEffect, useMemo, useState, type ComponentType, type ReactNode } from "react";
import { Button } from "@/components/ui/button";
import { FormHomeContext, type FormHome } from "@/lib/client/calculator/form-home";
import { MessagesProvider, useTranslate } from "@/lib/client/i18n/messages-context";
import type { Messages } from "@/lib/client/i18n/translate";
import { adapterOf } from "@/lib/client/set/calculations";
import { carriedInto, mayTakeQuietly, takingPatch } from "@/lib/client/set/carry";
import { loadTexts } from "@/lib/client/set/load-texts";
import type { SillSet } from "@/lib/client/set/schema";
import { keepReport, stageFormStore } from "@/lib/client/set/stage-form";
import type { Slot, Stage } from "@/lib/client/set/stages";
import { setStore } from "@/lib/client/set/use-sets";
import { stageCalculators } from "./stage-calculators";

interface StagePanelProps {
  set: SillSet;
  stages: readonly Stage[];
  slot: Slot;
  /** The calculator's version. */
  core: string;
  next: ReactNode;
}

interface Loaded {
  of: string;
  Calculator: ComponentType<{ header: ReactNode }>;
  messages: Messages;
}

/** One calculation of a set: the calculator's own page in use, its form kept by the set. */
export function StagePanel({ set, stages, slot, core, next }: StagePanelProps) {
  const t = useTranslate();
  const [tries, setTries] = useState(0);
  const [loaded, setLoaded] = useState<Loaded | "failed" | null>(null);
  const { locale } = t;
  const { calculator } = slot;

  useEffect(() => {
    let over = false;
    void Promise.all([stageCalculators[calculator]!(), loadTexts(locale, calculator)]).then(
      ([Calculator, messages]) => over || setLoaded({ of: calculator, Calculator, messages }),
      () => over || setLoaded("failed"),
    );
    return () => {
      over = true;
    };
  }, [locale, calculator, tries]);
  useTakeQuietly(set, stages, slot);

  const home = useStageHome(set.id, slot, core, next);
  if (loaded === "failed") {
    return (
      <div className="set-part">
        <p role="alert">{t("set.stages.failed")}</p>
        <Button onClick={() => setTries(tries + 1)}>{t("set.stages.again")}</Button>
      </div>
    );
  }
  // A calculator must never meet another's form.
  if (loaded === null || loaded.of !== calculator) return null;
  return (
    <MessagesProvider locale={locale} messages={loaded.messages}>
      <FormHomeContext value={home}>
        <loaded.Calculator key={slot.id} header={null} />
      </FormHomeContext>
    </MessagesProvider>
  );
}

/** Fills a stage from those before it, the first time it is opened with something to take. */
function useTakeQuietly(set: SillSet, stages: readonly Stage[], slot: Slot): void {
  useEffect(() => {
    const now = carriedInto(set, stages, slot);
    if (now === null || Object.keys(now).length === 0 || !mayTakeQuietly(set, slot, now)) return;
    setStore().change(set.id, { calculations: { [slot.id]: takingPatch(set, slot, now) } });
  }, [set, stages, slot]);
}

function useStageHome(setId: string, { id, stage, calculator, wall }: Slot, core: string, next: ReactNode): FormHome {
  const bound = useMemo(() => bindStage(setId, { id, stage, calculator, ...(wall === undefined ? {} : { wall }) }, core), [setId, id, stage, calculator, wall, core]);
  return useMemo(() => ({ ...bound, next }), [bound, next]);
}

function bindStage(setId: string, slot: Slot, core: string): Omit<FormHome, "next"> {
  const adapter = adapterOf(slot.calculator);
  let told: unknown = null;
  return {
    open: (start) => stageFormStore(setStore(), setId, slot.id, start),
    report(report) {
      // A search that ends by time may answer otherwise in another tab: each tab tells an answer once, so that they do not take turns.
      if (report.answer !== null && report.answer === told) return;
      told = report.answer;
      if (adapter !== undefined) keepReport({ store: setStore(), setId, slot, adapter, core }, report);
    },
  };
}
