import { useCallback, useState } from "react";
import type { BenchInstrument } from "./bench-props";
import { rememberedInstrument, rememberInstrument } from "./remembered-instrument";

/**
 * The instrument for readings of these units: the one last taken for them on this device, else none. Only the
 * person's own that have a range for one of the units, or none at all, are offered.
 */
export function useInstrument(userId: string, instruments: readonly BenchInstrument[], units: readonly string[]) {
  const [chosen, setChosen] = useState<Record<string, string | null>>({});
  const fitting = instruments.filter(
    ({ ranges }) => ranges.length === 0 || ranges.some((range) => units.includes(range.unit)),
  );
  const key = units[0] ?? "";
  const id = chosen[key] !== undefined ? chosen[key] : key === "" ? null : rememberedInstrument(userId, key);
  const instrument = fitting.find((one) => one.id === id);

  const choose = useCallback(
    (next: string | null) => {
      setChosen((before) => ({ ...before, ...Object.fromEntries(units.map((unit) => [unit, next])) }));
      for (const unit of units) rememberInstrument(userId, unit, next);
    },
    [userId, units],
  );
  return { fitting, instrument, choose };
}
