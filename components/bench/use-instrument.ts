import { useSyncExternalStore } from "react";
import type { BenchInstrument } from "./bench-props";
import { rememberedInstrument, rememberInstrument, watchInstruments } from "./remembered-instrument";

/** The person's own instruments that fit the units, and the one last taken for them on this device. */
export function useInstrument(userId: string, instruments: readonly BenchInstrument[], units: readonly string[]) {
  const fitting = instruments.filter(
    ({ ranges }) => ranges.length === 0 || ranges.some((range) => units.includes(range.unit)),
  );
  const id = useSyncExternalStore(
    watchInstruments,
    () => rememberedInstrument(userId, units[0] ?? ""),
    () => "",
  );
  const instrument = fitting.find((one) => one.id === id);
  return { fitting, instrument, choose: (next: string) => rememberInstrument(userId, units, next) };
}
