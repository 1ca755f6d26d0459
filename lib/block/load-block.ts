import { database } from "@/db/client";
import { findBuiltUnits } from "@/db/queries/blocks";
import type { ProjectScope } from "@/lib/access/scope";
import { loadDesigns } from "@/lib/board-plan/load-designs";
import { functionChoices } from "@/lib/part/own-logic";
import { aroundOf } from "./block-graph";
import type { GateLine } from "./gates-inside";
import { blockLines, type BlockLine } from "./load-blocks";
import { outdatedUnits } from "./outdated-units";

type Choice = { id: string; label: string; description: string };

export type BlockUse = {
  code: string;
  name: string;
  count: number;
  /** Blocks through which it gets there; empty when the board uses it itself. */
  through: string[];
  /** Serials of the units of the board that are there already. */
  units: string[];
};

export type BlockView = {
  /** Undefined: a new one. */
  block: BlockLine | undefined;
  parents: { id: string; name: string; count: number }[];
  uses: BlockUse[];
  /** Units that were built before the block last changed. */
  outdated: { serial: string; board: string; changedAt: string }[];
  functions: Choice[];
  /** Blocks that it may hold: in work, and not such as hold it themselves. */
  choices: (Choice & { gates: GateLine[] })[];
};

export async function loadBlock(scope: ProjectScope, id: string): Promise<BlockView | undefined> {
  const db = database();
  const [designs, units] = await Promise.all([loadDesigns(db, scope), findBuiltUnits(db, scope)]);
  const { boards, holdings } = designs;
  const lines = blockLines(designs);
  const block = lines.find((line) => line.id === id);
  if (!block && id !== "new") return undefined;
  const around = block ? aroundOf(holdings, block.id) : new Set<string>();
  const nameOf = (blockId: string) => lines.find((line) => line.id === blockId)?.name ?? "";
  const uses = (block?.boards ?? []).flatMap(({ code, count }): BlockUse[] => {
    const board = boards.find((one) => one.code === code);
    if (!board) return [];
    const own = designs.uses.filter(({ boardId, blockId }) => boardId === board.id && around.has(blockId));
    const isDirect = own.some(({ blockId }) => blockId === block?.id);
    return [
      {
        ...{ code, count, name: board.name },
        through: isDirect ? [] : own.map(({ blockId }) => nameOf(blockId)),
        units: units.filter(({ boardId }) => boardId === board.id).map(({ serial }) => serial),
      },
    ];
  });
  const outdated = outdatedUnits({ blocks: designs.blocks, holdings, uses: designs.uses, units });
  return {
    block,
    parents: holdings
      .filter(({ childId }) => childId === block?.id)
      .map(({ blockId, count }) => ({ id: blockId, name: nameOf(blockId), count })),
    uses,
    outdated: outdated
      .filter((unit) => unit.block.id === block?.id)
      .map(({ serial, boardId, changedAt }) => ({
        ...{ serial, changedAt },
        board: boards.find((one) => one.id === boardId)?.code ?? "",
      })),
    functions: functionChoices(designs.own),
    choices: lines
      .filter(
        (line) => !around.has(line.id) && (!line.archived || block?.children.some((one) => one.block === line.id)),
      )
      .map((line) => ({ id: line.id, label: line.name, description: gatesText(line), gates: line.allGates })),
  };
}

const gatesText = ({ allGates }: BlockLine) => {
  const count = allGates.reduce((sum, gate) => sum + gate.count, 0);
  return count === 1 ? "1 gate" : `${count} gates`;
};
