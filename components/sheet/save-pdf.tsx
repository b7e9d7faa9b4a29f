"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { Messages } from "@/lib/client/i18n/translate";
import type { SillSet } from "@/lib/client/set/schema";
import { useDeviceSettings } from "@/lib/client/settings/use-device-settings";
import type { Paper } from "@/lib/client/sheet/sheet";

type Doing = "idle" | "making" | "made" | "failed";

/** Makes the PDF on this device when it is asked for, and says how that went. */
export function SavePdf({ set, paper, texts, small = false }: { set: SillSet; paper: Paper; texts: () => Promise<Messages>; small?: boolean }) {
  const t = useTranslate();
  const { precision } = useDeviceSettings();
  const [doing, setDoing] = useState<Doing>("idle");
  const save = async () => {
    setDoing("making");
    try {
      const [{ saveSheetPdf }, messages] = await Promise.all([import("./save-sheet-pdf"), texts()]);
      await saveSheetPdf(set, { locale: t.locale, messages, precision, paper });
      setDoing("made");
    } catch (error) {
      console.error(error);
      setDoing("failed");
    }
  };
  return (
    <>
      <Button kind="ghost" small={small} aria-disabled={doing === "making"} onClick={() => (doing === "making" ? undefined : void save())}>
        {t("sheet.actions.pdf")}
      </Button>
      <span role="status" className="sheet-status">
        {doing === "idle" ? "" : t(`sheet.actions.${doing}`)}
      </span>
    </>
  );
}
