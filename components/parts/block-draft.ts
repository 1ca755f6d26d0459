import type { BlockView } from "@/lib/block/load-block";
import { gatesInside, type GateLine } from "@/lib/block/gates-inside";
import { readCount } from "@/lib/form/whole-count";

type Draft = {
  gates: readonly { gateFunction: string; count: string }[];
  children: readonly { block: string; count: string }[];
};

const countOf = (typed: string): number => {
  const read = readCount(typed);
  return typeof read === "number" ? read : 0;
};

/** All gates of a block as it is typed; rows that do not read yet count nothing. */
export function draftGates({ gates, children }: Draft, { choices, functions }: BlockView): GateLine[] {
  const known = new Map(functions.map(({ id, label }) => [id, label]));
  const own = gates
    .filter(({ gateFunction }) => known.has(gateFunction))
    .map(({ gateFunction, count }) => ({ gateFunction, count: countOf(count) }));
  const inside = children.flatMap(({ block, count }) => {
    const choice = choices.find(({ id }) => id === block);
    return choice ? [{ gates: choice.gates, times: countOf(count) }] : [];
  });
  return gatesInside([{ gates: own, times: 1 }, ...inside]).filter(({ count }) => count > 0);
}

/** Whether the contents are others than at first, in whatever order. */
export function isOtherContents(draft: Draft, before: Draft): boolean {
  const text = ({ gates, children }: Draft) =>
    JSON.stringify([
      gates.map((row) => `${row.gateFunction} ${row.count.trim()}`).sort(),
      children.map((row) => `${row.block} ${row.count.trim()}`).sort(),
    ]);
  return text(draft) !== text(before);
}
