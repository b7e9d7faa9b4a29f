import type Fraction from "fraction.js";
import { graduation, Length, squareRoot } from "../length";
import { CalculationError, measure, type Issue } from "../schema";
import type { InsetAnswer } from "./answer";
import { chalkCorners, cornerDistance, figureOf, slabCorners, type Corner, type Slab } from "./chalk-geometry";
import { sides, type Diagonal, type InsetInput, type Side } from "./input";
import { burnOf, readingsOf, type ByDiagonal, type Group, type Readings } from "./readings";
import { closureFactor, judgeChalk, marksFrom, type Suspect } from "./suspects";

/** As in squareness: what a careful reading may be off, in inches. */
const defaultReadingError = Length.from(0.125);

/**
 * Chalk lines inset from a slab, the diagonals that prove them, and what a wrong mark would look like.
 *
 * Units: lengths are exact rational inches; a rectangle's lines and drops come out exact where they are rational. The
 * slab is the parallelogram of its two sizes whose racking its diagonals give: cos A = (AC² − BD²) / (4·AB·DA).
 * Each chalk line runs parallel to its edge.
 * Source: the strips' geometry (see `cornerDistance`), and the closure test of `judgeChalk`.
 *
 * @throws CalculationError `inset-too-big`, `burn-over-reading`, `diagonal-impossible`.
 * @example 28 by 40 ft inset 1/2 in all round: 27' 11" by 39' 11", diagonal 48' 8 1/2" (domain.md N01).
 */
export function layChalkLines(input: InsetInput): InsetAnswer {
  const { length, width, precision } = input;
  const insets = insetsOf(input);
  const lines = linesOf(input, insets);
  const readings = readingsOf(input);
  const slab = slabOf(input, readings.slabDiagonals);
  const show = (value: Length | number) => measure(value, precision);

  const diagonal = squareRoot(square(lines.ab).add(square(lines.bc)));
  const slabDiagonal = squareRoot(square(length).add(square(width)));
  const burn = input.burn ?? Length.zero;
  const drop = less(slabDiagonal, diagonal);
  const drops = slab.cosine === 0 ? { ac: drop, bd: drop } : rackedDrops(slab, insets);
  const expected = expectedDiagonals(readings.slabDiagonals, drops, diagonal);
  const asRead = { ac: plus(expected.ac, burnOf(input, "chalkDiagonals", "ac")), bd: plus(expected.bd, burnOf(input, "chalkDiagonals", "bd")) };
  const { check, suspects } = checkOf(input, slab, insets, readings, drops);

  return {
    lines: { ab: show(lines.ab), bc: show(lines.bc), cd: show(lines.cd), da: show(lines.da) },
    lineBound: lineBoundOf(slab, insets),
    diagonal: show(diagonal),
    reading: show(plus(diagonal, burn)),
    slabDiagonal: show(slabDiagonal),
    drop: show(drop),
    drops: { ac: show(drops.ac), bd: show(drops.bd) },
    expected: { ac: { diagonal: show(expected.ac), reading: show(asRead.ac) }, bd: { diagonal: show(expected.bd), reading: show(asRead.bd) } },
    offsets: {
      A: { ab: show(insets.ab), da: show(insets.da) },
      B: { ab: show(insets.ab), bc: show(insets.bc) },
      C: { bc: show(insets.bc), cd: show(insets.cd) },
      D: { cd: show(insets.cd), da: show(insets.da) },
    },
    corners: cornersOf(slab, insets, show),
    check,
    suspects: suspects.map((suspect) => suspectAnswer(input, suspect)),
    ask: askFor(input, suspects),
    warnings: warningsOf(input, slab, insets, readings.slabDiagonals).map(({ code, by }) => ({ code, by: show(by) })),
  };
}

type Insets = Readonly<Record<Side, Length>>;

const square = (value: Length): Fraction => value.inches.mul(value.inches);
const plus = (value: Length | number, more: Length) => (typeof value === "number" ? value + more.toNumber() : value.plus(more));
const less = (value: Length | number, other: Length | number) => (value instanceof Length && other instanceof Length ? value.minus(other) : inches(value) - inches(other));
const inches = (value: Length | number) => (typeof value === "number" ? value : value.toNumber());

function insetsOf({ inset, veneer }: InsetInput): Insets {
  const of = (side: Side) => {
    const own = inset instanceof Length ? inset : inset[side];
    const extra = veneer instanceof Length ? veneer : veneer?.[side];
    return extra === undefined ? own : own.plus(extra);
  };
  return { ab: of("ab"), bc: of("bc"), cd: of("cd"), da: of("da") };
}

function linesOf({ length, width, inset, precision }: InsetInput, { ab, bc, cd, da }: Insets): Insets {
  const along = length.minus(da).minus(bc);
  const across = width.minus(ab).minus(cd);
  const issues: Issue[] = [];
  const refuse = (side: Side, size: Length) => issues.push({ pointer: inset instanceof Length ? "/inset" : `/inset/${side}`, code: "inset-too-big", params: { size: measure(size, precision).text } });
  if (!along.isPositive()) refuse("bc", length);
  else if (!across.isPositive()) refuse("cd", width);
  if (issues.length > 0) throw new CalculationError(issues);
  return { ab: along, bc: across, cd: along, da: across };
}

function slabOf({ length, width }: InsetInput, read: ByDiagonal<Length> | null): Slab {
  const cosine = read === null ? 0 : square(read.ac).sub(square(read.bd)).div(length.inches.mul(width.inches).mul(4)).valueOf();
  return { length: length.toNumber(), width: width.toNumber(), cosine };
}

const inNumbers = (insets: Insets) => ({ ab: insets.ab.toNumber(), bc: insets.bc.toNumber(), cd: insets.cd.toNumber(), da: insets.da.toNumber() });

function rackedDrops(slab: Slab, insets: Insets): ByDiagonal<number> {
  const concrete = figureOf(slabCorners(slab));
  const chalk = figureOf(chalkCorners(slab, marksFrom(inNumbers(insets))));
  return { ac: concrete.ac - chalk.ac, bd: concrete.bd - chalk.bd };
}

/** The slab's diagonal as read less its drop, so that the tape's own error stays in both; without readings, the true one. */
function expectedDiagonals(read: ByDiagonal<Length> | null, drops: ByDiagonal<Length | number>, diagonal: Length | number): ByDiagonal<Length | number> {
  return read === null ? { ac: diagonal, bd: diagonal } : { ac: less(read.ac, drops.ac), bd: less(read.bd, drops.bd) };
}

function lineBoundOf(slab: Slab, { ab, bc, cd, da }: Insets): number {
  const sine = Math.sqrt(1 - slab.cosine ** 2);
  const strips = Math.max(Math.abs(ab.plus(cd).toNumber()), Math.abs(bc.plus(da).toNumber()));
  return strips * (1 / sine - 1);
}

function cornersOf(slab: Slab, insets: Insets, show: (value: number) => InsetAnswer["drop"]): InsetAnswer["corners"] {
  const numbers = inNumbers(insets);
  const { ab, bc, cd, da } = numbers;
  const onSlab = slabCorners(slab);
  const onChalk = chalkCorners(slab, marksFrom(numbers));
  const at = (name: Corner, first: number, second: number, cosine: number) => ({
    slab: onSlab[name],
    chalk: onChalk[name],
    angleDegrees: (Math.acos(cosine) * 180) / Math.PI,
    fromCorner: show(cornerDistance(first, second, cosine)),
  });
  return { A: at("A", da, ab, slab.cosine), B: at("B", ab, bc, -slab.cosine), C: at("C", bc, cd, slab.cosine), D: at("D", cd, da, -slab.cosine) };
}

function checkOf(input: InsetInput, slab: Slab, insets: Insets, readings: Readings, drops: ByDiagonal<Length | number>): { check: InsetAnswer["check"]; suspects: Suspect[] } {
  const { slabDiagonals: onSlab, chalkDiagonals: onChalk, chalkLines } = readings;
  if (onChalk === null && Object.keys(chalkLines).length === 0) return { check: null, suspects: [] };
  const numbers = (pair: ByDiagonal<Length> | null) => (pair === null ? null : { ac: pair.ac.toNumber(), bd: pair.bd.toNumber() });
  const { closure, limit, suspects } = judgeChalk({
    slab,
    insets: inNumbers(insets),
    slabDiagonals: numbers(onSlab),
    chalkDiagonals: numbers(onChalk),
    chalkLines: Object.fromEntries(Object.entries(chalkLines).map(([side, value]) => [side, value.toNumber()])),
    readingError: (input.readingError ?? defaultReadingError).toNumber(),
  });
  const show = (value: Length | number) => measure(value, input.precision);
  const dropOf = (name: Diagonal) => {
    const measured = onSlab![name].minus(onChalk![name]);
    return { measured: show(measured), difference: show(less(measured, drops[name])) };
  };
  const measuredDrops = onSlab === null || onChalk === null ? null : { ac: dropOf("ac"), bd: dropOf("bd") };
  return { check: { agrees: closure <= limit, closureIn: closure, limitIn: limit, drops: measuredDrops }, suspects };
}

/** As in squareness, a slip is named when it is within this of the burn or of a foot. */
const slipWithin = 3 / 16;

function suspectAnswer(input: InsetInput, { line, end, reading, off, fits }: Suspect): InsetAnswer["suspects"][number] {
  const [group, name] = (reading ?? ".").split(".") as [Group, Diagonal | Side];
  const isNear = (slip: number) => reading !== null && slip > 0 && Math.abs(Math.abs(off) - slip) <= slipWithin;
  const burn = reading === null ? 0 : burnOf(input, group, name).toNumber() || 1;
  const likely = isNear(burn) ? "burn" : isNear(12) ? "foot" : null;
  const toward = reading === null ? (off > 0 ? "in" : "out") : off > 0 ? "more" : "less";
  return { line, end, reading, off: measure(Math.abs(off), input.precision), toward, fits, likely };
}

/** What parts the suspects that fit: first the slab's diagonals, then the chalk's lengths, and opposite lines only by their offsets. */
function askFor({ slabDiagonals, chalkDiagonals, chalkLines }: InsetInput, suspects: readonly Suspect[]): InsetAnswer["ask"] {
  if (suspects.length === 0) return null;
  if (chalkLines === undefined || sides.some((side) => chalkLines[side] === undefined)) return "chalk-lines";
  if (chalkDiagonals !== undefined && slabDiagonals === undefined) return "slab-diagonals";
  const fitting = suspects.filter(({ fits }) => fits);
  return fitting.length === 1 && fitting[0]!.reading === null && fitting[0]!.end !== null ? null : "offsets";
}

function warningsOf({ length, width, readingError, precision }: InsetInput, slab: Slab, insets: Insets, read: ByDiagonal<Length> | null) {
  const warnings: { code: InsetAnswer["warnings"][number]["code"]; by: Length | number }[] = [];
  if (read !== null) {
    const mean = Math.sqrt(square(read.ac).add(square(read.bd)).div(2).valueOf());
    const closure = mean - Math.hypot(length.toNumber(), width.toNumber());
    if (Math.abs(closure) > closureFactor * (readingError ?? defaultReadingError).toNumber()) warnings.push({ code: "slab-contradictory", by: Math.abs(closure) });
    const difference = read.ac.minus(read.bd).magnitude();
    if (difference.compare(graduation(precision)) > 0) warnings.push({ code: "slab-racked", by: difference });
  }
  const outermost = sides.map((side) => insets[side]).reduce((least, inset) => (inset.compare(least) < 0 ? inset : least));
  if (outermost.isNegative()) warnings.push({ code: "overhang", by: outermost.magnitude() });
  return warnings;
}
