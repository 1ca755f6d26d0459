import { type Limits, type Quantity } from "../units";
import { type Acceptance } from "./acceptance";
import { type Accuracy, type UncertaintyModel } from "./accuracy";

/** "simple": the reading counts as it stands. "guarded": it has to keep U away from every limit. */
export type DecisionRule = "simple" | "guarded";

export type Verdict = "conforms" | "guard-band" | "does-not-conform";

/** The verdicts in the words of the interface. */
export const VERDICT_WORDS: Readonly<Record<Verdict, string>> = {
  conforms: "conforms",
  "guard-band": "conforms, inside guard band",
  "does-not-conform": "does not conform",
};

const SENTENCES: Readonly<Record<Verdict, string>> = {
  conforms: "Conforms.",
  "guard-band": "Conforms, inside guard band: repeat with a better instrument.",
  "does-not-conform": "Does not conform.",
};

/** A verdict as one short sentence that says what follows. */
export const verdictSentence = (verdict: Verdict): string => SENTENCES[verdict];

/** What is judged. Values in base units; `accuracy` is that of the range in use (see pickRange). */
export type Measured = {
  reading: Quantity;
  limits: Limits;
  accuracy?: Accuracy;
  rule: DecisionRule;
  model?: UncertaintyModel;
};

/** A reading, judged. All values in the reading's base unit; what needs an accuracy is absent without one. */
export type Judgement = {
  verdict: Verdict;
  rule: DecisionRule;
  /** The maker's limit of error a at this reading. */
  maximumError?: number;
  /** U, k = 2. */
  expandedUncertainty?: number;
  /** w: U under the guarded rule, 0 under the simple one or when U is unknown. */
  guardBand: number;
  /** Where the reading has to lie to conform. */
  acceptance: Acceptance;
  probabilityOfConformance?: number;
  /** Probability that the true value lies outside the limits, i.e. of accepting this reading wrongly; both tails. */
  probabilityOfFalseAcceptance?: number;
  /** U as a share of the tolerance (see shareOfTolerance). */
  shareOfTolerance?: number;
  tooCoarse: boolean;
  /** Short sentences for people, the weightiest first. */
  sentences: string[];
};
