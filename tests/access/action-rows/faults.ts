import { randomUUID } from "node:crypto";
import { createRevision } from "@/lib/board/create-revision";
import { dealPunch } from "@/lib/punch/deal-punch";
import { loadPunch } from "@/lib/punch/load-punch";
import { takePunch } from "@/lib/punch/take-punch";
import { database } from "@/db/client";
import { revisions } from "@/db/schema/boards";
import { and, eq } from "drizzle-orm";
import { must } from "../../support/bench";
import { one } from "../../support/database";
import { FAULT_FORM } from "../../support/faults";
import { rework } from "../../support/reworks";
import { makeFault, type Machine } from "../machine";
import type { Rows } from "./row";

const doubt = {
  unit: "TIM-01",
  kind: "cut-track",
  wire: null,
  touches: { signals: ["CLK"], pins: [], parts: [], blocks: [], rails: [] },
  added: [],
  spared: [],
};

const write = ({ slug }: Machine) => ({ project: slug, writeId: randomUUID() });

/** Revision B, begun after revision A was reworked. */
async function nextRevision(machine: Machine): Promise<string> {
  const { maintainer } = machine.scopes;
  await must(rework(maintainer, machine.unit, { signals: ["CLK"] }));
  const letter = (await must(createRevision(maintainer, { ...write(machine), boardId: machine.board.id, notes: "" })))
    .letter;
  const { board } = machine;
  const where = and(eq(revisions.boardId, board.id), eq(revisions.letter, letter));
  return one(await database().select({ id: revisions.id }).from(revisions).where(where)).id;
}

async function punchItem(machine: Machine): Promise<string> {
  const { maintainer } = machine.scopes;
  const revisionId = await nextRevision(machine);
  await must(takePunch(maintainer, { ...write(machine), revisionId }));
  return (await loadPunch(maintainer, machine.board.id))[revisionId]?.[0]?.id ?? "";
}

export const faultRows: Record<string, Rows> = {
  "app/(workshop)/projects/[project]/faults/actions.ts": {
    openFault: {
      permission: "fault.write",
      input: () => ({ ...FAULT_FORM, unit: "TIM-01", checkId: null, attemptId: null, probePlanId: null }),
    },
    editFault: {
      permission: "fault.write",
      input: async (machine) => ({
        ...FAULT_FORM,
        cause: "A bridge",
        faultId: (await makeFault(machine)).id,
        version: 1,
      }),
    },
    similarFaults: {
      permission: "project.see",
      input: () => ({ except: null, words: "bit never", signals: [], pins: [] }),
    },
  },
  "app/(workshop)/projects/[project]/units/[unit]/reworks/actions.ts": {
    previewRework: { permission: "rework.record", input: () => doubt },
    recordRework: {
      permission: "rework.record",
      input: (machine) => ({
        ...doubt,
        what: "Track to pin 3 cut",
        why: "",
        faultId: null,
        carriedFrom: null,
        performedAt: new Date().toISOString(),
        // Of the three only this one has passed, and it states nothing: it counts for the whole board.
        seen: [machine.checks.held],
      }),
    },
  },
  "app/(workshop)/projects/[project]/boards/[board]/punch-actions.ts": {
    takePunch: {
      permission: "board.edit",
      input: async (machine) => ({ revisionId: await nextRevision(machine) }),
    },
    dealPunch: {
      permission: "board.edit",
      input: async (machine) => ({ itemId: await punchItem(machine), version: 1, how: "Routed." }),
    },
    reopenPunch: {
      permission: "board.edit",
      input: async (machine) => {
        const itemId = await punchItem(machine);
        await must(dealPunch(machine.scopes.maintainer, { ...write(machine), itemId, version: 1, how: "Routed." }));
        return { itemId, version: 2 };
      },
    },
  },
};
