import { cornerName, sideName, sideNames } from "../geometry/corner-names";
import { forSides } from "../geometry/per-side";
import { plus, scaled, distance } from "../geometry/point";
import { around, insideAngles, signedArea } from "../geometry/polygon";
import { provingDiagonals } from "../geometry/proving-diagonals";
import { Length } from "../length";
import { CalculationError, measure } from "../schema";
import type { FootprintAnswer } from "./answer";
import { between, chalkOf, type Chalk } from "./chalk";
import type { FootprintInput } from "./input";
import type { Outline } from "./outline";
import { asNumber } from "./walk-closure";

/** A place on a side where the edge departs from the straight: from `bows`, or from a middle that was read. */
export interface Bow {
  side: number;
  station: Length | number;
  outward: Length | number;
}

type Described = Pick<FootprintAnswer, "areaSquareFeet" | "areaSquareMetres" | "corners" | "lines" | "checks" | "bows">;

/** Square inches to square feet and square metres; 1 in = 0.0254 m exactly. */
const squareFoot = 144;
const squareMetre = 0.00064516;

/** All that follows from a closed plan: its area, corners, chalk lines and the checks that prove it. */
export function describeOutline(outline: Outline, { inset, bows = [], burn, precision }: FootprintInput, read: readonly Bow[] = []): Described {
  const { points, exact } = outline;
  const count = points.length;
  const show = (value: Length | number) => measure(value, precision);
  const insets = inset === undefined ? null : forSides(inset, count, "/inset");
  const chalk = insets === null ? null : chalkOf(outline, insets);
  const area = exact === null ? signedArea(points) : exactArea(exact);
  const angles = insideAngles(points);
  return {
    areaSquareFeet: area / squareFoot,
    areaSquareMetres: area * squareMetre,
    corners: points.map(({ x, y }, index) => ({
      name: cornerName(index),
      x,
      y,
      inside: angles[index]! > 180,
      angleDegrees: angles[index]!,
      chalk: chalk && { ...chalk.points[index]!, fromCorner: show(distance(points[index]!, chalk.points[index]!)) },
    })),
    lines: points.map((corner, index) => {
      const middle = plus(scaled(corner, 0.5), scaled(around(points, index + 1), 0.5));
      const length = outline.sides[index]!;
      const half = typeof length === "number" ? length / 2 : length.over(2);
      return { side: sideName(index, count), toward: outline.toward[index] ?? null, length: show(length), inset: insets && show(insets[index]!), chalk: chalk && show(chalk.lengths[index]!), middle: { station: show(half), ...middle } };
    }),
    checks: checksOf(outline, chalk, burn ?? Length.zero, precision),
    bows: [...bowsGiven(outline, bows, precision), ...read].map(({ side, station, outward }) => ({
      side: sideName(side, count),
      station: show(station),
      outward: show(outward),
      toChalk: insets && show(sum(insets[side]!, outward)),
    })),
  };
}

const sum = (a: Length, b: Length | number) => (typeof b === "number" ? a.toNumber() + b : a.plus(b));

function exactArea(corners: NonNullable<Outline["exact"]>): number {
  const twice = corners.map((corner, index) => {
    const next = around(corners, index + 1);
    return corner.x.inches.mul(next.y.inches).sub(next.x.inches.mul(corner.y.inches));
  });
  return twice.reduce((total, part) => total.add(part)).div(2).valueOf();
}

function checksOf({ points, exact }: Outline, chalk: Chalk | null, burn: Length, precision: FootprintInput["precision"]): FootprintAnswer["checks"] {
  const proving = provingDiagonals(points).map(({ from, to, fixes }) => ({ from, to, fixes }));
  const pulls = points.length === 4 ? [{ from: 0, to: 2, fixes: 2 }, { from: 1, to: 3, fixes: 3 }] : proving;
  const withReading = (length: Length | number) => ({ length: measure(length, precision), reading: measure(sum(burn, length), precision) });
  return pulls.map(({ from, to, fixes }) => ({
    from: cornerName(from),
    to: cornerName(to),
    fixes: cornerName(fixes),
    ...withReading(between(points, exact, from, to)),
    chalk: chalk && withReading(between(chalk.points, chalk.exact, from, to)),
  }));
}

function bowsGiven({ points, sides }: Outline, bows: NonNullable<FootprintInput["bows"]>, precision: FootprintInput["precision"]): Bow[] {
  const names = sideNames(points.length);
  return bows.map(({ side, station, outward }, index) => {
    const at = names.indexOf(side.trim().toLowerCase());
    if (at < 0) throw new CalculationError([{ pointer: `/bows/${index}/side`, code: "side-unknown", params: { found: side.slice(0, 8), first: names[0]!, last: names.at(-1)! } }]);
    const length = sides[at]!;
    if (station !== undefined && station.toNumber() > asNumber(length)) throw new CalculationError([{ pointer: `/bows/${index}/station`, code: "station-past-side", params: { most: measure(length, precision).text } }]);
    return { side: at, station: station ?? (typeof length === "number" ? length / 2 : length.over(2)), outward };
  });
}
