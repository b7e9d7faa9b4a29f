"use client";

import { useSearchParams } from "next/navigation";
import { useMemo, type ReactNode } from "react";
import { Button } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { readPlace, setAddress } from "@/lib/client/set/set-address";
import type { Keeping } from "@/lib/client/set/set-store";
import { stagesWith } from "@/lib/client/set/stages";
import { useSets } from "@/lib/client/set/use-sets";
import { SetLink } from "./set-link";
import { SetList } from "./set-list";
import { SetView } from "./set-view";
import { stageCalculators } from "./stage-calculators";

interface SetPageProps {
  /** Versions of the calculators that have a page, by name. */
  versions: Readonly<Record<string, string>>;
  /** Title and first words of the list, rendered by the server. */
  header: ReactNode;
}

/** All of the sets on one static page: which set and which stage is in the address, and read here. */
export function SetPage({ versions, header }: SetPageProps) {
  const t = useTranslate();
  const query = useSearchParams();
  const { sets, keeping } = useSets();
  const stages = useMemo(() => stagesWith(Object.keys(versions).filter((name) => name in stageCalculators)), [versions]);
  const place = readPlace(new URLSearchParams(query));
  const set = sets?.find(({ id, deleted }) => id === place.set && deleted === null);

  if (sets === null) {
    return (
      <div className="set-start">
        {header}
        <p role="status">{t("set.loading")}</p>
      </div>
    );
  }
  if (set !== undefined) {
    return (
      <>
        <KeepingNote keeping={keeping} />
        <SetView set={set} stages={stages} place={place} versions={versions} />
      </>
    );
  }
  return (
    <div className="set-start">
      {header}
      <KeepingNote keeping={keeping} />
      {place.set === null ? null : (
        <Note tone="warn" title={t("set.missing.title")}>
          <p>{t("set.missing.text")}</p>
          <p>
            <SetLink href={setAddress(t.locale)}>{t("set.list.all")}</SetLink>
          </p>
        </Note>
      )}
      <SetList sets={sets} stages={stages} />
    </div>
  );
}

/** Whoever types must know when it is not kept. */
function KeepingNote({ keeping }: { keeping: Keeping }) {
  const t = useTranslate();
  if (keeping === "kept") return null;
  return (
    <div className="set-keeping" role="alert">
      <Note tone="out">
        <p>{t(`set.keeping.${keeping}`)}</p>
        {keeping === "outdated" ? (
          <Button small onClick={() => window.location.reload()}>
            {t("set.keeping.reload")}
          </Button>
        ) : null}
      </Note>
    </div>
  );
}
