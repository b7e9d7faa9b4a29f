/**
 * One line of the report. `met` is whether the aim is reached, or undefined for a figure without one.
 * @param {string} what @param {string} figure @param {{ aim?: string, met?: boolean }} [judged]
 */
export const row = (what, figure, { aim = "", met } = {}) => ({ what, figure, aim, met });

/** A figure that should stay at or under its aim. */
export const atMost = (what, value, aim, unit = "", digits = 2) => row(what, `${value.toFixed(digits)}${unit}`, { aim: `≤ ${aim}${unit}`, met: value <= aim });

export const atLeast = (what, value, aim, digits = 2) => row(what, value.toFixed(digits), { aim: `≥ ${aim}`, met: value >= aim });

export function printTable(rows) {
  const widths = ["what", "figure", "aim"].map((column) => Math.max(column.length, ...rows.map((line) => line[column].length)));
  const line = (what, figure, aim, met) => `${what.padEnd(widths[0])}  ${figure.padStart(widths[1])}  ${aim.padStart(widths[2])}  ${met}`.trimEnd();
  console.log(`\n${line("what", "figure", "aim", "")}`);
  for (const { what, figure, aim, met } of rows) console.log(line(what, figure, aim, met === undefined ? "" : met ? "met" : "MISSED"));
}

/** The value that `part` of the sorted values do not exceed. */
export function percentile(values, part) {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.ceil(part * sorted.length) - 1)];
}

export const median = (values) => percentile(values, 0.5);
