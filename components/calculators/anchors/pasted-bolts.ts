export interface PastedBolt {
  station: string;
  offset?: string;
  projection?: string;
  engineered?: string;
}

const mostBolts = 200;
const engineeredWords = /^(hd|hold|engineer|strap|tens|fleje|ingenier)/i;

/**
 * One bolt a line: station, then offset, then how far it stands above the concrete, parted by tabs or semicolons,
 * else by commas; a word such as HD marks it as engineered. A line without a digit (a heading) is passed over. Lengths stay as written.
 */
export function readPastedBolts(text: string): PastedBolt[] {
  return text
    .split(/\r?\n/)
    .filter((line) => /\d/.test(line))
    .slice(0, mostBolts)
    .map((line) => {
      const parts = partsOf(line).map((part) => part.trim());
      const engineered = parts.some((part) => engineeredWords.test(part));
      const [station = "", offset = "", projection = ""] = parts.filter((part) => part !== "" && !engineeredWords.test(part));
      return { station, ...(offset === "" ? {} : { offset }), ...(projection === "" ? {} : { projection }), ...(engineered ? { engineered: "true" } : {}) };
    })
    .filter(({ station }) => station !== "");
}

/** Where a tab or semicolon parts, a comma is a decimal one. */
function partsOf(line: string): string[] {
  return line.split(/[\t;]/.test(line) ? /[\t;]/ : ",");
}
