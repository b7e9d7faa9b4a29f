/** All that the sheet needs of the cores, as one piece fetched when a sheet is asked for: import it lazily, never from a page. */
import { calculators, operations } from "@/calculators";
import { stagesWith } from "@/lib/client/set/stages";

export { unpackSet } from "@/lib/client/sheet/packed-set";
export { sheetOf } from "@/lib/client/sheet/sheet-of";
export { codeOf } from "@/lib/client/sheet/code";
export const stages = stagesWith(calculators.map(({ name }) => name));
export { operations };
