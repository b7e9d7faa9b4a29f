import type { Translate } from "@/lib/client/i18n/translate";

/** How far a figure's source was read, in words; nothing for a rule of one's own. */
export function statusText(status: string | null, t: Translate): string {
  return status === null ? "" : t(`common.sourceStatus.${status}`);
}
