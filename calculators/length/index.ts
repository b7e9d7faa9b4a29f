export { Length, squareRoot, lengthUnits, type LengthUnit } from "./length";
export { LengthError, type LengthProblemCode, type LengthProblems } from "./length-error";
export { characterLimit, parseLength, readLength, ReadLength } from "./parse-length";
export { tokenizeLength } from "./length-tokens";
export { graduation, isMetric, precisions, printExact, printLength, roundLength, type Lean, type LengthStyle, type Precision } from "./print-length";
