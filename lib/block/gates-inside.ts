import { gateFunctionName } from "@/lib/calc/logic-parts";

export type GateLine = { gateFunction: string; name: string; count: number };

/** Gates by function over several blocks, each so many times, with the words for them; most of a kind first. */
export function gatesInside(
  parts: readonly { gates: readonly { gateFunction: string; count: number }[]; times: number }[],
): GateLine[] {
  const counts = new Map<string, number>();
  for (const { gates, times } of parts) {
    for (const { gateFunction, count } of gates) {
      counts.set(gateFunction, (counts.get(gateFunction) ?? 0) + count * times);
    }
  }
  return [...counts]
    .map(([gateFunction, count]) => ({ gateFunction, name: gateFunctionName(gateFunction), count }))
    .sort((one, other) => other.count - one.count);
}
