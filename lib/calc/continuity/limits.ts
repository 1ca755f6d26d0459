/**
 * Thresholds of IPC-9252. Class 3 (level C) and 3/A were read in trade articles, classes 1 and 2 are from memory; the standard
 * itself was not opened. Bare boards only: for populated ones see planProbes.
 */
export type ProbeLimits = {
  class: "1" | "2" | "3" | "3/A" | "own";
  /** Joined points read at most this. */
  continuityOhm: number;
  /** Separate nets read at least this. */
  isolationOhm: number;
  /** Least voltage of the isolation test; null: not said. */
  testVolts: number | null;
};

const CLASSES = [
  { class: "1", continuityOhm: 50, isolationOhm: 0.5e6, testVolts: null },
  { class: "2", continuityOhm: 50, isolationOhm: 2e6, testVolts: null },
  { class: "3", continuityOhm: 10, isolationOhm: 10e6, testVolts: 40 },
  { class: "3/A", continuityOhm: 10, isolationOhm: 100e6, testVolts: 250 },
] as const satisfies readonly ProbeLimits[];

export type LimitClass = (typeof CLASSES)[number]["class"];

export const PROBE_LIMIT_CLASSES: readonly (ProbeLimits & { class: LimitClass })[] = CLASSES;
