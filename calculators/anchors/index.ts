import { defineOperation, type Calculator } from "../schema";
import { checkBolts } from "./check";
import { checkAnswer, checkInput } from "./check-input";
import { layOutBolts, layoutAnswer, layoutInput } from "./layout";

export { checkAnswer, checkInput, findingCodes, remedies, untestedCodes, type CheckAnswer, type CheckInput, type Finding, type FindingCode, type Remedy } from "./check-input";
export { layoutAnswer, layoutInput, type LayoutAnswer, type LayoutInput } from "./layout";

export const layoutOperation = defineOperation({
  id: "anchorsLayout",
  path: "anchors/layout",
  input: layoutInput,
  answer: layoutAnswer,
  calculate: layOutBolts,
  examples: [
    { id: "tenFeet", input: { pieces: ["10 ft"], endDistance: "12", rule: "us-irc" }, answer: { pieces: [{ count: 3, spacing: { exact: "48" } }] }, source: "domain.md B10" },
    { id: "sixteenAndTwelve", input: { pieces: ["16 ft", "12 ft"], rule: "us-irc" }, answer: { bolts: 7, pieces: [{ count: 4 }, { count: 3 }] }, source: "arithmetic: (192 − 16)/72 and (144 − 16)/72, rounded up, plus one" },
  ],
});

export const checkOperation = defineOperation({
  id: "anchorsCheck",
  path: "anchors/check",
  input: checkInput,
  answer: checkAnswer,
  calculate: checkBolts,
  examples: [
    {
      id: "oneGap",
      input: {
        pieces: [{ from: "0", to: "16 ft" }],
        bolts: [
          { station: "8", offset: "2 3/4" },
          { station: "80", offset: "2 3/4" },
          { station: "184", offset: "1 1/2" },
        ],
        plateWidth: "5 1/2",
        rule: "us-irc",
      },
      answer: { ok: false, findings: [{ code: "spacing", bolt: 1, actual: { exact: "104" } }, { code: "middle-third", bolt: 2 }] },
      source: "arithmetic on domain.md B04 and B07: 184 − 80 = 104 over 72; 1 1/2 below 1.8333",
    },
    {
      id: "fromSlab",
      input: { pieces: [{ from: "0", to: "8 ft" }], bolts: [{ station: "12 1/2", offset: "2 3/4", from: "slab" }, { station: "84 1/2", offset: "2 3/4", from: "slab" }], plateWidth: "5 1/2", inset: "1/2", rule: "us-irc" },
      answer: { ok: true, converted: [{ bolt: 0, station: { exact: "12" }, offset: { exact: "9/4" } }, { bolt: 1 }] },
      source: "domain.md N07: 2 3/4 less 1/2 is 2 1/4 from the plate's edge, inside the middle third of a 2x6",
    },
  ],
});

export const anchors: Calculator = {
  name: "anchors",
  version: "1.0.0",
  stage: 4,
  operations: [layoutOperation, checkOperation],
  sources: [
    { title: "International Residential Code 2024", clause: "R403.1.6, R403.1.6.1, public transcription", status: "read", address: "https://molina1998329.wixsite.com/369homeinspectionsll/new-foundation" },
    { title: "AWC FAQ, anchorage of wood sill plates", clause: "R403.1.6", status: "second-hand", address: "https://awc.org/faqs/codes-standards/irc/what-are-the-requirements-for-anchorage-of-wood-sill-plates-and-wood-wall-sole-plates-in-the-irc" },
    { title: "International Building Code 2006", clause: "2308.6, end distance 4 in to 12 in, as quoted", status: "second-hand", address: "https://forum.nachi.org/t/mud-sill-strap-bolting-and-irc/33952" },
    { title: "International Building Code", clause: "2308.3.1, bolt, spacing, embedment, two per piece", status: "memory" },
    { title: "International Building Code 2006", clause: "2305.3.11, plate washers, as quoted", status: "second-hand", address: "https://seaint.blogspot.com/2008/01/fw-3x3-square-sill-plate-washers.html" },
    { title: "National Building Code of Canada, Division B", clause: "9.23.6.1", status: "read", address: "https://guides.co/g/canadian-building-code-division-b-part-9-housing-and-small-buildings/189713" },
    { title: "Ontario O. Reg. 332/12", clause: "9.23.6.1, embedment", status: "read", address: "https://oncodes.ca/foundation/anchorage-of-building-frames" },
    { title: "NDS, bolt holes", clause: "1/32 to 1/16 in over the bolt", status: "second-hand", address: "https://civilengineeringx.com/bdac/bolts" },
    { title: "NAVEDTRA 14044, Builder 3 & 2, Volume 2 (1994)", clause: "p. 1-2, 1/4 in over: conflicts with the NDS", status: "read", address: "https://constructionmanuals.tpub.com/14044/css/Figure-1-2-Anchor-bolt-layout-14.htm" },
    { title: "SDPWS", clause: "washer within 1/2 in of the sheathed edge", status: "second-hand", address: "https://buildastrawbalehouse.com/tag/seismic" },
    { title: "PS 20", clause: "dressed widths, dry and green", status: "second-hand", address: "https://www.engineeringtoolbox.com/softwood-lumber-standard-d_1270.html" },
    { title: "ASME B18.2.2", clause: "height of a hex nut, about 7/8 of the diameter", status: "memory" },
  ],
  cautions: ["code-governs", "engineered-anchors", "adhesive-anchors", "young-concrete", "bolt-caps", "silica-dust", "treated-wood"],
};
