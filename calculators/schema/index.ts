export { calculatorInput, choiceField, flagField, lengthField, numberField, orRequired } from "./fields";
export { CalculationError, issuesOf, pointerTo, type Issue } from "./issue";
export { lengthAnswer, measure, type LengthAnswer } from "./measure";
export { defineOperation, type Calculator, type Caution, type Operation, type Source, type SourceStatus, type WorkedExample } from "./operation";
export { inputFromQuery, queryFromInput } from "./query";
export { answerTo, type Answered } from "./answer-to";
