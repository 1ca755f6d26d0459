import type { Designs } from "@/lib/board-plan/load-designs";
import type { Draw } from "@/lib/calc/interconnect";
import {
  boardPower,
  type BoardPower,
  type MachineRail,
  type PowerItem,
  type RailSupply,
  type TypedDraw,
} from "@/lib/calc/power";
import { boardItems } from "./board-items";
import { powerLineItem, type PowerLineItem } from "./line-item";

export type PlannedLine = { id: string; item: PowerLineItem };

/** What one board draws, by itself and with what others take through it. */
export type BoardBudget = {
  boardId: string;
  code: string;
  lines: PlannedLine[];
  /** On the bench, alone. Null: nothing is known of the board, or `problem` says why it cannot be added up. */
  alone: BoardPower | null;
  /** In the machine. */
  together: BoardPower | null;
  notes: string[];
  problem: string | null;
};

type RailRow = Omit<MachineRail, "sourcePlacement"> & { sourceBoardId: string | null };
type Placed = { id: string; boardId: string };

export type PowerRows = {
  designs: Designs;
  bom: readonly { boardId: string; partNumber: string; count: number }[];
  lines: readonly { id: string; boardId: string; item: unknown }[];
  rails: readonly RailRow[];
  conditions: { logicVolts: number; logicRail: string };
  placed: readonly Placed[];
};

export type PowerPlan = { rails: MachineRail[]; boards: BoardBudget[]; draws: Draw[] };

/** Of the logic's rail while nobody has described it. */
const USUAL_TOLERANCE_PERCENT = 5;

/** Budgets of all boards, and what each placement draws through its connector. */
export function planPower(rows: PowerRows): PowerPlan {
  const rails = machineRails(rows);
  const boards = rows.designs.boards.map(({ id, code }) => budget(rows, rails, id, code, []));
  const made = boards.filter(({ lines }) => lines.some((line) => makes(line, rails)));
  // A board that makes a rail passes on what the others take, and may take it from another such board: one pass each.
  for (const _pass of made) {
    const draws = drawsOf(rows.placed, boards, rails);
    for (const { boardId, code } of made) {
      const elsewhere = takenElsewhere(rows.placed, draws, rails, boardId);
      const again = budget(rows, rails, boardId, code, elsewhere);
      boards.splice(
        boards.findIndex((one) => one.boardId === boardId),
        1,
        again,
      );
    }
  }
  return { rails, boards, draws: drawsOf(rows.placed, boards, rails) };
}

function machineRails({ rails, conditions, placed }: PowerRows): MachineRail[] {
  const known = rails.map(({ sourceBoardId, name, volts, tolerancePercent, capacityA }): MachineRail => {
    const source = placed.find((one) => one.boardId === sourceBoardId);
    return { name, volts, tolerancePercent, capacityA, sourcePlacement: source?.id ?? null };
  });
  const { logicRail: name, logicVolts: volts } = conditions;
  if (known.some((rail) => rail.name === name)) return known;
  const tolerancePercent = USUAL_TOLERANCE_PERCENT;
  return [{ name, volts, tolerancePercent, capacityA: null, sourcePlacement: null }, ...known];
}

const makes = ({ item }: PlannedLine, rails: readonly RailSupply[]): boolean =>
  item.kind === "regulator" && rails.some((rail) => rail.name === item.output);

function budget(
  rows: PowerRows,
  rails: readonly MachineRail[],
  boardId: string,
  code: string,
  elsewhere: TypedDraw[],
): BoardBudget {
  const lines = rows.lines
    .filter((line) => line.boardId === boardId)
    .map(({ id, item }) => ({ id, item: powerLineItem.parse(item) }));
  const logic = boardItems(rows.designs, rows.bom, boardId, rows.conditions.logicRail);
  const own = lines.flatMap(({ item }): PowerItem[] => (item.kind === "whole" ? [] : [item]));
  const typed = lines.flatMap(({ item }): TypedDraw[] => (item.kind === "whole" ? [item] : []));
  const items = [...logic.items, ...own];
  const found = { boardId, code, lines, notes: logic.notes };
  if (items.length === 0 && typed.length === 0) return { ...found, alone: null, together: null, problem: null };
  const supplies = rails.map(({ name, volts, tolerancePercent }) => ({ name, volts, tolerancePercent }));
  const alone = boardPower({ items, rails: supplies, typed, elsewhere: [] });
  const together = elsewhere.length === 0 ? alone : boardPower({ items, rails: supplies, typed, elsewhere });
  if (!alone.ok) return { ...found, alone: null, together: null, problem: alone.message };
  const notes = [...logic.notes, ...alone.value.notes];
  const problem = together.ok ? null : together.message;
  return { ...found, notes, alone: alone.value, together: together.ok ? together.value : null, problem };
}

/** Through its connector: from rails that it makes itself a board takes nothing there, but feeds the others. */
function drawsOf(placed: readonly Placed[], boards: readonly BoardBudget[], rails: readonly MachineRail[]): Draw[] {
  const names = new Set(rails.map(({ name }) => name));
  const taken = placed.flatMap(({ id, boardId }) =>
    (boards.find((board) => board.boardId === boardId)?.together?.rails ?? [])
      .filter(({ rail, madeHere }) => !madeHere && names.has(rail))
      .map(({ rail, taken }): Draw => ({ placement: id, rail, typicalA: taken.typical, worstA: taken.worst })),
  );
  const fed = rails.flatMap(({ name, sourcePlacement }): Draw[] => {
    if (sourcePlacement === null) return [];
    const others = taken.filter((draw) => draw.rail === name && draw.placement !== sourcePlacement);
    if (others.length === 0) return [];
    const sum = (field: "typicalA" | "worstA") => others.reduce((total, draw) => total + draw[field], 0);
    return [{ placement: sourcePlacement, rail: name, typicalA: -sum("typicalA"), worstA: -sum("worstA") }];
  });
  // What a source draws from its own rail does not pass through its connector.
  const isOwn = ({ placement, rail }: Draw) =>
    rails.some(({ name, sourcePlacement }) => name === rail && sourcePlacement === placement);
  return [...taken.filter((draw) => !isOwn(draw)), ...fed];
}

/** What all other boards together take from the rails that this board makes. */
function takenElsewhere(
  placed: readonly Placed[],
  draws: readonly Draw[],
  rails: readonly MachineRail[],
  boardId: string,
): TypedDraw[] {
  const own = new Set(placed.filter((one) => one.boardId === boardId).map(({ id }) => id));
  return rails
    .filter(({ sourcePlacement }) => sourcePlacement !== null && own.has(sourcePlacement))
    .flatMap(({ name }) => {
      const others = draws.filter((draw) => draw.rail === name && draw.worstA > 0 && !own.has(draw.placement));
      const sum = (field: "typicalA" | "worstA") => others.reduce((total, draw) => total + draw[field], 0);
      return others.length === 0 ? [] : [{ rail: name, typicalA: sum("typicalA"), worstA: sum("worstA") }];
    });
}
