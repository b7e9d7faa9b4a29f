import { operations as everyOperation } from "@/calculators";
import { isMetric, type Precision } from "@/calculators/length";
import type { Operation } from "@/calculators/schema";
import { queryFromInput } from "@/calculators/schema/query";
import type { Translate } from "@/lib/client/i18n/translate";
import { hashOf } from "@/lib/client/set/hash";
import type { SillSet } from "@/lib/client/set/schema";
import { stageStates } from "@/lib/client/set/stage-state";
import type { Stage } from "@/lib/client/set/stages";
import { answersOf, type Answers } from "./answers";
import { contextOf } from "./context";
import { sheetAddress } from "./packed-set";
import { planPart } from "./plan";
import { findingsSections, ruleSection, wallsSection } from "./sections/bolts";
import { cautionsSection, marksSections, takeoffSection } from "./sections/lists";
import { boardsSection, piecesSection } from "./sections/pieces";
import { linesTable, offsetsTable, readingsTable, shimsTable } from "./sections/readings";
import { contentWidth, gap, planShare, type Paper, type Section, type Sheet, type SignOff } from "./sheet";

export interface SheetOptions {
  stages: readonly Stage[];
  /** With the namespaces of sheet-texts.ts. */
  t: Translate;
  /** Carries the units too: `1/16` or `1mm`. */
  precision: Precision;
  paper: Paper;
  /** When it was printed. */
  now: Date;
  /** Of the site, for the square code: `https://host`. */
  origin: string;
  operations?: ReadonlyMap<string, Operation>;
}

/**
 * The field sheet of a set: all its words and figures, worked out anew at the sheet's precision. Stages the set does not have are left out.
 * Pure: the page and the PDF are two renderings of what this answers.
 */
export function sheetOf(set: SillSet, { stages, t, precision, paper, now, origin, operations = everyOperation }: SheetOptions): Sheet {
  const answers = answersOf(set, stages, precision, operations);
  const context = contextOf({ set, stages, answers, t, precision, metric: isMetric(precision), paper });
  const plan = planPart(context, (contentWidth(paper) - gap) * planShare, 330);
  const beside = [readingsTable(context), offsetsTable(context), linesTable(context)].filter((table) => table !== null);
  const shown: (Section | null)[] = [piecesSection(context), wallsSection(context), ...findingsSections(context), boardsSection(context), takeoffSection(context), ...marksSections(context), shimsTable(context), ruleSection(context)];
  const sections = shown.filter((section) => section !== null);
  const { address, whole } = sheetAddress(set, t.locale, origin);
  const empty = plan === null && beside.length === 0 && sections.length === 0;
  return {
    locale: t.locale,
    paper,
    brand: t("common.name"),
    title: set.name,
    facts: [
      { label: t("sheet.facts.site"), text: typeof set.site === "string" && set.site.trim() !== "" ? set.site : null },
      { label: t("sheet.facts.date"), text: t("sheet.facts.dateText", { date: now }) },
      { label: t("sheet.facts.revision"), text: t("sheet.facts.revisionText", { date: new Date(set.changed), mark: revisionOf(set) }) },
    ],
    warnings: [...warningsOf(set, stages, t), ...(sameAsStage(set, answers) ? [] : [t("sheet.differs")])],
    plan,
    beside,
    sections: [...sections, cautionsSection(context), signOff(t)],
    code: { address, title: t("sheet.code.title"), text: t(`sheet.code.${whole ? "whole" : "part"}`) },
    empty: empty ? t("sheet.empty") : null,
    sheetOf: (number, count) => t("sheet.of", { number, count }),
  };
}

/** The same inputs have the same mark, on any device: two printed sheets can be told apart at a glance. */
function revisionOf(set: SillSet): string {
  const asked = Object.entries(set.calculations).flatMap(([slot, { result }]) => (result === null ? [] : [...queryFromInput(result.input)].map(([name, text]): [string, string] => [`${slot} ${name}`, text])));
  return hashOf(Object.fromEntries(asked), JSON.stringify(Object.entries(set.choices).sort())).slice(0, 5);
}

/** One sentence a kind, with the stages it is about. */
function warningsOf(set: SillSet, stages: readonly Stage[], t: Translate): string[] {
  const states = stageStates(set, stages);
  return (["stale", "look"] as const).flatMap((kind) => {
    const names = states.filter(({ state }) => state === kind).map(({ stage }) => t(`sheet.stage.${stage.name}`));
    return names.length === 0 ? [] : [t(`sheet.${kind}`, { stages: names.join(", ") })];
  });
}

/** A search that ran out of time may end elsewhere on another device: pieces printed must be those the crew saw in the stage. */
function sameAsStage(set: SillSet, { plates }: Answers): boolean {
  const seen = set.calculations["plates.plates"]?.result?.layers.pieces;
  if (plates === null || seen === undefined) return true;
  const found = plates.answer.pieces.filter(({ wall }) => wall !== null);
  return found.length === seen.length && found.every(({ wall, from, to }) => seen.some((piece) => piece.wall === wall && Math.abs(piece.from - (from?.in ?? NaN)) < 1e-6 && Math.abs(piece.to - (to?.in ?? NaN)) < 1e-6));
}

const signOff = (t: Translate): SignOff => ({ kind: "signOff", id: "sign-off", title: t("sheet.signOff.title"), lines: ["laidOut", "checked", "accepted"].map((who) => t(`sheet.signOff.${who}`)) });
