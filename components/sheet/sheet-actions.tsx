"use client";

import { ButtonLink } from "@/components/ui/button";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { localePath } from "@/lib/client/i18n/locales";
import { loadTexts } from "@/lib/client/set/load-texts";
import type { SillSet } from "@/lib/client/set/schema";
import { useDeviceSettings } from "@/lib/client/settings/use-device-settings";
import { SavePdf } from "./save-pdf";

/** The way from a set to its field sheet: the page to print, and the PDF straight away. The sheet's texts are fetched when asked for. */
export function SheetActions({ set }: { set: SillSet }) {
  const t = useTranslate();
  const { units } = useDeviceSettings();
  return (
    <>
      <ButtonLink small kind="ghost" href={localePath(t.locale, `/set/sheet?set=${encodeURIComponent(set.id)}`)}>
        {t("sheet.actions.print")}
      </ButtonLink>
      <SavePdf small set={set} paper={units === "mm" ? "a4" : "letter"} texts={() => loadTexts(t.locale, "sheet")} />
    </>
  );
}
