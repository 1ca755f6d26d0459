export const RAIL_10_PERCENT = { minVolts: 4.5, maxVolts: 5.5 };

/** An input of plain CMOS: clamped to its supply; 1 µA over the whole temperature range. */
export const CMOS = { technology: "CMOS", iihA: 1e-6, iilA: 1e-6, inputMaxVolts: null } as const;

/** 0.7 and 0.3 of a supply of 4.5 V. */
export const CMOS_LEVELS = { volts: 4.5, vihMin: 3.15, vilMax: 1.35 } as const;

export const HC_OUTPUT = { vohMin: 3.84, iohA: 4e-3, volMax: 0.33, iolA: 4e-3, iozA: 5e-6, inputPf: 3.5, outputPf: 10 };

export const REST_FROM_MEMORY = "Leakage, capacitances, delay and edge from memory.";
