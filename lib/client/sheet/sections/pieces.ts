import type { PlatesAnswer } from "@/calculators/plates";
import { byCorners, runningFigure, shownAs, unitOfInput, type Context } from "../context";
import type { Strips } from "../sheet";
import { stripDrawing, type StripMark } from "../strip";

type Piece = PlatesAnswer["pieces"][number];
type Hole = Piece["holes"][number];

export const labelWidth = 116;

/** Each piece with its holes: running from the marked end, across from the outer edge. */
export function piecesSection(context: Context): Strips | null {
  const { t, answers, precision, metric, width } = context;
  if (answers.plates === null || answers.plates.answer.pieces.length === 0) return null;
  const { pieces, bit } = answers.plates.answer;
  const usual = usualAcross(pieces.flatMap(({ holes }) => holes));
  const plateWidth = widthOf(context);
  const longest = Math.max(...pieces.map(({ length }) => length.in));
  const unit = t(`sheet.unit.${metric ? "mm" : "in"}`);
  const added = pieces.some(({ holes }) => holes.some(({ kind }) => kind === "added"));
  const engineered = pieces.some(({ holes }) => holes.some(({ kind }) => kind === "engineered"));
  return {
    kind: "strips",
    id: "pieces",
    title: t("sheet.pieces.title"),
    notes: [
      t("sheet.pieces.pull", { unit }),
      usual === null ? t("sheet.pieces.bit", { bit: bit.size.text }) : t("sheet.pieces.across", { across: usual, bit: bit.size.text }),
      ...(added ? [t("sheet.pieces.added")] : []),
      ...(engineered ? [t("sheet.pieces.engineered")] : []),
    ],
    strips: pieces.map((piece) => {
      const marks = piece.holes.map((hole): StripMark => ({ at: hole.running.in, text: holeText(hole, usual, context), shape: hole.kind === "bolt" ? "hole" : hole.kind, ...(hole.across === null || plateWidth === null ? {} : { across: Math.min(0.8, Math.max(0.2, hole.across.in / plateWidth)) }) }));
      return {
        id: piece.id,
        title: pieceTitle(piece, t),
        length: piece.length.text,
        drawing: stripDrawing({ length: piece.length.in, longest, width: width - labelWidth, marks, pull: true }),
        description: t("sheet.pieces.description", { piece: piece.id, length: piece.length.text, holes: marks.map(({ text }) => text).join("; ") || t("sheet.pieces.none") }),
      };
    }),
  };

  function holeText(hole: Hole, across: string | null, { t: say }: Context): string {
    const running = runningFigure(hole.running, precision);
    return hole.across === null || hole.across.text === across ? running : say("sheet.pieces.at", { running, across: runningFigure(hole.across, precision) });
  }
}

/** The offset most holes share, so that only the others carry theirs. */
function usualAcross(holes: readonly Hole[]): string | null {
  const counts = new Map<string, number>();
  for (const { across } of holes) if (across !== null) counts.set(across.text, (counts.get(across.text) ?? 0) + 1);
  return [...counts].sort(([, a], [, b]) => b - a)[0]?.[0] ?? null;
}

function pieceTitle({ id, wall, from }: Piece, t: Context["t"]): string {
  if (wall === null || from === null) return id;
  return from.in < 12 ? t("sheet.pieces.fromCorner", { piece: id, wall: byCorners(wall), corner: wall.slice(0, 1).toUpperCase() }) : t("sheet.pieces.fromJoint", { piece: id, wall: byCorners(wall) });
}

function widthOf({ answers }: Context): number | null {
  const input = answers.plates?.input ?? {};
  if (typeof input.plateWidth !== "string" && typeof input.plateWidth !== "number") return null;
  const shown = shownAs(String(input.plateWidth), "1/64", unitOfInput(input));
  const [whole = "0", fraction] = shown.replace('"', "").split(" ");
  const [top, bottom] = (fraction ?? "0/1").split("/").map(Number);
  const inches = Number(whole) + top! / (bottom ?? 1);
  return Number.isFinite(inches) && inches > 0 ? inches : null;
}

/** Which board each piece comes from, and what is left. */
export function boardsSection({ t, answers, precision, width }: Context): Strips | null {
  if (answers.plates === null || answers.plates.answer.boards.length === 0) return null;
  const { boards, pieces, boardsProved, totals } = answers.plates.answer;
  const byId = new Map(pieces.map((piece) => [piece.id, piece]));
  const longest = Math.max(...boards.map(({ stock }) => stock.in));
  return {
    kind: "strips",
    id: "boards",
    title: t("sheet.boards.title"),
    notes: [t("sheet.boards.summary", { boards: totals.boards, pieces: totals.pieces, waste: Math.round(totals.wasteShare * 100) }), ...(boardsProved ? [] : [t("sheet.boards.notProved")])],
    strips: boards.map(({ stock, pieces: cut, offcut }, index) => {
      let from = 0;
      const parts = cut.map((id) => {
        const length = byId.get(id)?.length.in ?? 0;
        const part = { from, to: from + length, text: `${id} ${byId.get(id) === undefined ? "" : runningFigure(byId.get(id)!.length, precision)}`.trim() };
        from += length;
        return part;
      });
      const left = offcut.in > 0.5 ? [{ from: stock.in - offcut.in, to: stock.in, text: runningFigure(offcut, precision), offcut: true }] : [];
      return {
        id: String(index + 1),
        title: t("sheet.boards.board", { number: index + 1 }),
        length: stock.text,
        drawing: stripDrawing({ length: stock.in, longest, width: width - labelWidth, parts: [...parts, ...left] }),
        description: t("sheet.boards.description", { number: index + 1, stock: stock.text, pieces: parts.map(({ text }) => text).join("; "), offcut: offcut.text }),
      };
    }),
  };
}
