"use server";

import { defineAction } from "@/lib/actions/define-action";
import { acceptFinding as accept } from "@/lib/finding/accept-finding";
import { acceptFindingInput, withdrawAcceptanceInput } from "@/lib/finding/schema";
import { withdrawAcceptance as withdraw } from "@/lib/finding/withdraw-acceptance";

const permission = "finding.accept";

export const acceptFinding = defineAction({
  name: "accept-finding",
  permission,
  input: acceptFindingInput,
  run: accept,
});

export const withdrawAcceptance = defineAction({
  name: "withdraw-acceptance",
  permission,
  input: withdrawAcceptanceInput,
  run: withdraw,
});
