import { type Quantity } from "../units";
import { type AccuracyRange } from "./accuracy";
import { atMost } from "./compare";

/**
 * The smallest range of the reading's unit that holds the reading; undefined when none does. `range` is filled in from
 * fullScale where the maker's figures left it out. An overload belongs to the largest range of the unit, since an
 * instrument that ranges by itself shows it only there.
 */
export function pickRange(ranges: readonly AccuracyRange[], reading: Quantity): AccuracyRange | undefined {
  const size = Math.abs(reading.value);
  const rising = ranges.filter(({ unit }) => unit === reading.unit).sort((a, b) => a.fullScale - b.fullScale);
  const found = size === Infinity ? rising.at(-1) : rising.find(({ fullScale }) => atMost(size, fullScale));
  return found && { ...found, range: found.range ?? found.fullScale };
}
