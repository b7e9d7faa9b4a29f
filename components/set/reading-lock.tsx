"use client";

import { useEffect, useState } from "react";
import { Button } from "@/components/ui/button";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** The second tap must come within this time, and not sooner than a bouncing drop. */
const windowMilliseconds = 5_000;
const bounceMilliseconds = 350;

/** Locked against wet touches: one tap asks for another at the other side of the screen, and only that one unlocks. No drag. */
export function ReadingLock({ onUnlock }: { onUnlock: () => void }) {
  const t = useTranslate();
  const [firstAt, setFirstAt] = useState<number | null>(null);
  useEffect(() => {
    if (firstAt === null) return;
    const timer = setTimeout(() => setFirstAt(null), windowMilliseconds);
    return () => clearTimeout(timer);
  }, [firstAt]);
  return (
    <div className="reading-controls reading-locked">
      {firstAt === null ? (
        <Button kind="ghost" onClick={({ timeStamp }) => setFirstAt(timeStamp)}>
          {t("set.reading.unlock")}
        </Button>
      ) : (
        <Button
          autoFocus
          className="reading-second"
          onClick={({ timeStamp }) => {
            if (timeStamp - firstAt >= bounceMilliseconds) onUnlock();
          }}
        >
          {t("set.reading.unlockNow")}
        </Button>
      )}
    </div>
  );
}
