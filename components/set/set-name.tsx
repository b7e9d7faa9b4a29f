"use client";

import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/button";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { SillSet } from "@/lib/client/set/schema";
import { setStore } from "@/lib/client/set/use-sets";

/** The set's name as heading, and the way to change it. */
export function SetName({ set }: { set: SillSet }) {
  const t = useTranslate();
  const [draft, setDraft] = useState<string | null>(null);
  const save = (event: FormEvent) => {
    event.preventDefault();
    const name = (draft ?? "").trim().slice(0, 200);
    if (name !== "" && name !== set.name) setStore().change(set.id, { name }, { what: "rename" });
    setDraft(null);
  };
  return (
    <>
      <h1>{set.name}</h1>
      {draft === null ? (
        <Button small kind="ghost" className="no-print" onClick={() => setDraft(set.name)}>
          {t("set.actions.rename")}
        </Button>
      ) : (
        <form className="set-new" onSubmit={save}>
          <label className="field-label" htmlFor="set-rename">
            {t("set.list.name")}
          </label>
          <input id="set-rename" className="control" value={draft} maxLength={200} autoComplete="off" autoFocus onChange={(event) => setDraft(event.target.value)} />
          <Button small type="submit">
            {t("set.actions.save")}
          </Button>
        </form>
      )}
    </>
  );
}
