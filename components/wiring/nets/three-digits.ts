import { formatQuantity, type Unit } from "@/lib/calc/units";

type Rounding = "nearest" | "up" | "down";

/** Three digits are as many as a plan deserves: "2.7 V", "1.24 kΩ". A limit is rounded to its safe side. */
export function threeDigits(value: number, unit: Unit, rounding: Rounding = "nearest"): string {
  return formatQuantity({ value: rounded(value, rounding), unit });
}

function rounded(value: number, rounding: Rounding): number {
  const nearest = Number(value.toPrecision(3));
  if (rounding === "nearest" || value === 0 || !Number.isFinite(value)) return nearest;
  const step = 10 ** (Math.floor(Math.log10(Math.abs(value))) - 2);
  const isShort = rounding === "up" ? nearest < value : nearest > value;
  const moved = isShort ? nearest + (rounding === "up" ? step : -step) : nearest;
  return Number(moved.toPrecision(3));
}
