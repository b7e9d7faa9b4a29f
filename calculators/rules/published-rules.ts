import type { FigureStatus, RuleId, RuleText } from "./rule";

/**
 * The published rules. Figures and statuses are those of domain.md sections 1.1 to 1.9: `read` in a transcription or
 * page, `second-hand` in one that quotes the code, `memory` until someone opens the book. Section numbers move between
 * editions; a clause names the edition it was read in.
 */
const irc2024 = "2024 IRC, public transcription (molina1998329.wixsite.com/369homeinspectionsll/new-foundation)";
const ibcQuote = "2006 IBC as quoted at forum.nachi.org/t/mud-sill-strap-bolting-and-irc/33952";
const ibcBook = "IBC conventional light-frame construction";
const nbcGuide = "NBC Division B, guides.co/g/canadian-building-code-division-b-part-9-housing-and-small-buildings/189713";
const ontario = "Ontario O. Reg. 332/12, oncodes.ca/foundation/anchorage-of-building-frames";
const washerQuote = "2006 IBC 2305.3.11 as quoted at seaint.blogspot.com/2008/01/fw-3x3-square-sill-plate-washers.html";

const from = (clause: string, source: string, status: FigureStatus) => ({ clause, source, status });
const unstated = { clause: null, source: null, status: null };
const silent = { value: null, ...unstated };

const nothing: RuleText = {
  id: null,
  title: null,
  diameter: silent,
  spacing: silent,
  spacingOfThicker: { diameter: null, value: null, ...unstated },
  endMinimum: { value: null, diameters: null, ...unstated },
  endMaximum: silent,
  foundationEndMaximum: silent,
  boltsPerPiece: silent,
  embedment: silent,
  middleThird: silent,
  edgeCover: silent,
  washer: { size: null, thickness: null, slotLength: null, slotOver: null, ...unstated },
  shortWalls: [],
};

const irc: RuleText = {
  ...nothing,
  id: "us-irc",
  title: "IRC R403.1.6",
  diameter: { value: "1/2 in", ...from("R403.1.6", irc2024, "read") },
  spacing: { value: "6 ft", ...from("R403.1.6", irc2024, "read") },
  endMinimum: { value: null, diameters: 7, ...from("R403.1.6", irc2024, "read") },
  endMaximum: { value: "12 in", ...from("R403.1.6", irc2024, "read") },
  boltsPerPiece: { value: 2, ...from("R403.1.6", irc2024, "read") },
  embedment: { value: "7 in", ...from("R403.1.6", irc2024, "read") },
  middleThird: { value: true, ...from("R403.1.6", irc2024, "read") },
  shortWalls: [
    { upTo: "12 in", bolts: 0, ...from("R403.1.6 exception 2", irc2024, "read") },
    { upTo: "24 in", bolts: 1, ...from("R403.1.6 exception 1", irc2024, "read") },
  ],
};

/** 6 ft carries over from the general rule for one and two storeys: our reading, hence derived. */
const ircSeismic: RuleText = {
  ...irc,
  id: "us-irc-seismic",
  title: "IRC R403.1.6.1, one and two storeys",
  spacing: { value: "6 ft", ...from("R403.1.6.1, R403.1.6", irc2024, "derived") },
  washer: { size: "3 in", thickness: "0.229 in", slotLength: "1 3/4 in", slotOver: "3/16 in", ...from("R602.11.1", washerQuote, "second-hand") },
};

export const publishedRuleTexts: Readonly<Record<RuleId, RuleText>> = {
  "us-irc": irc,
  "us-irc-seismic": ircSeismic,
  "us-irc-seismic-3-storey": {
    ...ircSeismic,
    id: "us-irc-seismic-3-storey",
    title: "IRC R403.1.6.1, over two storeys",
    spacing: { value: "4 ft", ...from("R403.1.6.1", irc2024, "read") },
  },
  ibc: {
    ...nothing,
    id: "ibc",
    title: "IBC 2308, conventional light-frame construction",
    diameter: { value: "1/2 in", ...from("2308.3.1", ibcBook, "memory") },
    spacing: { value: "6 ft", ...from("2308.3.1", ibcBook, "memory") },
    endMinimum: { value: "4 in", diameters: null, ...from("2308.6 (2006)", ibcQuote, "second-hand") },
    endMaximum: { value: "12 in", ...from("2308.6 (2006)", ibcQuote, "second-hand") },
    boltsPerPiece: { value: 2, ...from("2308.3.1", ibcBook, "memory") },
    embedment: { value: "7 in", ...from("2308.3.1", ibcBook, "memory") },
  },
  "ca-nbc": {
    ...nothing,
    id: "ca-nbc",
    title: "NBC 9.23.6.1",
    diameter: { value: "12.7 mm", ...from("9.23.6.1", nbcGuide, "read") },
    spacing: { value: "2.4 m", ...from("9.23.6.1", nbcGuide, "read") },
    embedment: { value: "100 mm", ...from("9.23.6.1", ontario, "read") },
  },
  "ca-nbc-braced": {
    ...nothing,
    id: "ca-nbc-braced",
    title: "NBC 9.23.6.1(3), two or more framed floors, Sa(0.2) up to 0.70",
    diameter: { value: "12.7 mm", ...from("9.23.6.1(3)", nbcGuide, "read") },
    spacing: { value: "1.7 m", ...from("9.23.6.1(3)", nbcGuide, "read") },
    spacingOfThicker: { diameter: "15.9 mm", value: "2.4 m", ...from("9.23.6.1(3)", nbcGuide, "read") },
    foundationEndMaximum: { value: "0.5 m", ...from("9.23.6.1(3)", nbcGuide, "read") },
    embedment: { value: "100 mm", ...from("9.23.6.1", ontario, "read") },
  },
};
