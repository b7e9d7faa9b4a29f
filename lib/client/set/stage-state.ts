import { changedSince } from "./carry";
import { hashOf } from "./hash";
import type { Calculation, KeyFigure, SillSet } from "./schema";
import { slotsOf, type Slot, type Stage } from "./stages";

/**
 * `empty` nothing done; `open` begun, no answer; `done`; `look` answered, and the answer wants a decision; `stale` worked out from
 * values that have changed since, or from ones that are stale themselves.
 */
export type State = "empty" | "open" | "done" | "look" | "stale";

export interface SlotState {
  slot: Slot;
  state: State;
  key: KeyFigure | null;
  /** Carried values that changed since they were taken. */
  changed: readonly string[];
}

export interface StageState {
  stage: Stage;
  state: State;
  key: KeyFigure | null;
  slots: readonly SlotState[];
}

export const fingerprint = ({ fields, unit, precision }: Pick<Calculation, "fields" | "unit" | "precision">) => hashOf(fields, `${unit} ${precision}`);

const order: readonly State[] = ["stale", "look", "open", "done", "empty"];

/** Which earlier stages a stage rests on. */
const restsOn: Readonly<Record<Stage["name"], readonly Stage["name"][]>> = {
  concrete: [],
  chalk: ["concrete"],
  recheck: ["chalk"],
  bolts: ["chalk"],
  plates: ["chalk", "bolts"],
  takeoff: ["plates"],
  marks: ["chalk", "bolts"],
};

function slotState(set: SillSet, stages: readonly Stage[], slot: Slot, groundIsStale: boolean): SlotState {
  const calculation = set.calculations[slot.id];
  if (calculation === undefined) return { slot, state: "empty", key: null, changed: [] };
  const changed = changedSince(set, stages, slot);
  const { result } = calculation;
  const answered = result !== null && result.of === fingerprint(calculation);
  const took = Object.keys(calculation.taken).length > 0;
  if (result === null && Object.entries(calculation.fields).every(([name, text]) => calculation.taken[name] === text)) return { slot, state: "empty", key: null, changed };
  const state: State = changed.length > 0 || (groundIsStale && took && result !== null) ? "stale" : !answered ? "open" : result.key.tone === "good" || result.key.tone === "plain" ? "done" : "look";
  return { slot, state, key: result?.key ?? null, changed };
}

/** Every stage with its state and the figure to show for it, in order. */
export function stageStates(set: SillSet, stages: readonly Stage[]): StageState[] {
  const states = new Map<Stage["name"], StageState>();
  for (const stage of stages) {
    const groundIsStale = restsOn[stage.name].some((name) => states.get(name)?.state === "stale");
    const slots = slotsOf(set, stage).map((slot) => slotState(set, stages, slot, groundIsStale));
    states.set(stage.name, { stage, slots, ...summary(slots) });
  }
  return [...states.values()];
}

/** One state for several calculations: the one that most wants eyes; done only once all of a kind that must be are. */
function summary(slots: readonly SlotState[]): { state: State; key: KeyFigure | null } {
  const begun = slots.filter(({ state }) => state !== "empty");
  const worst = order.find((state) => begun.some((slot) => slot.state === state)) ?? "empty";
  const walls = slots.filter(({ slot }) => slot.wall !== undefined);
  const unfinished = worst === "done" && walls.length > 0 && walls.some(({ state }) => state === "empty");
  return { state: unfinished ? "open" : worst, key: (begun.find(({ state }) => state === worst) ?? begun[0])?.key ?? null };
}
