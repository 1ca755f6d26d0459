import { database } from "@/db/client";
import { findMachineBoards, findMachineConnectors, findMachineSlots } from "@/db/queries/machine";
import { findPinNotes } from "@/db/queries/pin-map";
import type { BoardKind } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import type { ConnectorGrid } from "@/lib/calc/connector";
import type { Machine } from "@/lib/calc/interconnect";
import { loadFindings, type FindingView } from "@/lib/finding/load-findings";
import { loadMachine } from "@/lib/machine/load-machine";

/** A connector as it is listed and changed; its pins are the machine's, its notes stand here. */
export type ConnectorView = {
  id: string;
  boardId: string;
  /** Of its board: "CON", "Constituent". */
  code: string;
  boardName: string;
  kind: BoardKind;
  reference: string;
  type: string;
  grid: ConnectorGrid | null;
  position: number;
  slotId: string | null;
  takes: string;
  cabledTo: string | null;
  version: number;
  notes: Record<string, string>;
};

export type WiringSlot = { id: string; position: number; boardId: string | null };
export type WiringBoard = { id: string; code: string; name: string; kind: BoardKind };

export type WiringView = {
  machine: Machine;
  /** The backplane's first, then card by card, each in its board's own order. */
  connectors: ConnectorView[];
  boards: WiringBoard[];
  slots: WiringSlot[];
  /** What the last stored run found, with what a maintainer said about it. */
  findings: FindingView[];
};

/** Everything that the pin maps, their drawing and the check in the browser need. */
export async function loadWiring(scope: ProjectScope): Promise<WiringView> {
  const db = database();
  const [machine, boards, slots, connectors, notes, { findings }] = await Promise.all([
    loadMachine(db, scope),
    findMachineBoards(db, scope),
    findMachineSlots(db, scope),
    findMachineConnectors(db, scope),
    findPinNotes(db, scope),
    loadFindings(scope),
  ]);
  const inOrder = [...boards].sort(
    (one, other) => Number(other.kind === "backplane") - Number(one.kind === "backplane"),
  );
  return {
    machine,
    connectors: inOrder.flatMap(({ id, code, name, kind }) =>
      connectors
        .filter(({ boardId }) => boardId === id)
        .map(({ projectId: _project, createdAt: _made, ...connector }): ConnectorView => ({
          ...connector,
          code,
          boardName: name,
          kind,
          notes: Object.fromEntries(
            notes.filter(({ connectorId }) => connectorId === connector.id).map(({ pin, note }) => [pin, note]),
          ),
        })),
    ),
    boards: inOrder.map(({ id, code, name, kind }) => ({ id, code, name, kind })),
    slots: slots.map(({ id, position, boardId }) => ({ id, position, boardId })),
    findings,
  };
}
