import { graduation, isMetric, Length } from "../length";
import { measure, type LengthAnswer } from "../schema";
import type { SquarenessAnswer } from "./answer";
import { findSuspects, type Suspect } from "./blunders/find-suspects";
import { separatingPull, type PullEnd } from "./blunders/separating-pull";
import { anglesOf, cornerNames } from "./figure/corners";
import { solveFigure, type Figure } from "./figure/solve-figure";
import { readingNames, type ReadingName, type SquarenessInput } from "./input";
import { burnOf, hasFourSides, inches, less, magnitude, measurementsOf, plus, type Measured, type Measurements, type Quantity } from "./readings";
import { shownBy, totalOf } from "./tape/correct-tape";
import { allowedFor, everyPreset, exceeded, type Allowed } from "./tolerance/allow";

/** What a careful reading may be off, and how much of it a closure may hold: √6, since six readings each off by e close within √6·e. */
const defaultReadingError = Length.from(0.125);
const closureFactor = 2.45;

/** Doubles of equal lengths part by less than this. */
const same = 1e-9;

/**
 * Whether a slab is square, how far it is racked and tapered, which side to move, and what the diagonals must then read.
 *
 * Units: lengths are exact rational inches as far as they go: difference and rack of two sides; adjusted figures, angles and
 * roots are doubles. Only fields named `reading` hold the burn.
 * Source: rack (AC² − BD²)/(4·AB); with four sides the least-squares adjustment of the braced quadrilateral, six readings
 * and five unknowns, equal weights (`adjustQuadrilateral`). Two sides are checked by √((AC² + BD²)/2) against √(AB² + DA²).
 *
 * @throws CalculationError `sides-and-sizes`, `burn-over-reading`, `diagonal-impossible`, `sides-cross`, `tape-impossible`.
 * @example 28 by 24 ft with diagonals 443 5/16 and 441 13/16: CD is racked 0.988 in and goes back toward D (domain.md S07): the worked
 * example `racked`, which a test runs.
 */
export function checkSquare(input: SquarenessInput): SquarenessAnswer {
  const { precision } = input;
  const show = (value: Quantity) => measure(value, precision);
  const measurements = measurementsOf(input);
  const figure = solveFigure(measurements, precision);
  const signed = less(measurements.ac.actual, measurements.bd.actual);
  const difference = magnitude(signed);
  const tapers = tapersOf(figure);
  const closureLimit = closureFactor * (input.readingError ?? defaultReadingError).toNumber();
  const suspects = findSuspects(measurements, { commonBurn: input.burn ?? Length.zero, metric: readsMetric(input), closedBy: figure.closedBy });
  const angles = anglesOf(figure.corners);
  const shape = shapeOf(difference, tapers, graduation(precision).toNumber());
  const allowed = allowedFor(input, figure.corners);
  const exceeds = allowed === null ? [] : exceeded(input, allowed, { corners: figure.corners, angles: cornerNames.map((name) => angles[name]), difference, targetDiagonal: inches(figure.targetDiagonal), tapers });
  const contradictory = figure.closure > closureLimit;

  return {
    shape,
    verdict: contradictory ? "contradictory" : verdictOf(shape, allowed, exceeds.length),
    exceeds,
    allowed: allowed === null ? null : { difference: show(allowed.difference), taper: show(allowed.taper) },
    presets: everyPreset(figure.corners).map(({ id, preset, difference: most, taper }) => ({ id, difference: show(most), taper: show(taper), status: preset.status, source: preset.source })),
    difference: show(difference),
    longer: Math.abs(inches(signed)) < same ? null : inches(signed) > 0 ? "ac" : "bd",
    taper: tapers === null ? null : { length: show(tapers[0]), width: show(tapers[1]) },
    target: targetOf(input, figure.targetDiagonal, show),
    rack: { distance: show(magnitude(figure.slide)), side: "cd", toward: Math.abs(inches(figure.slide)) < same ? null : inches(figure.slide) > 0 ? "D" : "C" },
    corners: {
      A: { ...figure.corners.A, angleDegrees: angles.A },
      B: { ...figure.corners.B, angleDegrees: angles.B },
      C: { ...figure.corners.C, angleDegrees: angles.C },
      D: { ...figure.corners.D, angleDegrees: angles.D },
    },
    readings: readingsAnswer(measurements, figure, show),
    closureIn: figure.closure,
    closureLimitIn: closureLimit,
    suspects: suspects.map(({ reading, change, likely }) => ({ reading, changeIn: change, likely, shown: show(inches(measurements[reading]!.actual) + change) })),
    separatingPull: pullAnswer(input, measurements, suspects, closureLimit),
    proves: proofsOf(measurements, contradictory, difference, tapers, graduation(precision).toNumber()),
  };
}

/** Whether the tape counts millimetres: a slip of digits is one of the digits read. */
function readsMetric({ unit, precision }: SquarenessInput): boolean {
  return isMetric(precision) || (unit !== "in" && unit !== "ft");
}

function tapersOf({ adjusted }: Figure): readonly [number, number] | null {
  return adjusted === null ? null : [Math.abs(adjusted.ab - adjusted.cd), Math.abs(adjusted.bc - adjusted.da)];
}

function shapeOf(difference: Quantity, tapers: readonly [number, number] | null, graduation: number): SquarenessAnswer["shape"] {
  const racked = inches(difference) > graduation + same;
  const tapered = tapers !== null && tapers.some((taper) => taper > graduation + same);
  if (racked) return tapered ? "irregular" : "racked";
  return tapered ? "tapered" : "square";
}

function verdictOf(shape: SquarenessAnswer["shape"], allowed: Allowed | null, exceeding: number): SquarenessAnswer["verdict"] {
  if (allowed === null) return null;
  if (shape === "square") return "square";
  return exceeding === 0 ? "within" : "out";
}

/** The tape shows the diagonal less its own correction, and the burn on top. */
function shownFor(input: SquarenessInput, length: Quantity, burn: Length): Quantity {
  return plus(input.tape === undefined ? length : shownBy(input.tape, inches(length)), burn);
}

function targetOf(input: SquarenessInput, diagonal: Quantity, show: (value: Quantity) => LengthAnswer): SquarenessAnswer["target"] {
  const [ac, bd] = [burnOf(input, "ac"), burnOf(input, "bd")];
  const common = ac.equals(bd) ? ac : (input.burn ?? Length.zero);
  const reading = (burn: Length) => show(shownFor(input, diagonal, burn));
  const shown = reading(common);
  return { diagonal: show(diagonal), reading: shown, readings: { ac: ac.equals(common) ? shown : reading(ac), bd: bd.equals(common) ? shown : reading(bd) } };
}

function readingsAnswer(measurements: Measurements, { adjusted }: Figure, show: (value: Quantity) => LengthAnswer): SquarenessAnswer["readings"] {
  const of = (name: ReadingName, { reading, correction, actual }: Measured) => ({
    reading: reading === null ? null : show(reading),
    correctionIn: correction === null ? null : { ...correction, total: totalOf(correction) },
    measured: show(actual),
    adjusted: adjusted === null ? null : show(adjusted[name]),
    residualIn: adjusted === null ? null : adjusted[name] - inches(actual),
  });
  const { bc, cd } = measurements;
  return {
    ab: of("ab", measurements.ab),
    bc: bc === undefined ? null : of("bc", bc),
    cd: cd === undefined ? null : of("cd", cd),
    da: of("da", measurements.da),
    ac: of("ac", measurements.ac),
    bd: of("bd", measurements.bd),
  };
}

function pullAnswer(input: SquarenessInput, measurements: Measurements, suspects: readonly Suspect[], leastGap: number): SquarenessAnswer["separatingPull"] {
  const found = separatingPull(suspects.map(({ reading, corners }) => ({ suspect: reading, corners })), {
    lengthOf: (name) => {
      const known = readingNames.find((reading) => reading === name.toLowerCase());
      const measured = known === undefined ? undefined : measurements[known];
      return measured === undefined ? undefined : inches(measured.actual);
    },
    leastGap,
    triangleUnit: readsMetric(input) ? 100 / 25.4 : 12,
  });
  if (found === null) return null;
  const show = (value: Quantity) => measure(value, input.precision);
  const end = ({ corner, toward, inches: far }: PullEnd) => ({ corner, toward, distance: toward === null ? null : show(far) });
  return {
    kind: found.kind,
    from: end(found.from),
    to: end(found.to),
    separatesAll: found.separatesAll,
    expected: found.expected.map(({ suspect, inches: length }) => ({ suspect, length: show(length), reading: show(shownFor(input, length, input.burn ?? Length.zero)) })),
  };
}

function proofsOf(measurements: Measurements, contradictory: boolean, difference: Quantity, tapers: readonly [number, number] | null, graduation: number): SquarenessAnswer["proves"] {
  if (!hasFourSides(measurements)) return ["rack-if-sides-match", contradictory ? "sides-disagree" : "sides-agree", "taper-unknown", "scale-unchecked"];
  const fools = inches(difference) <= graduation + same && tapers !== null && tapers.some((taper) => taper > graduation + same);
  return [contradictory ? "readings-disagree" : "readings-close", "corners-solved", ...(fools ? (["equal-diagonals-not-square"] as const) : []), "scale-unchecked"];
}
