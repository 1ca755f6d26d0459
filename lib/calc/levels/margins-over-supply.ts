import { computed, fault, type Computed } from "../computed";
import { familyAt } from "./family-at";
import type { Family, SupplyRange } from "./family";
import { margins, type Margins } from "./margins";
import { volts } from "./wording";

/**
 * same: both cards hang on one rail, so whatever it does, they see alike.
 * separate: each card has its own regulator, and one may stand at the low end while the other stands at the high one.
 */
export type Supplies = "same" | "separate";

/**
 * The worst noise margins while the supply moves within its tolerance.
 *
 * On the same rail both ends are looked at and the smaller margin counts. On separate rails the driver's high level is
 * that of the lowest supply and the receiver's threshold that of the highest, the low threshold that of the lowest: HC
 * into HC at 5 V ± 10 % has +0.69 V on one rail and −0.01 V on two.
 *
 * Source: note 5 of the MM74HC sheets. Leaves out: see margins; the sheets' ranges bound the supply, see familyAt.
 */
export function marginsOverSupply(
  driver: Family,
  receiver: Family,
  range: SupplyRange,
  supplies: Supplies,
): Computed<Margins> {
  if (range.minVolts > range.maxVolts) return fault("minVolts", "The lowest supply lies above the highest.");
  const giving = atBothEnds(driver, range);
  if (!giving.ok) return giving;
  const taking = atBothEnds(receiver, range);
  if (!taking.ok) return taking;
  return computed((supplies === "same" ? together : apart)(giving.value, taking.value));
}

type Ends = { low: Family; high: Family };

function atBothEnds(family: Family, { minVolts, maxVolts }: SupplyRange): Computed<Ends> {
  const low = familyAt(family, minVolts);
  if (!low.ok) return low;
  const high = familyAt(family, maxVolts);
  return high.ok ? computed({ low: low.value, high: high.value }) : high;
}

function together(driver: Ends, receiver: Ends): Margins {
  const atLow = margins(driver.low, receiver.low);
  const atHigh = margins(driver.high, receiver.high);
  const worstHigh = atHigh.highVolts < atLow.highVolts ? atHigh : atLow;
  const worstLow = atHigh.lowVolts < atLow.lowVolts ? atHigh : atLow;
  const { highVolts } = worstHigh;
  const { lowVolts } = worstLow;
  const fits = highVolts >= 0 && lowVolts >= 0;
  const told = [...(fits || highVolts < 0 ? [worstHigh] : []), ...(lowVolts < 0 ? [worstLow] : [])];
  const sentences = new Set([...told.map(({ sentence }) => sentence), "Both cards hang on one supply."]);
  return { highVolts, lowVolts, verdict: fits ? "fits" : "does not fit", sentence: [...sentences].join(" ") };
}

function apart({ low, high }: Ends, receiver: Ends): Margins {
  const driver = { ...low, vohMin: Math.min(low.vohMin, high.vohMin), volMax: Math.max(low.volMax, high.volMax) };
  const worstReceiver = {
    ...receiver.low,
    vihMin: Math.max(receiver.low.vihMin, receiver.high.vihMin),
    vilMax: Math.min(receiver.low.vilMax, receiver.high.vilMax),
  };
  const found = margins(driver, worstReceiver);
  const where = `The cards have separate supplies, anywhere from ${volts(low.volts)} to ${volts(high.volts)}.`;
  return { ...found, sentence: `${found.sentence} ${where}` };
}
