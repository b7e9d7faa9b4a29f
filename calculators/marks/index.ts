import { defineOperation, type Calculator } from "../schema";
import { marksAnswer } from "./answer";
import { marksInput } from "./input";
import { layOutMarks } from "./lay-out-marks";

export { marksAnswer, type MarksAnswer } from "./answer";
export { marksInput, type MarksInput } from "./input";

export const marksOperation = defineOperation({
  id: "marks",
  path: "marks",
  input: marksInput,
  answer: marksAnswer,
  calculate: layOutMarks,
  examples: [
    {
      id: "sixteen",
      input: { length: "8 ft", spacing: "16", thickness: "1 1/2" },
      answer: { marks: [{ exact: "61/4" }, { exact: "125/4" }, { exact: "189/4" }, { exact: "253/4" }, { exact: "317/4" }], bays: 6, lastBay: { exact: "16" } },
      source: "domain.md J01 (15 1/4, 31 1/4, 47 1/4, 63 1/4) and J04 (6 bays in 96 in)",
    },
    {
      id: "nineteenTwo",
      input: { length: "9 ft", spacing: "19.2" },
      answer: { marks: [{ text: "1' 6 7/16\"" }, { text: "3' 1 5/8\"" }, { text: "4' 8 7/8\"" }, { text: "6' 4 1/16\"" }, { text: "7' 11 1/4\"" }], sheetBreaks: [{ onJoist: true }] },
      source: "domain.md section 9: 18 7/16, 37 5/8, 56 7/8, 76 1/16, 95 1/4, each rounded from zero",
    },
  ],
});

export const marks: Calculator = {
  name: "marks",
  version: "1.0.0",
  stage: 7,
  operations: [marksOperation],
  sources: [
    { title: "Pulling layout (framing book page, author not shown)", clause: "15 1/4, 31 1/4, 47 1/4, 63 1/4", status: "read", address: "https://boulderlibrary.net/framing/pulling-layout-from-a-corner-16-quot-o-c.html" },
    { title: "Modern Carpentry (2016)", clause: "p. 246: line and X, lapped joists shift the opposite wall", status: "read", address: "https://g-wonlinetextbooks.com/modern-carpentry-2016/268" },
    { title: "Miller, The Carpenters' Guide", clause: "15 and 17 in from the corner, then every 16", status: "read", address: "https://chestofbooks.com/home-improvement/woodworking/Carpenters-Guide/Spacing-And-Placing-Joists.html" },
    { title: "Fundamentals of Building Construction", clause: "p. 181: 16, 19.2 and 24 in divide an 8 ft sheet; its 486 mm is 487.68", status: "read", address: "https://fliphtml5.com/osspz/ikfp" },
    { title: "Trade school video text", clause: "24 in on centre; 59 1/4 printed for 71 1/4", status: "read", address: "https://www.protradecraft.com/video/framing-floor" },
    { title: "ASME B18.21.1", clause: "a 1/2 in washer is 1 3/8 in across", status: "memory" },
  ],
  cautions: ["code-governs", "recheck-before-cutting", "bolt-caps"],
};
