import { defineOperation, type Calculator } from "../schema";
import { conversionsAnswer } from "./answer";
import { convert } from "./convert";
import { conversionsInput } from "./input";

export { conversionsAnswer, type ConversionsAnswer, type DecimalForm, type PrintedForm } from "./answer";
export { conversionsInput, stripOperations, type ConversionsInput, type StripOperation } from "./input";

export const conversionsOperation = defineOperation({
  id: "conversions",
  path: "conversions",
  input: conversionsInput,
  answer: conversionsAnswer,
  calculate: convert,
  examples: [
    {
      id: "decimalFoot",
      input: { value: "8' 3 5/16\"" },
      answer: { decimalFeet: { text: "8.2760 ft" }, inches: { text: "99 5/16\"" } },
      source: "domain.md U06: Glencoe, Carpentry & Building Construction, math activity 9",
    },
    {
      id: "planFeet",
      input: { value: "5.1719 ft" },
      answer: { feetInches: { text: "5' 2 1/16\"", lean: "strong" } },
      source: "domain.md U08: Glencoe, math activity 9",
    },
    {
      id: "timesEight",
      input: { strip: [{ op: "add", value: "13.89" }, { op: "times", value: "8" }] },
      answer: { total: { text: "9' 3 1/8\"" } },
      source: "domain.md D20: NAVEDTRA 14044",
    },
    {
      id: "timesTenAndThird",
      input: { strip: [{ op: "add", value: "17.69" }, { op: "times", value: "10 1/3" }] },
      answer: { total: { text: "15' 2 13/16\"" } },
      source: "domain.md D22: Army, flagged, its own text prints 15 ft 3 in",
    },
    {
      id: "threeSpaces",
      input: { value: "10' 0\"", spaces: "3" },
      answer: { spacing: { each: { text: "3' 4\"" }, marks: [{ text: "3' 4\"" }, { text: "6' 8\"" }, { text: "10' 0\"" }] } },
      source: "arithmetic: 120 / 3 = 40",
    },
  ],
});

export const conversions: Calculator = {
  name: "conversions",
  version: "1.0.0",
  stage: null,
  operations: [conversionsOperation],
  sources: [
    { title: "Federal Register, 85 FR 62698 (5 October 2020)", clause: "1 ft = 0.3048 m exactly", status: "read", address: "https://federal.elaws.us/fr/10/5/2020/2020-21902" },
    { title: "NIST Handbook 44", clause: "s. 10.3, a reading midway goes to the even graduation", status: "second-hand", address: "https://www.corada.com/documents/dimensional-tolerances-in-construction-and-for-surface-accessibility/Metal-measuring-tapes" },
    { title: "Glencoe, Carpentry & Building Construction", clause: "math activity 9, decimal feet", status: "read", address: "https://glencoe.mheducation.com/sites/0078797845" },
    { title: "NAVEDTRA 14044, Builder 3 & 2", clause: "lengths per foot of run", status: "read", address: "https://constructionmanuals.tpub.com/14044/css/" },
  ],
  cautions: [], // nothing is built from a converted length that another calculator does not caution about
};
