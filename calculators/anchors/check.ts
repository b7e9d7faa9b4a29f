import { Length } from "../length";
import { ruleOf } from "../rules";
import { measure } from "../schema";
import { fewestAdditions } from "./additions";
import type { CheckAnswer, CheckInput } from "./check-input";
import { untestedCodes } from "./check-input";
import { neededProjection } from "./hardware";
import { judgeWall, type Violation, type Wall } from "./judge";
import { crowded, diameterOf, evenMark, limitsOf, refuseTooMany, shortWallException } from "./limits";
import { memberCentres, memberReach } from "./members";
import { answerAboutRule } from "./shared-answer";
import { boltsInOrder, insetsAt, pieceOf, piecesInOrder, type Bolt } from "./survey";
import { boltWarnings } from "./bolt-warnings";

/**
 * Every bolt of a poured wall judged against a rule, and the fewest anchors to add where they fail it.
 *
 * Units: exact rational inches; a bolt on a limit meets it. Source: the rule's figures, each with clause and status in
 * the finding. The centre is tested against the middle third; a shank that leaves it is a warning. Engineered bolts are
 * neither judged nor counted nor moved. Bolts and pieces may come in any order; a bolt entered twice counts once.
 *
 * @throws CalculationError `piece-backwards`, `pieces-overlap`, `inset-needed`, `too-many-bolts`.
 * @example A 16 ft piece with bolts at 8 in, 80 in and 184 in fails us-irc in spacing alone: 104 in where 72 are allowed.
 */
export function checkBolts(input: CheckInput): CheckAnswer {
  const rule = ruleOf(input.rule);
  const diameter = diameterOf(rule, input.diameter);
  const limits = limitsOf(rule, diameter);
  const pieces = piecesInOrder(input);
  const all = boltsInOrder(input, diameter);
  refuseTooMany(limits, pieces.map(({ from, to }) => to.minus(from)));
  const [start, end] = [pieces[0]!.from, pieces.at(-1)!.to];
  const exception = shortWallException(rule, end.minus(start), input.joinsOffsetPanels);
  const wall: Wall = {
    rule,
    limits,
    pieces,
    bolts: all.filter(({ engineered, duplicateOf }) => !engineered && duplicateOf === null),
    exception,
    plateWidth: input.plateWidth ?? null,
    centres: memberCentres(input.members, start, end),
    reach: (size) => memberReach(input.members, size),
    neededProjection: (size) => neededProjection(rule, size, input.plateThickness, input.washerThickness),
  };
  const violations = judgeWall(wall);
  const needsAnchors = violations.some(({ remedy }) => remedy !== "move-joist" && remedy !== "extend-bolt");
  const fix = needsAnchors
    ? fewestAdditions(wall, violations, { inConcrete: all, clearOfBolts: input.clearOfBolts ?? crowded, endDistance: input.endDistance, mark: evenMark(input.precision) })
    : { added: [], unfixable: [] };
  const show = (value: Length) => measure(value, input.precision);
  const across = input.plateWidth === undefined ? null : show(input.plateWidth.over(2));
  const insets = insetsAt(input);

  return {
    ok: violations.length === 0,
    pieces: [...pieces].sort((a, b) => a.index - b.index).map((piece) => ({ from: show(piece.from), to: show(piece.to), length: show(piece.to.minus(piece.from)), bolts: wall.bolts.filter((bolt) => pieceOf(pieces, bolt) === piece).length })),
    bolts: inRequestOrder(all).map(({ station, offset, engineered }) => ({ station: show(station), offset: offset === null ? null : show(offset), engineered })),
    findings: violations.map((violation) => findingOf(violation, show)),
    additions: fix.added.map(({ piece, station }) => ({ piece: piece.index, station: show(station), hole: show(station.minus(piece.from)), across })),
    unfixable: fix.unfixable.map(({ piece, tooShort }) => ({ piece: piece.index, code: tooShort ? "piece-too-short" : "no-room", least: tooShort && limits.endMinimum !== null ? show(limits.endMinimum.times(2).plus(crowded)) : null })),
    converted: inRequestOrder(all)
      .filter(({ converted }) => converted)
      .map(({ index, station, offset }) => ({ bolt: index, station: show(station), offset: offset === null ? null : show(offset), stationBy: show(insets!.first), offsetBy: show(insets!.own) })),
    untested: untestedOf(wall),
    engineered: inRequestOrder(all).filter(({ engineered }) => engineered).map(({ index }) => index),
    thirds: input.plateWidth === undefined || rule.middleThird.value !== true ? null : { from: show(input.plateWidth.over(3)), to: show(input.plateWidth.times(2).over(3)) },
    projection: show(wall.neededProjection(diameter)),
    ...answerAboutRule(rule, limits, exception, input.precision),
    warnings: boltWarnings(input, wall, all),
  };
}

const inRequestOrder = (bolts: readonly Bolt[]) => [...bolts].sort((a, b) => a.index - b.index);

function findingOf({ piece, bolt, next, limit, actual, ...violation }: Violation, show: (value: Length) => CheckAnswer["projection"]): CheckAnswer["findings"][number] {
  const shown = (value: Length | number | null) => (value instanceof Length ? show(value) : value);
  return {
    code: violation.code,
    piece: piece?.index ?? null,
    bolt: bolt?.index ?? null,
    next: next?.index ?? null,
    clause: violation.clause,
    source: violation.source,
    status: violation.status,
    limit: shown(limit),
    actual: shown(actual),
    remedy: violation.remedy,
  };
}

/** What the rule, or a careful eye, would ask and the input leaves open. */
function untestedOf({ rule, bolts, plateWidth, centres }: Wall): CheckAnswer["untested"] {
  const lacking = {
    "middle-third": (bolt: Bolt) => rule.middleThird.value === true && (plateWidth === null || bolt.offset === null),
    "slab-edge": (bolt: Bolt) => rule.edgeCover.value !== null && bolt.slabOffset === null,
    "under-joist": () => centres.length === 0,
    "too-short": (bolt: Bolt) => bolt.projection === null,
  } as const;
  return untestedCodes
    .map((code) => ({ code, bolts: bolts.filter(lacking[code]).map(({ index }) => index).sort((a, b) => a - b) }))
    .filter((entry) => entry.bolts.length > 0);
}
