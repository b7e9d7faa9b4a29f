/**
 * Quantities worked by hand, each with its arithmetic.
 * Volume of a US gallon 3785.411784 ml, cubic inch 16.387064 ml, pound 0.45359237 kg: exact by definition (NIST HB 44 App. C, memory).
 */
export const takeoffRows = [
  { what: "180 ft of plate in 50 ft rolls", request: { plateLength: "180 ft" }, item: "sill-sealer", quantity: 4, needed: 3.6 },
  { what: "30 m of plate in 15 m rolls", request: { plateLength: "30 m", sealerRoll: "15 m" }, item: "sill-sealer", quantity: 2, needed: 2 },
  // (π/4)(0.625² − 0.5²) × 7 = 0.773126 in³ = 12.6693 ml a hole; 30 of them in 280 ml cartridges
  { what: "adhesive for 30 rods of 1/2 in, 7 in deep", request: { newAnchors: 30 }, item: "adhesive", quantity: 2, needed: (30 * (Math.PI / 4) * (0.625 ** 2 - 0.5 ** 2) * 7 * 16.387064) / 280 },
  // 20 pieces × 2 ends × 5.5 × 1.5 + 44 holes × π × 9/16 × 1.5 in², over 144, two coats at 100 ft² a gallon, cans of 946 ml
  { what: "preservative for 20 pieces and 44 holes", request: { pieceCount: 20, bolts: 40, newAnchors: 4 }, item: "preservative", quantity: 1, needed: (((20 * 2 * 5.5 * 1.5 + 44 * Math.PI * 0.5625 * 1.5) / 144 / 100) * 2 * 3785.411784) / 946 },
  { what: "a nut for each bolt and each anchor", request: { bolts: 40, boltsToCast: 3, newAnchors: 4 }, item: "nut", quantity: 47, needed: 47 },
] as const;
