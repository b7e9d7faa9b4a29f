import { bitAnswer, holeFault } from "../anchors/hardware";
import { judgeWall } from "../anchors/judge";
import { answerAboutRule } from "../anchors/shared-answer";
import type { Bolt, Piece } from "../anchors/survey";
import { Length } from "../length";
import { measure } from "../schema";
import type { PlatesAnswer } from "./answer";
import type { Interval } from "./joints/intervals";
import { isPlanned } from "./joints/plan-joints";
import { placeAnchors, type AnchorTaste } from "./joints/place-anchors";
import type { Planned } from "./plan-plates";
import { judgedBolts, soundBolts, wallToJudge, type PlannedStretch } from "./plan-stretches";
import { totalLength } from "./stock-kinds";
import type { SurveyedWall } from "./survey-walls";

type PieceAnswer = PlatesAnswer["pieces"][number];
type Added = PlatesAnswer["addedAnchors"][number];
type Hole = PieceAnswer["holes"][number];

/** The whole answer in the contract's shape, every length exact and rounded once. */
export function presentPlates(planned: Planned): PlatesAnswer {
  const { input, settled, stock, units, boards, stretches, walls } = planned;
  const show = (length: Length) => measure(length, input.precision);
  const boardOf = new Map(boards.plan.boards.flatMap((board, index) => board.pieces.map((piece) => [piece, index] as const)));
  const cut = input.pieces === undefined ? piecesOfWalls(planned, boardOf) : { pieces: cutList(planned, boardOf), added: [], joints: [] };
  const findings = walls.flatMap((wall) => findingsOf(planned, wall, cut.pieces, cut.added));
  const cost = boards.cost * stock.moneyUnit;
  const provedBound = boards.bound * stock.moneyUnit;
  const boardLengths = boards.plan.boards.map((board) => input.stock[stock.places[board.kind]!]!.length);
  const pieceLength = totalLength(cut.pieces.map((piece) => piece.exact));
  const boardLength = totalLength(boardLengths);
  const kerfs = settled.kerf.times(boards.plan.boards.reduce((sum, board) => sum + board.pieces.length - 1, 0));
  const { endMinimum, endMaximum } = settled.limits;
  const fault = holeFault(input.bit, settled.diameter);
  return {
    ok: findings.length === 0,
    addedAnchors: cut.added.map((added) => added.shown),
    pieces: cut.pieces.map((piece) => piece.shown),
    joints: cut.joints,
    boards: boards.plan.boards.map((board, index) => {
      const pieces = board.pieces.map((piece) => cut.pieces[piece]!);
      const left = boardLengths[index]!.minus(settled.trim.times(2)).minus(totalLength(pieces.map((piece) => piece.exact))).minus(settled.kerf.times(pieces.length));
      return {
        stock: show(boardLengths[index]!),
        stockIndex: stock.places[board.kind]!,
        pieces: pieces.map((piece) => piece.shown.id),
        offcut: show(left.isNegative() ? Length.zero : left),
        uncut: pieces.length === 1 && pieces[0]!.exact.equals(boardLengths[index]!),
      };
    }),
    cost,
    bound: boards.material! * stock.moneyUnit,
    provedBound,
    gap: boards.costProved || cost === 0 ? 0 : (cost - provedBound) / cost,
    anchorsProved: planned.anchorsProved,
    boardsProved: boards.costProved && boards.countProved,
    ended: planned.ended,
    totals: { boards: boards.plan.boards.length, pieces: cut.pieces.length, pieceLength: show(pieceLength), boardLength: show(boardLength), kerfs: show(kerfs), wasteShare: boardLength.isZero() ? 0 : 1 - pieceLength.toNumber() / boardLength.toNumber() },
    walls: walls.map((wall) => ({
      name: wall.name,
      from: show(wall.from),
      to: show(wall.to),
      pieces: cut.pieces.filter((piece) => piece.wall === wall).map((piece) => piece.shown.id),
      added: cut.added.filter((added) => added.wall === wall).length,
      boltsLeftOut: boltsLeftOut(planned, wall),
    })),
    findings,
    astride: endMinimum === null || endMaximum === null ? null : { least: show(endMinimum.times(2)), most: show(endMaximum.times(2)) },
    notes: notesOf(planned, stretches),
    bit: { size: bitAnswer(settled.bit, input.precision), warning: fault?.code ?? null },
    ...answerAboutRule(settled.rule, settled.limits, null, input.precision),
  };

  function cutList({ problem }: Planned, onBoard: ReadonlyMap<number, number>): ExactPiece[] {
    return problem.stretches.map(({ to }, index) => {
      const exact = units.length(to);
      return { wall: null, from: Length.zero, to: exact, exact, shown: { id: `P${index + 1}`, wall: null, from: null, to: null, length: show(exact), holes: [], window: null, board: onBoard.get(index)! } };
    });
  }
}

interface ExactPiece {
  wall: SurveyedWall | null;
  from: Length;
  to: Length;
  exact: Length;
  shown: PieceAnswer;
}

interface ExactAnchor {
  wall: SurveyedWall;
  station: Length;
  shown: Added;
}

function piecesOfWalls({ input, settled, units, stretches, joints, boards, problem }: Planned, boardOf: ReadonlyMap<number, number>) {
  const show = (length: Length) => measure(length, input.precision);
  const shownSpan = ([low, high]: Interval) => ({ from: show(units.length(low)), to: show(units.length(high)) });
  const taste: AnchorTaste = { endDistance: units.whole(settled.endDistance), graduations: settled.graduations.map((step) => units.whole(step)) };
  const pieces: ExactPiece[] = [];
  const added: ExactAnchor[] = [];
  const between: PlatesAnswer["joints"] = [];
  const counts = new Map<SurveyedWall, number>();
  stretches.forEach((stretch, index) => {
    const { wall, limits, plan, placedBefore } = stretch;
    if (!isPlanned(plan)) throw new Error("only planned stretches are presented");
    const windows = problem.stretches[index]!.ways[boards.plan.ways[index]!]!;
    const ends = [plan.stretch.from, ...joints[index]!, plan.stretch.to];
    ends.slice(1).forEach((to, place) => {
      const from = ends[place]!;
      const number = (counts.get(wall) ?? 0) + 1;
      counts.set(wall, number);
      const id = `${wall.name.toUpperCase()}${/\d$/.test(wall.name) ? "-" : ""}${number}`;
      const start = units.length(from);
      const window = windows[place];
      const drilled = [...placeAnchors(plan.stretch, limits, [from, to], taste)!, ...placedBefore.filter((at) => at > from && at < to).map((at) => ({ at, window: [at, at] as const }))];
      const holes: Hole[] = standingHoles(stretch, wall, start, units.length(to), settled.plateWidth).map(({ bolt, across }) => ({
        station: show(bolt.station),
        running: show(bolt.station.minus(start)),
        across: across === null ? null : show(across),
        kind: bolt.engineered ? "engineered" : "bolt",
        bolt: bolt.index,
      }));
      for (const anchor of drilled) {
        const station = units.length(anchor.at);
        const across = settled.plateWidth.over(2);
        holes.push({ station: show(station), running: show(station.minus(start)), across: show(across), kind: "added", bolt: null });
        added.push({ wall, station, shown: { wall: wall.name, piece: id, station: show(station), running: show(station.minus(start)), across: show(across), window: shownSpan(anchor.window) } });
      }
      holes.sort((a, b) => a.station.in - b.station.in);
      if (place > 0) between.push({ wall: wall.name, at: show(start), window: shownSpan(windows[place - 1]!), before: pieces.at(-1)!.shown.id, after: id });
      const exact = units.length(to - from);
      pieces.push({
        wall,
        from: start,
        to: units.length(to),
        exact,
        shown: { id, wall: wall.name, from: show(start), to: show(units.length(to)), length: show(exact), holes, window: window === undefined ? null : shownSpan(window), board: boardOf.get(pieces.length)! },
      });
    });
  });
  added.sort((a, b) => a.wall.index - b.wall.index || a.station.compare(b.station));
  return { pieces, added, joints: between };
}

/** The bolts that go through a piece, and how far across it: the chalk line is the plate's outer edge. A bolt off the plate has no hole. */
function standingHoles({ wall }: PlannedStretch, survey: SurveyedWall, from: Length, to: Length, width: Length): { bolt: Bolt; across: Length | null }[] {
  return wall.bolts
    .filter((bolt) => bolt.duplicateOf === null && !survey.straps.has(bolt.index) && bolt.station.compare(from) >= 0 && bolt.station.compare(to) <= 0)
    .filter(({ offset }) => offset === null || (offset.isPositive() && offset.compare(width) < 0))
    .map((bolt) => ({ bolt, across: bolt.offset }));
}

/** What the as-poured check still finds, with the pieces as cut and the added anchors in. */
function findingsOf({ input, settled }: Planned, wall: SurveyedWall, pieces: readonly ExactPiece[], added: readonly ExactAnchor[]): PlatesAnswer["findings"] {
  const mine = pieces.filter((piece) => piece.wall === wall);
  const judged = mine.map(({ from, to }, index): Piece => ({ index, from, to }));
  const drilled = added.filter((anchor) => anchor.wall === wall).map(({ station }): Bolt => ({ index: -1, station, offset: null, slabOffset: null, projection: null, diameter: settled.diameter, engineered: false, converted: false, duplicateOf: null }));
  // A bolt in an opening is told among those left out; here it would be off every piece.
  const onPlate = judgedBolts(wall).filter((bolt) => mine.some(({ from, to }) => bolt.station.compare(from) >= 0 && bolt.station.compare(to) <= 0));
  const bolts = [...onPlate, ...drilled].sort((a, b) => a.station.compare(b.station));
  const shown = (value: Length | number | null) => (value instanceof Length ? measure(value, input.precision) : value);
  const numberOf = (bolt: Bolt | null) => (bolt === null || bolt.index < 0 ? null : bolt.index);
  return judgeWall(wallToJudge(wall, judged, settled, bolts)).map(({ code, piece, bolt, next, clause, source, status, limit, actual, remedy }) => ({
    wall: wall.name,
    code,
    piece: piece === null ? null : mine[piece.index]!.shown.id,
    bolt: numberOf(bolt),
    next: numberOf(next),
    clause,
    source,
    status,
    limit: shown(limit),
    actual: shown(actual),
    remedy,
  }));
}

function boltsLeftOut({ settled }: Planned, wall: SurveyedWall): PlatesAnswer["walls"][number]["boltsLeftOut"] {
  const sound = soundBolts(wall, settled);
  return [...wall.bolts]
    .sort((a, b) => a.index - b.index)
    .flatMap((bolt) => {
      if (sound.has(bolt)) return [];
      const isOnPart = wall.parts.some(({ from, to }) => bolt.station.compare(from) >= 0 && bolt.station.compare(to) <= 0);
      const reason = bolt.duplicateOf !== null ? "duplicate" : bolt.engineered ? "engineered" : isOnPart ? "unsound" : "in-opening";
      return [{ bolt: bolt.index, reason } as const];
    });
}

function notesOf({ input, walls, shortened }: Planned, stretches: readonly PlannedStretch[]): PlatesAnswer["notes"] {
  const notes: PlatesAnswer["notes"] = [];
  const joints = stretches.reduce((sum, { plan }) => sum + (isPlanned(plan) ? plan.pieces - 1 : 0), 0);
  const added = stretches.reduce((sum, { plan }) => sum + (isPlanned(plan) ? plan.added : 0), 0);
  if (joints > 0 && added > 0 && walls.some((wall) => wall.bolts.length > 0)) notes.push({ code: "joints-cost-anchors", wall: null });
  for (const wall of walls) if (judgedBolts(wall).length === 0) notes.push({ code: "no-bolts-given", wall: wall.name });
  if (walls.length > 1 && Object.keys(input.corners ?? {}).length === 0) notes.push({ code: "corners-not-given", wall: null });
  if (shortened) notes.push({ code: "shorter-pieces-for-stock", wall: null });
  return notes;
}
