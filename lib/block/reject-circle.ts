import { reject } from "@/lib/actions/answer";
import { findCycle } from "@/lib/calc/packing";
import type { Holding } from "./block-graph";

type Draft = { id: string; name: string; children: readonly { block: string; count: number }[] };

/** Refuses contents with which a block would come to hold itself, and names the blocks on the way. */
export function rejectCircle(
  blocks: readonly { id: string; name: string }[],
  holdings: readonly Holding[],
  draft: Draft,
): void {
  const childrenOf = (id: string) =>
    holdings.filter(({ blockId }) => blockId === id).map(({ childId, count }) => ({ block: childId, count }));
  const designs = [
    { ...draft, children: [...draft.children], gates: [] },
    ...blocks
      .filter(({ id }) => id !== draft.id)
      .map(({ id, name }) => ({ id, name, gates: [], children: childrenOf(id) })),
  ];
  const cycle = findCycle(designs);
  if (!cycle) return;
  const at = Math.max(
    0,
    cycle.findIndex(({ id }) => id === draft.id),
  );
  const members = [...cycle.slice(at, -1), ...cycle.slice(0, at)];
  const next = members[1] ?? members[0];
  const row = draft.children.findIndex(({ block }) => block === next?.id);
  const sentence =
    members.length === 1
      ? `${draft.name} cannot hold itself.`
      : `${members.map(({ name }) => name).join(" holds ")} holds ${draft.name}: that goes round in a circle.`;
  const named = row < 0 ? sentence : `Row ${row + 1}: ${sentence}`;
  reject("conflict", `${sentence} Nothing was changed.`, { fields: { [`children.${Math.max(row, 0)}.block`]: named } });
}
