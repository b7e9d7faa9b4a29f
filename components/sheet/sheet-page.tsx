"use client";

import { useSearchParams } from "next/navigation";
import { useEffect, useMemo, useState, useSyncExternalStore } from "react";
import { Button, ButtonLink } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import { Segmented } from "@/components/ui/segmented";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { Messages } from "@/lib/client/i18n/translate";
import type { SillSet } from "@/lib/client/set/schema";
import { setAddress } from "@/lib/client/set/set-address";
import { newSetId, setStore, useSets } from "@/lib/client/set/use-sets";
import { useDeviceSettings } from "@/lib/client/settings/use-device-settings";
import type { Paper } from "@/lib/client/sheet/sheet";
import type * as core from "./sheet-core";
import { SavePdf } from "./save-pdf";
import { SheetView } from "./sheet-view";

const onHashChange = (listener: () => void) => {
  window.addEventListener("hashchange", listener);
  return () => window.removeEventListener("hashchange", listener);
};

/** The sheet of a set on this device (`?set=`), or of the inputs that a printed code brought (`#…`). */
export function SheetPage({ messages }: { messages: Messages }) {
  const t = useTranslate();
  const query = useSearchParams();
  const { sets } = useSets();
  const { precision, units } = useDeviceSettings();
  const [chosen, setChosen] = useState<Paper | null>(null);
  const [loaded, setLoaded] = useState<typeof core | null>(null);
  const [now] = useState(() => new Date());
  const packed = useSyncExternalStore(onHashChange, () => window.location.hash.slice(1), () => "");
  useEffect(() => void import("./sheet-core").then(setLoaded, () => undefined), []);

  const brought = useMemo(() => {
    if (loaded === null || packed === "") return null;
    try {
      return loaded.unpackSet(packed, "brought", loaded.operations);
    } catch {
      return "damaged" as const;
    }
  }, [loaded, packed]);
  const set: SillSet | undefined = packed === "" ? sets?.find(({ id, deleted }) => id === query.get("set") && deleted === null) : brought === "damaged" || brought === null ? undefined : brought;
  const paper: Paper = chosen ?? (units === "mm" ? "a4" : "letter");
  const sheet = useMemo(() => (loaded === null || set === undefined ? null : loaded.sheetOf(set, { stages: loaded.stages, t, precision, paper, now, origin: window.location.origin })), [loaded, set, t, precision, paper, now]);
  const code = useMemo(() => (loaded === null || sheet === null ? null : loaded.codeOf(sheet.code.address)), [loaded, sheet]);

  if (loaded === null || (packed === "" && sets === null)) return <p role="status">{t("sheet.actions.loading")}</p>;
  if (sheet === null || set === undefined || code === null) {
    return (
      <Note tone="warn" title={t("sheet.missing.title")}>
        <p>{t(brought === "damaged" ? "sheet.missing.damaged" : "sheet.missing.text")}</p>
        <p>
          <a href={setAddress(t.locale)}>{t("sheet.missing.sets")}</a>
        </p>
      </Note>
    );
  }
  const keep = async () => {
    const kept = { ...set, id: newSetId() };
    setStore().add(kept);
    await setStore().flush();
    window.location.assign(setAddress(t.locale, { set: kept.id }));
  };
  return (
    <>
      <div className="sheet-bar no-print">
        <Segmented name="paper" legend={t("sheet.actions.paper")} value={paper} onChange={(value) => setChosen(value as Paper)} options={(["letter", "a4"] as const).map((value) => ({ value, label: t(`sheet.actions.${value}`) }))} />
        <div className="set-buttons">
          <Button onClick={() => window.print()}>{t("sheet.actions.print")}</Button>
          <SavePdf set={set} paper={paper} texts={() => Promise.resolve(messages)} />
          {packed === "" ? (
            <ButtonLink kind="ghost" href={setAddress(t.locale, { set: set.id })}>
              {t("sheet.actions.back")}
            </ButtonLink>
          ) : (
            <Button kind="ghost" onClick={() => void keep()}>
              {t("sheet.actions.keep")}
            </Button>
          )}
        </div>
        <p className="field-hint">{t("sheet.actions.hint")}</p>
      </div>
      <div className="sheet-desk" role="region" aria-label={t("sheet.actions.show")} tabIndex={0}>
        <SheetView sheet={sheet} code={code} />
      </div>
    </>
  );
}
