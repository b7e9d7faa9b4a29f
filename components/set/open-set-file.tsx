"use client";

import { useState } from "react";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { duplicateOf } from "@/lib/client/set/new-set";
import { newSetId, setStore } from "@/lib/client/set/use-sets";

/** Takes a set from a file and keeps it beside those there are; a file that is none is named for what is wrong with it. */
export function OpenSetFile() {
  const t = useTranslate();
  const [said, setSaid] = useState<{ text: string; bad: boolean } | null>(null);
  const open = async (file: File) => {
    const { readSetFile } = await import("@/lib/client/set/set-file");
    const { set, problem } = readSetFile(await file.text());
    if (problem !== null) return setSaid({ text: t(`set.file.${problem.code}`, problem.params), bad: true });
    const known = setStore().find(set.id) !== undefined;
    setStore().add(known ? duplicateOf(set, newSetId(), t("set.actions.copyOf", { name: set.name }), new Date().toISOString()) : { ...set, deleted: null });
    setSaid({ text: t(known ? "set.file.openedCopy" : "set.file.opened", { name: set.name }), bad: false });
  };
  return (
    <div className="set-file">
      <label className="btn btn-ghost">
        {t("set.actions.import")}
        <input
          type="file"
          accept="application/json,.json"
          className="sr-only"
          onChange={({ target }) => {
            const [file] = target.files ?? [];
            target.value = "";
            if (file !== undefined) void open(file);
          }}
        />
      </label>
      <p role="status" className={said?.bad ? "field-error" : undefined}>
        {said?.text}
      </p>
    </div>
  );
}
