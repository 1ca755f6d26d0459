import { randomUUID } from "node:crypto";
import { createBoard } from "@/lib/board/create-board";
import { addConnector } from "@/lib/connector/add-connector";
import { must } from "../../support/bench";
import type { Machine } from "../machine";
import type { Rows } from "./row";

const form = { reference: "J1", type: "din41612-c64", grid: null, slotId: null, takes: "J1", cabledTo: null };

const write = ({ slug }: Machine) => ({ project: slug, writeId: randomUUID() });

async function withConnector(machine: Machine) {
  const input = { ...write(machine), ...form, boardId: machine.board.id };
  const { id } = await must(addConnector(machine.scopes.maintainer, input));
  return { connectorId: id, version: 1 };
}

async function withBackplane(machine: Machine) {
  const board = { code: "BP", name: "Backplane", summary: "", kind: "backplane" as const };
  const edge = { connectorType: null, connectorReference: "J1" };
  const { id: boardId } = await must(createBoard(machine.scopes.maintainer, { ...write(machine), ...board, ...edge }));
  const { id } = await must(addConnector(machine.scopes.maintainer, { ...write(machine), ...form, boardId }));
  return { connectorId: id, version: 1 };
}

export const pinMapRows: Record<string, Rows> = {
  "app/(workshop)/projects/[project]/wiring/actions.ts": {
    addConnector: { permission: "wiring.edit", input: ({ board }) => ({ ...form, boardId: board.id }) },
    editConnector: {
      permission: "wiring.edit",
      input: async (machine) => ({ ...form, ...(await withConnector(machine)), reference: "X1", position: 1 }),
    },
    removeConnector: { permission: "wiring.edit", input: withConnector },
    savePinMap: {
      permission: "wiring.edit",
      input: async (machine) => ({
        ...(await withConnector(machine)),
        pins: [{ pin: "a4", signal: "CLK", role: "pp", family: "HC", loads: "2", pullUpOhm: "4k7" }],
      }),
    },
    copyPinMap: {
      permission: "wiring.edit",
      input: async (machine) => ({
        ...(await withBackplane(machine)),
        slots: [{ slotId: machine.slot.id, version: null }],
      }),
    },
  },
};
