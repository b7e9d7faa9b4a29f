/**
 * J rows of domain.md section 14, and the marks it lists in section 9 (derived by rule, the misprints of sources put right).
 * Near edges from the outside of the rim, the sheet breaking on centre.
 */
export const markRows = [
  { id: "J01", spacing: "16", thickness: "1 1/2", marks: ["15 1/4", "31 1/4", "47 1/4", "63 1/4", "79 1/4"] },
  { id: "J02", spacing: "24", thickness: "1 1/2", marks: ["23 1/4", "47 1/4", "71 1/4", "95 1/4"] },
  { id: "J05", spacing: "16", thickness: "2", marks: ["15"] },
] as const;

/** J04: bays in a sheet of 96 in. */
export const bayRows = [
  { spacing: "16", bays: 6 },
  { spacing: "19.2", bays: 5 },
  { spacing: "24", bays: 4 },
] as const;

/** Section 9: 19.2 in to the nearest 1/16, each from zero. */
export const nineteenTwo = ["18 7/16", "37 5/8", "56 7/8", "76 1/16", "95 1/4"] as const;
/** Section 9: 400 mm with 38 mm joists. */
export const fourHundred = [381, 781, 1181, 1581, 1981, 2381] as const;
