import { pinName, type Netlist } from "@/lib/calc/netlist";
import type { findTouched } from "@/db/queries/probing";
import type { TouchedByRework } from "./load-rounds";

type Touch = Awaited<ReturnType<typeof findTouched>>[number];

/** Nets that each rework touched, by their own names or by their pins ("J1 a4", "U6-12"). */
export function touchedSignals(touches: readonly Touch[], { nets }: Netlist): TouchedByRework[] {
  const names = new Map(nets.map(({ name }) => [plain(name), name]));
  const byPin = new Map(
    nets.flatMap(({ name, points }) => points.map((point) => [plain(pinName(point)), name] as const)),
  );
  const found = new Map<number, TouchedByRework>();
  for (const { number, what, kind, name } of touches) {
    const net = (kind === "pin" ? byPin : names).get(plain(name));
    if (net === undefined) continue;
    const rework = found.get(number) ?? { number, what, signals: [] };
    if (!rework.signals.includes(net)) rework.signals.push(net);
    found.set(number, rework);
  }
  return [...found.values()];
}

/** "J1 a4", "J1.A4" and "J1-a4" are one pin; "+5 V" is "+5V". */
const plain = (name: string) => name.replace(/[\s.-]+/g, "").toLowerCase();
