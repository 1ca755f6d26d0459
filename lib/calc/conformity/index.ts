export { type Acceptance } from "./acceptance";
export {
  expandedUncertainty,
  maximumError,
  standardUncertainty,
  type Accuracy,
  type AccuracyRange,
  type UncertaintyModel,
} from "./accuracy";
export { shareOfTolerance } from "./coarseness";
export { judge } from "./judge";
export {
  VERDICT_WORDS,
  verdictSentence,
  type DecisionRule,
  type Judgement,
  type Measured,
  type Verdict,
} from "./judgement";
export { JudgementError } from "./judgement-error";
export { probabilityInside, probabilityOutside, upperTail } from "./normal-error";
export { pickRange } from "./pick-range";
