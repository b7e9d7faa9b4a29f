export { batchAnswer, batchEnvelope, batchInput, batchItem, batchLimit, operationPaths, type BatchAnswer } from "./batch";
export { liveAnswer, readyAnswer } from "./health";
export { linkAnswer, linkBodyLimit, linkIdPattern, linkInput, linkLanguages, linkParams, madeLink, type LinkAnswer, type MadeLink } from "./link";
export { problemAnswer, type ProblemAnswer } from "./problem";
export { problemCodes, problemPath, problems, type ProblemCode, type ProblemStatus } from "./problems";
