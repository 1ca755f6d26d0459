import { type Quantity, type Unit } from "../units";
import { JudgementError } from "./judgement-error";

/**
 * An instrument's accuracy as its maker states it: ± (% of reading + counts + % of range).
 * `resolution` is the value of one count of the **range in use** in the base unit, not of the reading as typed;
 * `range` is the full scale of that range, needed when percentOfRange is not 0.
 */
export type Accuracy = {
  percentOfReading: number;
  counts: number;
  resolution: number;
  percentOfRange: number;
  range?: number;
};

/** One range of an instrument: up to ± fullScale of a unit. */
export type AccuracyRange = Accuracy & { unit: Unit; fullScale: number };

/** How U is taken from the maker's limit a. */
export type UncertaintyModel = "rectangular" | "limit";

/** k = 2: about 95 % for a normal error. */
const COVERAGE_FACTOR = 2;

/**
 * The maker's limit of error a for a reading, in the reading's base unit:
 * a = % of reading × |reading| + counts × resolution + % of range × range. Infinite for an overload.
 * Leaves out temperature, ageing and loading of the circuit.
 * Throws JudgementError for NaN, negative figures, or a % of range without a range.
 */
export function maximumError(reading: Quantity, accuracy: Accuracy): number {
  const { percentOfReading, counts, resolution, percentOfRange, range } = accuracy;
  const figures = [percentOfReading, counts, resolution, percentOfRange, range ?? 0];
  if (figures.some((figure) => !Number.isFinite(figure) || figure < 0)) {
    throw new JudgementError("accuracy", "The instrument's accuracy has a figure that is negative or no number.");
  }
  if (percentOfRange > 0 && range === undefined) {
    throw new JudgementError(
      "accuracy",
      "The instrument's accuracy is a percentage of its range, but no range is given.",
    );
  }
  if (Number.isNaN(reading.value)) throw new JudgementError("reading", "The reading is no number.");
  // Products before the division: 0.5 × 5.2 / 100 loses less than 0.005 × 5.2.
  const ofReading = percentOfReading === 0 ? 0 : (percentOfReading * Math.abs(reading.value)) / 100;
  return ofReading + counts * resolution + (percentOfRange * (range ?? 0)) / 100;
}

/**
 * Standard uncertainty u of a reading. "rectangular" (the default): the true error lies anywhere within ± a with equal
 * probability, u = a/√3 (GUM, JCGM 100:2008, 4.3.7). "limit": the maker's limit is quoted as U with k = 2, u = a/2.
 */
export function standardUncertainty(
  reading: Quantity,
  accuracy: Accuracy,
  model: UncertaintyModel = "rectangular",
): number {
  const limit = maximumError(reading, accuracy);
  return model === "limit" ? limit / COVERAGE_FACTOR : limit / Math.sqrt(3);
}

/**
 * Expanded uncertainty U = 2u (k = 2), in the reading's base unit.
 *
 * The two models are not the same: "rectangular" gives U = 2a/√3 = 1.155 a, **more** than the maker's limit; "limit"
 * gives U = a. Rectangular is the default, because a data sheet states a limit and no probability within it, which is
 * the case that the GUM treats so; "limit" suits a maker who states U (k = 2) himself. Judgements show a and U.
 */
export function expandedUncertainty(
  reading: Quantity,
  accuracy: Accuracy,
  model: UncertaintyModel = "rectangular",
): number {
  if (model === "limit") return maximumError(reading, accuracy);
  return COVERAGE_FACTOR * standardUncertainty(reading, accuracy, model);
}
