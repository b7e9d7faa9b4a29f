/** A cell that a spreadsheet would take for a formula: it begins so, half or full width, or after white space that is trimmed away. */
const looksLikeFormula = /^[\s\u0000-\u001f]*[=+\-@\uff1d\uff0b\uff0d\uff20\u2212]|^[\t\r\n]/;

/**
 * Rows as CSV (RFC 4180): CRLF, quotes where needed. A text that a spreadsheet would run is made harmless by an apostrophe
 * before it; numbers stay numbers, negative ones too.
 */
export function toCsv(rows: readonly (readonly (string | number | null)[])[]): string {
  return rows.map((row) => row.map(cell).join(",")).join("\r\n") + "\r\n";
}

function cell(value: string | number | null): string {
  if (value === null) return "";
  if (typeof value === "number") return Number.isFinite(value) ? String(value) : "";
  const safe = looksLikeFormula.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(safe) || safe !== safe.trim() ? `"${safe.replaceAll('"', '""')}"` : safe;
}
