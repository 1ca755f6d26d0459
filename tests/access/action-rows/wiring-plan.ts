import { randomUUID } from "node:crypto";
import { database } from "@/db/client";
import { connectors, families, ruleFindings, signals } from "@/db/schema/wiring";
import { one } from "../../support/database";
import { SHEET } from "../../support/data-sheet";
import type { Machine } from "../machine";
import type { Rows } from "./row";

const wiring = (path: string) => `app/(workshop)/projects/[project]/wiring/${path}/actions.ts`;

/** A finding that a run of the rule check left, open or accepted. */
async function withFinding({ id: projectId }: Machine, state: "open" | "accepted") {
  const key = `two-push-pull ${randomUUID()}`;
  const finding = { title: "Two push-pull outputs drive PH6", why: "", mend: "", edits: [], pins: [], boards: ["TIM"] };
  await database()
    .insert(ruleFindings)
    .values({
      ...{ projectId, key, rule: "two-push-pull", weight: "must", boards: ["TIM"], finding, facts: "as it is", state },
      ...(state === "accepted" ? { acceptedFacts: "as it is", acceptedAt: new Date(), reason: "Fine." } : {}),
    });
  return { key, reason: "A jumper stays open." };
}

async function withSignal({ id: projectId }: Machine) {
  const name = `CLK_${randomUUID().slice(0, 8)}`;
  await database().insert(signals).values({ projectId, name, class: "clock" });
  return { name, version: 1 };
}

async function withFamily({ id: projectId }: Machine) {
  const figures = {
    ...{
      technology: "CMOS",
      volts: 4.5,
      vihMin: 3.15,
      vilMax: 1.35,
      vohMin: 3.84,
      iohA: 0.004,
      volMax: 0.33,
      iolA: 0.004,
    },
    ...{ iihA: 1e-6, iilA: 1e-6, iozA: 5e-6, inputPf: 3.5, outputPf: 10, tpdTypicalS: 9e-9, edgeS: 7e-9 },
    ...{ inputMaxVolts: null, source: "Maker B" },
  };
  const name = `F${randomUUID().slice(0, 8)}`;
  const row = one(await database().insert(families).values({ projectId, name, figures }).returning());
  return { familyId: row.id, version: 1 };
}

export const wiringPlanRows: Record<string, Rows> = {
  [wiring("findings")]: {
    acceptFinding: {
      permission: "finding.accept",
      input: async (machine) => ({ ...(await withFinding(machine, "open")), facts: "as it is" }),
    },
    withdrawAcceptance: { permission: "finding.accept", input: (machine) => withFinding(machine, "accepted") },
  },
  [wiring("signals")]: {
    saveSignal: {
      permission: "wiring.edit",
      input: async (machine) => ({
        ...(await withSignal(machine)),
        ...{ class: "clock", aliases: "CK", frequency: "1 MHz", note: "" },
      }),
    },
    removeSignal: { permission: "wiring.edit", input: withSignal },
  },
  [wiring("families")]: {
    saveFamily: {
      permission: "wiring.edit",
      input: () => ({ familyId: "", version: 0, name: "HCX", technology: "CMOS", source: "Maker B", typed: SHEET }),
    },
    removeFamily: { permission: "wiring.edit", input: withFamily },
  },
  [wiring("take")]: {
    takePinMaps: {
      permission: "wiring.edit",
      input: async ({ id: projectId, board }) => {
        const made = { projectId, boardId: board.id, reference: "J1", position: 1, type: "din41612-b64" };
        const { id: connectorId } = one(await database().insert(connectors).values(made).returning());
        return { connectors: [{ connectorId, version: 1, pins: [{ pin: "a4", signal: "CLK" }] }] };
      },
    },
  },
};
