"use server";

import { changePassword as change } from "@/lib/account/change-password";
import { changePasswordInput, endSessionInput, nothingInput } from "@/lib/account/schema";
import { endAllSessions, endSession as endOne } from "@/lib/account/sessions";
import { defineAction } from "@/lib/actions/define-action";
import { currentSessionKey } from "@/lib/auth/session-cookie";

export const changePassword = defineAction({
  name: "change-password",
  permission: "own",
  input: changePasswordInput,
  run: async (scope, input) => change(scope, input, await currentSessionKey()),
});

export const endSession = defineAction({
  name: "end-session",
  permission: "own",
  input: endSessionInput,
  run: (scope, input) => endOne(scope, input.session),
});

export const signOutEverywhere = defineAction({
  name: "sign-out-everywhere",
  permission: "own",
  input: nothingInput,
  run: (scope) => endAllSessions(scope),
});
