import convert from "convert-units";
import type { Length } from "../../length";
import type { tapeSystems } from "./input";

/** The tape as asked for, its lengths settled. */
export interface Tape {
  system: (typeof tapeSystems)[number];
  nominalLength?: Length;
  trueLength?: Length;
  temperature?: number;
  standardTemperature?: number;
  expansion?: number;
  pull?: number;
  standardPull?: number;
  section?: number;
  weight?: number;
  span?: Length;
}

/** Inches to add to what the tape showed, part by part. */
export interface TapeCorrection {
  length: number;
  temperature: number;
  pull: number;
  sag: number;
}

/** Steel per degree F, as surveyors use it (from memory; the Navy course rounds it to 0.0000065), and its stiffness in psi. */
const steelPerDegreeF = 6.45e-6;
const steelModulus = 29_000_000;
const standardDegreesF = 68;

/**
 * What a steel tape's reading must be corrected by.
 *
 * Units: inches in, inches out; the tape's own figures in `system`. Temperatures, masses and areas go through
 * convert-units, whose six digits serve: a correction is some thousandth of the length.
 * Source: (true − nominal)/nominal·L; k(T − T₀)L; (P − P₀)L/(AE); −w²s³/(24P²) for each span
 * (vermessungsseiten.de, read; taping-correction course slides, read).
 * @example 368.50 ft at 22 F with 0.0000065 per degree is 0.1102 ft short (domain.md T04).
 */
export function tapeCorrection(tape: Tape, inches: number): TapeCorrection {
  return { ...linearParts(tape, inches), sag: sagOf(tape, inches) };
}

export function totalOf({ length, temperature, pull, sag }: TapeCorrection): number {
  return length + temperature + pull + sag;
}

/** What the tape shows for a true length: the way back, by repeated correction (each round gains three digits and more). */
export function shownBy(tape: Tape, trueInches: number): number {
  let shown = trueInches;
  for (let round = 0; round < 20; round += 1) shown = trueInches - totalOf(tapeCorrection(tape, shown));
  return shown;
}

function linearParts(tape: Tape, inches: number): Omit<TapeCorrection, "sag"> {
  const metric = tape.system === "metric";
  const { nominalLength, trueLength, temperature, expansion, pull, standardPull, section } = tape;
  const perDegreeF = expansion === undefined ? steelPerDegreeF : metric ? (expansion * 5) / 9 : expansion;
  const degreesF = (value: number) => (metric ? convert(value).from("C").to("F") : value);
  const standardF = tape.standardTemperature === undefined ? standardDegreesF : degreesF(tape.standardTemperature);
  const squareInches = section === undefined ? 0 : metric ? convert(section).from("mm2").to("in2") : section;
  return {
    length: nominalLength === undefined || trueLength === undefined ? 0 : trueLength.minus(nominalLength).inches.div(nominalLength.inches).valueOf() * inches,
    temperature: temperature === undefined ? 0 : perDegreeF * (degreesF(temperature) - standardF) * inches,
    pull: pull === undefined || standardPull === undefined || section === undefined ? 0 : (pounds(tape, pull - standardPull) * inches) / (squareInches * steelModulus),
  };
}

function sagOf(tape: Tape, inches: number): number {
  const { pull, weight, span } = tape;
  if (pull === undefined || weight === undefined || span === undefined) return 0;
  const feetOfWeight = tape.system === "metric" ? 100 / 0.3048 : 100;
  const poundsPerInch = pounds(tape, weight) / feetOfWeight / 12;
  const support = span.toNumber();
  const whole = Math.floor(inches / support + 1e-9);
  const cubes = whole * support ** 3 + Math.max(0, inches - whole * support) ** 3;
  return -(poundsPerInch ** 2 * cubes) / (24 * pounds(tape, pull) ** 2);
}

function pounds(tape: Tape, value: number): number {
  return tape.system === "metric" ? convert(value).from("kg").to("lb") : value;
}
