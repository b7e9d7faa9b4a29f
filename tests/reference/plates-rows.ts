/**
 * Published cutting stock cases with known best values, domain.md section 7 (C rows). Sizes as printed there.
 *
 * - t60_00: Falkenauer's triplets, capacity 1000: 20 bins; first-fit decreasing needs 23 (BPPLIB).
 * - u120_00: OR-Library binpack1, capacity 150: 48 bins; first-fit decreasing needs 49.
 * - roll: the 5600 mm paper roll of the encyclopedia (graphsearch.epfl.ch/en/concept/826868): 73 rolls, 407,160 mm in all.
 */
const t60 = "495 474 473 472 466 450 445 444 439 430 419 414 410 395 372 370 366 366 366 363 361 357 355 351 350 350 347 320 315 307 303 299 298 298 292 288 287 283 275 275 274 273 273 272 272 271 269 269 268 263 262 261 259 258 255 254 252 252 252 251";
const u120 =
  "42 69 67 57 93 90 38 36 45 42 33 79 27 57 44 84 86 92 46 38 85 33 82 73 49 70 59 23 57 72 74 69 33 42 28 46 30 64 29 74 41 49 55 98 80 32 25 38 82 30 35 39 57 84 62 50 55 27 30 36 20 78 47 26 45 41 58 98 91 96 73 84 37 93 91 43 73 85 81 79 71 80 76 83 41 78 70 23 42 87 43 84 60 55 49 78 73 62 36 44 94 69 32 96 70 84 58 78 25 80 58 66 83 24 98 60 42 43 43 39";
const roll: readonly (readonly [width: number, count: number])[] = [[1380, 22], [1520, 25], [1560, 12], [1710, 14], [1820, 18], [1880, 18], [1930, 20], [2000, 10], [2050, 12], [2100, 14], [2140, 16], [2150, 18], [2200, 20]];

export const cuttingStockCases: readonly { id: string; name: string; capacity: number; sizes: readonly number[]; best: number }[] = [
  { id: "C01", name: "t60_00", capacity: 1000, sizes: t60.split(" ").map(Number), best: 20 },
  { id: "C03", name: "u120_00", capacity: 150, sizes: u120.split(" ").map(Number), best: 48 },
  { id: "C04", name: "the 5600 mm roll", capacity: 5600, sizes: roll.flatMap(([width, count]) => new Array<number>(count).fill(width)), best: 73 },
];

/** B19 to B21: holes by the NDS (second-hand), 1/32 to 1/16 in over the bolt. */
export const bitRows = [
  { id: "B19", diameter: "1/2", bit: "17/32", warning: null, least: "17/32", most: "9/16" },
  { id: "B19", diameter: "1/2", bit: "9/16", warning: null, least: "17/32", most: "9/16" },
  { id: "B19", diameter: "1/2", bit: "1/2", warning: "hole-too-small", least: "17/32", most: "9/16" },
  { id: "B20", diameter: "5/8", bit: "11/16", warning: null, least: "21/32", most: "11/16" },
  { id: "B21", diameter: "1/2", bit: "3/4", warning: "hole-too-big", least: "17/32", most: "9/16" },
] as const;
