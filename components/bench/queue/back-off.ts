const FIRST_MS = 1_000;
const LONGEST_MS = 60_000;

/**
 * Milliseconds to wait after the given number of failed tries: 1 s, 2 s, 4 s … at most a minute, less up to a
 * quarter so that several devices in one shed do not all come back at the same instant. `random` is in 0 … 1.
 */
export function backOff(tries: number, random: number = Math.random()): number {
  const whole = Math.min(LONGEST_MS, FIRST_MS * 2 ** Math.max(0, Math.min(tries, 20) - 1));
  return Math.round(whole * (1 - random / 4));
}
