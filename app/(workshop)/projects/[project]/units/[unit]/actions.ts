"use server";

import { defineAction } from "@/lib/actions/define-action";
import { voidAttemptInput } from "@/lib/attempt/schema";
import { voidAttempt as voidAttemptCase } from "@/lib/attempt/void-attempt";
import { liftHold as liftHoldCase } from "@/lib/check/lift-hold";
import { reopenCheck as reopenCheckCase } from "@/lib/check/reopen-check";
import { liftHoldInput, reopenCheckInput } from "@/lib/check/schema";
import { grantConcession as grantConcessionCase } from "@/lib/concession/grant-concession";
import { grantConcessionInput, withdrawConcessionInput } from "@/lib/concession/schema";
import { withdrawConcession as withdrawConcessionCase } from "@/lib/concession/withdraw-concession";
import { addPrerequisite as addPrerequisiteCase } from "@/lib/prerequisite/add-prerequisite";
import { removePrerequisite as removePrerequisiteCase } from "@/lib/prerequisite/remove-prerequisite";
import { prerequisiteInput } from "@/lib/prerequisite/schema";
import { moveTraveler as moveTravelerCase } from "@/lib/traveler/move-traveler";
import { moveTravelerInput, startTravelerInput } from "@/lib/traveler/schema";
import { startUnitTraveler } from "@/lib/traveler/start-unit-traveler";

export const voidAttempt = defineAction({
  name: "void-attempt",
  permission: "attempt.void-own",
  input: voidAttemptInput,
  run: voidAttemptCase,
});

export const reopenCheck = defineAction({
  name: "reopen-check",
  permission: "check.reopen",
  input: reopenCheckInput,
  run: reopenCheckCase,
});

export const grantConcession = defineAction({
  name: "grant-concession",
  permission: "concession.grant",
  input: grantConcessionInput,
  run: grantConcessionCase,
});

export const withdrawConcession = defineAction({
  name: "withdraw-concession",
  permission: "concession.grant",
  input: withdrawConcessionInput,
  run: withdrawConcessionCase,
});

export const liftHold = defineAction({
  name: "lift-hold",
  permission: "hold.lift",
  input: liftHoldInput,
  run: liftHoldCase,
});

export const addPrerequisite = defineAction({
  name: "add-prerequisite",
  permission: "prerequisite.edit",
  input: prerequisiteInput,
  run: addPrerequisiteCase,
});

export const removePrerequisite = defineAction({
  name: "remove-prerequisite",
  permission: "prerequisite.edit",
  input: prerequisiteInput,
  run: removePrerequisiteCase,
});

export const startTraveler = defineAction({
  name: "start-traveler",
  permission: "unit.edit",
  input: startTravelerInput,
  run: startUnitTraveler,
});

export const moveTraveler = defineAction({
  name: "move-traveler",
  permission: "procedure.edit",
  input: moveTravelerInput,
  run: moveTravelerCase,
});
