import { randomUUID } from "node:crypto";
import { startDraft } from "@/lib/procedure/start-draft";
import { must } from "../../support/bench";
import type { Machine } from "../machine";
import type { Rows } from "./row";

const permission = "procedure.edit";

/** What every action on a draft names: begun from the issued version, so that it has its checks. */
async function draft({ slug, scopes }: Machine) {
  const given = { project: slug, writeId: randomUUID(), board: "TIM", from: "issued" as const };
  const { version } = await must(startDraft(scopes.maintainer, given));
  return { board: "TIM", version };
}

const check = {
  stage: "continuity",
  title: "Shield is on ground",
  instruction: "",
  caution: "",
  reference: "",
  holdPoint: false,
  kind: "reading",
  typed: { unit: "Ω", limits: "< 0.5 Ω", expected: "" },
  covers: { signals: [], pins: [], rails: [], blocks: [] },
  needs: [],
};

const keyOf = ({ board }: Machine, title: string) => board.keys.get(title) ?? title;

export const procedureRows: Record<string, Rows> = {
  "app/(workshop)/projects/[project]/boards/[board]/procedure/actions.ts": {
    startDraft: { permission, input: () => ({ board: "TIM", from: "scratch" }) },
    saveCheck: { permission, input: async (machine) => ({ ...(await draft(machine)), key: null, after: null, check }) },
    deleteCheck: {
      permission,
      input: async (machine) => ({ ...(await draft(machine)), key: keyOf(machine, "Clock runs") }),
    },
    reorderChecks: {
      permission,
      input: async (machine) => ({ ...(await draft(machine)), keys: [...machine.board.keys.values()] }),
    },
    discardDraft: { permission, input: draft },
    issueProcedure: { permission, input: async (machine) => ({ ...(await draft(machine)), note: "Tighter." }) },
    offerToCheck: {
      permission,
      input: () => ({
        board: "TIM",
        draftVersion: null,
        issuedNumber: 1,
        target: { is: "new", check },
        caution: { begins: "Set the bench supply", text: "Set the bench supply's limit to 0.35 A." },
      }),
    },
  },
};
