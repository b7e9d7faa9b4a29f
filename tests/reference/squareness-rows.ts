/**
 * Rows of domain.md section 14, recomputed there with python3; the last column there is the status: D derived, R read,
 * R2 read second-hand.
 */

/** S01 to S04: the 12 by 16 ft triangle at its limits (NAHB family, R2; the angles D). */
export const triangleRows = [
  { id: "S01", hypotenuse: 240.5, openDegrees: 0.2489, over12: 0.6257, over16: 0.8342 },
  { id: "S04", hypotenuse: 239.5, openDegrees: -0.2484 },
] as const;

/** S05, S06: Kent, 3/4 in per 100 ft of hypotenuse (JLC quoting Kent, R2). Feet and inches. */
export const kentRows = [
  { id: "S05", feet: 50, inches: 3 / 8 },
  { id: "S06", feet: 100, inches: 3 / 4 },
] as const;

/** S07: 24 by 28 ft with diagonals 1.5 in apart (FHB thread data, D). */
export const racked = { id: "S07", length: 336, width: 288, ac: 443.3125, bd: 441.8125, cornerErrorDegrees: 0.1965, over24: 0.988, over28: 1.152 } as const;

/** S10: equal diagonals of a true rectangle (D). */
export const rectangle = { id: "S10", sides: { ab: 336, bc: 288, cd: 336, da: 288 }, diagonal: 442.5381 } as const;

/** S11: corners of a trapezoid with equal diagonals (D). */
export const trapezoid = { id: "S11", corners: { A: [0, 0], B: [336, 0], C: [335, 288], D: [1, 288] }, diagonal: 441.779, baseAngle: 89.801 } as const;

/** Q05 to Q07: adjusted braced quadrilaterals, to 2e-4 in (D). */
export const adjustedRows = [
  { id: "Q05", sides: { ab: 336, bc: 288, cd: 336, da: 288 }, diagonals: { ac: 443.3125, bd: 441.8125 }, adjusted: { ab: 336.0095, bc: 288.0081, cd: 336.0095, da: 288.0081, ac: 443.3, bd: 441.8 } },
  {
    id: "Q06",
    sides: { ab: 336, bc: 288, cd: 336.25, da: 288 },
    diagonals: { ac: 442.5, bd: 442.5 },
    adjusted: { ab: 335.9495, bc: 287.9567, cd: 336.1995, da: 287.9567, ac: 442.5665, bd: 442.5665 },
    angles: { A: 90.0249, B: 90.0249, C: 89.9751, D: 89.9751 },
  },
  { id: "Q07", sides: { ab: 480, bc: 360, cd: 480, da: 360 }, diagonals: { ac: 600, bd: 600 }, adjusted: { ab: 480, bc: 360, cd: 480, da: 360, ac: 600, bd: 600 }, angles: { A: 90, B: 90, C: 90, D: 90 } },
] as const;

/** T01 to T08 and T13: steel tapes. Lengths and corrections in feet; T03 is the corrected length's gain. */
export const tapeRows = [
  { id: "T01", feet: 100, tape: { temperature: 69, expansion: 0.0000065 }, part: "temperature", correction: 0.00065, within: 1e-9 }, // NAVEDTRA EA, R
  { id: "T02", feet: 100, tape: { temperature: 83, expansion: 0.0000065 }, part: "temperature", correction: 0.00975, within: 1e-9 }, // NAVEDTRA EA, R
  { id: "T03", feet: 500, tape: { nominalLength: "100 ft", trueLength: "100.02 ft" }, part: "length", correction: 0.1, within: 1e-9 }, // taping slides, R
  { id: "T04", feet: 368.5, tape: { temperature: 22, expansion: 0.0000065 }, part: "temperature", correction: -0.1102, within: 5e-4 }, // taping slides, R
  { id: "T05", feet: 348.75, tape: { pull: 12, weight: 2.8, span: "100 ft" }, part: "sag", correction: -0.7068, within: 5e-4 }, // taping slides, R
  { id: "T06", feet: 348.75, tape: { pull: 18, weight: 2.8, span: "100 ft" }, part: "sag", correction: -0.3142, within: 5e-4 }, // taping slides, R
  { id: "T07", feet: 348.75, tape: { pull: 12, weight: 2.8, span: "50 ft" }, part: "sag", correction: -0.1964, within: 5e-4 }, // taping slides, R
  { id: "T08", feet: 100, tape: { pull: 18, standardPull: 12, section: 0.015 }, part: "pull", correction: 0.00138, within: 5e-5 }, // taping slides, R
  { id: "T13", feet: 50, tape: { temperature: 98 }, part: "temperature", correction: 0.0097, within: 1e-4 }, // arithmetic, D
] as const;
