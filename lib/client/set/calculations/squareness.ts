import type { SquarenessAnswer } from "@/calculators/squareness";
import { exactText, inchText, keyFigure, pointOf, typed, type Adapter } from "./adapter";

type Side = SquarenessAnswer["readings"]["ab"];

const corners = ["A", "B", "C", "D"] as const;

/** On concrete and on chalk alike: what the tape said of four corners. */
export const squareness: Adapter<SquarenessAnswer> = {
  operation: () => "squareness",
  key({ verdict, difference, shape }) {
    if (verdict === null) return keyFigure("plain", shape === "square" ? "square" : "difference", { difference: difference.text });
    return keyFigure(verdict === "contradictory" ? "warn" : verdict === "out" ? "out" : "good", verdict, { difference: difference.text });
  },
  gives({ readings, corners: places, shape, verdict }, asked) {
    if (verdict === "contradictory") return {}; // nothing may rest on readings that cannot be true together
    const shorter = (one: Side, opposite: Side | null) => exactText(opposite === null || one.measured.in <= opposite.measured.in ? one.measured : opposite.measured);
    return {
      length: shorter(readings.ab, readings.cd),
      width: shorter(readings.da, readings.bc),
      tapered: shape === "tapered" || shape === "irregular" ? "true" : "",
      ...typed(asked, { "sides.ab": "sides.ab", "sides.bc": "sides.bc", "sides.cd": "sides.cd", "sides.da": "sides.da", ac: "diagonals.ac", bd: "diagonals.bd", burn: "burn" }),
      ...Object.fromEntries(corners.flatMap((name) => [[`corners.${name}.x`, inchText(places[name].x)], [`corners.${name}.y`, inchText(places[name].y)]])),
    };
  },
  layers: ({ corners: places }) => ({ slab: corners.map((name) => pointOf(places[name])) }),
  readings: ({ target, difference, rack }) => [
    { key: "squareness.difference", text: difference.text },
    ...(rack.toward === null
      ? []
      : [
          { key: "squareness.move", params: { corner: rack.toward }, text: rack.distance.text },
          { key: "squareness.target", params: { pull: "AC" }, text: target.readings.ac.text },
          { key: "squareness.target", params: { pull: "BD" }, text: target.readings.bd.text },
        ]),
  ],
};
