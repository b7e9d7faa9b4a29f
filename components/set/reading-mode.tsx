"use client";

import { useEffect, useRef, useState } from "react";
import { Button } from "@/components/ui/button";
import { MessagesProvider, useTranslate } from "@/lib/client/i18n/messages-context";
import type { Messages } from "@/lib/client/i18n/translate";
import type { Reading } from "@/lib/client/set/calculations/adapter";
import { loadTexts } from "@/lib/client/set/load-texts";
import { readingsOf } from "@/lib/client/set/readings";
import { BigFigure } from "./big-figure";
import { ReadingLock } from "./reading-lock";
import { useWakeLock } from "./use-wake-lock";

interface ReadingModeProps {
  /** The calculator, and its answer. */
  name: string;
  answer: unknown;
  onClose: () => void;
}

/** One reading fills the screen, to be read across the slab. Fetches its words and the figures' names when it opens. */
export function ReadingMode({ name, answer, onClose }: ReadingModeProps) {
  const { locale } = useTranslate();
  const [loaded, setLoaded] = useState<{ messages: Messages; readings: readonly Reading[] } | null>(null);
  const dialog = useRef<HTMLDialogElement>(null);

  useEffect(() => {
    let over = false;
    void Promise.all([loadTexts(locale, "reading"), readingsOf(name, answer)]).then(
      ([messages, readings]) => over || setLoaded({ messages, readings }),
      () => over || onClose(),
    );
    return () => {
      over = true;
    };
  }, [locale, name, answer, onClose]);
  useEffect(() => {
    if (loaded !== null && dialog.current?.open === false) dialog.current.showModal();
  }, [loaded]);

  if (loaded === null) return null;
  return (
    <MessagesProvider locale={locale} messages={loaded.messages}>
      <dialog ref={dialog} className="reading" aria-labelledby="reading-name" onClose={onClose}>
        <Sheet readings={loaded.readings} close={() => dialog.current?.close()} />
      </dialog>
    </MessagesProvider>
  );
}

/** Untouched for this long it locks itself. */
const restMilliseconds = 12_000;

function Sheet({ readings, close }: { readings: readonly Reading[]; close: () => void }) {
  const t = useTranslate();
  const awake = useWakeLock();
  const [at, setAt] = useState(0);
  const [locked, setLocked] = useState(false);
  const reading = readings[at];

  useEffect(() => {
    if (locked) return;
    const timer = setTimeout(() => setLocked(true), restMilliseconds);
    return () => clearTimeout(timer);
  }, [locked, at]);

  const step = (by: number) => setAt((at + by + readings.length) % readings.length);
  return (
    <div
      className="reading-sheet"
      data-locked={locked ? "" : undefined}
      onKeyDown={({ key }) => {
        if (readings.length < 2 || locked) return;
        if (key === "ArrowRight") step(1);
        if (key === "ArrowLeft") step(-1);
      }}
    >
      <div aria-live="polite" className="reading-words">
        <p id="reading-name" className="reading-name">
          {reading === undefined ? t("set.reading.nothing") : t(`set.readings.${reading.key}`, (reading.params ?? {}) as Record<string, string | number>)}
        </p>
        {reading === undefined ? null : <BigFigure text={reading.text} />}
      </div>
      <p className="reading-status">
        {readings.length > 1 ? `${t("set.reading.place", { place: at + 1, of: readings.length })} ` : null}
        {awake === null ? null : t(awake ? "set.reading.awake" : "set.reading.sleeps")}
      </p>
      {locked ? (
        <ReadingLock onUnlock={() => setLocked(false)} />
      ) : (
        <div className="reading-controls">
          {readings.length > 1 ? (
            <>
              <Button kind="ghost" onClick={() => step(-1)}>
                {t("set.reading.previous")}
              </Button>
              <Button onClick={() => step(1)}>{t("set.reading.next")}</Button>
            </>
          ) : null}
          <Button kind="ghost" onClick={() => setLocked(true)}>
            {t("set.reading.lock")}
          </Button>
          <Button kind="ghost" onClick={close}>
            {t("common.actions.close")}
          </Button>
        </div>
      )}
    </div>
  );
}
