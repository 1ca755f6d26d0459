import type { Queryable } from "@/db/client";
import { findSignals } from "@/db/queries/machine";
import {
  findCoveringChecks,
  findNamedPins,
  findPlacedUnits,
  type CoveringRow,
  type ReworkUnit,
} from "@/db/queries/reworks";
import type { BoardMap } from "@/lib/calc/doubt";

export type DoubtGround = { rows: CoveringRow[]; maps: BoardMap[]; neighbours: string[] };

/** Units that sit in the machine together with this one; none while it lies on the bench. */
export async function findNeighbours(db: Queryable, scope: InProject, unit: ReworkUnit): Promise<string[]> {
  if (!unit.isPlaced) return [];
  return (await findPlacedUnits(db, scope)).filter((id) => id !== unit.id);
}

type InProject = { projectId: string };

/** All that decides which checks a rework of the unit puts in doubt. Four queries whatever the size. */
export async function loadDoubtGround(
  db: Queryable,
  scope: InProject,
  unit: ReworkUnit,
  neighbours: string[],
): Promise<DoubtGround> {
  const rows = await findCoveringChecks(db, scope, [unit.id, ...neighbours]);
  const codes = [...new Set([unit.board.code, ...rows.map(({ board }) => board)])];
  const [pins, signals] = await Promise.all([findNamedPins(db, scope, codes), findSignals(db, scope)]);
  const aliases = signals.map(({ name, aliases }) => ({ name, aliases }));
  const maps = codes.map((board): BoardMap => ({
    board,
    pins: pins.filter((pin) => pin.board === board),
    // Which parts hang on a signal is in the netlist of the revision; until one is read, parts go by their own name.
    parts: [],
    aliases,
  }));
  return { rows, maps, neighbours };
}
