/** Rows B09 to B16 of domain.md section 14: even spacing under R403.1.6, end bolts at 12 in (2024 IRC, read; arithmetic derived). */
export const layoutRows = [
  { id: "B09", piece: "8 ft", rule: "us-irc", count: 2, spacing: "72" },
  { id: "B10", piece: "10 ft", rule: "us-irc", count: 3, spacing: "48" },
  { id: "B11", piece: "12 ft", rule: "us-irc", count: 3, spacing: "60" },
  { id: "B12", piece: "14 ft", rule: "us-irc", count: 3, spacing: "72" },
  { id: "B13", piece: "16 ft", rule: "us-irc", count: 4, spacing: "56" },
  { id: "B14", piece: "20 ft", rule: "us-irc", count: 4, spacing: "72" },
  { id: "B15", piece: "24 ft", rule: "us-irc", count: 5, spacing: "66" },
  { id: "B16", piece: "8 ft", rule: "us-irc-seismic-3-storey", count: 3, spacing: "36" },
] as const;

/** B06 to B08: the middle third of dry 2x4, 2x6, 2x8 (R403.1.6 with PS 20), inches to 1e-4. */
export const thirdRows = [
  { id: "B06", width: "3 1/2", from: 1.1667, to: 2.3333 },
  { id: "B07", width: "5 1/2", from: 1.8333, to: 3.6667 },
  { id: "B08", width: "7 1/4", from: 2.4167, to: 4.8333 },
] as const;
