import convert from "convert-units";
import { Length } from "../length";
import { measure } from "../schema";
import type { TakeoffAnswer, TakeoffLine } from "./answer";
import type { TakeoffInput } from "./input";
import { quantitiesOf, type Quantities } from "./quantities";

const half = Length.from(0.5);
const defaults = {
  plateWidth: Length.from(5.5),
  plateThickness: Length.from(1.5),
  sealerRoll: Length.from(50, "ft"),
  anchorDepth: Length.from(7),
  anchorHoleOver: Length.from(0.125),
  /** Out of the plate: washer, nut and two threads more. */
  rodAbove: Length.from(1.25),
  cartridge: 280,
  preservativeCan: 946,
  coverage: 100,
};
/** Brushed on twice. */
const coats = 2;
/** A wet 16 ft 2x6 weighs about 45 lb (customary, domain.md section 11): 49 lb a cubic foot. */
const poundsPerCubicFoot = 49;

/**
 * What must be on the truck for a sill: boards, sealer, bolts, nuts, washers, adhesive and cut-end preservative.
 *
 * Units: lengths are exact rational inches; areas, volumes and masses are doubles, converted by convert-units where its
 * accuracy serves. What is counted is rounded up once, waste in.
 * Source: plate washers 3 by 3 by 0.229 in (IRC R602.11.1, second-hand); steel bolts of 1/2 in and more need no galvanizing in
 * treated wood, smaller fasteners, nuts and washers do (IRC R319.3 and 2012 IBC 2304.9.5.1, second-hand); cut ends, holes
 * and notches are treated in the field (IRC R317.1.1 with AWPA M4, from memory). Adhesive: the space between rod and hole. Its
 * approval governs depth and hole; coverage, coats and weight are customary figures and said to be assumed.
 *
 * @throws CalculationError `plates-or-lumber`, `required`.
 * @example Twelve 16 ft boards over 180 ft of plate take four 50 ft rolls of sealer, and five with 15 percent waste.
 */
export function listMaterials(input: TakeoffInput): TakeoffAnswer {
  const job = quantitiesOf(input);
  const waste = input.waste ?? 0;
  const diameter = input.diameter ?? job.diameter ?? half;
  const withWaste = (needed: number) => Math.ceil(Number((needed * (1 + waste / 100)).toPrecision(12)));
  const show = (length: Length) => measure(length, input.precision);
  const line = (item: TakeoffLine["item"], unit: TakeoffLine["unit"], needed: number, more: Partial<TakeoffLine> = {}): TakeoffLine[] =>
    needed <= 0 ? [] : [{ item, unit, needed, quantity: withWaste(needed), size: null, amount: null, note: null, ...more }];

  const roll = input.sealerRoll ?? defaults.sealerRoll;
  const rods = rodOf(input, diameter);
  const hung = job.bolts + job.boltsToCast + job.newAnchors;
  const adhesive = job.newAnchors * adhesiveMillilitres(rods);
  const treated = treatedArea(input, job, diameter);
  const preservative = convert(treated / (input.coverage ?? defaults.coverage)).from("gal").to("ml") * coats;
  const hardwareNote = diameter.compare(half) >= 0 ? "galvanized" : "galvanized-small";
  const lines = [
    ...boardLines(job, waste, show),
    ...line("sill-sealer", "roll", job.plateLength.inches.div(roll.inches).valueOf(), { size: show(roll), amount: lengthAmount(job.plateLength), note: "width-of-plate" }),
    ...line("anchor-bolt", "piece", job.boltsToCast, { size: show(diameter), note: hardwareNote }),
    ...line("threaded-rod", "piece", job.newAnchors, { size: show(rods.length), note: "rod-length" }),
    ...line("nut", "piece", hung, { size: show(diameter), note: "galvanized" }),
    ...(job.plateWashers ? line("plate-washer", "piece", hung, { size: show(Length.from(3)), note: "plate-washer-size" }) : line("washer", "piece", hung, { size: show(diameter), note: "galvanized" })),
    ...line("adhesive", "cartridge", adhesive / (input.cartridge ?? defaults.cartridge), { amount: { value: adhesive, unit: "ml", metric: adhesive, metricUnit: "ml" }, note: "approval-governs" }),
    ...line("preservative", "can", preservative / (input.preservativeCan ?? defaults.preservativeCan), { amount: { value: treated, unit: "ft2", metric: convert(treated).from("ft2").to("m2"), metricUnit: "m2" }, note: "cut-ends-and-holes" }),
  ];
  return {
    lines,
    totals: totalsOf(input, job, lines, show),
    waste,
    assumed: [
      ...(job.plateLengthAssumed ? (["plate-length-from-boards"] as const) : []),
      ...(job.newAnchors > 0 && input.anchorDepth === undefined ? (["anchor-depth"] as const) : []),
      ...(job.newAnchors > 0 && input.anchorHole === undefined ? (["anchor-hole"] as const) : []),
      ...(input.coverage === undefined && treated > 0 ? (["coverage"] as const) : []),
      "density",
    ],
  };
}

/** Boards of each length as planned; waste is spare boards of the longest, since those can replace any. */
function boardLines({ lumber }: Quantities, waste: number, show: (length: Length) => TakeoffAnswer["totals"]["boardLength"]): TakeoffLine[] {
  const all = lumber.reduce((sum, { count }) => sum + count, 0);
  const spare = Math.ceil(Number((all * (waste / 100)).toPrecision(12)));
  return lumber.map(({ length, count }, index) => ({ item: "board", size: show(length), quantity: count + (index === 0 ? spare : 0), unit: "board", needed: count, amount: null, note: "treated" }));
}

interface Rod {
  diameter: Length;
  hole: Length;
  depth: Length;
  length: Length;
}

function rodOf(input: TakeoffInput, diameter: Length): Rod {
  const depth = input.anchorDepth ?? defaults.anchorDepth;
  return { diameter, hole: input.anchorHole ?? diameter.plus(defaults.anchorHoleOver), depth, length: depth.plus(input.plateThickness ?? defaults.plateThickness).plus(defaults.rodAbove) };
}

/** The space between rod and hole, full depth. */
function adhesiveMillilitres({ diameter, hole, depth }: Rod): number {
  const [outer, inner] = [hole.toNumber(), diameter.toNumber()];
  return convert(Math.max(0, (Math.PI / 4) * (outer ** 2 - inner ** 2) * depth.toNumber())).from("in3").to("ml");
}

/** Both ends of every piece and the wall of every hole, in square feet. */
function treatedArea(input: TakeoffInput, { pieces, holes }: Quantities, diameter: Length): number {
  const [width, thickness] = [(input.plateWidth ?? defaults.plateWidth).toNumber(), (input.plateThickness ?? defaults.plateThickness).toNumber()];
  const bore = diameter.toNumber() + 1 / 16;
  return convert(2 * pieces * width * thickness + holes * Math.PI * bore * thickness).from("in2").to("ft2");
}

function lengthAmount(length: Length): TakeoffLine["amount"] {
  return { value: length.in("ft").valueOf(), unit: "ft", metric: length.in("m").valueOf(), metricUnit: "m" };
}

function totalsOf(input: TakeoffInput, { lumber }: Quantities, lines: readonly TakeoffLine[], show: (length: Length) => TakeoffAnswer["totals"]["boardLength"]): TakeoffAnswer["totals"] {
  const ordered = lines.filter(({ item }) => item === "board").map(({ quantity }) => quantity);
  const length = lumber.reduce((sum, board, index) => sum.plus(board.length.times(ordered[index]!)), Length.zero);
  const [width, thickness] = [(input.plateWidth ?? defaults.plateWidth).toNumber(), (input.plateThickness ?? defaults.plateThickness).toNumber()];
  const pounds = (inches: number) => convert(inches * width * thickness).from("in3").to("ft3") * poundsPerCubicFoot;
  const heaviest = pounds(lumber[0]?.length.toNumber() ?? 0);
  const all = pounds(length.toNumber());
  return {
    boards: ordered.reduce((sum, quantity) => sum + quantity, 0),
    boardLength: show(length),
    boardFeet: (length.in("ft").valueOf() * 2 * nominalWidth(width)) / 12,
    pounds: all,
    kilograms: convert(all).from("lb").to("kg"),
    heaviestPounds: heaviest,
    heaviestKilograms: convert(heaviest).from("lb").to("kg"),
  };
}

/** PS 20: dressed 3 1/2, 5 1/2, 7 1/4, 9 1/4, 11 1/4 (green a little more) are sold as 4, 6, 8, 10, 12. */
function nominalWidth(width: number): number {
  return [4, 6, 8, 10, 12].find((nominal) => width <= nominal) ?? Math.ceil(width);
}
