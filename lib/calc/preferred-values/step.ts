import { computed, fault, needsPositive, type Computed } from "../computed";
import { hundredsOf, type SeriesName } from "./series";

/** Values of parts in base units, from far below a picofarad to far above a teraohm. */
const LEAST = 1e-15;
const MOST = 1e15;

/** Next value of the series that is not below the given one: what a lower limit wants. */
export const nextUp = (series: SeriesName, value: number): Computed<number> =>
  around(value, (snapped) => neighbours(series, snapped).up);

/** Next value of the series that is not above the given one: what an upper limit wants. */
export const nextDown = (series: SeriesName, value: number): Computed<number> =>
  around(value, (snapped) => neighbours(series, snapped).down);

/**
 * Nearest value of the series by ratio: the border between two neighbours is their geometric mean, as parts' tolerances
 * are percentages. Just on the border the upper one. Nearest may lie beyond a limit; use nextUp and nextDown there.
 * Source: IEC 60063.
 */
export const nearestValue = (series: SeriesName, value: number): Computed<number> =>
  around(value, (snapped) => {
    const { down, up } = neighbours(series, snapped);
    return snapped / down < up / snapped ? down : up;
  });

/** All values of the series from low to high, ends included, ascending; none when low lies above high. */
export function valuesBetween(series: SeriesName, low: number, high: number): number[] {
  if (!(low > 0) || !(high >= low)) return [];
  const [from, to] = [snap(Math.max(low, LEAST)), snap(Math.min(high, MOST))];
  const decades = Array.from({ length: decadeOf(to) - decadeOf(from) + 1 }, (_, at) => decadeOf(from) + at);
  return decades
    .flatMap((decade) => hundredsOf(series).map((hundreds) => valueAt(hundreds, decade)))
    .filter((value) => value >= from && value <= to);
}

function around(value: number, pick: (snapped: number) => number): Computed<number> {
  const bad = needsPositive("value", "value", value);
  if (bad) return bad;
  if (value < LEAST || value > MOST) return fault("value", "The value lies outside what parts are made for.");
  return computed(pick(snap(value)));
}

function neighbours(series: SeriesName, value: number): { down: number; up: number } {
  const decade = decadeOf(value);
  const values = hundredsOf(series).map((hundreds) => valueAt(hundreds, decade));
  const down = values.findLast((other) => other <= value) ?? value;
  return { down, up: values.find((other) => other >= value) ?? valueAt(100, decade + 1) };
}

/** Takes the noise of computing off: 0.1 + 0.2 is 0.3, and a window that ends at 1 kΩ has 1 kΩ in it. */
const snap = (value: number): number => Number(value.toPrecision(12));

/** Power of ten of the leading digit, from the decimal that names the number. */
const decadeOf = (value: number): number => Number(value.toExponential().split("e")[1]);

/** 470 in decade 3 is 4700, read as a decimal so that it is the very number one types. */
const valueAt = (hundreds: number, decade: number): number => Number(`${hundreds}e${decade - 2}`);
