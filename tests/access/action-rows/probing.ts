import { randomUUID } from "node:crypto";
import { keep, startedRound, WHOLE } from "../../support/probing";
import type { Machine } from "../machine";
import type { Rows } from "./row";

const netlist = async ({ scopes, board }: Machine) => (await keep(scopes.maintainer, board.revisionId)).id;
const round = async ({ scopes, board, unit }: Machine) =>
  (await startedRound(scopes.maintainer, unit.serial, board.revisionId)).id;

export const probingRows: Record<string, Rows> = {
  "app/(workshop)/projects/[project]/units/[unit]/probing/actions.ts": {
    previewRound: {
      permission: "attempt.record",
      input: async (machine) => ({ netlistId: await netlist(machine), options: WHOLE }),
    },
    startRound: {
      permission: "attempt.record",
      input: async (machine) => ({
        ...{ unit: machine.unit.serial, netlistId: await netlist(machine), options: WHOLE, checkId: null },
      }),
    },
    closeRound: {
      permission: "attempt.record",
      input: async (machine) => ({ plan: await round(machine), checkId: null, attemptId: randomUUID(), note: "" }),
    },
    askAgain: { permission: "attempt.record", input: async (machine) => ({ plan: await round(machine) }) },
  },
};
