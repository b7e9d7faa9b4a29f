import { operations as everyOperation } from "@/calculators";
import { isMetric, type Precision } from "@/calculators/length";
import type { Operation } from "@/calculators/schema";
import type { Translate } from "@/lib/client/i18n/translate";
import { hashOf } from "@/lib/client/set/hash";
import type { SillSet } from "@/lib/client/set/schema";
import { stageStates } from "@/lib/client/set/stage-state";
import type { Stage } from "@/lib/client/set/stages";
import { answersOf } from "./answers";
import { contextOf } from "./context";
import { sheetAddress } from "./packed-set";
import { planPart } from "./plan";
import { findingsSections, ruleSection, wallsSection } from "./sections/bolts";
import { cautionsSection, marksSections, takeoffSection } from "./sections/lists";
import { boardsSection, piecesSection } from "./sections/pieces";
import { linesTable, offsetsTable, readingsTable, shimsTable } from "./sections/readings";
import { contentWidth, type Paper, type Section, type Sheet, type SignOff } from "./sheet";

export interface SheetOptions {
  stages: readonly Stage[];
  /** With the namespaces of `sheetNamespaces`. */
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

/** What a translator of the sheet must know. */
export const sheetNamespaces = ["common", "sheet", "anchors", "cautions"] as const;
export const sheetKeys = ["common.name", "common.lean.", "common.sourceStatus.", "common.cautionsTitle", "sheet.", "anchors.code.", "anchors.findings.", "anchors.remedy.", "anchors.rule.", "anchors.figure.", "anchors.additions.", "anchors.table.", "cautions."];

/** The share of the width that the plan takes; the short tables stand beside it. */
export const planShare = 0.56;
export const gap = 18;

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
    warnings: warningsOf(set, stages, t),
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
  const asked = Object.entries(set.calculations).map(([slot, { result, unit }]): [string, string] => [slot, JSON.stringify([result?.input ?? null, unit])]);
  return hashOf(Object.fromEntries(asked), JSON.stringify(Object.entries(set.choices).sort())).slice(0, 5);
}

function warningsOf(set: SillSet, stages: readonly Stage[], t: Translate): string[] {
  return stageStates(set, stages).flatMap(({ stage, state }) => (state === "stale" ? [t("sheet.stale", { stage: t(`sheet.stage.${stage.name}`) })] : state === "look" ? [t("sheet.look", { stage: t(`sheet.stage.${stage.name}`) })] : []));
}

const signOff = (t: Translate): SignOff => ({ kind: "signOff", id: "sign-off", title: t("sheet.signOff.title"), lines: ["laidOut", "checked", "accepted"].map((who) => t(`sheet.signOff.${who}`)) });
