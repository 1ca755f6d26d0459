import { formatLimits, formatQuantity } from "../units";
import { type Judgement, type Measured } from "./judgement";

/** Above this a risk is worth a sentence: what the guarded rule lets pass at a single limit (ILAC-G8). */
const RISK_WORTH_SAYING = 0.025;

/** Why the verdict is what it is, in short sentences, the weightiest first. */
export function sentencesFor(measured: Measured, judged: Omit<Judgement, "sentences">): string[] {
  return [
    position(measured, judged),
    nearMiss(measured, judged),
    simpleRisk(measured, judged),
    emptyZone(judged),
    coarse(measured, judged),
    uncertainty(measured, judged),
  ].filter((sentence) => sentence !== undefined);
}

type Judged = Omit<Judgement, "sentences">;

/** "±53 mV": at most two digits of an uncertainty mean anything (GUM, JCGM 100:2008, 7.2.6). */
const spread = (value: number, { reading: { unit } }: Measured) =>
  `±${formatQuantity({ value, unit }, { significant: 2 })}`;

function position(measured: Measured, { verdict, guardBand }: Judged): string {
  const { reading, limits } = measured;
  const read = formatQuantity(reading);
  if (verdict === "does-not-conform") return outside(measured);
  const fits = `${read} fits ${formatLimits(limits)}`;
  if (verdict === "guard-band") {
    return `${fits}, but by less than the instrument's uncertainty of ${spread(guardBand, measured)}: repeat with a better instrument.`;
  }
  return guardBand > 0
    ? `${fits} by more than the instrument's uncertainty of ${spread(guardBand, measured)}.`
    : `${fits}.`;
}

function outside(measured: Measured): string {
  const { reading, limits } = measured;
  const { limit, distance, word } = overstepped(measured);
  const read = formatQuantity(reading);
  if (distance <= 0 || distance < 1e-12 * Math.abs(limit))
    return `${read} is on the limit, and ${formatLimits(limits)} leaves the limit out.`;
  const { unit } = reading;
  const by = formatQuantity({ value: distance, unit }, { significant: 2 });
  return `${read} is ${by} ${word} the limit of ${formatQuantity({ value: limit, unit })}.`;
}

/** The limit that the reading is beyond, or on. */
function overstepped({ reading: { value }, limits: { lower, upper } }: Measured) {
  const over = upper === undefined ? -Infinity : value - upper;
  const under = lower === undefined ? -Infinity : lower - value;
  return over >= under
    ? { limit: upper ?? 0, distance: over, word: "above" }
    : { limit: lower ?? 0, distance: under, word: "below" };
}

function nearMiss(measured: Measured, { verdict, expandedUncertainty: U = 0 }: Judged): string | undefined {
  if (verdict !== "does-not-conform" || overstepped(measured).distance >= U) return undefined;
  return `That is less than the instrument's uncertainty of ${spread(U, measured)}: a better instrument may tell.`;
}

function simpleRisk(
  { rule }: Measured,
  { verdict, probabilityOfFalseAcceptance: risk = 0 }: Judged,
): string | undefined {
  if (rule !== "simple" || verdict !== "conforms" || risk <= RISK_WORTH_SAYING) return undefined;
  return `Accepted as read; the chance that the true value lies outside is ${percent(risk)}.`;
}

function emptyZone({ acceptance, verdict }: Judged): string | undefined {
  if (!acceptance.empty || verdict === "does-not-conform") return undefined;
  return "The uncertainty is more than half the width of the limits, so no reading can keep clear of both.";
}

function coarse({ limits }: Measured, { tooCoarse, shareOfTolerance }: Judged): string | undefined {
  if (!tooCoarse || shareOfTolerance === undefined) return undefined;
  const twoSided = limits.lower !== undefined && limits.upper !== undefined;
  const of = twoSided ? "the tolerance (half the width of the limits)" : "the limit";
  return `The instrument is coarse for this check: its uncertainty is ${percent(shareOfTolerance)} of ${of}; 25 % at most is usual.`;
}

function uncertainty(measured: Measured, { maximumError, expandedUncertainty }: Judged): string | undefined {
  if (maximumError === undefined || expandedUncertainty === undefined) {
    if (measured.rule === "simple") return undefined;
    return "The instrument's accuracy is not known, so nothing was held back at the limits.";
  }
  const limit = spread(maximumError, measured);
  if (measured.model === "limit") return `The maker's limit of error at this reading is ${limit}, taken as U (k = 2).`;
  return `The maker's limit of error at this reading is ${limit}; U (k = 2) is ${spread(expandedUncertainty, measured)}.`;
}

const percent = (share: number) => formatQuantity({ value: share * 100, unit: "%" }, { significant: 2 });
