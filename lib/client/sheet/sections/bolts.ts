import type { CheckAnswer, LayoutAnswer } from "@/calculators/anchors";
import { publishedRuleTexts, ruleIds, type RuleText } from "@/calculators/rules";
import { byCorners, runningFigure, shownAs, type Context } from "../context";
import type { Section, Strips, Table } from "../sheet";
import { stripDrawing, type StripMark } from "../strip";
import { labelWidth } from "./pieces";

const isCheck = (answer: CheckAnswer | LayoutAnswer): answer is CheckAnswer => "ok" in answer;

/** Every wall with its bolts as they stand, where no plates say more. */
export function wallsSection({ t, answers, precision, metric, width }: Context): Strips | null {
  if (answers.plates !== null || answers.bolts.length === 0) return null;
  const walls = answers.bolts.map(({ wall, answer }) => {
    const end = isCheck(answer) ? (answer.pieces.at(-1)?.to ?? null) : null;
    const bad = new Set(isCheck(answer) ? answer.findings.flatMap(({ bolt, code }) => (bolt === null || code === "spacing" ? [] : [bolt])) : []);
    const marks: StripMark[] = isCheck(answer)
      ? [
          ...answer.bolts.map(({ station, engineered }, index) => ({ at: station.in, text: runningFigure(station, precision), shape: engineered ? ("engineered" as const) : bad.has(index) ? ("bad" as const) : ("good" as const) })),
          ...answer.additions.map(({ station }) => ({ at: station.in, text: runningFigure(station, precision), shape: "added" as const })),
        ].sort((a, b) => a.at - b.at)
      : answer.pieces.flatMap(({ stations }) => stations).map((station) => ({ at: station.in, text: runningFigure(station, precision), shape: "good" as const }));
    const length = end?.in ?? answer.pieces.reduce((sum, piece) => sum + piece.length.in, 0);
    return { wall, marks, length, text: end?.text ?? answer.pieces.map((piece) => piece.length.text).join(" + ") };
  });
  const longest = Math.max(...walls.map(({ length }) => length));
  return {
    kind: "strips",
    id: "walls",
    title: t("sheet.walls.title"),
    notes: [t("sheet.walls.pull", { unit: t(`sheet.unit.${metric ? "mm" : "in"}`) })],
    strips: walls.map(({ wall, marks, length, text }) => ({
      id: wall,
      title: t("sheet.walls.from", { wall: byCorners(wall), corner: wall.slice(0, 1).toUpperCase() }),
      length: text,
      drawing: stripDrawing({ length, longest, width: width - labelWidth, marks, pull: true }),
      description: t("sheet.walls.description", { wall: byCorners(wall), length: text, stations: marks.map((mark) => mark.text).join("; ") }),
    })),
  };
}

/** What does not pass, by wall, with what helps; what must be added, and where. */
export function findingsSections({ t, answers, precision }: Context): Section[] {
  const checks = answers.bolts.flatMap(({ wall, answer }) => (isCheck(answer) ? [{ wall, answer }] : []));
  const findings = checks.flatMap(({ wall, answer }) =>
    answer.findings.map((finding) => {
      const shown = (value: typeof finding.limit) => (value === null ? "" : typeof value === "number" ? value : value.text);
      const { code, bolt, next, piece } = finding;
      const key = `anchors.findings.${code === "spacing" && (next === null || bolt === null) ? "spacing-end" : code}`;
      const station = bolt === null ? "" : (answer.bolts[bolt]?.station.text ?? "");
      const sentence = t(key, { piece: piece === null ? "" : piece + 1, bolt: bolt === null ? "" : bolt + 1, next: next === null ? "" : next + 1, station, limit: shown(finding.limit), actual: shown(finding.actual) });
      return [byCorners(wall), sentence, [t(`anchors.remedy.${finding.remedy}`), finding.clause].filter(Boolean).join(" ")];
    }),
  );
  const added = checks.flatMap(({ wall, answer }) => answer.additions.map(({ station, hole, across }) => [byCorners(wall), station.text, hole.text, across?.text ?? "", runningFigure(station, precision)]));
  const addedByPlates = answers.plates?.answer.addedAnchors.map(({ wall, piece, station, running, across }) => [byCorners(wall), station.text, `${piece}: ${running.text}`, across?.text ?? ""]) ?? [];
  const rows = answers.plates === null ? added.map((row) => row.slice(0, 4)) : addedByPlates;
  const sections: Section[] = [];
  if (checks.length > 0 && findings.length === 0) sections.push({ kind: "words", id: "findings", title: t("sheet.findings.title"), items: [t("sheet.findings.none")] });
  // With plates settled, its own joints answer for number, ends and spacing: the survey's first judgement would only confuse.
  if (findings.length > 0 && answers.plates === null) sections.push({ kind: "table", id: "findings", title: t("sheet.findings.title"), columns: [{ text: t("sheet.findings.wall"), share: 1 }, { text: t("sheet.findings.what"), share: 6 }, { text: t("sheet.findings.remedy"), share: 5 }], rows: findings });
  const plateFindings = answers.plates?.answer.findings ?? [];
  if (plateFindings.length > 0) {
    const shown = (value: (typeof plateFindings)[number]["limit"]) => (value === null ? "" : typeof value === "number" ? String(value) : value.text);
    sections.push({
      kind: "table",
      id: "findings",
      title: t("sheet.findings.title"),
      columns: [{ text: t("sheet.findings.wall"), share: 1 }, { text: t("sheet.findings.what"), share: 3 }, { text: t("sheet.findings.is"), figure: true, share: 2 }, { text: t("sheet.findings.limit"), figure: true, share: 2 }, { text: t("sheet.findings.remedy"), share: 5 }],
      rows: plateFindings.map(({ wall, code, bolt, actual, limit, remedy }) => [byCorners(wall), bolt === null ? t(`anchors.code.${code}`) : t("sheet.findings.bolt", { code: t(`anchors.code.${code}`), bolt: bolt + 1 }), shown(actual), shown(limit), t(`anchors.remedy.${remedy}`)]),
    });
  }
  if (rows.length > 0) sections.push({ kind: "table", id: "additions", title: t("sheet.additions.title"), note: t("anchors.additions.intro"), columns: [{ text: t("sheet.findings.wall"), share: 1 }, { text: t("anchors.table.station"), figure: true, share: 2 }, { text: t("anchors.table.hole"), figure: true, share: 2 }, { text: t("anchors.table.across"), figure: true, share: 2 }], rows });
  return sections;
}

/** The rule's figures, each with its clause and how far its source was read; what it does not state is said so. */
export function ruleSection({ t, answers, precision, metric }: Context): Table | null {
  const told = answers.plates?.answer.rule ?? answers.bolts[0]?.answer.rule;
  if (told === undefined) return null;
  const id = ruleIds.find((known) => known === told.id);
  if (id === undefined) return { kind: "table", id: "rule", title: t("sheet.rule.title", { rule: told.title ?? t("anchors.rule.own") }), note: t("sheet.rule.own"), columns: [], rows: [] };
  const rule: RuleText = publishedRuleTexts[id];
  const notStated = t("anchors.rule.notStated");
  type Figure = { clause: string | null; status: RuleText["diameter"]["status"]; source: string | null };
  const row = (label: string, value: string | null, { clause, status }: Figure) => [t(`anchors.figure.${label}`), value ?? notStated, clause ?? "", status === null ? "" : t(`common.sourceStatus.${status}`)];
  // A limit is what its source says: in other units it is rounded, so the source's own figure stands beside it.
  const length = (text: string | null) => (text === null ? null : metric && !text.endsWith("mm") ? `${shownAs(text, precision)} (${text})` : shownAs(text, precision));
  const { endMinimum } = rule;
  const rows = [
    row("diameter", length(rule.diameter.value), rule.diameter),
    row("spacing", length(rule.spacing.value), rule.spacing),
    row("endMinimum", endMinimum.diameters === null ? length(endMinimum.value) : t("anchors.figure.diameters", { count: endMinimum.diameters }), endMinimum),
    row("endMaximum", length(rule.endMaximum.value), rule.endMaximum),
    row("boltsPerPiece", rule.boltsPerPiece.value === null ? null : String(rule.boltsPerPiece.value), rule.boltsPerPiece),
    row("middleThird", rule.middleThird.value === null ? null : t(`anchors.rule.${rule.middleThird.value ? "yes" : "no"}`), rule.middleThird),
  ];
  const figures: readonly Figure[] = [rule.diameter, rule.spacing, endMinimum, rule.endMaximum, rule.boltsPerPiece, rule.middleThird];
  const sources = [...new Set(figures.flatMap(({ source }) => (source === null ? [] : [source])))];
  return {
    kind: "table",
    id: "rule",
    title: t("sheet.rule.title", { rule: t(`anchors.rule.name.${id}`) }),
    note: sources.length === 0 ? undefined : t("sheet.rule.sources", { sources: sources.join("; ") }),
    columns: [{ text: t("sheet.rule.figure"), share: 4 }, { text: t("sheet.rule.says"), share: 3 }, { text: t("sheet.rule.clause"), share: 3 }, { text: t("sheet.rule.status"), share: 3 }],
    rows,
  };
}
