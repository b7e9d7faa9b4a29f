/** Calculators whose figures can be read big. */
export const readable: readonly string[] = ["squareness", "corner", "inset", "anchors", "conversions", "footprint", "fit", "level", "plates", "takeoff", "marks"];
