import { randomUUID } from "node:crypto";
import { archiveBoard } from "@/lib/board/archive-board";
import { archiveSlot } from "@/lib/slot/archive-slot";
import { placeUnit } from "@/lib/slot/place-unit";
import { archiveUnit } from "@/lib/unit/archive-unit";
import { must } from "../../support/bench";
import { makeBareUnit, type Machine } from "../machine";
import type { Rows } from "./row";

const asMaintainer = ({ slug, scopes }: Machine) => ({
  scope: scopes.maintainer,
  write: { project: slug, writeId: randomUUID() },
});

const boardForm = {
  code: "SUM",
  name: "Summing card",
  summary: "",
  kind: "card",
  connectorType: null,
  connectorReference: "J1",
};
const slotForm = { label: "", pitchHp: 4, boardId: null };

export const boardRows: Record<string, Rows> = {
  "app/(workshop)/projects/[project]/boards/actions.ts": {
    createBoard: { permission: "board.edit", input: () => boardForm },
    editBoard: {
      permission: "board.edit",
      input: ({ board }) => ({ ...boardForm, boardId: board.id, version: board.version }),
    },
    archiveBoard: { permission: "board.edit", input: ({ board }) => ({ boardId: board.id }) },
    restoreBoard: {
      permission: "board.edit",
      input: async (machine) => {
        const { scope, write } = asMaintainer(machine);
        await must(archiveBoard(scope, { ...write, boardId: machine.board.id }));
        return { boardId: machine.board.id };
      },
    },
    purgeBoard: {
      permission: "board.purge",
      input: async (machine) => {
        const { scope, write } = asMaintainer(machine);
        await must(archiveBoard(scope, { ...write, boardId: machine.board.id }));
        return { boardId: machine.board.id, confirmation: "TIM" };
      },
    },
    createRevision: { permission: "board.edit", input: ({ board }) => ({ boardId: board.id, notes: "Wider tracks." }) },
    releaseRevision: { permission: "board.edit", input: ({ board }) => ({ revisionId: board.revisionId }) },
  },
  "app/(workshop)/projects/[project]/boards/slot-actions.ts": {
    createSlot: { permission: "slot.edit", input: () => ({ ...slotForm, position: 2 }) },
    editSlot: {
      permission: "slot.edit",
      input: ({ slot }) => ({ ...slotForm, slotId: slot.id, version: slot.version, position: 3 }),
    },
    archiveSlot: { permission: "slot.edit", input: ({ slot }) => ({ slotId: slot.id }) },
    restoreSlot: {
      permission: "slot.edit",
      input: async (machine) => {
        const { scope, write } = asMaintainer(machine);
        await must(archiveSlot(scope, { ...write, slotId: machine.slot.id }));
        return { slotId: machine.slot.id };
      },
    },
    placeUnit: { permission: "slot.edit", input: ({ slot, unit }) => ({ slotId: slot.id, unitId: unit.id }) },
    removeUnit: {
      permission: "slot.edit",
      input: async (machine) => {
        const { scope, write } = asMaintainer(machine);
        await must(placeUnit(scope, { ...write, slotId: machine.slot.id, unitId: machine.unit.id }));
        return { unitId: machine.unit.id };
      },
    },
  },
  "app/(workshop)/projects/[project]/boards/unit-actions.ts": {
    createUnit: {
      permission: "unit.edit",
      input: ({ board }) => ({ boardId: board.id, serial: "TIM-02", revisionId: board.revisionId, note: "" }),
    },
    editUnit: {
      permission: "unit.edit",
      input: ({ board, unit }) => ({
        unitId: unit.id,
        version: unit.version,
        serial: "TIM-01A",
        revisionId: board.revisionId,
        note: "Relabelled.",
      }),
    },
    archiveUnit: { permission: "unit.edit", input: ({ unit }) => ({ unitId: unit.id }) },
    restoreUnit: {
      permission: "unit.edit",
      input: async (machine) => {
        const { scope, write } = asMaintainer(machine);
        const unitId = await makeBareUnit(machine, "TIM-03");
        await must(archiveUnit(scope, { ...write, unitId }));
        return { unitId };
      },
    },
    purgeUnit: {
      permission: "board.purge",
      input: async (machine) => {
        const { scope, write } = asMaintainer(machine);
        await must(archiveUnit(scope, { ...write, unitId: machine.unit.id }));
        return { unitId: machine.unit.id, confirmation: "TIM-01" };
      },
    },
  },
};
