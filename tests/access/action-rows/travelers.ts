import { randomUUID } from "node:crypto";
import { grantConcession } from "@/lib/concession/grant-concession";
import { voidAttempt } from "@/lib/attempt/void-attempt";
import { addPrerequisite } from "@/lib/prerequisite/add-prerequisite";
import { must } from "../../support/bench";
import type { Rows } from "./row";

const reason = "Read at the wrong probe.";

export const travelerRows: Record<string, Rows> = {
  "app/(bench)/projects/[project]/bench/[unit]/actions.ts": {
    voidSlipAction: {
      permission: "attempt.void-own",
      input: ({ attempts }) => ({ attemptId: attempts.passing, reason }),
    },
  },
  "app/(workshop)/projects/[project]/units/[unit]/actions.ts": {
    voidAttempt: { permission: "attempt.void-own", input: ({ attempts }) => ({ attemptId: attempts.passing, reason }) },
    reopenCheck: { permission: "check.reopen", input: ({ checks }) => ({ checkId: checks.failed, reason }) },
    grantConcession: { permission: "concession.grant", input: ({ checks }) => ({ checkId: checks.failed, reason }) },
    withdrawConcession: {
      permission: "concession.grant",
      input: async ({ scopes, slug, checks }) => {
        const concessionId = randomUUID();
        const given = { project: slug, writeId: concessionId, checkId: checks.failed, reason };
        await must(grantConcession(scopes.maintainer, given));
        return { concessionId, reason };
      },
    },
    liftHold: {
      permission: "hold.lift",
      input: async ({ scopes, slug, checks, attempts }) => {
        const slip = { attemptId: attempts.passing, reason };
        await must(voidAttempt(scopes.maintainer, { ...slip, project: slug, writeId: randomUUID() }));
        return { checkId: checks.held, reason };
      },
    },
    addPrerequisite: {
      permission: "prerequisite.edit",
      input: ({ checks }) => ({ checkId: checks.untested, needsCheckId: checks.failed }),
    },
    removePrerequisite: {
      permission: "prerequisite.edit",
      input: async ({ scopes, slug, checks }) => {
        const edge = { checkId: checks.untested, needsCheckId: checks.failed };
        await must(addPrerequisite(scopes.maintainer, { ...edge, project: slug, writeId: randomUUID() }));
        return edge;
      },
    },
    moveTraveler: {
      permission: "procedure.edit",
      input: async ({ board }) => {
        await board.issue(2, [{ title: "Look it over", stage: "inspection", holdPoint: true }]);
        return { unit: "TIM-01", from: 1, to: 2 };
      },
    },
  },
};
