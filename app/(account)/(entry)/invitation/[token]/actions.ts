"use server";

import { openSessionWith } from "@/lib/account/open-session";
import { nothingInput } from "@/lib/account/schema";
import { ok } from "@/lib/actions/answer";
import { defineAction } from "@/lib/actions/define-action";
import { signOut } from "@/lib/auth/auth";
import { acceptInvitation } from "@/lib/invitation/accept-invitation";
import { acceptInput, signUpByInvitationInput } from "@/lib/invitation/schema";
import { signUpByInvitation } from "@/lib/invitation/sign-up-by-invitation";

export const accept = defineAction({
  name: "accept-invitation",
  permission: "own",
  input: acceptInput,
  run: acceptInvitation,
});

export const signUp = defineAction({
  name: "sign-up-by-invitation",
  permission: "public",
  input: signUpByInvitationInput,
  run: async (_scope, input, call) => {
    const done = await signUpByInvitation(input, call);
    if (!done.ok) return done;
    const { slug, email } = done.value;
    return openSessionWith({ email, password: input.password }, { slug });
  },
});

export const signOutHere = defineAction({
  name: "sign-out",
  permission: "public",
  input: nothingInput,
  run: async () => {
    await signOut({ redirect: false });
    return ok(null);
  },
});
