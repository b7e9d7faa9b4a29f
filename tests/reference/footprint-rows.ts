/** domain.md section 14, rows V (traverse and area) and Q (braced quadrilateral). Expected values are the document's, not ours. */
export const walkRows = [
  { id: "V05", walk: "E 40 ft, N 20 ft, W 16 ft, N 12 ft, W 24 ft, S 32 ft", east: 0, north: 0, oneIn: null, squareFeet: 1088, perimeterFeet: 144 }, // arithmetic, D
  { id: "V06", walk: "E 40 ft, N 20 ft, W 15 ft 11 in, N 12 ft, W 24 ft, S 32 ft", east: 1, north: 0, oneIn: 1727, squareFeet: null, perimeterFeet: 1727 / 12 }, // arithmetic, D: about 1:1727
] as const;

/** V07: Mahun COGO chapter H, (N, E) in feet; the area recomputed exactly, 140,493.1 (the source prints 140,494 from rounded products). */
export const mahun = {
  corners: [
    { north: 406.31, east: 1259.97 },
    { north: 235.12, east: 1489.47 },
    { north: 65.81, east: 1126.4 },
    { north: 317.89, east: 942.04 },
    { north: 675.32, east: 1282.54 },
  ],
  squareFeet: 140_493.1,
  tolerance: 1,
};

/** V08: one product of that table, and what its running text misprints. */
export const product = { north: 235.12, east: 1126.4, squareFeet: 264_839.17, misprint: 264_489 };

/** Q rows: six readings, and what they adjust to (inches). */
export const quadrilateralRows = [
  { id: "Q05", readings: { ab: 336, bc: 288, cd: 336, da: 288, ac: 443.3125, bd: 441.8125 }, adjusted: { ab: 336.0095, bc: 288.0081, cd: 336.0095, da: 288.0081, ac: 443.3, bd: 441.8 }, tolerance: 2e-4 },
  { id: "Q06", readings: { ab: 336, bc: 288, cd: 336.25, da: 288, ac: 442.5, bd: 442.5 }, adjusted: { ab: 335.9495, bc: 287.9567, cd: 336.1995, da: 287.9567, ac: 442.5665, bd: 442.5665 }, tolerance: 2e-4 },
  { id: "Q07", readings: { ab: 480, bc: 360, cd: 480, da: 360, ac: 600, bd: 600 }, adjusted: { ab: 480, bc: 360, cd: 480, da: 360, ac: 600, bd: 600 }, tolerance: 1e-9 },
] as const;

/** The true inset at one corner: domain.md N04 to N06, from t / sin(angle / 2). */
export const cornerRows = [
  { id: "N04", degrees: 90, inset: 0.5, fromCorner: 0.7071 },
  { id: "N05", degrees: 89.75, inset: 0.5, fromCorner: 0.7087 },
  { id: "N06", degrees: 135, inset: 0.5, fromCorner: 0.5412 },
] as const;
