/** Rows B01 to B05, B22, B27 to B29 of domain.md section 14: the figures that the published rules must hold, in inches. */
export const ruleRows = [
  { id: "B01", rule: "us-irc", diameter: "1/2", endMinimum: "7/2" },
  { id: "B02", rule: "us-irc", diameter: "5/8", endMinimum: "35/8" },
  { id: "B03", rule: "us-irc", diameter: "1/2", endMaximum: "12" },
  { id: "B04", rule: "us-irc", diameter: "1/2", spacing: "72" },
  { id: "B05", rule: "us-irc-seismic-3-storey", diameter: "1/2", spacing: "48" },
  { id: "B27", rule: "ibc", diameter: "1/2", endMinimum: "4", endMaximum: "12" },
  { id: "B28", rule: "ca-nbc", diameter: "12.7 mm", spacing: "12000/127" }, // 2400 mm
  { id: "B29", rule: "ca-nbc-braced", diameter: "15.9 mm", spacing: "12000/127" },
  { id: "B29", rule: "ca-nbc-braced", diameter: "5/8", spacing: "12000/127" }, // 15.875 mm is the nominal 15.9
  { id: "B29", rule: "ca-nbc-braced", diameter: "12.7 mm", spacing: "8500/127" }, // 1700 mm
] as const;
