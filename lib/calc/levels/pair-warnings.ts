import { hasTtlThresholds } from "./family-at";
import type { Family } from "./family";
import { margins } from "./margins";
import { inputStress } from "./over-voltage";
import { output, volts } from "./wording";

export type PairWarning = {
  kind: "over-voltage" | "bipolar-into-cmos" | "levels" | "supply-current";
  sentence: string;
  mend: string;
};

/**
 * What to mind when an output of one family drives an input of another, the weightiest first.
 * Figures of both are taken at the supply they are for. That a TTL high raises the supply current of HCT parts (up to
 * 360 µA an input times its unit load) was read in the CD74HCT08 sheet; taken to hold for ACT and AHCT, from memory.
 */
export function pairWarnings(driver: Family, receiver: Family): PairWarning[] {
  return [overVoltage(driver, receiver), levels(driver, receiver), supplyCurrent(driver, receiver)].filter(
    (warning) => warning !== undefined,
  );
}

function overVoltage(driver: Family, receiver: Family): PairWarning | undefined {
  const { over, sentence } = inputStress(driver, receiver);
  if (!over) return undefined;
  const mend = "Take a receiver whose inputs bear more than its supply (AHC, LVC), or a level shifter between them.";
  return { kind: "over-voltage", sentence, mend };
}

function levels(driver: Family, receiver: Family): PairWarning | undefined {
  const { highVolts, lowVolts, verdict, sentence } = margins(driver, receiver);
  if (verdict === "fits") return undefined;
  const bipolarHigh = driver.technology === "bipolar" && receiver.technology === "CMOS" && !hasTtlThresholds(receiver);
  if (bipolarHigh && highVolts < 0 && lowVolts >= 0) {
    const mend = `Take a receiver with TTL thresholds (HCT, ACT, AHCT), or a pull-up to ${volts(receiver.volts)}.`;
    return { kind: "bipolar-into-cmos", sentence, mend };
  }
  return { kind: "levels", sentence, mend: "Put a buffer between them whose levels fit both." };
}

function supplyCurrent(driver: Family, receiver: Family): PairWarning | undefined {
  const ttlHigh = driver.technology === "bipolar" && driver.vohMin < receiver.volts - 1;
  if (!ttlHigh || receiver.technology !== "CMOS" || !hasTtlThresholds(receiver)) return undefined;
  return {
    kind: "supply-current",
    sentence: `${output(driver)} stays so far below the supply that each ${receiver.name} input it holds high draws up to 360\u202fµA of supply current.`,
    mend: "Count it in the power budget; a pull-up to the supply takes it away.",
  };
}
