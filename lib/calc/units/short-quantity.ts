import { formatQuantity } from "./format-quantity";
import { type Unit } from "./unit-list";

/** A computed figure for a sentence: three significant digits, zeros at the end dropped ("80 ns", "12.5 MHz"). */
export const shortQuantity = (value: number, unit: Unit): string =>
  formatQuantity({ value: Number(value.toPrecision(3)), unit });
