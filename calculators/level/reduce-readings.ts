import { Length } from "../length";
import { CalculationError } from "../schema";
import type { LevelInput } from "./input";

export interface Elevation {
  index: number;
  setup: number;
  reading: LevelInput["setups"][number]["readings"][number];
  elevation: Length;
}

export interface Reduced {
  elevations: readonly Elevation[];
  instruments: readonly { height: Length; on: "benchmark" | "turn" }[];
  misclosure: Length | null;
  check: { backsights: Length; foresights: Length; rise: Length };
}

/**
 * Elevations from rod readings: height of instrument = what the backsight stands on + backsight; elevation = height − rod. A
 * set-up's backsight is on the last turning point of the set-up before, else on the benchmark.
 *
 * The page check takes each chain of set-ups: its backsights, less the foresights that carry it on (turning points, and the
 * last reading, or the benchmark shot again), is its last elevation less its first.
 */
export function reduceReadings({ setups, benchmark }: LevelInput): Reduced {
  const datum = benchmark?.elevation ?? Length.zero;
  const elevations: Elevation[] = [];
  const instruments: { height: Length; on: "benchmark" | "turn" }[] = [];
  let standsOn: { elevation: Length; on: "benchmark" | "turn" } = { elevation: datum, on: "benchmark" };
  let [backsights, foresights, rise] = [Length.zero, Length.zero, Length.zero];
  let misclosure: Length | null = null;
  setups.forEach(({ backsight, readings }, setup) => {
    const turns = readings.filter(({ turn }) => turn === true);
    if (turns.length > 1) throw new CalculationError([{ pointer: `/setups/${setup}/readings`, code: "one-turn-only", params: {} }]);
    const height = standsOn.elevation.plus(backsight);
    instruments.push({ height, on: standsOn.on });
    const start = standsOn.elevation;
    let turned: Length | null = null;
    for (const reading of readings) {
      const elevation = height.minus(reading.rod);
      elevations.push({ index: elevations.length, setup, reading, elevation });
      if (reading.turn === true) turned = elevation;
    }
    const isLast = setup === setups.length - 1;
    const closing = isLast ? benchmark?.closing : undefined;
    const carried = closing ?? (turned !== null && !isLast ? turns[0]!.rod : readings.at(-1)!.rod);
    backsights = backsights.plus(backsight);
    foresights = foresights.plus(carried);
    rise = rise.plus(height.minus(carried).minus(start));
    if (closing !== undefined) misclosure = height.minus(closing).minus(datum);
    standsOn = turned !== null ? { elevation: turned, on: "turn" } : { elevation: datum, on: "benchmark" };
  });
  return { elevations, instruments, misclosure, check: { backsights, foresights, rise } };
}
