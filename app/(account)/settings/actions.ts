"use server";

import { profileInput } from "@/lib/account/schema";
import { keepTheme } from "@/lib/account/theme-cookie";
import { updateProfile } from "@/lib/account/update-profile";
import { defineAction } from "@/lib/actions/define-action";

/** The cookie goes with it, so that the next page has its colours from the first byte. */
export const saveProfile = defineAction({
  name: "update-profile",
  permission: "own",
  input: profileInput,
  run: async (scope, input) => {
    const done = await updateProfile(scope, input);
    if (done.ok) await keepTheme(input.theme);
    return done;
  },
});
