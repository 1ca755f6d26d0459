"use server";

import { openSessionWith } from "@/lib/account/open-session";
import { requestSignInLink } from "@/lib/account/request-sign-in-link";
import { linkInput, signInInput } from "@/lib/account/schema";
import { defineAction } from "@/lib/actions/define-action";

export const signIn = defineAction({
  name: "sign-in",
  permission: "public",
  input: signInInput,
  run: (_scope, input) => openSessionWith(input, { next: input.next }),
});

export const sendSignInLink = defineAction({
  name: "send-sign-in-link",
  permission: "public",
  input: linkInput,
  run: (_scope, input, call) => requestSignInLink(input, call),
});
