import { formatQuantity, isUnit, parseQuantity } from "@/lib/calc/units";
import type { CheckLine } from "./check-line";

type Limits = { lower: number | null; upper: number | null };

const round = (value: number, figures: number) => Number(value.toPrecision(figures));

/** What a healthy board would show: near the expected value, else well inside the limits; an open circuit reads OL. */
export function likelyReading(
  unit: string,
  limits: Limits,
  expected: string | undefined,
  chance: () => number,
): string {
  if (!isUnit(unit)) throw new Error(`${unit} is no unit`);
  const { lower, upper } = limits;
  if (unit === "Ω" && upper === null)
    return lower !== null && lower >= 1e6 ? "OL" : write((lower ?? 100) * (2 + chance() * 3));
  const wanted = expected ? parseQuantity(expected, unit) : undefined;
  if (unit === "Hz" && wanted?.ok) return write(wanted.value.value * (1 + (chance() - 0.5) * 2e-5), 7);
  if (wanted?.ok && wanted.value.value !== 0) {
    const width = lower !== null && upper !== null ? (upper - lower) / 2 : Math.abs(wanted.value.value) * 0.5;
    return write(wanted.value.value + (chance() - 0.5) * 0.4 * width);
  }
  if (lower !== null && upper !== null) return write(lower + (upper - lower) * (0.42 + chance() * 0.16));
  return write((upper ?? 1) * (0.15 + chance() * 0.3));

  function write(value: number, figures = 3): string {
    if (unit === "") return String(Math.round(value));
    return isUnit(unit) ? formatQuantity({ value: round(value, figures), unit }) : String(value);
  }
}

export function entryFor(
  expect: CheckLine["expect"],
  spec: unknown,
  chance: () => number,
  limitsOf: (spec: unknown) => { unit: string; limits: Limits }[],
): unknown {
  if (expect.kind === "reading") {
    const [only] = limitsOf(spec);
    return only ? { typed: likelyReading(only.unit, only.limits, expect.expected, chance) } : { typed: "0" };
  }
  if (expect.kind === "table") {
    return {
      cells: limitsOf(spec).map((row, index) =>
        expect.columns.map(() => likelyReading(row.unit, row.limits, expect.rows[index]?.expected, chance)),
      ),
    };
  }
  return { conforms: true };
}
