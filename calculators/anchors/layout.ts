import { z } from "zod";
import { Length } from "../length";
import { isThickEnough, ruleOf, type Rule } from "../rules";
import { CalculationError, calculatorInput, lengthAnswer, measure, type Issue } from "../schema";
import { layoutFields } from "./fields";
import { bitAnswer, holeFault } from "./hardware";
import { crowded, diameterOf, endDistanceWithin, evenMark, limitsOf, refuseTooMany, shortWallException, type Limits } from "./limits";
import { layPiece, type LaidPiece } from "./lay-piece";
import { memberCentres, memberReach } from "./members";
import { answerAboutRule, sharedAnswer } from "./shared-answer";

export const layoutInput = calculatorInput(layoutFields);
export type LayoutInput = z.output<typeof layoutInput>;

export const layoutAnswer = z
  .strictObject({
    pieces: z.array(
      z.strictObject({
        length: lengthAnswer,
        from: lengthAnswer,
        to: lengthAnswer,
        count: z.number(),
        spacing: lengthAnswer.nullable().meta({ description: "Between bolts: the same everywhere when even, else the greatest; null below two bolts" }),
        even: z.boolean(),
        endDistance: lengthAnswer.nullable().meta({ description: "From the piece's first end to its first bolt" }),
        stations: z.array(lengthAnswer).meta({ description: "From the wall's first corner" }),
        holes: z.array(lengthAnswer).meta({ description: "From the piece's own first end" }),
      }),
    ),
    bolts: z.number().meta({ description: "In all" }),
    ...sharedAnswer,
    warnings: z.array(z.strictObject({ code: z.enum(["bolts-crowded", "hole-too-big", "hole-too-small"]), piece: z.number().nullable(), limit: lengthAnswer, actual: lengthAnswer })),
  })
  .meta({ id: "AnchorLayout" });

export type LayoutAnswer = z.output<typeof layoutAnswer>;

/**
 * Bolts for the pieces of a new wall: the fewest that a rule allows, evenly or on a module, clear of joists and studs.
 *
 * Units: exact rational inches. Source: the rule's own figures; evenly, n bolts over a piece of length l with ends e stand
 * (l − 2e)/(n − 1) apart, n the least with that within the spacing, and never under the rule's number. A rule that states
 * no number or no end distance leaves both to the layout: two bolts, `endDistance` from the ends.
 *
 * @throws CalculationError `end-distance-outside-rule`, `end-distance-under-rule`, `piece-too-short`, `no-layout`, `diameter-under-rule`, `too-many-bolts`.
 * @example 10 ft with end bolts at 12 in under us-irc takes 3 bolts, 48 in apart (domain.md B10).
 */
export function layOutBolts(input: LayoutInput): LayoutAnswer {
  const rule = ruleOf(input.rule);
  const diameter = diameterOf(rule, input.diameter);
  const limits = limitsOf(rule, diameter);
  const wallLength = input.pieces.reduce((sum, length) => sum.plus(length), Length.zero);
  const exception = shortWallException(rule, wallLength, input.joinsOffsetPanels);
  const ends = endDistanceOf(input, limits);
  refuseThinBolt(rule, limits, input.diameter);

  refuseTooMany(limits, input.pieces);
  const centres = memberCentres(input.members, Length.zero, wallLength);
  const reach = memberReach(input.members, diameter);
  const grid = input.module === undefined ? null : { step: input.module, start: input.moduleStart ?? Length.zero };
  const issues: Issue[] = [];
  const laid: LaidPiece[] = [];
  let from = Length.zero;
  input.pieces.forEach((length, index) => {
    const isFirst = index === 0;
    const isLast = index === input.pieces.length - 1;
    const to = from.plus(length);
    const piece = layPiece({ from, to, limits, ends, exception, centres, reach, grid, isFirst, isLast, mark: evenMark(input.precision) });
    if ("refused" in piece) issues.push({ pointer: `/pieces/${index}`, code: piece.refused, params: piece.least === null ? {} : { least: measure(piece.least, input.precision).text } });
    else laid.push(piece);
    from = to;
  });
  if (issues.length > 0) throw new CalculationError(issues);
  return answerOf(input, rule, limits, exception, laid);
}

function endDistanceOf({ endDistance, precision }: LayoutInput, { endMinimum, wallEndMaximum: endMaximum }: Limits): Length {
  const fits = (value: Length) => (endMinimum === null || value.compare(endMinimum) >= 0) && (endMaximum === null || value.compare(endMaximum) <= 0);
  if (endDistance === undefined) return endDistanceWithin(endMinimum, endMaximum);
  if (fits(endDistance)) return endDistance;
  const text = (value: Length) => measure(value, precision).text;
  const least = text(endMinimum ?? Length.zero);
  if (endMaximum === null) throw new CalculationError([{ pointer: "/endDistance", code: "end-distance-under-rule", params: { least } }]);
  throw new CalculationError([{ pointer: "/endDistance", code: "end-distance-outside-rule", params: { least, most: text(endMaximum) } }]);
}

/** A layout for bolts the rule does not allow would be no layout. */
function refuseThinBolt(rule: Rule, { diameter }: Limits, asked: Length | undefined): void {
  const least = rule.diameter.value;
  if (asked === undefined || least === null || isThickEnough(diameter, least)) return;
  throw new CalculationError([{ pointer: "/diameter", code: "diameter-under-rule", params: { least: measure(least, "1/16").text } }]);
}

function answerOf(input: LayoutInput, rule: Rule, limits: Limits, exception: Rule["shortWalls"][number] | null, laid: readonly LaidPiece[]): LayoutAnswer {
  const { precision } = input;
  const show = (value: Length) => measure(value, precision);
  const warnings: LayoutAnswer["warnings"] = laid.flatMap(({ closest }, piece) =>
    closest !== null && closest.compare(crowded) < 0 ? [{ code: "bolts-crowded" as const, piece, limit: show(crowded), actual: show(closest) }] : [],
  );
  const fault = holeFault(input.hole, limits.diameter);
  if (fault !== null) warnings.push({ code: fault.code, piece: null, limit: bitAnswer(fault.limit, precision), actual: bitAnswer(fault.actual, precision) });
  return {
    pieces: laid.map(({ from, to, stations, spacing, even }) => ({
      length: show(to.minus(from)),
      from: show(from),
      to: show(to),
      count: stations.length,
      spacing: spacing === null ? null : show(spacing),
      even,
      endDistance: stations.length === 0 ? null : show(stations[0]!.minus(from)),
      stations: stations.map(show),
      holes: stations.map((station) => show(station.minus(from))),
    })),
    bolts: laid.reduce((sum, { stations }) => sum + stations.length, 0),
    ...answerAboutRule(rule, limits, exception, precision),
    warnings,
  };
}
