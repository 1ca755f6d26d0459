import { randomUUID } from "node:crypto";
import type { ProjectScope } from "@/lib/access/scope";
import { voidAttempt } from "@/lib/attempt/void-attempt";
import { liftHold } from "@/lib/check/lift-hold";
import { reopenCheck } from "@/lib/check/reopen-check";
import { grantConcession } from "@/lib/concession/grant-concession";
import { withdrawConcession } from "@/lib/concession/withdraw-concession";
import { addPrerequisite } from "@/lib/prerequisite/add-prerequisite";
import { removePrerequisite } from "@/lib/prerequisite/remove-prerequisite";

const fresh = (scope: ProjectScope) => ({ project: scope.slug, writeId: randomUUID() });

/** The decisions of a maintainer, each as one new write; the answer is left to the caller. */
export const reopen = (scope: ProjectScope, checkId: string, reason = "Look again.") =>
  reopenCheck(scope, { ...fresh(scope), checkId, reason });

export const lift = (scope: ProjectScope, checkId: string, reason = "The part comes next week.") =>
  liftHold(scope, { ...fresh(scope), checkId, reason });

export const concede = (scope: ProjectScope, checkId: string, reason = "Good enough for this card.") =>
  grantConcession(scope, { ...fresh(scope), checkId, reason });

export const withdraw = (scope: ProjectScope, concessionId: string, reason = "It is not good enough.") =>
  withdrawConcession(scope, { ...fresh(scope), concessionId, reason });

export const voiding = (scope: ProjectScope, attemptId: string, reason = "Probe slipped.") =>
  voidAttempt(scope, { ...fresh(scope), attemptId, reason });

export const tie = (scope: ProjectScope, checkId: string, needsCheckId: string) =>
  addPrerequisite(scope, { ...fresh(scope), checkId, needsCheckId });

export const untie = (scope: ProjectScope, checkId: string, needsCheckId: string) =>
  removePrerequisite(scope, { ...fresh(scope), checkId, needsCheckId });
