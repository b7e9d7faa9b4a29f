import type Fraction from "fraction.js";
import { Length, squareRoot, type Precision } from "../../length";
import { CalculationError, measure, type Issue } from "../../schema";
import type { Diagonal, ReadingName } from "../input";
import { hasFourSides, inches, less, magnitude, plus, pointerOf, type Measurements, type Quantity } from "../readings";
import { adjustQuadrilateral, changeThatCloses, sixOf } from "./adjust-quadrilateral";
import { misclosureOf, type Six } from "./braced-quadrilateral";
import { isConvex, parallelogram, placeCorners, type Corners } from "./corners";

/** The slab as the readings make it. */
export interface Figure {
  corners: Corners;
  /** Root of the squared misfits in inches; what it is compared with is in `verdict`. */
  closure: number;
  /** Adjusted lengths; null with two sides, whose check spreads nothing. */
  adjusted: Six | null;
  /** Of the rectangle, or of the tapered slab once its diagonals are equal. */
  targetDiagonal: Quantity;
  /** How far CD must slide toward D; negative toward C. */
  slide: Quantity;
  /** The change of one reading that alone would close the figure, and the slab it then is; null when none does. */
  closedBy: (name: ReadingName) => { change: number; corners: Corners } | null;
}

/**
 * Four sides: the braced quadrilateral, adjusted; CD moved along AB's direction by (AC² − BD²)/(2(AB + xC − xD)) makes the
 * diagonals equal. Two sides: a parallelogram, moved by (AC² − BD²)/(4·AB) onto the rectangle of the two sizes.
 *
 * @throws CalculationError `diagonal-impossible` at a diagonal that the sides cannot have, `sides-cross` when the six make no
 * convex slab.
 */
export function solveFigure(measurements: Measurements, precision: Precision): Figure {
  refuseImpossibleDiagonals(measurements, precision);
  return hasFourSides(measurements) ? solveFour(measurements) : solveTwo(measurements);
}

function refuseImpossibleDiagonals(measurements: Measurements, precision: Precision): void {
  const issues: Issue[] = [];
  const of = (name: ReadingName) => (measurements[name] ?? measurements[name === "bc" ? "da" : "ab"])!.actual;
  const check = (diagonal: Diagonal, pairs: readonly (readonly [ReadingName, ReadingName])[]) => {
    const most = pairs.map(([one, other]) => plus(of(one), of(other))).reduce((a, b) => (inches(b) < inches(a) ? b : a));
    const least = pairs.map(([one, other]) => magnitude(less(of(one), of(other)))).reduce((a, b) => (inches(b) > inches(a) ? b : a));
    const actual = inches(of(diagonal));
    if (actual < inches(most) && actual > inches(least)) return;
    issues.push({ pointer: pointerOf(measurements, diagonal), code: "diagonal-impossible", params: { least: measure(least, precision).text, most: measure(most, precision).text } });
  };
  check("ac", [["ab", "bc"], ["cd", "da"]]);
  check("bd", [["ab", "da"], ["bc", "cd"]]);
  if (issues.length > 0) throw new CalculationError(issues);
}

function solveFour(measurements: Measurements): Figure {
  const measured = sixOf((name) => inches(measurements[name]!.actual));
  const solved = adjustQuadrilateral(measured);
  const misclosure = misclosureOf(measured);
  const corners = solved === null ? null : placeCorners(solved.adjusted);
  if (solved === null || corners === null || misclosure === null || Math.abs(misclosure.crossed) < Math.abs(misclosure.w) || !isConvex(corners)) {
    throw new CalculationError((["ac", "bd"] as const).map((name) => ({ pointer: `/diagonals/${name}`, code: "sides-cross", params: {} })));
  }
  const { ab, ac, bd } = solved.adjusted;
  const slide = (ac * ac - bd * bd) / (2 * (ab + corners.C.x - corners.D.x));
  return {
    corners,
    closure: solved.closure,
    adjusted: solved.adjusted,
    targetDiagonal: Math.hypot(corners.C.x - slide, corners.C.y),
    slide,
    closedBy: (name) => {
      const change = changeThatCloses(measured, name);
      return change === null ? null : closed(change, placeCorners({ ...measured, [name]: measured[name] + change }));
    },
  };
}

function solveTwo({ ab, da, ac, bd }: Measurements): Figure {
  const [length, width, first, second] = [ab.actual, da.actual, ac.actual, bd.actual].map(inches) as [number, number, number, number];
  const cornersOf = (four: Four) => parallelogram(four.ab, four.da, (four.ac ** 2 - four.bd ** 2) / (4 * four.ab * four.da));
  const four: Four = { ab: length, da: width, ac: first, bd: second };
  const rest: Record<keyof Four, number> = {
    ab: (first ** 2 + second ** 2) / 2 - width ** 2,
    da: (first ** 2 + second ** 2) / 2 - length ** 2,
    ac: 2 * (length ** 2 + width ** 2) - second ** 2,
    bd: 2 * (length ** 2 + width ** 2) - first ** 2,
  };
  const mean = Math.sqrt((first ** 2 + second ** 2) / 2);
  return {
    corners: cornersOf(four),
    closure: Math.abs(mean - Math.hypot(length, width)),
    adjusted: null,
    targetDiagonal: bothSquared(ab.actual, da.actual),
    slide: exactSlide(ab.actual, ac.actual, bd.actual),
    closedBy: (name) => {
      if (!isOfFour(name) || !(rest[name] > 0)) return null;
      const alone = Math.sqrt(rest[name]);
      return closed(alone - four[name], cornersOf({ ...four, [name]: alone }));
    },
  };
}

interface Four {
  ab: number;
  da: number;
  ac: number;
  bd: number;
}

const square = (value: Length): Fraction => value.inches.mul(value.inches);

function bothSquared(ab: Quantity, da: Quantity): Quantity {
  return ab instanceof Length && da instanceof Length ? squareRoot(square(ab).add(square(da))) : Math.hypot(inches(ab), inches(da));
}

function exactSlide(ab: Quantity, ac: Quantity, bd: Quantity): Quantity {
  if (ab instanceof Length && ac instanceof Length && bd instanceof Length) return Length.from(square(ac).sub(square(bd)).div(ab.inches.mul(4)));
  return (inches(ac) ** 2 - inches(bd) ** 2) / (4 * inches(ab));
}

function isOfFour(name: ReadingName): name is keyof Four {
  return name !== "bc" && name !== "cd";
}

/** A change whose slab would cross itself or have a corner turned in is no explanation. */
function closed(change: number, corners: Corners): { change: number; corners: Corners } | null {
  return isConvex(corners) ? { change, corners } : null;
}
