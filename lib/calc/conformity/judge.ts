import { acceptanceZone, holds } from "./acceptance";
import { expandedUncertainty, maximumError, standardUncertainty } from "./accuracy";
import { isTooCoarse, shareOfTolerance } from "./coarseness";
import { judgeOverload } from "./judge-overload";
import { type Judgement, type Measured, type Verdict } from "./judgement";
import { JudgementError } from "./judgement-error";
import { probabilityInside, probabilityOutside } from "./normal-error";
import { sentencesFor } from "./sentences";

/**
 * Judges a reading against limits.
 *
 * - does-not-conform: outside the limits.
 * - guard-band: inside the limits, but closer than w to one of them (guarded rule only).
 * - conforms: inside the acceptance zone, the limits drawn in by w.
 *
 * w = U under the guarded rule (JCGM 106:2012, ISO 14253-1, ILAC-G8:09/2019 §4.2: at most 2.5 % false
 * acceptance at a single limit), w = 0 under simple acceptance (up to 50 %). Without an accuracy there is no U, so
 * nothing is held back, and a sentence says so. A reading on an included limit conforms; on an excluded one (`<`) not.
 * An overload (±Infinity) meets a limit that it lies beyond, see judgeOverload.
 *
 * Throws JudgementError for NaN, limits without a bound, another unit than the limits', or an accuracy that is none:
 * mistakes of the caller, since parsed readings and limits cannot be so.
 * Leaves out: what is known of the circuit before measuring, repeated readings, loading, calibration drift.
 */
export function judge(measured: Measured): Judgement {
  refuseWhatCannotBeJudged(measured);
  const { reading, limits, accuracy, rule, model } = measured;
  const { value } = reading;
  if (!Number.isFinite(value)) return judgeOverload(measured);

  const known = accuracy && {
    maximumError: maximumError(reading, accuracy),
    expandedUncertainty: expandedUncertainty(reading, accuracy, model),
    ...probabilities(value, standardUncertainty(reading, accuracy, model), measured),
  };
  const guardBand = rule === "guarded" ? (known?.expandedUncertainty ?? 0) : 0;
  const acceptance = acceptanceZone(limits, guardBand);
  const share = known && shareOfTolerance(known.expandedUncertainty, limits);
  const found = { verdict: verdictOf(measured, guardBand), rule, ...known, guardBand, acceptance };
  const judged = { ...found, shareOfTolerance: share, tooCoarse: isTooCoarse(share) };
  return { ...judged, sentences: sentencesFor(measured, judged) };
}

function verdictOf({ reading: { value }, limits }: Measured, guardBand: number): Verdict {
  if (!holds(limits, value)) return "does-not-conform";
  return holds(limits, value, guardBand) ? "conforms" : "guard-band";
}

function probabilities(value: number, u: number, { limits }: Measured) {
  // Without any error the verdict is certain, and rounding must not say otherwise.
  const certain = u === 0 ? (holds(limits, value) ? 1 : 0) : undefined;
  return {
    probabilityOfConformance: certain ?? probabilityInside(value, u, limits),
    probabilityOfFalseAcceptance: certain === undefined ? probabilityOutside(value, u, limits) : 1 - certain,
  };
}

function refuseWhatCannotBeJudged({ reading, limits, accuracy }: Measured): void {
  if (Number.isNaN(reading.value)) throw new JudgementError("reading", "The reading is no number.");
  const bounds = [limits.lower, limits.upper].filter((bound) => bound !== undefined);
  if (bounds.length === 0) throw new JudgementError("limits", "There is no limit to judge by.");
  if (!bounds.every(Number.isFinite)) throw new JudgementError("limits", "A limit is no number.");
  if (limits.lower !== undefined && limits.upper !== undefined && limits.lower > limits.upper) {
    throw new JudgementError("limits", "The lower limit lies above the upper one.");
  }
  if (reading.unit !== limits.unit) {
    throw new JudgementError(
      "unit",
      `The reading is in ${reading.unit || "plain numbers"}, the limits are in ${limits.unit || "plain numbers"}.`,
    );
  }
  if (accuracy) maximumError({ ...reading, value: 0 }, accuracy);
}
