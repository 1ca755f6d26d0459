"use server";

import { signUpInput } from "@/lib/account/schema";
import { signUp as askForAccount } from "@/lib/account/sign-up";
import { defineAction } from "@/lib/actions/define-action";

export const signUp = defineAction({
  name: "sign-up",
  permission: "public",
  input: signUpInput,
  run: (_scope, input, call) => askForAccount(input, call),
});
