const feetAndInches = /^(-?)(\d+)' (?:(\d+)(?: (\d+\/\d+))?|(\d+\/\d+))"$/;

/** A printed length as a tape that counts inches shows it: `35' 8 5/16"` is `428 5/16"`. Anything else stays as it is. */
export function inInches(text: string): string {
  const found = feetAndInches.exec(text);
  if (found === null) return text;
  const [, sign = "", feet = "0", inches = "0", fraction = "", alone = ""] = found;
  const rest = fraction || alone;
  return `${sign}${Number(feet) * 12 + Number(inches)}${rest === "" ? "" : ` ${rest}`}"`;
}

/** Whether readings were typed as a count of inches; then they are answered so. */
export function countsInches(typed: string): boolean {
  return typed.trim() !== "" && !/['\u2018\u2019\u2032\u00B4`]|f|pie|m/i.test(typed);
}
