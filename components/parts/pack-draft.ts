import { pack, type PackingMode, type PackingResult } from "@/lib/calc/packing";
import type { BoardPlanView } from "@/lib/board-plan/load-board-plan";
import { readCount } from "@/lib/form/whole-count";

export type PlanDraft = Pick<BoardPlanView["plan"], "packing" | "family" | "blocks">;

/** Packs a plan as it is typed; rows that do not read yet count nothing. */
export function packDraft(view: BoardPlanView, draft: PlanDraft, mode: PackingMode = draft.packing): PackingResult {
  const counts = new Map<string, number>();
  for (const { block, count } of draft.blocks) {
    const read = readCount(count);
    if (block !== "" && typeof read === "number") counts.set(block, (counts.get(block) ?? 0) + read);
  }
  const technology = view.families.find(({ name }) => name === draft.family)?.technology ?? "CMOS";
  return pack({
    blocks: view.designs,
    board: { use: [...counts].map(([block, count]) => ({ block, count })), loose: [] },
    packages: view.packages,
    family: { name: draft.family, technology },
    mode,
  });
}

/** Whether the packages are counted from something else than what is saved. */
export const isOtherDraft = (draft: PlanDraft, saved: PlanDraft): boolean =>
  JSON.stringify(pick(draft)) !== JSON.stringify(pick(saved));

const pick = ({ packing, family, blocks }: PlanDraft) => [
  packing,
  family,
  blocks.map(({ block, count }) => `${block} ${count.trim()}`),
];
