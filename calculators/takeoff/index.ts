import { defineOperation, type Calculator } from "../schema";
import { takeoffAnswer } from "./answer";
import { takeoffInput } from "./input";
import { listMaterials } from "./list-materials";

export { takeoffAnswer, type TakeoffAnswer, type TakeoffLine } from "./answer";
export { takeoffInput, type TakeoffInput } from "./input";
export { toCsv } from "./to-csv";

export const takeoffOperation = defineOperation({
  id: "takeoffs",
  path: "takeoffs",
  input: takeoffInput,
  answer: takeoffAnswer,
  calculate: listMaterials,
  examples: [
    {
      id: "sill",
      input: { lumber: [{ length: "16 ft", count: 12 }], plateLength: "180 ft", pieceCount: 14, bolts: 30, newAnchors: 4 },
      answer: { lines: [{ item: "board", quantity: 12 }, { item: "sill-sealer", quantity: 4 }, { item: "threaded-rod", quantity: 4 }, { item: "nut", quantity: 34 }, { item: "washer", quantity: 34 }, { item: "adhesive" }, { item: "preservative" }] },
      source: "arithmetic: 180 / 50 is 3.6, so four rolls; 30 + 4 nuts and washers",
    },
    {
      id: "waste",
      input: { lumber: [{ length: "16 ft", count: 12 }], plateLength: "180 ft", bolts: 30, waste: 15 },
      answer: { lines: [{ item: "board", quantity: 14 }, { item: "sill-sealer", quantity: 5 }, { item: "nut", quantity: 35 }, { item: "washer", quantity: 35 }, { item: "preservative" }] },
      source: "arithmetic: 12 × 0.15 is 1.8, so two spare; 3.6 × 1.15 is 4.14; 30 × 1.15 is 34.5",
    },
  ],
});

export const takeoff: Calculator = {
  name: "takeoff",
  version: "1.0.0",
  stage: 6,
  operations: [takeoffOperation],
  sources: [
    { title: "International Building Code 2006", clause: "2305.3.11, plate washers 0.229 by 3 by 3 in, as quoted", status: "second-hand", address: "https://seaint.blogspot.com/2008/01/fw-3x3-square-sill-plate-washers.html" },
    { title: "IRC R319.3 (2003/2006)", clause: "fasteners in treated wood; steel bolts 1/2 in and more excepted, as quoted", status: "second-hand", address: "https://conradlumberco.com/products/fasteners-treated-wood" },
    { title: "IBC 2012", clause: "2304.9.5.1: nuts and washers are named", status: "second-hand", address: "https://studylib.net/doc/18063432" },
    { title: "IRC R317.1.1 with AWPA M4", clause: "cut ends, holes and notches treated in the field", status: "memory" },
    { title: "PS 20", clause: "dressed and nominal widths", status: "second-hand", address: "https://www.engineeringtoolbox.com/softwood-lumber-standard-d_1270.html" },
    { title: "Coverage, coats and wet weight", clause: "customary figures", status: "practice" },
  ],
  cautions: ["code-governs", "treated-wood", "adhesive-anchors", "silica-dust"],
};
