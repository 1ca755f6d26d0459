import { database } from "@/db/client";
import { findMachineBoards, findMachineConnectors, findMachinePins } from "@/db/queries/machine";
import type { ProjectScope } from "@/lib/access/scope";
import { faceOf, type ConnectorGrid } from "@/lib/calc/connector";
import { designPin } from "@/lib/machine/load-machine";
import { knownNames } from "@/lib/pin-map/known-names";
import type { PinTexts } from "@/lib/pin-map/pin-columns";
import { pinTexts } from "@/lib/pin-map/read-pin-row";
import type { KnownNames } from "@/lib/pin-map/read-cell";
import type { TakeTarget } from "./resolve-target";

/** A connector with its pins, without the drawing of its face, which its type tells. */
export type TakeSource = Omit<TakeTarget, "face"> & { type: string; grid: ConnectorGrid | null };

export type TakeView = { sources: TakeSource[]; known: KnownNames };

/** Every connector of boards in work with what its pins carry, by board and place; and the names that cells may use. */
export async function loadTakeSources(scope: ProjectScope): Promise<TakeView> {
  const db = database();
  const [boards, connectors, pins, known] = await Promise.all([
    findMachineBoards(db, scope),
    findMachineConnectors(db, scope),
    findMachinePins(db, scope),
    knownNames(db, scope),
  ]);
  const kept = new Map<string, Record<string, PinTexts>>();
  for (const row of pins) {
    const own = kept.get(row.connectorId) ?? {};
    own[row.pin] = pinTexts({ ...designPin(row), note: row.note });
    kept.set(row.connectorId, own);
  }
  const sources = boards.flatMap((board) =>
    connectors
      .filter((connector) => connector.boardId === board.id && faceOf(connector) !== undefined)
      .map(({ id, reference, version, type, grid }): TakeSource => {
        return { id, board: board.code, reference, version, type, grid, kept: kept.get(id) ?? {} };
      }),
  );
  return { sources, known };
}
