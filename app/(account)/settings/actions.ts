"use server";

import { cookies } from "next/headers";
import { THEME_COOKIE } from "@/components/ui/theme";
import { profileInput } from "@/lib/account/schema";
import { updateProfile } from "@/lib/account/update-profile";
import { defineAction } from "@/lib/actions/define-action";

const A_YEAR = 365 * 24 * 3600;

/** The cookie goes with it, so that the next page has its colours from the first byte. */
export const saveProfile = defineAction({
  name: "update-profile",
  permission: "own",
  input: profileInput,
  run: async (scope, input) => {
    const done = await updateProfile(scope, input);
    if (done.ok) (await cookies()).set(THEME_COOKIE, input.theme, { path: "/", maxAge: A_YEAR, sameSite: "lax" });
    return done;
  },
});
