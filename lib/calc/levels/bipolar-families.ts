import type { Family } from "./family";

const RAIL_5_PERCENT = { minVolts: 4.75, maxVolts: 5.25 };
const RAIL_10_PERCENT = { minVolts: 4.5, maxVolts: 5.5 };

/** What all of them share: TTL thresholds, inputs that bear 7 V (absolute maximum, from memory). */
const TTL = { technology: "bipolar", vihMin: 2.0, vilMax: 0.8, inputMaxVolts: 7 } as const;

const MEMORY = "Leakage, capacitances, delay and edge from memory.";

/** Bipolar families at their lowest supply, worst case 0 … 70 °C. */
export const BIPOLAR_FAMILIES: Family[] = [
  {
    ...TTL,
    name: "LS",
    volts: 4.75,
    vohMin: 2.7,
    iohA: 0.4e-3,
    volMax: 0.5,
    iolA: 8e-3,
    iihA: 20e-6,
    iilA: 0.4e-3,
    iozA: 20e-6,
    inputPf: 5,
    outputPf: 10,
    tpdTypicalS: 9.5e-9,
    edgeS: 8e-9,
    supply: RAIL_5_PERCENT,
    source: `Read in the SN74LS00 sheet (SDLS025B); other makers give 0.36 mA for the input's low current. Output 0.4 V at 4 mA. ${MEMORY}`,
  },
  {
    ...TTL,
    name: "ALS",
    volts: 4.5,
    vohMin: 2.5,
    iohA: 0.4e-3,
    volMax: 0.5,
    iolA: 8e-3,
    iihA: 20e-6,
    iilA: 0.1e-3,
    iozA: 20e-6,
    inputPf: 5,
    outputPf: 10,
    tpdTypicalS: 4e-9,
    edgeS: 5e-9,
    supply: RAIL_10_PERCENT,
    source: `Read in the 74ALS04B and SN74ALS00A sheets; the high output is the supply less 2 V. ${MEMORY}`,
  },
  {
    ...TTL,
    name: "F",
    volts: 4.5,
    vohMin: 2.5,
    iohA: 1e-3,
    volMax: 0.5,
    iolA: 20e-3,
    iihA: 20e-6,
    iilA: 0.6e-3,
    iozA: 50e-6,
    inputPf: 5,
    outputPf: 10,
    tpdTypicalS: 3.5e-9,
    edgeS: 2.5e-9,
    supply: RAIL_10_PERCENT,
    source: `Read in the 74F00 sheet, p. 3; the high output is 2.7 V at 5 V ± 5 %. ${MEMORY}`,
  },
  {
    ...TTL,
    name: "S",
    volts: 4.75,
    vohMin: 2.7,
    iohA: 1e-3,
    volMax: 0.5,
    iolA: 20e-3,
    iihA: 50e-6,
    iilA: 2e-3,
    iozA: 50e-6,
    inputPf: 5,
    outputPf: 10,
    tpdTypicalS: 3e-9,
    edgeS: 3e-9,
    inputMaxVolts: 5.5,
    supply: RAIL_5_PERCENT,
    source: "All from memory: no data sheet of this family was opened.",
  },
];
