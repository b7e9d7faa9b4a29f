/** Hand-worked fits; each row says how. Inches. */
export const fitRows = [
  {
    what: "a true slab takes its chalk exactly",
    input: { corners: { A: { x: 0, y: 0 }, B: { x: 336, y: 0 }, C: { x: 336, y: 288 }, D: { x: 0, y: 288 } }, size: { length: "335 1/8", width: "287 1/8" }, inset: "7/16" },
    worst: "0", // 336 − 335 1/8 = 2 × 7/16
    offsets: { A: { ab: "7/16", da: "7/16" }, C: { bc: "7/16", cd: "7/16" } },
  },
  {
    what: "a true slab an inch too long shares it between its ends, and the other way stays as wanted",
    input: { corners: { A: { x: 0, y: 0 }, B: { x: 337, y: 0 }, C: { x: 337, y: 288 }, D: { x: 0, y: 288 } }, size: { length: 335, width: 287 }, inset: "1/2" },
    worst: "1/2", // 337 − 335 = 2, 1 at each end, 1/2 more than wanted
    offsets: { A: { ab: "1/2", da: "1" }, C: { bc: "1", cd: "1/2" } },
  },
  {
    what: "a true slab too short overhangs by half at each end when that is allowed",
    input: { corners: { A: { x: 0, y: 0 }, B: { x: "334 1/2", y: 0 }, C: { x: "334 1/2", y: 288 }, D: { x: 0, y: 288 } }, size: { length: 335, width: 287 }, inset: "1/2", overhang: 1 },
    worst: "3/4", // 334 1/2 − 335 = −1/2, −1/4 at each end, 3/4 less than wanted
    offsets: { A: { ab: "1/2", da: "-1/4" }, B: { ab: "1/2", bc: "-1/4" } },
  },
  {
    what: "insets of their own on each side are each met on a true slab",
    input: { corners: { A: { x: 0, y: 0 }, B: { x: 336, y: 0 }, C: { x: 336, y: 288 }, D: { x: 0, y: 288 } }, size: { length: 331, width: "287" }, inset: { ab: "1/2", bc: "4 1/2", cd: "1/2", da: "1/2" } },
    worst: "0", // 336 − 4 1/2 − 1/2 = 331
    offsets: { B: { ab: "1/2", bc: "9/2" }, D: { cd: "1/2", da: "1/2" } },
  },
  {
    what: "a true L, sizes free, takes every line at its inset",
    input: { corners: { A: { x: 0, y: 0 }, B: { x: 480, y: 0 }, C: { x: 480, y: 240 }, D: { x: 288, y: 240 }, E: { x: 288, y: 384 }, F: { x: 0, y: 384 } }, inset: "1/2", mode: "size-free" },
    worst: "0",
    offsets: { D: { cd: "1/2", de: "1/2" }, F: { ef: "1/2", fa: "1/2" } },
  },
] as const;
