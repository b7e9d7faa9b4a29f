import { readLength } from "../../calculators/length";
import { percentile, row } from "./table.mjs";

/** Lengths as they are typed, half-typed and mistyped. */
const texts = [
  "28' 7 1/2\"", "28-7 1/2", "28 ft 7 1/2 in", "343.5", "343 1/2", "7/16", "⅞", "8.7249 m", "8724,9 mm", "28′ 7½″", "28 pies 7 1/2 pulg",
  "2", "28'", "28' 7 1/", "3-1/2", "1,234", "28' 13\"", "abc", "9".repeat(64), "1/".repeat(32), "½".repeat(64), `${"9".repeat(50)}/${"7".repeat(9)}`,
];
const rounds = 10_000;

function read(text: string): void {
  try {
    readLength(text);
  } catch {
    // Refusing is part of the work.
  }
}

for (let round = 0; round < 500; round += 1) texts.forEach(read);
const microseconds: number[] = [];
for (let round = 0; round < rounds; round += 1) {
  for (const text of texts) {
    const began = process.hrtime.bigint();
    read(text);
    microseconds.push(Number(process.hrtime.bigint() - began) / 1000);
  }
}
const shown = (part: number) => `${percentile(microseconds, part).toFixed(1)} µs`;
console.log(JSON.stringify([row("reading a length, p50", shown(0.5)), row(`reading a length, p99.9 of ${(texts.length * rounds).toLocaleString("en-US")}`, shown(0.999))]));
