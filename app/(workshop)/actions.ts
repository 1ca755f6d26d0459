"use server";

import { nothingInput, setThemeInput } from "@/lib/account/schema";
import { setTheme as set } from "@/lib/account/set-theme";
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

export const setTheme = defineAction({ name: "set-theme", permission: "own", input: setThemeInput, run: set });
