/** Rows of domain.md section 14 that speak of lengths themselves. Each keeps its row's id, figures and source. */

/** `exact` in inches as a fraction's text. */
export const exactRows = [
  { id: "U01", text: "1 ft", unit: "m", value: "0.3048", source: "85 FR 62698" },
  { id: "U02", text: "1 in", unit: "mm", value: "25.4", source: "from U01" },
  { id: "U17", text: "1/64", unit: "in", value: "0.015625", source: "Hawkins table" },
  { id: "U17", text: "1/64", unit: "mm", value: "0.396875", source: "Hawkins table: 396,875 nm" },
  { id: "U18", text: "21/64", unit: "in", value: "0.328125", source: "Hawkins; Cosgrove" },
  { id: "U19", text: "45/64", unit: "in", value: "0.703125", source: "Hawkins; Cosgrove" },
  { id: "U20", text: "57/64", unit: "in", value: "0.890625", source: "Hawkins; Cosgrove" },
  { id: "U21", text: "19/32", unit: "in", value: "0.59375", source: "Hawkins; Cosgrove" },
  { id: "U27", text: "4 3/8", unit: "in", value: "4.375", source: "arithmetic" },
  { id: "U28", text: "0.01 ft", unit: "in", value: "0.12", source: "arithmetic" },
  { id: "U28", text: "0.01 ft", unit: "mm", value: "3.048", source: "arithmetic" },
  { id: "U29", text: "19.2", unit: "mm", value: "487.68", source: "Allen & Iano p. 181, flagged: it prints 486" },
] as const;

/** Decimal feet of typed lengths. */
export const decimalFeetRows = [
  { id: "U06", text: `8' 3 5/16"`, feet: 8.276, within: 5e-5, source: "Glencoe activity 9" },
  { id: "U14", text: `7' 4 3/4"`, feet: 7.395833, within: 1e-6, source: "arithmetic" },
  { id: "U15", text: `15' 11 1/8"`, feet: 15.927083, within: 1e-6, source: "exercise in Dr. Math 58323" },
  { id: "U27", text: "4 3/8", feet: 0.364583, within: 1e-6, source: "arithmetic" },
  { id: "section 4", text: `16' 10 5/8"`, feet: 16.88541667, within: 5e-9, source: "Dr. Math 58323" },
  ...[0.0833, 0.1667, 0.25, 0.3333, 0.4167, 0.5, 0.5833, 0.6667, 0.75, 0.8333, 0.9167, 1].map((feet, index) => ({ id: "U16", text: `${index + 1}"`, feet, within: 5e-5, source: "arithmetic" })),
  ...[0.0104, 0.0208, 0.0313, 0.0417, 0.0521, 0.0625, 0.0729, 0.0833].map((feet, index) => ({ id: "section 4", text: `${index + 1}/8`, feet, within: 5.0001e-5, source: "table of eighths" })),
  { id: "section 4", text: "1/16", feet: 0.0052, within: 5e-5, source: "table of eighths" },
] as const;

/** What prints, to a precision. */
export const printedRows = [
  { id: "U07", text: "5.4583 ft", precision: "1/16", printed: `5' 5 1/2"`, source: "Glencoe activity 9" },
  { id: "U08", text: "5.1719 ft", precision: "1/16", printed: `5' 2 1/16"`, source: "Glencoe activity 9" },
  { id: "U09", text: "8.5833 ft", precision: "1/16", printed: `8' 7"`, source: "Glencoe activity 9" },
  { id: "U10", text: "13.1042 ft", precision: "1/16", printed: `13' 1 1/4"`, source: "Glencoe activity 9" },
  { id: "section 4", text: "10.7396 ft", precision: "1/16", printed: `10' 8 7/8"`, source: "Glencoe activity 9, the only choice that fits" },
  { id: "U22", text: "0.1330", precision: "1/64", printed: `9/64"`, source: "ICS Building Trades Pocketbook" },
  { id: "U23", text: "0.3670", precision: "1/64", printed: `23/64"`, source: "ICS Building Trades Pocketbook" },
  { id: "U24", text: "0.8979", precision: "1/64", printed: `57/64"`, source: "ICS Building Trades Pocketbook" },
  { id: "U25", text: "0.3123", precision: "1/64", printed: `5/16"`, source: "FAA AMT Handbook, 20/64" },
  { id: "U26", text: "0.763", precision: "1/64", printed: `49/64"`, source: "FAA AMT Handbook" },
  { id: "D20", text: "111.12", precision: "1/8", printed: `9' 3 1/8"`, source: "NAVEDTRA 14044: 13.89 in x 8" },
  { id: "J06", text: "95.9375", precision: "1/16", printed: `7' 11 15/16"`, source: "arithmetic: five times 19 3/16" },
] as const;
