/** Rows D01 to D29 of domain.md section 14; `feet` and `inches` are the legs' unit. Status in the comment: R read, R2 second-hand, D derived. */
export const diagonalRows = [
  { id: "D01", unit: "ft", legs: [6, 8], diagonal: 10, within: 0 }, // Carpenters Guide, R
  { id: "D02", unit: "ft", legs: [12, 16], diagonal: 20, within: 0 }, // NAHB family, R2
  { id: "D03", unit: "mm", legs: [300, 400], diagonal: 500, within: 0 }, // CMHC p. 30, R
  { id: "D04", unit: "ft", legs: [9, 12], diagonal: 15, within: 0 }, // toolsofthetrade, R
  { id: "D05", unit: "ft", legs: [30, 40], diagonal: 50, within: 0 }, // toolsofthetrade, R
  { id: "D06", unit: "ft", legs: [10, 10], diagonal: 14.142, within: 5e-4 }, // forum.civiljungle, R
  { id: "D10", unit: "in", legs: [12, 7], diagonal: 13.89, within: 0.005 }, // NAVEDTRA 14044, R
  { id: "D11", unit: "in", legs: [12, 6], diagonal: 13.42, within: 0.005 }, // Griffith, R
  { id: "D12", unit: "in", legs: [12, 13], diagonal: 17.69, within: 0.005 }, // Army EN0069, R
  { id: "D13", unit: "in", legs: [12, 16], diagonal: 20, within: 0 }, // Army EN0069, R
  { id: "D14", unit: "in", legs: [24, 24], diagonal: 33.94, within: 0.005 }, // NAVEDTRA, R
  { id: "D15", unit: "in", legs: [27, 27], diagonal: 38.18, within: 0.005 }, // NAVEDTRA, R
  { id: "D16", unit: "in", legs: [30, 30], diagonal: 42.43, within: 0.005 }, // NAVEDTRA, R
  { id: "D17", unit: "in", legs: [8, 8], diagonal: 11.31, within: 0.005 }, // NAVEDTRA, R
  { id: "D18", unit: "in", legs: [21, 21], diagonal: 29.7, within: 0.005 }, // Hodgson, R
  { id: "D19", unit: "in", legs: [18, 18], diagonal: 25.46, within: 0.005 }, // Hodgson prints 25.45, flagged, D
] as const;

/** Printed in feet and inches, within 1/32 in. */
export const printedRows = [
  { id: "D07", legs: [20, 20], inches: 28 * 12 + 3 + 7 / 16 }, // diychatroom, R
  { id: "D08", legs: [7, 7], inches: 9 * 12 + 10 + 13 / 16 }, // diychatroom, R
  { id: "D09", legs: [5, 5], inches: 7 * 12 + 7 / 8 }, // diychatroom, R
  { id: "D23", legs: [20, 30], inches: 36 * 12 + 11 / 16 }, // Pythagoras, D
  { id: "D24", legs: [24, 28], inches: 36 * 12 + 10 + 9 / 16 }, // D
  { id: "D26", legs: [28, 40], inches: 48 * 12 + 9 + 15 / 16 }, // D
  { id: "D28", legs: [26, 44], inches: 51 * 12 + 1 + 5 / 16 }, // D
] as const;

/** D29: right triangles in whole numbers (D). */
export const wholeRows = [
  [5, 12, 13],
  [8, 15, 17],
  [20, 21, 29],
  [12, 35, 37],
] as const;
