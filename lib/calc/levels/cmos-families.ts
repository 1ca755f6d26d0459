import type { Family } from "./family";
import { CMOS, CMOS_LEVELS, HC_OUTPUT, RAIL_10_PERCENT, REST_FROM_MEMORY } from "./shared-ratings";

const UP_TO_5_5 = { minVolts: 3, maxVolts: 5.5 };
const TTL_LEVELS = { volts: 4.5, vihMin: 2.0, vilMax: 0.8 } as const;

const AC_OUTPUT = { vohMin: 3.76, iohA: 24e-3, volMax: 0.44, iolA: 24e-3, iozA: 5e-6, inputPf: 4.5, outputPf: 15 };
const AHC_OUTPUT = { vohMin: 3.8, iohA: 8e-3, volMax: 0.44, iolA: 8e-3, iozA: 2.5e-6, inputPf: 3, outputPf: 4 };

/** HC, AC, AHC and their kin with TTL thresholds at 4.5 V, worst case −40 … 85 °C. */
export const CMOS_FAMILIES: Family[] = [
  {
    ...CMOS,
    ...CMOS_LEVELS,
    ...HC_OUTPUT,
    name: "HC",
    tpdTypicalS: 7e-9,
    edgeS: 7e-9,
    supply: { minVolts: 3, maxVolts: 6 },
    source:
      "Read in the MC74HC08A (p. 3) and MM74HC86 (p. 3) sheets, delay at 5 V and 15 pF in the Philips HC00's; 4.4 V and 0.1 V at 20 µA. Leakage, capacitances and edge from memory.",
  },
  {
    ...CMOS,
    ...TTL_LEVELS,
    ...HC_OUTPUT,
    name: "HCT",
    tpdTypicalS: 10e-9,
    edgeS: 7e-9,
    supply: RAIL_10_PERCENT,
    source: `Read in the CD74HCT08 and MM74HCT00 sheets. ${REST_FROM_MEMORY}`,
  },
  {
    ...CMOS,
    ...CMOS_LEVELS,
    ...AC_OUTPUT,
    name: "AC",
    tpdTypicalS: 5e-9,
    edgeS: 2e-9,
    supply: UP_TO_5_5,
    source: `Read in the 74AC and MC74AC32 sheets. ${REST_FROM_MEMORY}`,
  },
  {
    ...CMOS,
    ...TTL_LEVELS,
    ...AC_OUTPUT,
    name: "ACT",
    tpdTypicalS: 5e-9,
    edgeS: 2e-9,
    supply: RAIL_10_PERCENT,
    source: `Read in the SN74ACT00 (SCAS523D) and MC74ACT00 sheets. ${REST_FROM_MEMORY}`,
  },
  {
    ...CMOS,
    ...CMOS_LEVELS,
    ...AHC_OUTPUT,
    name: "AHC",
    tpdTypicalS: 3.5e-9,
    edgeS: 3e-9,
    inputMaxVolts: 5.5,
    supply: UP_TO_5_5,
    source: `Read in the 74AHC04 sheet, table 6; its thresholds at 4.5 V are 0.7 and 0.3 of the supply, computed. ${REST_FROM_MEMORY} Inputs bear 5.5 V, from memory.`,
  },
  {
    ...CMOS,
    ...TTL_LEVELS,
    ...AHC_OUTPUT,
    name: "AHCT",
    tpdTypicalS: 3.5e-9,
    edgeS: 3e-9,
    inputMaxVolts: 5.5,
    supply: RAIL_10_PERCENT,
    source: `Read in the 74AHCT04 sheet, table 6. ${REST_FROM_MEMORY} Inputs bear 5.5 V, from memory.`,
  },
];
