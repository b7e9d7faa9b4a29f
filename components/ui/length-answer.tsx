"use client";

import { useTranslate } from "@/lib/client/i18n/messages-context";
import { LengthText } from "./length-text";

/** A length as the contract answers it: its text, then "strong" or "scant" when the true length leans. */
export function LengthAnswer({ length, className }: { length: { text: string; lean: string }; className?: string }) {
  const t = useTranslate();
  return (
    <>
      <LengthText text={length.text} className={className} />
      {length.lean === "exact" ? null : <span className="length-lean"> {t(`common.lean.${length.lean}`)}</span>}
    </>
  );
}
