"use server";

import { defineAction } from "@/lib/actions/define-action";
import { voidAttemptInput } from "@/lib/attempt/schema";
import { voidAttempt as voidOne } from "@/lib/attempt/void-attempt";
import { liftHold as lift } from "@/lib/check/lift-hold";
import { reopenCheck as reopen } from "@/lib/check/reopen-check";
import { liftHoldInput, reopenCheckInput } from "@/lib/check/schema";
import { grantConcession as concede } from "@/lib/concession/grant-concession";
import { grantConcessionInput, withdrawConcessionInput } from "@/lib/concession/schema";
import { withdrawConcession as withdraw } from "@/lib/concession/withdraw-concession";
import { addPrerequisite as add } from "@/lib/prerequisite/add-prerequisite";
import { removePrerequisite as remove } from "@/lib/prerequisite/remove-prerequisite";
import { prerequisiteInput } from "@/lib/prerequisite/schema";
import { moveTraveler as move } from "@/lib/traveler/move-traveler";
import { moveTravelerInput } from "@/lib/traveler/schema";

export const reopenCheck = defineAction({
  name: "reopen-check",
  permission: "check.reopen",
  input: reopenCheckInput,
  run: reopen,
});

export const grantConcession = defineAction({
  name: "grant-concession",
  permission: "concession.grant",
  input: grantConcessionInput,
  run: concede,
});

export const withdrawConcession = defineAction({
  name: "withdraw-concession",
  permission: "concession.grant",
  input: withdrawConcessionInput,
  run: withdraw,
});

export const liftHold = defineAction({
  name: "lift-hold",
  permission: "hold.lift",
  input: liftHoldInput,
  run: lift,
});

/** Of a builder's own within the window, of anybody for a maintainer: the use case tells them apart. */
export const voidAttempt = defineAction({
  name: "void-attempt",
  permission: "attempt.void-own",
  input: voidAttemptInput,
  run: voidOne,
});

export const addPrerequisite = defineAction({
  name: "add-prerequisite",
  permission: "prerequisite.edit",
  input: prerequisiteInput,
  run: add,
});

export const removePrerequisite = defineAction({
  name: "remove-prerequisite",
  permission: "prerequisite.edit",
  input: prerequisiteInput,
  run: remove,
});

export const moveTraveler = defineAction({
  name: "move-traveler",
  permission: "procedure.edit",
  input: moveTravelerInput,
  run: move,
});
