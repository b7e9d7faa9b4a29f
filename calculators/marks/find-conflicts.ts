import type { Length } from "../length";
import type { Joist } from "./lay-joists";

export interface PlateBolt {
  station: Length;
  diameter: Length;
  washer: Length;
}

export interface Conflict {
  joist: number;
  bolt: number;
  hits: "bolt" | "washer";
  overlap: Length;
  move: Length;
  toward: "start" | "end";
}

/**
 * Joists that lie over a bolt or its washer. A joist that only touches a washer's edge does not hit it. The move is the
 * least that clears the washer by `clearance`, to whichever side is nearer; of two as near, away from the start.
 */
export function findConflicts(joists: readonly Joist[], bolts: readonly PlateBolt[], thickness: Length, clearance: Length): Conflict[] {
  return joists.flatMap(({ mark }, joist) =>
    bolts.flatMap(({ station, diameter, washer }, bolt): Conflict[] => {
      const far = mark.plus(thickness);
      const over = (width: Length) => {
        const [low, high] = [station.minus(width.over(2)), station.plus(width.over(2))];
        return lesser(far, high).minus(greater(mark, low));
      };
      const shank = over(diameter);
      const reach = (washer.compare(diameter) > 0 ? washer : diameter).plus(clearance.times(2));
      const all = over(reach);
      if (!all.isPositive()) return [];
      const back = far.minus(station.minus(reach.over(2)));
      const on = station.plus(reach.over(2)).minus(mark);
      const toward = back.compare(on) < 0 ? "start" : "end";
      return [{ joist, bolt, hits: shank.isPositive() ? "bolt" : "washer", overlap: shank.isPositive() ? shank : all, move: toward === "start" ? back : on, toward }];
    }),
  );
}

const lesser = (a: Length, b: Length) => (a.compare(b) < 0 ? a : b);
const greater = (a: Length, b: Length) => (a.compare(b) > 0 ? a : b);
