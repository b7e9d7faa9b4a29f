/** Rows N01 to N05 of domain.md section 14. Arithmetic recomputed there with python3 (status D); texts at 1/16 in. */
export const insetRows = [
  { id: "N01", request: { length: "28 ft", width: "40 ft", inset: "1/2" }, ab: "27' 11\"", bc: "39' 11\"", diagonal: "48' 8 1/2\"" },
  { id: "N02", request: { length: "28 ft", width: "40 ft", inset: "7/16" }, ab: "27' 11 1/8\"", bc: "39' 11 1/8\"", diagonal: "48' 8 11/16\"" },
] as const;

/** N04 to N06: how far the inset corner stands from the old one, t / sin(angle / 2), inches to 1e-4. */
export const cornerRows = [
  { id: "N04", inset: 0.5, angleDegrees: 90, distance: 0.7071 },
  { id: "N05", inset: 0.5, angleDegrees: 89.75, distance: 0.7087 },
  { id: "N06", inset: 0.5, angleDegrees: 135, distance: 0.5412 },
] as const;
