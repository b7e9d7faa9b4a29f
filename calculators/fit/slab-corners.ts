import type Fraction from "fraction.js";
import { adjustNetwork } from "../geometry/distance-network";
import { cornerName, mostCorners, sideNames } from "../geometry/corner-names";
import { settledAt } from "../geometry/place-network";
import type { Point } from "../geometry/point";
import { crossingSides, signedArea } from "../geometry/polygon";
import type { ExactPoint } from "../footprint/outline";
import { Length } from "../length";
import { CalculationError, measure, type Issue } from "../schema";
import type { FitInput } from "./input";

export interface BuiltSlab {
  points: Point[];
  /** As given; null when they come from readings. */
  exact: ExactPoint[] | null;
}

/**
 * The slab's corners: as given, or from its sides and diagonals as the squareness calculator places them (two sides make
 * a parallelogram, four the least squares quadrilateral).
 *
 * @throws CalculationError `slab-missing`, `corner-skipped`, `too-few-corners`, `corners-clockwise`, `corners-cross`, `burn-over-reading`,
 * `diagonal-impossible`.
 */
export function slabCorners(input: FitInput): BuiltSlab {
  const built = input.corners !== undefined && Object.keys(input.corners).length > 0 ? given(input.corners) : fromReadings(input);
  const pointer = built.exact === null ? "/diagonals" : "/corners";
  if (crossingSides(built.points) !== null) throw refusal(pointer, "corners-cross");
  if (signedArea(built.points) <= 0) throw refusal(pointer, "corners-clockwise");
  return built;
}

const refusal = (pointer: string, code: string, params: Issue["params"] = {}) => new CalculationError([{ pointer, code, params }]);

function given(corners: NonNullable<FitInput["corners"]>): BuiltSlab {
  const named = new Map(Object.entries(corners).map(([name, place]) => [name.toUpperCase(), place]));
  const odd = Object.keys(corners).find((name) => !/^[A-Za-z]$/.test(name));
  if (odd !== undefined) throw refusal(`/corners/${odd}`, "point-unknown", { found: odd.slice(0, 20) });
  const exact: ExactPoint[] = [];
  for (let index = 0; index < named.size; index += 1) {
    const place = named.get(cornerName(index));
    if (place === undefined) throw refusal("/corners", "corner-skipped", { corner: cornerName(index), last: [...named.keys()].sort().at(-1)! });
    exact.push(place);
  }
  if (exact.length < 3 || exact.length > mostCorners) throw refusal("/corners", "too-few-corners", { corners: exact.length });
  return { exact, points: exact.map(({ x, y }) => ({ x: x.toNumber(), y: y.toNumber() })) };
}

function fromReadings(input: FitInput): BuiltSlab {
  const { diagonals, length, width, sides } = input;
  const required = (field: string) => refusal(`/${field}`, "required");
  if (diagonals === undefined && length === undefined && sides === undefined) throw refusal("/corners", "slab-missing");
  if (diagonals === undefined) throw required("diagonals");
  const issues: Issue[] = [];
  const actual = (group: "sides" | "diagonals", name: "ab" | "bc" | "cd" | "da" | "ac" | "bd", reading: Length) => {
    const burn = input.burns?.[name] ?? input.burn ?? Length.zero;
    const value = reading.minus(burn);
    if (!value.isPositive()) issues.push({ pointer: `/${group}/${name}`, code: "burn-over-reading", params: { burn: measure(burn, input.precision).text } });
    return value;
  };
  const ac = actual("diagonals", "ac", diagonals.ac);
  const bd = actual("diagonals", "bd", diagonals.bd);
  const read = sides && { ab: actual("sides", "ab", sides.ab), da: actual("sides", "da", sides.da), bc: sides.bc && actual("sides", "bc", sides.bc), cd: sides.cd && actual("sides", "cd", sides.cd) };
  if (issues.length > 0) throw new CalculationError(issues);
  if (read?.bc !== undefined && read.cd !== undefined) return { exact: null, points: quadrilateral(read.ab, read.bc, read.cd, read.da, ac, bd) };
  const ab = read?.ab ?? length;
  const da = read?.da ?? width;
  if (ab === undefined) throw required("length");
  if (da === undefined) throw required("width");
  return { exact: null, points: parallelogram(ab, da, ac, bd) };
}

const square = (value: Length): Fraction => value.inches.mul(value.inches);

/** cos A = (AC² − BD²) / (4·AB·DA). */
function parallelogram(ab: Length, da: Length, ac: Length, bd: Length): Point[] {
  const cosine = square(ac).sub(square(bd)).div(ab.inches.mul(da.inches).mul(4)).valueOf();
  if (Math.abs(cosine) >= 1) throw impossible(ab, da);
  const [long, wide] = [ab.toNumber(), da.toNumber()];
  const d = { x: wide * cosine, y: wide * Math.sqrt(1 - cosine * cosine) };
  return [{ x: 0, y: 0 }, { x: long, y: 0 }, { x: long + d.x, y: d.y }, d];
}

function impossible(ab: Length, da: Length) {
  return refusal("/diagonals/ac", "diagonal-impossible", { least: measure(ab.minus(da).magnitude(), "1/16").text, most: measure(ab.plus(da), "1/16").text });
}

function quadrilateral(ab: Length, bc: Length, cd: Length, da: Length, ac: Length, bd: Length): Point[] {
  const lengths = [ab, bc, cd, da, ac, bd].map((length) => length.toNumber());
  const ends = [[0, 1], [1, 2], [2, 3], [3, 0], [0, 2], [1, 3]] as const;
  const start = parallelogram(ab, da, ac, bd);
  const { points, converged } = adjustNetwork(start, ends.map(([from, to], index) => ({ from, to, length: lengths[index]! })));
  if (!converged) throw impossible(ab, da);
  return settledAt(points, false, 0, 1);
}

/** The number of a side by its name. @throws CalculationError `side-unknown`. */
export function sideNumber(name: string, count: number, pointer: string): number {
  const names = sideNames(count);
  const found = names.indexOf(name.trim().toLowerCase());
  if (found < 0) throw refusal(pointer, "side-unknown", { found: name.slice(0, 8), first: names[0]!, last: names.at(-1)! });
  return found;
}
