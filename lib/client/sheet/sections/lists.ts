import { calculatorOf } from "@/calculators";
import type { Caution } from "@/calculators/schema";
import { runningFigure, shownAs, unitOfInput, type Context } from "../context";
import type { Figures, Section, Table, Words } from "../sheet";

/** What must be on the truck. */
export function takeoffSection({ t, answers }: Context): Table | null {
  if (answers.takeoff === null || answers.takeoff.answer.lines.length === 0) return null;
  return {
    kind: "table",
    id: "takeoff",
    title: t("sheet.takeoff.title"),
    note: t("sheet.takeoff.waste", { waste: answers.takeoff.answer.waste }),
    columns: [{ text: t("sheet.takeoff.item"), share: 4 }, { text: t("sheet.takeoff.size"), figure: true, share: 2 }, { text: t("sheet.takeoff.quantity"), figure: true, share: 2 }, { text: t("sheet.takeoff.note"), share: 5 }],
    rows: answers.takeoff.answer.lines.map(({ item, size, quantity, unit, note }) => [t(`sheet.item.${item}`), size?.text ?? "", t(`sheet.itemUnit.${unit}`, { count: quantity }), note === null ? "" : t(`sheet.itemNote.${note}`)]),
  };
}

/** Running marks of joists or studs, from one end; those that hit a bolt are told by number. */
export function marksSections({ t, answers, precision, metric }: Context): Section[] {
  if (answers.marks === null) return [];
  const { input, answer } = answers.marks;
  const spacing = typeof input.spacing === "string" ? shownAs(input.spacing, precision, unitOfInput(input), "inches") : "";
  const unit = t(`sheet.unit.${metric ? "mm" : "in"}`);
  const figures = (id: string, title: string, notes: readonly string[], lengths: readonly { in: number; exact: string | null }[]): Figures => ({ kind: "figures", id, title, notes, items: lengths.map((mark) => runningFigure(mark, precision)) });
  const clashes = answer.conflicts.map(({ line, joist, bolt, move, toward, hits }) => t(`sheet.marks.${hits}`, { joist: joist + 1, bolt: bolt + 1, move: move.text, toward: t(`sheet.marks.${toward}`), line: t(`sheet.marks.${line}`) }));
  return [
    figures("marks", t("sheet.marks.title", { spacing }), [t("sheet.marks.how", { unit }), t("sheet.marks.lastBay", { lastBay: answer.lastBay.text }), ...clashes], answer.marks),
    ...(answer.opposite === null ? [] : [figures("opposite", t("sheet.marks.oppositeTitle"), [t("sheet.marks.how", { unit })], answer.opposite)]),
  ];
}

/** What the calculators in this set warn of, once each, in the order of the job. */
export function cautionsSection({ t, set }: Context): Words {
  const codes = new Set<Caution>(["code-governs"]);
  for (const { result } of Object.values(set.calculations)) if (result) for (const code of calculatorOf(result.operation)?.cautions ?? []) codes.add(code);
  return { kind: "words", id: "cautions", title: t("common.cautionsTitle"), items: [...codes].map((code) => t(`cautions.${code}`)) };
}

