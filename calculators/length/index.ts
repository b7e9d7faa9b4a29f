export { Length, squareRoot, lengthUnits, type LengthUnit } from "./length";
export { LengthError, type LengthProblemCode, type LengthProblems } from "./length-error";
export { characterLimit, parseLength, readLength } from "./parse-length";
export { LengthReader } from "./length-reader";
export { rangeLimit, ReadLength } from "./read-length";
export { tokenizeLength } from "./length-tokens";
export { graduation, isMetric, precisions, printExact, printLength, printRounded, roundLength, roundTo, type Lean, type LengthStyle, type Precision } from "./print-length";
