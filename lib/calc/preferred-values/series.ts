export const SERIES_NAMES = ["E3", "E6", "E12", "E24", "E48", "E96", "E192"] as const;

/** A series of preferred values by the number of its steps in a decade. */
export type SeriesName = (typeof SERIES_NAMES)[number];

/** E24 and below are tables of IEC 60063; the formula would give 26 for 27, 29 for 30 and six more. */
const E24 = [10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91];

const everyNthOfE24 = (steps: number) => E24.filter((_, at) => at % (24 / steps) === 0).map((value) => value * 10);

/** 100 · 10^(n/N) to three digits; the standard has 920 in E192 where this gives 919 (from memory). */
const byFormula = (steps: number) =>
  Array.from({ length: steps }, (_, n) => {
    const value = Math.round(100 * 10 ** (n / steps));
    return value === 919 ? 920 : value;
  });

const HUNDREDS: Record<SeriesName, readonly number[]> = {
  E3: everyNthOfE24(3),
  E6: everyNthOfE24(6),
  E12: everyNthOfE24(12),
  E24: everyNthOfE24(24),
  E48: byFormula(48),
  E96: byFormula(96),
  E192: byFormula(192),
};

/** The values of one decade as whole numbers from 100 to 999, ascending. */
export const hundredsOf = (series: SeriesName): readonly number[] => HUNDREDS[series];
