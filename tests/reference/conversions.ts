/** Rows of domain.md that the conversions must meet: section 14 U06 to U16 (decimal feet) and D20 to D22 (tape arithmetic). */

export const decimalFootTexts = [
  { id: "U06", value: `8' 3 5/16"`, decimalFeet: "8.2760 ft", source: "Glencoe activity 9" },
  { id: "U14", value: `7' 4 3/4"`, decimalFeet: "7.3958 ft", source: "arithmetic, 7.395833" },
  { id: "U15", value: `15' 11 1/8"`, decimalFeet: "15.9271 ft", source: "Dr. Math 58323, 15.927083" },
  { id: "section 4", value: `16' 10 5/8"`, decimalFeet: "16.8854 ft", source: "Dr. Math 58323, 16.88541667" },
  ...[".0833", ".1667", ".2500", ".3333", ".4167", ".5000", ".5833", ".6667", ".7500", ".8333", ".9167"].map((feet, index) => ({ id: "U16", value: `${index + 1}"`, decimalFeet: `0${feet} ft`, source: "table" })),
  { id: "U16", value: `12"`, decimalFeet: "1.0000 ft", source: "table" },
  ...[".0104", ".0208", ".0313", ".0417", ".0521", ".0625", ".0729", ".0833"].map((feet, index) => ({ id: "section 4", value: `${index + 1}/8"`, decimalFeet: `0${feet} ft`, source: "table of eighths; 3/8 is a tie, rounded up" })),
  { id: "section 4", value: `1/16"`, decimalFeet: "0.0052 ft", source: "table" },
] as const;

export const feetInchesTexts = [
  { id: "U07", value: "5.4583", feetInches: `5' 5 1/2"`, source: "Glencoe activity 9" },
  { id: "U08", value: "5.1719", feetInches: `5' 2 1/16"`, source: "Glencoe activity 9" },
  { id: "U09", value: "8.5833", feetInches: `8' 7"`, source: "Glencoe activity 9" },
  { id: "U10", value: "13.1042", feetInches: `13' 1 1/4"`, source: "Glencoe activity 9" },
  { id: "section 4", value: "10.7396", feetInches: `10' 8 7/8"`, source: "Glencoe activity 9" },
] as const;

export const stripRows = [
  { id: "D20", first: "13.89 in", factor: "8", totalIn: 111.12, text: `9' 3 1/8"`, source: "NAVEDTRA 14044" },
  { id: "D21", first: "13.42 in", factor: "12.5", totalIn: 167.75, text: `13' 11 3/4"`, source: "Griffith, 13.98 ft" },
  { id: "D22", first: "17.69 in", factor: "10 1/3", totalIn: 182.79666666666667, text: `15' 2 13/16"`, source: "Army, flagged" },
] as const;
