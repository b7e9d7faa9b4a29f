/**
 * E rows of domain.md section 14.
 * E01: levelling course text (ru.scribd.com/document/282803623; 827.22 computed from the text). E04: the remodelling
 * standard, 1/2 in between any two points within 20 ft (second-hand). E05: Kent, 1/4 in in 10 ft and 1/2 in overall
 * (second-hand). E06: derived.
 */
export const onSetup = { id: "E01", benchmark: "820.00", backsight: "8.42", rod: "1.20", height: 828.42, elevation: 827.22 } as const;

export const publishedLimits = [
  { id: "E04", tolerance: "half-in-20-ft", limits: [{ difference: "1/2", within: "240" }] },
  { id: "E05", tolerance: "quarter-in-10-ft", limits: [{ difference: "1/4", within: "120" }, { difference: "1/2", within: null }] },
] as const;

/** Heights 0, −3/16, −1/2, −1/4 in: as rod readings, larger is lower. */
export const fourHeights = { id: "E06", rods: ["48", "48 3/16", "48 1/2", "48 1/4"], shims: ["0", "3/16", "1/2", "1/4"] } as const;
