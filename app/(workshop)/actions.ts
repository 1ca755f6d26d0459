"use server";

import { nothingInput } from "@/lib/account/schema";
import { ok } from "@/lib/actions/answer";
import { defineAction } from "@/lib/actions/define-action";
import { signOut as endSession } from "@/lib/auth/auth";

/** Ends this session; the row is deleted, so the cookie is worth nothing any more. */
export const signOut = defineAction({
  name: "sign-out",
  permission: "public",
  input: nothingInput,
  run: async () => {
    await endSession({ redirectTo: "/" });
    return ok(null);
  },
});
