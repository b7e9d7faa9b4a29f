/** The length core as one lazily loaded piece; import it through `useLengthCore` or a calculator's own lazy `core.ts`, never directly from a page. */
export { Length, LengthError, graduation, isMetric, parseLength, printExact, printLength, readLength, roundLength } from "@/calculators/length";
