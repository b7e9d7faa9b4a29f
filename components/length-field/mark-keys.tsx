"use client";

import type { RefObject } from "react";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { insertMark, type Mark } from "./insert-mark";

const keys = [
  { mark: "feet", label: "common.field.feet", spoken: "common.field.insertFeet" },
  { mark: "inches", label: "common.field.inches", spoken: "common.field.insertInches" },
  { mark: "slash", label: "common.field.slash", spoken: "common.field.insertSlash" },
  { mark: "space", label: "common.field.space", spoken: "common.field.insertSpace" },
] as const satisfies readonly { mark: Mark; label: string; spoken: string }[];

/** The slim row of a touch screen, whose decimal keypad lacks these marks. The field keeps focus and its keypad. */
export function MarkKeys({ input }: { input: RefObject<HTMLInputElement | null> }) {
  const t = useTranslate();

  function press(mark: Mark): void {
    const field = input.current;
    if (field === null) return;
    const length = field.value.length;
    const typed = insertMark(field.value, field.selectionStart ?? length, field.selectionEnd ?? length, mark);
    // Written into the field and told to React as typing is, so that text and caret change in the same moment and the next key falls right.
    field.setRangeText(typed.text, 0, length, "end");
    field.setSelectionRange(typed.caret, typed.caret);
    field.dispatchEvent(new Event("input", { bubbles: true }));
  }

  return (
    <div className="length-keys" role="group" aria-label={t("common.field.keys")}>
      {keys.map(({ mark, label, spoken }) => (
        <button key={mark} type="button" tabIndex={-1} aria-label={t(spoken)} onPointerDown={(event) => event.preventDefault()} onClick={() => press(mark)}>
          {t(label)}
        </button>
      ))}
    </div>
  );
}
