/** A direction in plan, clockwise from north in degrees, as maps and deeds give it; `axis` when it is exactly one of the four. */
export interface Toward {
  degrees: number;
  axis: Axis | null;
}

export type Axis = "N" | "E" | "S" | "W";

const axes: Readonly<Record<number, Axis>> = { 0: "N", 90: "E", 180: "S", 270: "W" };

/** English and Spanish; O is oeste, and SO and NO its corners, as Spanish deeds write them. */
const words: Readonly<Record<string, number>> = {
  ...{ n: 0, north: 0, norte: 0, e: 90, east: 90, este: 90, s: 180, south: 180, sur: 180, w: 270, west: 270, o: 270, oeste: 270 },
  ...{ ne: 45, northeast: 45, noreste: 45, nordeste: 45, se: 135, southeast: 135, sureste: 135, sudeste: 135 },
  ...{ sw: 225, southwest: 225, so: 225, suroeste: 225, sudoeste: 225, nw: 315, northwest: 315, no: 315, noroeste: 315 },
};

const degreeMark = "(?:[°º˚]|deg(?:rees)?\\b|grados\\b)";
const minutes = "(?:\\s*-?\\s*(\\d{1,2}(?:\\.\\d{1,6})?)\\s*(?:['’′´]|min\\b|(?=-|\\s*[EWO]))";
const seconds = "(?:\\s*-?\\s*(\\d{1,2}(?:\\.\\d{1,6})?)\\s*(?:[\"”″]|''|’’|′′|seg?\\b|sec\\b|(?=\\s*[EWO])))?)?";
const angle = (mark: string) => `(\\d{1,3}(?:\\.\\d{1,9})?)\\s*${mark}${minutes}${seconds}`;

const quadrant = new RegExp(`^(north|norte|n|south|sur|s)\\s*${angle(`${degreeMark}?`)}\\s*(east|este|e|west|oeste|w|o)(?![\\p{L}])`, "iu");
const azimuth = new RegExp(`^${angle(degreeMark)}`, "iu");
const word = /^(north|south|norte|sur)?[\s-]?(?:east|west|este|oeste)?/iu;

export type TowardProblem = "toward-unknown" | "bearing-incomplete" | "bearing-out-of-range";

export type ReadToward = { toward: Toward; rest: string } | { problem: TowardProblem };

/**
 * Reads a direction from the front of a text: a word (`E`, `south`, `noroeste`), a quadrant bearing (`N 45° 30' 15" E`, at
 * most 90° from north or south), or an azimuth with its degree mark (`135° 30'`). What follows is handed back.
 *
 * One pass; each pattern has bounded repeats and no nesting.
 */
export function readToward(text: string): ReadToward {
  const start = text.trimStart();
  const bearing = quadrant.exec(start);
  if (bearing !== null) {
    const degrees = angleOf(bearing.slice(2, 5));
    if (degrees === null || degrees > 90) return { problem: "bearing-out-of-range" };
    const north = /^n/i.test(bearing[1]!);
    const east = /^e(?!$)|^e$/i.test(bearing[5]!);
    const clockwise = north === east ? degrees : -degrees;
    return { toward: towardAt(north ? clockwise : 180 + clockwise), rest: start.slice(bearing[0].length) };
  }
  const turned = azimuth.exec(start);
  if (turned !== null) {
    const degrees = angleOf(turned.slice(1, 4));
    if (degrees === null || degrees > 360) return { problem: "bearing-out-of-range" };
    return { toward: towardAt(degrees), rest: start.slice(turned[0].length) };
  }
  return readWord(start);
}

function readWord(start: string): ReadToward {
  const joined = word.exec(start)?.[0] ?? "";
  const letters = /^\p{L}+/u.exec(start)?.[0] ?? "";
  const found = joined.length > letters.length ? joined : letters;
  const degrees = words[found.toLowerCase().replace(/[\s-]/g, "")];
  if (degrees === undefined) return { problem: "toward-unknown" };
  const rest = start.slice(found.length);
  if ((degrees === 0 || degrees === 180) && new RegExp(`^\\s*\\d[\\d.]*\\s*${degreeMark}`, "iu").test(rest)) return { problem: "bearing-incomplete" };
  return { toward: towardAt(degrees), rest: rest.replace(/^\./, "") };
}

function angleOf([whole = "", minute = "0", second = "0"]: readonly (string | undefined)[]): number | null {
  if (Number(minute) >= 60 || Number(second) >= 60) return null;
  return Number(whole) + Number(minute) / 60 + Number(second) / 3600;
}

export function towardAt(degrees: number): Toward {
  const round = ((degrees % 360) + 360) % 360;
  const near = Math.round(round);
  const exact = Math.abs(round - near) < 1e-10 ? near % 360 : round;
  return { degrees: exact, axis: axes[exact] ?? null };
}

/** East and north per inch walked. */
export function stepToward({ degrees, axis }: Toward): { east: number; north: number } {
  if (axis !== null) return { east: axis === "E" ? 1 : axis === "W" ? -1 : 0, north: axis === "N" ? 1 : axis === "S" ? -1 : 0 };
  const radians = (degrees * Math.PI) / 180;
  return { east: Math.sin(radians), north: Math.cos(radians) };
}

/** `E`, or the quadrant bearing to the second: `N 45° 30' 15" E`. */
export function printToward({ degrees, axis }: Toward): string {
  if (axis !== null) return axis;
  const north = degrees < 90 || degrees > 270;
  const east = degrees < 180;
  const fromMeridian = north ? (east ? degrees : 360 - degrees) : Math.abs(180 - degrees);
  const all = Math.round(fromMeridian * 3600);
  const [whole, minute, second] = [Math.floor(all / 3600), Math.floor((all % 3600) / 60), all % 60];
  const parts = [`${whole}°`, minute > 0 || second > 0 ? `${minute}'` : "", second > 0 ? `${second}"` : ""].filter(Boolean);
  return `${north ? "N" : "S"} ${parts.join(" ")} ${east ? "E" : "W"}`;
}
