import { planSill, platesInput } from "../../calculators/plates";
import { atMost, row } from "./table.mjs";

/** A draw that is the same in every run. */
let state = 20260901;
const draw = () => (state = (state * 1103515245 + 12345) % 2147483648) / 2147483648;

/** Walls of 20 to 80 ft with bolts poured 48 to 72 in apart, none where a joint would want it. */
function job(walls: number, longest: number) {
  return platesInput.parse({
    walls: Array.from({ length: walls }, (_, wall) => {
      const length = Math.round((240 + draw() * (longest - 240)) * 8) / 8;
      const bolts: { station: number }[] = [];
      for (let at = 6 + Math.round(draw() * 48) / 8; at < length - 4; at += 48 + Math.round(draw() * 192) / 8) bolts.push({ station: at });
      return { name: `w${wall}x`, length, bolts };
    }),
    stock: [{ length: "16 ft" }, { length: "14 ft" }, { length: "12 ft" }, { length: "10 ft" }, { length: "8 ft" }],
    shortest: "24 in",
    rule: "us-irc",
  });
}

const rows = [];
planSill(job(4, 480)); // once for the engine to warm up
for (const [walls, longest] of [[5, 960], [10, 960], [20, 960], [40, 1320]] as const) {
  const input = job(walls, longest);
  const began = performance.now();
  let cut = 0;
  const answer = planSill(input, { onProgress: ({ stage }) => void (cut === 0 && stage === 2 && (cut = performance.now())) });
  const ended = performance.now();
  const bolts = input.walls!.reduce((sum, wall) => sum + wall.bolts.length, 0);
  const what = `plates of ${walls} walls, ${bolts} bolts, ${answer.totals.pieces} pieces`;
  rows.push(
    walls === 40 ? atMost(`${what}: answered in`, Math.round(ended - began), 1000, " ms", 0) : row(`${what}: answered in`, `${Math.round(ended - began)} ms`),
    row(`${what}: joints and a first plan, gap at the end`, `${Math.round((cut || ended) - began)} ms, ${(answer.gap * 100).toFixed(1)} %`),
  );
}
console.log(JSON.stringify(rows));
