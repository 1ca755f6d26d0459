import type { DrawLine } from "@/lib/calc/power";
import type { PlannedLine } from "./plan-power";

export type PairedLine = { draw: DrawLine | null; typed: PlannedLine | null };

/**
 * Lines of one rail as they were worked out, each with the line that somebody typed in where there is one. Packages have
 * none; a figure for the whole board has no part in the sum.
 */
export function pairLines(draws: readonly DrawLine[], typed: readonly PlannedLine[]): PairedLine[] {
  const left = [...typed];
  const paired = draws.map((draw): PairedLine => {
    const at = left.findIndex(({ item }) => item.kind === draw.kind && item.label === draw.label);
    const [found] = at < 0 ? [] : left.splice(at, 1);
    return { draw, typed: found ?? null };
  });
  return [...paired, ...left.map((line): PairedLine => ({ draw: null, typed: line }))];
}
