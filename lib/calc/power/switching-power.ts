const FROM_PICO = 1e-12;

export type Switching = {
  volts: number;
  cpdPf: number;
  /** How often an input changes to and fro, Hz. */
  inputHz: number;
  /** N: gates or inputs that switch so; 1 where Cpd is stated per package. */
  switching: number;
  outputs: { loadPf: number; hz: number }[];
};

/**
 * Power of a CMOS package that switches, W: Cpd · VCC² · fi · N + Σ (CL · VCC² · fo).
 * Source: NXP 74HC283 rev. 3 and 74HC86 rev. 4 (read); TI SCAA035B writes the same with N_SW.
 * Traps: Cpd is per gate in some sheets and per package in others; fo is fi / 2 behind a divide by two.
 * Leaves out: current through both transistors while an input passes slowly between the levels.
 */
export function switchingPower({ volts, cpdPf, inputHz, switching, outputs }: Switching): {
  internalW: number;
  loadW: number;
  totalW: number;
} {
  const internalW = cpdPf * FROM_PICO * volts ** 2 * inputHz * switching;
  const loadW = outputs.reduce((sum, { loadPf, hz }) => sum + loadPf * FROM_PICO * volts ** 2 * hz, 0);
  return { internalW, loadW, totalW: internalW + loadW };
}

/**
 * Additional current of CMOS inputs of TTL thresholds that stand at a TTL high (VCC − 2.1 V), A: N · ΔICC · duty.
 * ΔICC is the sheet's figure times the unit load of the input (360 µA × 0.6 for the HCT08, read in TI's sheet).
 */
export const ttlInputCurrent = (inputs: number, extraA: number, highShare: number): number =>
  inputs * extraA * highShare;
