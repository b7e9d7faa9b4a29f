import type { CheckAnswer, LayoutAnswer } from "@/calculators/anchors";
import type { FitAnswer } from "@/calculators/fit";
import type { FootprintAnswer } from "@/calculators/footprint";
import type { InsetAnswer } from "@/calculators/inset";
import type { Precision } from "@/calculators/length";
import type { LevelAnswer } from "@/calculators/level";
import type { MarksAnswer } from "@/calculators/marks";
import type { PlatesAnswer } from "@/calculators/plates";
import type { Operation } from "@/calculators/schema";
import { answerTo } from "@/calculators/schema/answer-to";
import type { SquarenessAnswer } from "@/calculators/squareness";
import type { TakeoffAnswer } from "@/calculators/takeoff";
import type { SillSet } from "@/lib/client/set/schema";
import { chosenFor, slotsOf, type Stage } from "@/lib/client/set/stages";

export interface Answered<Answer> {
  input: Readonly<Record<string, unknown>>;
  answer: Answer;
}

/** The answers of a set's stages, worked out anew from what each was asked, rounded as the sheet wants it. Null where a stage has none. */
export interface Answers {
  square: Answered<SquarenessAnswer> | null;
  footprint: Answered<FootprintAnswer> | null;
  level: Answered<LevelAnswer> | null;
  inset: Answered<InsetAnswer> | null;
  fit: Answered<FitAnswer> | null;
  recheck: Answered<SquarenessAnswer> | null;
  /** The recheck of chalk lines that are no quadrilateral. */
  repulled: Answered<FootprintAnswer> | null;
  /** By wall, in order. */
  bolts: readonly (Answered<CheckAnswer | LayoutAnswer> & { wall: string })[];
  plates: Answered<PlatesAnswer> | null;
  takeoff: Answered<TakeoffAnswer> | null;
  marks: Answered<MarksAnswer> | null;
}

export function answersOf(set: SillSet, stages: readonly Stage[], precision: Precision, operations: ReadonlyMap<string, Operation>): Answers {
  const answer = <Answer>(slot: string): Answered<Answer> | null => {
    const result = set.calculations[slot]?.result;
    const operation = result ? operations.get(result.operation) : undefined;
    if (!result || operation === undefined) return null;
    const answered = answerTo(operation, { ...result.input, precision });
    return answered.answer === null ? null : { input: result.input, answer: answered.answer as Answer };
  };
  const chosen = (name: Stage["name"], calculator: string) => {
    const stage = stages.find((known) => known.name === name);
    return stage !== undefined && chosenFor(set, stage) === calculator;
  };
  const main = <Answer>(name: Stage["name"], calculator: string) => (chosen(name, calculator) ? answer<Answer>(`${name}.${calculator}`) : null);
  const boltStage = stages.find(({ name }) => name === "bolts");
  return {
    square: main("concrete", "squareness"),
    footprint: main("concrete", "footprint"),
    level: answer("concrete.level"),
    inset: main("chalk", "inset"),
    fit: main("chalk", "fit"),
    recheck: main("recheck", "squareness"),
    repulled: main("recheck", "footprint"),
    bolts: (boltStage === undefined ? [] : slotsOf(set, boltStage)).flatMap(({ id, wall = "" }) => {
      const found = answer<CheckAnswer | LayoutAnswer>(id);
      return found === null ? [] : [{ ...found, wall }];
    }),
    plates: answer("plates.plates"),
    takeoff: answer("takeoff.takeoff"),
    marks: answer("marks.marks"),
  };
}
